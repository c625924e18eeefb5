package connate.deposition;

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
 * Porosity of sand at deposition from its sorting after Scherer.
 *
 * <pre>φ0 [%] = 20.91 + 22.90 / So</pre>
 *
 * <p><b>Valid</b> for clean, wet-packed sand; So after Trask, with the root.
 *
 * <p><b>Source</b>: Scherer (1987), AAPG Bulletin 71, 485–491, on the data of Beard and Weyl
 * (1973). Constants from memory.
 *
 * <p><b>Checked</b> in {@code SchererInitialTest}.
 */
public final class SchererInitial {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("scherer-initial", "Scherer, porosity at deposition")
          .equation("φ0 = 20.91 + 22.90/So")
          .input("So", "Trask sorting", Units.number, Range.from(1))
          .valid(1, 5.7)
          .result("φ0", "porosity", Units.percent)
          .source("Scherer (1987), AAPG Bulletin 71, 485–491")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "sorting", "sand", "deposition")
          .note("So with the square root and coarse over fine, at least 1.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.percent, SchererInitial::percent);

  private SchererInitial() {}

  /** Returns the porosity of one sand. */
  public static Fraction of(Ratio sorting) {
    return FORMULA.value(sorting);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand sorting) {
    return FORMULA.series(sorting);
  }

  static double percent(double sorting) {
    return 20.91 + 22.90 / sorting;
  }
}
