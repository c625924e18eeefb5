package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity without what shale holds.
 *
 * <pre>
 * φ_e = φ_t − V φ_sh
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>φ_t</td><td>total porosity</td><td>1</td></tr>
 * <tr><td>V</td><td>shale volume</td><td>1</td></tr>
 * <tr><td>φ_sh</td><td>porosity of shale</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> core porosity by helium, dried at 105 °C, is near the total.
 *
 * <p><b>Source</b>: volume balance; common practice.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class EffectivePorosity {

  /** The facts on volume balance. */
  public static final MethodCard CARD =
      MethodCard.named("effective-porosity", "Effective porosity")
          .equation("φ_e = φ_t - V φ_sh, cut at 0")
          .input("φ_t", "total porosity", Units.fraction)
          .input("V", "shale volume", Units.fraction, Range.PART)
          .input("φ_sh", "porosity of shale", Units.fraction, Range.PART)
          .result("φ_e", "effective porosity", Units.fraction)
          .source("volume balance; common practice")
          .constants(Constants.EXACT)
          .topics("porosity", "logs", "shale volume")
          .note("Cut at 0. Do not feed total porosity into a transform made for effective.")
          .build();

  private static final Formula<Fraction> CARD_FORMULA =
      Formula.of(
          CARD,
          Units.fraction,
          (total, shale, bound) -> EffectivePorosity.ofNumber(total, shale, bound));

  private EffectivePorosity() {}

  /** Returns the effective porosity of one sample by volume balance. */
  public static Fraction of(
      Fraction totalPorosity, Fraction shaleVolume, Fraction porosityOfShale) {
    return CARD_FORMULA.value(totalPorosity, shaleVolume, porosityOfShale);
  }

  /** Returns the effective porosity of each row by volume balance. */
  public static Series of(Operand totalPorosity, Operand shaleVolume, Operand porosityOfShale) {
    return CARD_FORMULA.series(totalPorosity, shaleVolume, porosityOfShale);
  }

  static double ofNumber(double total, double shale, double bound) {
    return StrictMath.max(0, total - shale * bound);
  }
}
