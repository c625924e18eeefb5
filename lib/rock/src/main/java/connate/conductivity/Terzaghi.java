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
 * Terzaghi: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) β ((n − 0.13) / (1 − n)^⅓)² d10²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for coarse sand.
 *
 * <p><b>Source</b>: Terzaghi (1925), Engineering News-Record 95, 832–836; in the form of Vuković
 * and Soro (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code TerzaghiTest}.
 */
public final class Terzaghi {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("terzaghi", "Terzaghi")
          .equation("K = (g/ν) β ((n - 0.13)/(1 - n)^(1/3))² d10², sizes in m")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .input("n", "porosity", Units.fraction, Range.above(0.13).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .input("β", "factor", Units.number, Range.POSITIVE)
          .valid(6.1e-3, 10.7e-3)
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "Terzaghi (1925), Engineering News-Record 95, 832–836; in the form of Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "β from 6.1e-3 for coarse grains to 10.7e-3 for smooth ones; the default is the middle, 8.4e-3.")
          .build();

  /** The factor of smooth grains. */
  public static final double SMOOTH = 10.7e-3;

  /** The factor of coarse, angular grains. */
  public static final double COARSE = 6.1e-3;

  /** The middle of both, the default. */
  public static final double MIDDLE = 8.4e-3;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.d10(), sand.n(), sand.celsius(), MIDDLE),
          sand -> Outside.median(sand, 0.5, 2));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Terzaghi::metresPerSecond);

  private Terzaghi() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(
      Length d10, Fraction porosity, Temperature temperature, Ratio beta) {
    return FORMULA.value(d10, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature, Operand beta) {
    return FORMULA.series(d10, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of one sand with the middle factor, in m/d. */
  public static HydraulicConductivity of(Length d10, Fraction porosity, Temperature temperature) {
    return of(d10, porosity, temperature, Units.number(MIDDLE));
  }

  /** Returns the conductivity of each row with the middle factor, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature) {
    return of(d10, porosity, temperature, Units.number(MIDDLE));
  }

  static double metresPerSecond(double mm, double n, double celsius, double beta) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n, beta);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n, double beta) {
    double d = mm / 1000;
    double c = (n - 0.13) / StrictMath.cbrt(1 - n);
    return beta * c * c * d * d;
  }
}
