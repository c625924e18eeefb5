package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Resistivity;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Resistivity of brine at another temperature, after Arps.
 *
 * <pre>
 * R2 = R1 (T1 + 6.77) / (T2 + 6.77)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>R1, R2</td><td>resistivity at both temperatures</td><td>ohm·m</td></tr>
 * <tr><td>T1, T2</td><td>temperatures</td><td>°F</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for sodium chloride brine.
 *
 * <p><b>Source</b>: Arps (1953), J. Pet. Technol. 5, TN175; constant from memory.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class Arps {

  /** The facts on the law of Arps. */
  public static final MethodCard CARD =
      MethodCard.named("arps", "Arps temperature correction")
          .equation("R2 = R1 (T1 + 6.77) / (T2 + 6.77), T in °F")
          .input("R1", "resistivity", Units.ohmM, Range.POSITIVE)
          .input("T1", "its temperature", Units.degF)
          .input("T2", "other temperature", Units.degF)
          .result("R2", "resistivity at the other temperature", Units.ohmM)
          .source("Arps (1953), J. Pet. Technol. 5, TN175")
          .constants(Constants.FROM_MEMORY)
          .topics("logs", "resistivity", "temperature")
          .note("With degrees Celsius the constant is 21.5.")
          .build();

  private static final Formula<Resistivity> CARD_FORMULA =
      Formula.of(CARD, Units.ohmM, (r, t1, t2) -> Arps.resistivityNumber(r, t1, t2));

  private Arps() {}

  /** Returns the resistivity at the other temperature of one sample by the law of Arps. */
  public static Resistivity resistivity(
      Resistivity resistivity, Temperature itsTemperature, Temperature otherTemperature) {
    return CARD_FORMULA.value(resistivity, itsTemperature, otherTemperature);
  }

  /** Returns the resistivity at the other temperature of each row by the law of Arps. */
  public static Series resistivity(
      Operand resistivity, Operand itsTemperature, Operand otherTemperature) {
    return CARD_FORMULA.series(resistivity, itsTemperature, otherTemperature);
  }

  static double resistivityNumber(double r, double t1, double t2) {
    if (t1 <= -6.77 || t2 <= -6.77) {
      throw new IllegalArgumentException(
          "the law of Arps needs temperatures above -6.77 °F, where brine is ice");
    }
    return r * (t1 + 6.77) / (t2 + 6.77);
  }
}
