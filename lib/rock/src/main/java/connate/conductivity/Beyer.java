package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Beyer: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 6·10⁻⁴ log10(500 / Cu) d10²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for d10 from 0.06 to 0.6 mm and Cu from 1 to 20.
 *
 * <p><b>Source</b>: Beyer (1964), Wasserwirtschaft-Wassertechnik 14, 165–168.
 *
 * <p><b>Checked</b> in {@code BeyerTest}.
 */
public final class Beyer {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("beyer", "Beyer")
          .equation("K = (g/ν) 6e-4 log10(500/Cu) d10², sizes in m")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .valid(0.06, 0.6)
          .input("Cu", "uniformity coefficient", Units.number, Range.from(1))
          .valid(1, 20)
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source("Beyer (1964), Wasserwirtschaft-Wassertechnik 14, 165–168")
          .constants(Constants.CHECKED)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "The decimal logarithm; at least one text prints the natural one, which is 2.3 times as much.")
          .build();

  private static final double BETA = 6e-4;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.d10(), sand.uniformity(), sand.celsius()),
          sand -> Outside.uniformity(sand, 1, 20));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Beyer::metresPerSecond);

  private Beyer() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(Length d10, Ratio uniformity, Temperature temperature) {
    return FORMULA.value(d10, uniformity, temperature).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand uniformity, Operand temperature) {
    return FORMULA.series(d10, uniformity, temperature).to(Units.mPerDay);
  }

  static double metresPerSecond(double mm, double cu, double celsius) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, cu);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double cu) {
    double d = mm / 1000;
    return BETA * StrictMath.log10(500 / cu) * d * d;
  }
}
