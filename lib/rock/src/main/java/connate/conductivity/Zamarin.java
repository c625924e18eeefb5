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
 * Zamarin: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 8.65·10⁻³ n³ / (1 − n)² (1.275 − 1.5 n)² de²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for coarse sand.
 *
 * <p><b>Source</b>: Zamarin (1928), as told by Vuković and Soro (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code ZamarinTest}.
 */
public final class Zamarin {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("zamarin", "Zamarin")
          .equation("K = (g/ν) 8.65e-3 n³/(1 - n)² (1.275 - 1.5n)² de², sizes in m")
          .input("de", "effective diameter", Units.mm, Range.POSITIVE)
          .input("n", "porosity", Units.fraction, Range.above(0).below(0.85))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source("Zamarin (1928), as told by Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("de is Zamarin's effective diameter: EffectiveDiameter.zamarin.")
          .build();

  private static final double BETA = 8.65e-3;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.deZamarin(), sand.n(), sand.celsius()),
          sand -> Outside.median(sand, 0.5, 2));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Zamarin::metresPerSecond);

  private Zamarin() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(
      Length diameter, Fraction porosity, Temperature temperature) {
    return FORMULA.value(diameter, porosity, temperature).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand diameter, Operand porosity, Operand temperature) {
    return FORMULA.series(diameter, porosity, temperature).to(Units.mPerDay);
  }

  static double metresPerSecond(double mm, double n, double celsius) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n) {
    double d = mm / 1000;
    double c = 1.275 - 1.5 * n;
    return BETA * n * n * n / ((1 - n) * (1 - n)) * c * c * d * d;
  }
}
