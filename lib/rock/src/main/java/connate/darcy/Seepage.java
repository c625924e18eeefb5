package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.quantity.Velocity;
import connate.series.Series;

/**
 * Velocity of the water itself, and its travel time, from the flux.
 *
 * <pre>
 * v = K i / φ
 * t = L / v
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>v</td><td>seepage velocity</td><td>m/s</td></tr>
 * <tr><td>K</td><td>hydraulic conductivity</td><td>m/s</td></tr>
 * <tr><td>i</td><td>gradient of head</td><td>1</td></tr>
 * <tr><td>φ</td><td>effective porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for a tracer that is not held back; porosity is the effective one.
 *
 * <p><b>Source</b>: Darcy (1856); common practice.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Seepage {

  /** The facts on Darcy flux over porosity. */
  public static final MethodCard CARD =
      MethodCard.named("seepage-velocity", "Seepage velocity")
          .equation("v = K i / φ")
          .input("K", "hydraulic conductivity", Units.mPerSecond, Range.from(0))
          .input("i", "gradient of head", Units.number)
          .input("φ", "effective porosity", Units.fraction, Range.above(0).to(1))
          .result("v", "seepage velocity", Units.metresPerSecond)
          .source("Darcy (1856); common practice")
          .constants(Constants.EXACT)
          .topics("flow", "darcy", "velocity", "aquifer")
          .note("The flux is not a velocity: divide by the effective porosity.")
          .build();

  private static final Formula<Velocity> CARD_FORMULA =
      Formula.of(
          CARD,
          Units.metresPerSecond,
          (k, gradient, phi) -> Seepage.velocityNumber(k, gradient, phi));

  private Seepage() {}

  /** Returns the seepage velocity of one sample by Darcy flux over porosity. */
  public static Velocity velocity(
      HydraulicConductivity hydraulicConductivity,
      double gradientOfHead,
      Fraction effectivePorosity) {
    return CARD_FORMULA.value(
        hydraulicConductivity, Units.number(gradientOfHead), effectivePorosity);
  }

  /** Returns the seepage velocity of each row by Darcy flux over porosity. */
  public static Series velocity(
      Operand hydraulicConductivity, Operand gradientOfHead, Operand effectivePorosity) {
    return CARD_FORMULA.series(hydraulicConductivity, gradientOfHead, effectivePorosity);
  }

  static double velocityNumber(double k, double gradient, double phi) {
    return k * gradient / phi;
  }
}
