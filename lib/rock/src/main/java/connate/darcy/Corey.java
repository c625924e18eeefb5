package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Relative permeability by powers of the mobile saturation, after Corey.
 *
 * <pre>
 * S = (Sw − Swc) / (1 − Swc − Sor)
 * k_rw = a S^n
 * k_ro = b (1 − S)^m
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>Sw, Swc, Sor</td><td>saturation of water, connate water, residual oil</td><td>1</td></tr>
 * <tr><td>a, b</td><td>end points</td><td>1</td></tr>
 * <tr><td>n, m</td><td>exponents, 2 to 6</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for drainage; fit the exponents to measurements.
 *
 * <p><b>Source</b>: Corey (1954), Producers Monthly 19(1), 38–41; Brooks and Corey (1964).
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Corey {

  /** The facts on water. */
  public static final MethodCard WATER =
      MethodCard.named("corey-water", "Corey, water")
          .equation("k_rw = a ((Sw - Swc) / (1 - Swc - Sor))^n")
          .input("Sw", "water saturation", Units.fraction, Range.PART)
          .input("Swc", "connate water", Units.fraction, Range.PART)
          .input("Sor", "residual oil", Units.fraction, Range.PART)
          .input("a", "end point", Units.number, Range.POSITIVE)
          .input("n", "exponent", Units.number, Range.POSITIVE)
          .valid(1, 6)
          .result("k_rw", "relative permeability to water", Units.fraction)
          .source("Corey (1954), Producers Monthly 19(1), 38–41")
          .constants(Constants.EXACT)
          .topics("relative permeability", "flow")
          .note("Drainage form.")
          .build();

  /** The facts on oil. */
  public static final MethodCard OIL =
      MethodCard.named("corey-oil", "Corey, oil")
          .equation("k_ro = b (1 - (Sw - Swc) / (1 - Swc - Sor))^m")
          .input("Sw", "water saturation", Units.fraction, Range.PART)
          .input("Swc", "connate water", Units.fraction, Range.PART)
          .input("Sor", "residual oil", Units.fraction, Range.PART)
          .input("b", "end point", Units.number, Range.POSITIVE)
          .input("m", "exponent", Units.number, Range.POSITIVE)
          .valid(1, 6)
          .result("k_ro", "relative permeability to oil", Units.fraction)
          .source("Corey (1954), Producers Monthly 19(1), 38–41")
          .constants(Constants.EXACT)
          .topics("relative permeability", "flow")
          .note("Drainage form.")
          .build();

  private static final Formula<Fraction> WATER_FORMULA =
      Formula.ofAny(
          WATER, Units.fraction, in -> Corey.waterNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Fraction> OIL_FORMULA =
      Formula.ofAny(OIL, Units.fraction, in -> Corey.oilNumber(in[0], in[1], in[2], in[3], in[4]));

  private Corey() {}

  /** Returns the relative permeability to water of one sample by water. */
  public static Fraction water(
      Fraction waterSaturation,
      Fraction connateWater,
      Fraction residualOil,
      double endPoint,
      double exponent) {
    return WATER_FORMULA.value(
        waterSaturation, connateWater, residualOil, Units.number(endPoint), Units.number(exponent));
  }

  /** Returns the relative permeability to water of each row by water. */
  public static Series water(
      Operand waterSaturation,
      Operand connateWater,
      Operand residualOil,
      double endPoint,
      double exponent) {
    return WATER_FORMULA.series(
        waterSaturation, connateWater, residualOil, Units.number(endPoint), Units.number(exponent));
  }

  static double waterNumber(double sw, double swc, double sor, double a, double n) {
    return a * StrictMath.pow(mobile(sw, swc, sor), n);
  }

  /** Returns the relative permeability to oil of one sample by oil. */
  public static Fraction oil(
      Fraction waterSaturation,
      Fraction connateWater,
      Fraction residualOil,
      double endPoint,
      double exponent) {
    return OIL_FORMULA.value(
        waterSaturation, connateWater, residualOil, Units.number(endPoint), Units.number(exponent));
  }

  /** Returns the relative permeability to oil of each row by oil. */
  public static Series oil(
      Operand waterSaturation,
      Operand connateWater,
      Operand residualOil,
      Operand endPoint,
      double exponent) {
    return OIL_FORMULA.series(
        waterSaturation, connateWater, residualOil, endPoint, Units.number(exponent));
  }

  static double oilNumber(double sw, double swc, double sor, double b, double m) {
    return b * StrictMath.pow(1 - mobile(sw, swc, sor), m);
  }

  private static double mobile(double sw, double swc, double sor) {
    double span = 1 - swc - sor;
    if (!(span > 0)) {
      throw new IllegalArgumentException(
          "connate water " + swc + " and residual oil " + sor + " leave nothing mobile");
    }
    return StrictMath.max(0, StrictMath.min(1, (sw - swc) / span));
  }
}
