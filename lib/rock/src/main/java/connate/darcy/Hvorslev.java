package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Time;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Hydraulic conductivity from a slug test, after Hvorslev.
 *
 * <pre>
 * K = r² ln(L/R) / (2 L T0)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>K</td><td>hydraulic conductivity</td><td>m/s</td></tr>
 * <tr><td>r</td><td>radius of the casing</td><td>m</td></tr>
 * <tr><td>R, L</td><td>radius and length of the screen</td><td>m</td></tr>
 * <tr><td>T0</td><td>time at which 37 % of the first head is left</td><td>s</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for screens longer than 8 radii; filter pack and skin spoil it.
 *
 * <p><b>Source</b>: Hvorslev (1951), US Army Corps of Engineers Waterways Experiment Station,
 * Bulletin 36; formula from memory.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Hvorslev {

  /** The facts on the slug test of Hvorslev. */
  public static final MethodCard CARD =
      MethodCard.named("hvorslev", "Hvorslev slug test")
          .equation("K = r² ln(L/R) / (2 L T0)")
          .input("r", "casing radius", Units.m, Range.POSITIVE)
          .input("R", "screen radius", Units.m, Range.POSITIVE)
          .input("L", "screen length", Units.m, Range.POSITIVE)
          .input("T0", "time lag", Units.s, Range.POSITIVE)
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source("Hvorslev (1951), Waterways Experiment Station Bulletin 36")
          .constants(Constants.FROM_MEMORY)
          .topics("well", "aquifer", "slug test", "hydraulic conductivity")
          .note("L/R above 8.")
          .build();

  private static final Formula<HydraulicConductivity> CARD_FORMULA =
      Formula.of(
          CARD,
          Units.mPerSecond,
          (r, radius, length, lag) -> Hvorslev.conductivityNumber(r, radius, length, lag));

  private Hvorslev() {}

  /** Returns the hydraulic conductivity of one sample by the slug test of Hvorslev. */
  public static HydraulicConductivity conductivity(
      Length casingRadius, Length screenRadius, Length screenLength, Time timeLag) {
    return CARD_FORMULA.value(casingRadius, screenRadius, screenLength, timeLag);
  }

  /** Returns the hydraulic conductivity of each row by the slug test of Hvorslev. */
  public static Series conductivity(
      Operand casingRadius, Operand screenRadius, Operand screenLength, Operand timeLag) {
    return CARD_FORMULA.series(casingRadius, screenRadius, screenLength, timeLag);
  }

  static double conductivityNumber(double r, double radius, double length, double lag) {
    if (length <= 8 * radius) {
      throw new IllegalArgumentException(
          "the screen is " + length / radius + " radii long; this form needs more than 8");
    }
    return r * r * StrictMath.log(length / radius) / (2 * length * lag);
  }
}
