package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Angle;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.InterfacialTension;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Capillary pressure of a throat, the column that a seal holds, and its scaling between fluids and
 * rocks.
 *
 * <pre>
 * p = 2 γ cos θ / r
 * h = (p_seal − p_reservoir) / (Δρ g)
 * p2 = p1 γ2 |cos θ2| / (γ1 |cos θ1|)
 * J = p √(k/φ) / (γ cos θ)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>p</td><td>threshold pressure</td><td>Pa</td></tr>
 * <tr><td>γ, θ</td><td>interfacial tension and contact angle</td><td>N/m, °</td></tr>
 * <tr><td>r</td><td>radius of the connected throat</td><td>m</td></tr>
 * <tr><td>h</td><td>column</td><td>m</td></tr>
 * <tr><td>Δρ</td><td>difference of density</td><td>kg/m³</td></tr>
 * <tr><td>J</td><td>Leverett function</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for the connected throat, not the mean one; one rock type for each J. Leaks along
 * faults are another matter.
 *
 * <p><b>Source</b>: Young (1805); Laplace (1806); Berg (1975), AAPG Bulletin 59, 939–956; Leverett
 * (1941), Trans. AIME 142, 152–169.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Capillary {

  /** The facts on Young and Laplace. */
  public static final MethodCard THRESHOLD =
      MethodCard.named("young-laplace", "Young–Laplace threshold")
          .equation("p = 2 γ |cos θ| / r")
          .input("γ", "interfacial tension", Units.NPerM, Range.POSITIVE)
          .input("θ", "contact angle", Units.degrees, Range.from(0))
          .input("r", "throat radius", Units.m, Range.POSITIVE)
          .result("p", "threshold pressure", Units.Pa)
          .source("Young (1805); Laplace (1806)")
          .constants(Constants.EXACT)
          .topics("capillary pressure", "seal", "column")
          .note("r is that of the connected throat.")
          .build();

  /** The facts on the balance of buoyancy. */
  public static final MethodCard COLUMN =
      MethodCard.named("sealed-column", "Column held by a seal")
          .equation("h = (p_seal - p_reservoir) / (Δρ g)")
          .input("p_seal", "threshold pressure of the seal", Units.Pa, Range.from(0))
          .input("p_reservoir", "threshold pressure of the reservoir", Units.Pa, Range.from(0))
          .input("Δρ", "density difference", Units.kgPerM3, Range.POSITIVE)
          .result("h", "column", Units.m)
          .source("Berg (1975), AAPG Bulletin 59, 939–956")
          .constants(Constants.EXACT)
          .topics("capillary pressure", "seal", "column", "containment")
          .note(
              "Capillary leakage only; faults and fractures leak on their own. An estimate: containment needs tests and licensed practice.")
          .build();

  /** The facts on tension and angle. */
  public static final MethodCard SCALED =
      MethodCard.named("capillary-scaling", "Capillary pressure in other fluids")
          .equation("p2 = p1 γ2 |cos θ2| / (γ1 |cos θ1|)")
          .input("p1", "pressure in the laboratory", Units.Pa, Range.from(0))
          .input("γ1", "tension in the laboratory", Units.NPerM, Range.POSITIVE)
          .input("θ1", "angle in the laboratory", Units.degrees, Range.from(0))
          .input("γ2", "tension in the rock", Units.NPerM, Range.POSITIVE)
          .input("θ2", "angle in the rock", Units.degrees, Range.from(0))
          .result("p2", "pressure in the rock", Units.Pa)
          .source("common practice")
          .constants(Constants.EXACT)
          .topics("capillary pressure", "mercury", "core")
          .note("480 mN/m and 140° or 485 and 130° for mercury: say which.")
          .build();

  /** The facts on the function of Leverett. */
  public static final MethodCard LEVERETT =
      MethodCard.named("leverett-j", "Leverett J")
          .equation("J = p √(k/φ) / (γ cos θ)")
          .input("p", "capillary pressure", Units.Pa, Range.from(0))
          .input("γ", "interfacial tension", Units.NPerM, Range.POSITIVE)
          .input("θ", "contact angle", Units.degrees, Range.from(0))
          .input("k", "permeability", Units.squareMetres, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .result("J", "Leverett function", Units.number)
          .source("Leverett (1941), Trans. AIME 142, 152–169")
          .constants(Constants.EXACT)
          .topics("capillary pressure", "rock type")
          .note(
              "One rock type for each J. The oilfield constant is 0.21660 by unit arithmetic; many texts print 0.21645.")
          .build();

  private static final Formula<Pressure> THRESHOLD_FORMULA =
      Formula.of(
          THRESHOLD, Units.Pa, (gamma, theta, r) -> Capillary.thresholdNumber(gamma, theta, r));

  private static final Formula<Length> COLUMN_FORMULA =
      Formula.of(
          COLUMN,
          Units.m,
          (seal, reservoir, density) -> Capillary.columnNumber(seal, reservoir, density));

  private static final Formula<Pressure> SCALED_FORMULA =
      Formula.ofAny(
          SCALED, Units.Pa, in -> Capillary.scaledNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Ratio> LEVERETT_FORMULA =
      Formula.ofAny(
          LEVERETT,
          Units.number,
          in -> Capillary.leverettNumber(in[0], in[1], in[2], in[3], in[4]));

  private Capillary() {}

  /** Returns the threshold pressure of one sample by Young and Laplace. */
  public static Pressure threshold(
      InterfacialTension interfacialTension, Angle contactAngle, Length throatRadius) {
    return THRESHOLD_FORMULA.value(interfacialTension, contactAngle, throatRadius);
  }

  /** Returns the threshold pressure of each row by Young and Laplace. */
  public static Series threshold(
      Operand interfacialTension, Operand contactAngle, Operand throatRadius) {
    return THRESHOLD_FORMULA.series(interfacialTension, contactAngle, throatRadius);
  }

  static double thresholdNumber(double gamma, double theta, double r) {
    return 2 * gamma * StrictMath.abs(StrictMath.cos(StrictMath.toRadians(theta))) / r;
  }

  /** Returns the column of one sample by the balance of buoyancy. */
  public static Length column(
      Pressure thresholdPressureOfTheSeal,
      Pressure thresholdPressureOfTheReservoir,
      Density densityDifference) {
    return COLUMN_FORMULA.value(
        thresholdPressureOfTheSeal, thresholdPressureOfTheReservoir, densityDifference);
  }

  /** Returns the column of each row by the balance of buoyancy. */
  public static Series column(
      Operand thresholdPressureOfTheSeal,
      Operand thresholdPressureOfTheReservoir,
      Operand densityDifference) {
    return COLUMN_FORMULA.series(
        thresholdPressureOfTheSeal, thresholdPressureOfTheReservoir, densityDifference);
  }

  static double columnNumber(double seal, double reservoir, double density) {
    return StrictMath.max(0, seal - reservoir) / (density * 9.80665);
  }

  /** Returns the pressure in the rock of one sample by tension and angle. */
  public static Pressure scaled(
      Pressure pressureInTheLaboratory,
      InterfacialTension tensionInTheLaboratory,
      Angle angleInTheLaboratory,
      InterfacialTension tensionInTheRock,
      Angle angleInTheRock) {
    return SCALED_FORMULA.value(
        pressureInTheLaboratory,
        tensionInTheLaboratory,
        angleInTheLaboratory,
        tensionInTheRock,
        angleInTheRock);
  }

  /** Returns the pressure in the rock of each row by tension and angle. */
  public static Series scaled(
      Operand pressureInTheLaboratory,
      Operand tensionInTheLaboratory,
      Operand angleInTheLaboratory,
      Operand tensionInTheRock,
      Operand angleInTheRock) {
    return SCALED_FORMULA.series(
        pressureInTheLaboratory,
        tensionInTheLaboratory,
        angleInTheLaboratory,
        tensionInTheRock,
        angleInTheRock);
  }

  static double scaledNumber(double p, double g1, double a1, double g2, double a2) {
    double first = g1 * StrictMath.abs(StrictMath.cos(StrictMath.toRadians(a1)));
    return p * g2 * StrictMath.abs(StrictMath.cos(StrictMath.toRadians(a2))) / first;
  }

  /** Returns the Leverett function of one sample by the function of Leverett. */
  public static Ratio leverett(
      Pressure capillaryPressure,
      InterfacialTension interfacialTension,
      Angle contactAngle,
      Permeability permeability,
      Fraction porosity) {
    return LEVERETT_FORMULA.value(
        capillaryPressure, interfacialTension, contactAngle, permeability, porosity);
  }

  /** Returns the Leverett function of each row by the function of Leverett. */
  public static Series leverett(
      Operand capillaryPressure,
      Operand interfacialTension,
      Operand contactAngle,
      Operand permeability,
      Operand porosity) {
    return LEVERETT_FORMULA.series(
        capillaryPressure, interfacialTension, contactAngle, permeability, porosity);
  }

  static double leverettNumber(double p, double gamma, double theta, double k, double phi) {
    return p
        * StrictMath.sqrt(k / phi)
        / (gamma * StrictMath.abs(StrictMath.cos(StrictMath.toRadians(theta))));
  }
}
