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
 * Krüger: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 4.35·10⁻⁴ n / (1 − n)² de²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for medium sand with Cu above 5.
 *
 * <p><b>Source</b>: Krüger (1919), Internationale Mitteilungen für Bodenkunde 8, 105; as told by
 * Vuković and Soro (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code KrugerTest}.
 */
public final class Kruger {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("kruger", "Krüger")
          .equation("K = (g/ν) 4.35e-4 n/(1 - n)² de², sizes in m")
          .input("de", "effective diameter", Units.mm, Range.POSITIVE)
          .input("n", "porosity", Units.fraction, Range.above(0).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "Krüger (1919), Internationale Mitteilungen für Bodenkunde 8, 105; as told by Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("de is Krüger's effective diameter: EffectiveDiameter.kruger.")
          .note("The form «240 m/d at 0 °C» found elsewhere implies 5.06e-4, 16 % more.")
          .build();

  private static final double BETA = 4.35e-4;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.deKruger(), sand.n(), sand.celsius()),
          sand -> Outside.both(Outside.median(sand, 0.25, 0.5), Outside.uniformity(sand, 5, 1000)));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Kruger::metresPerSecond);

  private Kruger() {}

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
    return BETA * n / ((1 - n) * (1 - n)) * d * d;
  }
}
