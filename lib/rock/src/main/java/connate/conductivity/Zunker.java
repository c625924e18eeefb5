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
 * Zunker: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) β (n / (1 − n))² de²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for fine and medium sand.
 *
 * <p><b>Source</b>: Zunker (1930), in Blanck, Handbuch der Bodenlehre 6; as told by Vuković and
 * Soro (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code ZunkerTest}.
 */
public final class Zunker {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("zunker", "Zunker")
          .equation("K = (g/ν) β (n/(1 - n))² de², sizes in m")
          .input("de", "effective diameter", Units.mm, Range.POSITIVE)
          .input("n", "porosity", Units.fraction, Range.above(0).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .input("β", "factor", Units.number, Range.POSITIVE)
          .valid(0.7e-3, 2.4e-3)
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "Zunker (1930), in Blanck, Handbuch der Bodenlehre 6; as told by Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "β from 0.7e-3 for angular, badly shaped grains to 2.4e-3 for smooth uniform ones; the default is the middle, 1.55e-3.")
          .note("de is Zunker's effective diameter: EffectiveDiameter.zunker.")
          .build();

  /** The middle of the published factors. */
  public static final double MIDDLE = 1.55e-3;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.deZunker(), sand.n(), sand.celsius(), MIDDLE),
          sand -> Outside.median(sand, 0.125, 0.5));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Zunker::metresPerSecond);

  private Zunker() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(
      Length diameter, Fraction porosity, Temperature temperature, Ratio beta) {
    return FORMULA.value(diameter, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand diameter, Operand porosity, Operand temperature, Operand beta) {
    return FORMULA.series(diameter, porosity, temperature, beta).to(Units.mPerDay);
  }

  /** Returns the conductivity of one sand with the middle factor, in m/d. */
  public static HydraulicConductivity of(
      Length diameter, Fraction porosity, Temperature temperature) {
    return of(diameter, porosity, temperature, Units.number(MIDDLE));
  }

  /** Returns the conductivity of each row with the middle factor, in m/d. */
  public static Series of(Operand diameter, Operand porosity, Operand temperature) {
    return of(diameter, porosity, temperature, Units.number(MIDDLE));
  }

  static double metresPerSecond(double mm, double n, double celsius, double beta) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n, beta);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n, double beta) {
    double d = mm / 1000;
    double c = n / (1 - n);
    return beta * c * c * d * d;
  }
}
