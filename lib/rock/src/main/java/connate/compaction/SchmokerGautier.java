package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity as a power of thermal maturity after Schmoker and Gautier; A and B are fitted for each
 * formation.
 *
 * <pre>
 * φ = A M^B,  B &lt; 0
 * </pre>
 *
 * <p><b>Valid</b> within the formation for which A and B were fitted. M is vitrinite reflectance or
 * a time-temperature index, and A belongs to the one chosen.
 *
 * <p><b>Source</b>: Schmoker and Gautier (1988), Geology 16, 1007–1010.
 *
 * <p><b>Checked</b> in {@code SchmokerGautierTest}.
 */
public final class SchmokerGautier {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("schmoker-gautier", "Schmoker and Gautier, porosity by maturity")
          .equation("φ = A M^B")
          .input("A", "factor", Units.fraction, Range.above(0).to(1))
          .input("M", "maturity", Units.number, Range.POSITIVE)
          .input("B", "exponent", Units.number, Range.upTo(0))
          .result("φ", "porosity", Units.fraction)
          .source("Schmoker and Gautier (1988), Geology 16, 1007–1010")
          .constants(Constants.CHECKED)
          .topics("compaction", "porosity", "temperature", "maturity")
          .note("Exponential decline with depth is the special case of an exponential maturity.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(
          CARD,
          Units.fraction,
          (factor, maturity, exponent) -> porosity(factor, maturity, exponent));

  private SchmokerGautier() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Fraction factor, Ratio maturity, Ratio exponent) {
    return FORMULA.value(factor, maturity, exponent);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand factor, Operand maturity, Operand exponent) {
    return FORMULA.series(factor, maturity, exponent);
  }

  static double porosity(double factor, double maturity, double exponent) {
    return factor * StrictMath.pow(maturity, exponent);
  }
}
