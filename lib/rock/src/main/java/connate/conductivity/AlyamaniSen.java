package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Conductivity after Alyamani and Şen, from where the lower half of the curve meets the axis.
 *
 * <pre>K [m/d] = 1300 (I0 + 0.025 (d50 − d10))²,  I0 = d10 − (d50 − d10) / 4,  sizes in mm</pre>
 *
 * <p>I0 is the size at which the straight line through d10 and d50 reaches 0 %. Where it falls
 * below zero the line means nothing and the result is refused.
 *
 * <p><b>Valid</b> for well-sorted sand; temperature and porosity do not enter.
 *
 * <p><b>Source</b>: Alyamani and Şen (1993), Ground Water 31, 551–555. Constants from memory.
 *
 * <p><b>Checked</b> in {@code AlyamaniSenTest}.
 */
public final class AlyamaniSen {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("alyamani-sen", "Alyamani and Şen")
          .equation("K = 1300 (I0 + 0.025 (d50 - d10))², I0 = d10 - (d50 - d10)/4")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .input("d50", "size with 50 % finer", Units.mm, Range.POSITIVE)
          .result("K", "hydraulic conductivity", Units.mPerDay)
          .source("Alyamani and Şen (1993), Ground Water 31, 551–555")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("Refused where the line through d10 and d50 meets 0 % below size 0: d50 > 5 d10.")
          .build();

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY = new Entry(CARD, s -> metresPerDay(s.d10(), s.d50()) / 86400, s -> "");

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerDay, AlyamaniSen::metresPerDay);

  private AlyamaniSen() {}

  /**
   * Returns the conductivity of one sand, in m/d.
   *
   * @throws IllegalArgumentException if d50 is below d10, or above 5 d10
   */
  public static HydraulicConductivity of(Length d10, Length d50) {
    if (d50.isBelow(d10)) {
      throw new IllegalArgumentException("d50 " + d50 + " is below d10 " + d10);
    }
    return FORMULA.value(d10, d50);
  }

  /** Returns the conductivity of each row, in m/d; missing where d50 is above 5 d10. */
  public static Series of(Operand d10, Operand d50) {
    return FORMULA.series(d10, d50);
  }

  static double metresPerDay(double d10, double d50) {
    double intercept = d10 - (d50 - d10) / 4;
    if (intercept < 0 || d50 < d10) {
      return Double.NaN;
    }
    double size = intercept + 0.025 * (d50 - d10);
    return 1300 * size * size;
  }
}
