package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Sauerbrei: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 3.75·10⁻³ n³ / (1 − n)² d17²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for sand and sandy clay with d17 below 0.5 mm.
 *
 * <p><b>Source</b>: Sauerbrei (1932), as told by Vuković and Soro (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code SauerbreiTest}.
 */
public final class Sauerbrei {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("sauerbrei", "Sauerbrei")
          .equation("K = (g/ν) 3.75e-3 n³/(1 - n)² d17², sizes in m")
          .input("d17", "size with 17 % finer", Units.mm, Range.POSITIVE)
          .valid(0, 0.5)
          .input("n", "porosity", Units.fraction, Range.above(0).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source("Sauerbrei (1932), as told by Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("d17, not d10.")
          .build();

  private static final double BETA = 3.75e-3;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(CARD, sand -> metresPerSecond(sand.d17(), sand.n(), sand.celsius()), sand -> "");

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Sauerbrei::metresPerSecond);

  private Sauerbrei() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(Length d17, Fraction porosity, Temperature temperature) {
    return FORMULA.value(d17, porosity, temperature).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d17, Operand porosity, Operand temperature) {
    return FORMULA.series(d17, porosity, temperature).to(Units.mPerDay);
  }

  static double metresPerSecond(double mm, double n, double celsius) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n) {
    double d = mm / 1000;
    return BETA * n * n * n / ((1 - n) * (1 - n)) * d * d;
  }
}
