package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Kozeny–Carman, conductivity: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) β n³ / (1 − n)² d10²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for sand and gravel with d10 below 3 mm, without clay.
 *
 * <p><b>Source</b>: Kozeny (1927); Carman (1937); Bear (1972), Dynamics of Fluids in Porous Media;
 * in the form of Vuković and Soro (1992).
 *
 * <p><b>Checked</b> in {@code BearKozenyCarmanTest}.
 */
public final class BearKozenyCarman {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("kozeny-carman-conductivity", "Kozeny–Carman, conductivity")
          .equation("K = (g/ν) β n³/(1 - n)² d10², sizes in m")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .valid(0, 3)
          .input("n", "porosity", Units.fraction, Range.above(0).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .input("β", "factor", Units.number, Range.POSITIVE)
          .valid(1.0 / 180, 8.3e-3)
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "Kozeny (1927); Carman (1937); Bear (1972), Dynamics of Fluids in Porous Media; in the form of Vuković and Soro (1992)")
          .constants(Constants.CHECKED)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "Texts disagree on β by a factor of 1.49: 8.3e-3, the default, or 1/180 = 5.556e-3.")
          .note("Not for clay.")
          .build();

  /** The factor of texts on grain-size formulas, the default. */
  public static final double VUKOVIC_SORO = 8.3e-3;

  /** The factor 1/180 of equal spheres. */
  public static final double SPHERES = 1.0 / 180;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.d10(), sand.n(), sand.celsius(), VUKOVIC_SORO),
          sand -> "");

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, BearKozenyCarman::metresPerSecond);

  private BearKozenyCarman() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(
      Length d10, Fraction porosity, Temperature temperature, Ratio beta) {
    return FORMULA.value(d10, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature, Operand beta) {
    return FORMULA.series(d10, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of one sand with the factor 8.3e-3, in m/d. */
  public static HydraulicConductivity of(Length d10, Fraction porosity, Temperature temperature) {
    return of(d10, porosity, temperature, Units.number(VUKOVIC_SORO));
  }

  /** Returns the conductivity of each row with the factor 8.3e-3, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature) {
    return of(d10, porosity, temperature, Units.number(VUKOVIC_SORO));
  }

  static double metresPerSecond(double mm, double n, double celsius, double beta) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n, beta);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n, double beta) {
    double d = mm / 1000;
    return beta * n * n * n / ((1 - n) * (1 - n)) * d * d;
  }
}
