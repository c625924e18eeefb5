package connate.grains;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Sorting after Trask: the square root of the ratio of the coarse quartile to the fine one, 1 for
 * equal grains.
 *
 * <pre>So = √(d75 / d25),  lognormal sizes: So = 2^(0.67449 sφ)</pre>
 *
 * <p><b>Valid</b> for any curve; it sees only the middle half. Some authors quote the ratio without
 * the root or turned over.
 *
 * <p><b>Source</b>: Trask (1932), Origin and Environment of Source Sediments of Petroleum. The
 * definition from memory.
 *
 * <p><b>Checked</b> in {@code TraskTest}.
 */
public final class Trask {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("trask", "Trask sorting")
          .equation("So = √(d75/d25)")
          .input("d75", "coarse quartile", Units.mm, Range.POSITIVE)
          .input("d25", "fine quartile", Units.mm, Range.POSITIVE)
          .result("So", "Trask sorting", Units.number)
          .source("Trask (1932), Origin and Environment of Source Sediments of Petroleum")
          .constants(Constants.FROM_MEMORY)
          .topics("grain size", "sorting", "grains")
          .note("At least 1; with the root, coarse over fine.")
          .build();

  /** The facts on the sorting of lognormal sizes from their spread in phi. */
  public static final MethodCard LOGNORMAL =
      MethodCard.named("trask-lognormal", "Trask sorting of lognormal sizes")
          .equation("So = 2^(0.67449 sφ)")
          .input("sφ", "standard deviation in phi", Units.number, Range.from(0))
          .result("So", "Trask sorting", Units.number)
          .source("upper quartile of the normal law; Trask (1932)")
          .constants(Constants.EXACT)
          .topics("grain size", "sorting", "grains")
          .build();

  private static final double UPPER_QUARTILE = 0.6744897501960817;

  private static final Formula<Ratio> FORMULA = Formula.of(CARD, Units.number, Trask::sorting);
  private static final Formula<Ratio> LOGNORMAL_FORMULA =
      Formula.of(LOGNORMAL, Units.number, Trask::ofSpread);

  private Trask() {}

  /**
   * Returns the sorting of two quartiles.
   *
   * @throws IllegalArgumentException if the coarse one is the finer
   */
  public static Ratio of(Length coarseQuartile, Length fineQuartile) {
    return FORMULA.value(coarseQuartile, fineQuartile);
  }

  /** Returns the sorting of each row. */
  public static Series of(Operand coarseQuartile, Operand fineQuartile) {
    return FORMULA.series(coarseQuartile, fineQuartile);
  }

  /** Returns the sorting of a curve. */
  public static Ratio of(GrainCurve curve) {
    return of(curve.d(75), curve.d(25));
  }

  /** Returns the sorting of each curve. */
  public static Series of(GrainCurves curves) {
    Listening.used(CARD);
    return curves.map("sorting", Units.number, c -> sorting(c.sizeMm(75), c.sizeMm(25)));
  }

  /** Returns the sorting of lognormal sizes with a standard deviation in phi. */
  public static Ratio ofPhiSpread(Ratio spread) {
    return LOGNORMAL_FORMULA.value(spread);
  }

  /** Returns the sorting of lognormal sizes in each row. */
  public static Series ofPhiSpread(Operand spread) {
    return LOGNORMAL_FORMULA.series(spread);
  }

  /** Returns the standard deviation in phi of lognormal sizes with a sorting. */
  public static Ratio phiSpread(Ratio sorting) {
    if (!(sorting.value() >= 1)) {
      throw new IllegalArgumentException("a Trask sorting is at least 1, found " + sorting);
    }
    Listening.used(LOGNORMAL);
    return Units.number(StrictMath.log(sorting.value()) / StrictMath.log(2) / UPPER_QUARTILE);
  }

  static double sorting(double coarse, double fine) {
    if (coarse < fine) {
      throw new IllegalArgumentException(
          "the coarse quartile "
              + coarse
              + " mm is finer than the fine quartile "
              + fine
              + " mm: turned over?");
    }
    return StrictMath.sqrt(coarse / fine);
  }

  static double ofSpread(double spread) {
    return StrictMath.pow(2, UPPER_QUARTILE * spread);
  }
}
