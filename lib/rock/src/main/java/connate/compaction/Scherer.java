package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Time;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of sandstone from composition, sorting, depth and age after Scherer.
 *
 * <pre>
 * φ [%] = 18.60 + 4.73 ln(quartz %) + 17.37/So − 3.8 z[km] − 4.65 ln(age[Ma])
 * </pre>
 *
 * <p><b>Valid</b> for sandstone with little clay or matrix and without overpressure; the standard
 * error is 4 to 5 porosity units (428 samples). The logarithm is natural, quartz in percent of the
 * solid grains, depth the greatest.
 *
 * <p><b>Source</b>: Scherer (1987), AAPG Bulletin 71, 485–491. Constants from memory.
 *
 * <p><b>Checked</b> in {@code SchererTest}.
 */
public final class Scherer {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("scherer", "Scherer, sandstone porosity")
          .equation("φ = 18.60 + 4.73 ln(Q) + 17.37/So - 3.8 z - 4.65 ln(t)")
          .input("Q", "quartz of the grains", Units.percent, Range.above(0).to(100))
          .valid(5, 100)
          .input("So", "Trask sorting", Units.number, Range.from(1))
          .valid(1, 5.7)
          .input("z", "depth", Units.km, Range.from(0))
          .valid(0, 7)
          .input("t", "age", Units.Ma, Range.POSITIVE)
          .valid(1, 500)
          .result("φ", "porosity", Units.percent)
          .source("Scherer (1987), AAPG Bulletin 71, 485–491")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "porosity", "depth", "sand", "sandstone", "sorting")
          .note(
              "Standard error 4 to 5 porosity units; little clay or matrix, no overpressure. Cut at 0.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(
          CARD,
          Units.percent,
          (quartz, sorting, depth, age) -> percent(quartz, sorting, depth, age));

  private Scherer() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Fraction quartz, Ratio sorting, Length depth, Time age) {
    return FORMULA.value(quartz, sorting, depth, age);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand quartz, Operand sorting, Operand depth, Operand age) {
    return FORMULA.series(quartz, sorting, depth, age);
  }

  static double percent(double quartz, double sorting, double depth, double age) {
    double phi =
        18.60
            + 4.73 * StrictMath.log(quartz)
            + 17.37 / sorting
            - 3.8 * depth
            - 4.65 * StrictMath.log(age);
    return StrictMath.max(0, phi);
  }
}
