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
 * Hazen: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 6·10⁻⁴ (1 + 10 (n − 0.26)) d10²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for d10 from 0.1 to 3 mm and Cu below 5.
 *
 * <p><b>Source</b>: Hazen (1892), Massachusetts State Board of Health, 24th Annual Report; in the
 * form of Vuković and Soro (1992).
 *
 * <p><b>Checked</b> in {@code HazenTest}.
 */
public final class Hazen {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("hazen", "Hazen")
          .equation("K = (g/ν) 6e-4 (1 + 10 (n - 0.26)) d10², sizes in m")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .valid(0.1, 3)
          .input("n", "porosity", Units.fraction, Range.above(0.16).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "Hazen (1892), Massachusetts State Board of Health, 24th Annual Report; in the form of Vuković and Soro (1992)")
          .constants(Constants.CHECKED)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "Uniformity coefficient below 5. Porosity of the sand in place, not of a repacked sample; above 0.16, where the bracket turns negative.")
          .build();

  private static final double BETA = 6e-4;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.d10(), sand.n(), sand.celsius()),
          sand -> Outside.uniformity(sand, 0, 5));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Hazen::metresPerSecond);

  private Hazen() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(Length d10, Fraction porosity, Temperature temperature) {
    return FORMULA.value(d10, porosity, temperature).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature) {
    return FORMULA.series(d10, porosity, temperature).to(Units.mPerDay);
  }

  static double metresPerSecond(double mm, double n, double celsius) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n) {
    double d = mm / 1000;
    return BETA * (1 + 10 * (n - 0.26)) * d * d;
  }
}
