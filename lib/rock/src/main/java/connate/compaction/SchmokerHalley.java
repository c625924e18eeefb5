package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of carbonates with depth after Schmoker and Halley.
 *
 * <pre>
 * φ [%] = 41.73 exp(−z / 2498 m)
 * </pre>
 *
 * <p><b>Valid</b> for south Florida carbonates, 0 to 5.5 km, on a cool passive margin; not for deep
 * hot basins. The paper has fits for limestone and dolomite apart, which are not here.
 *
 * <p><b>Source</b>: Schmoker and Halley (1982), AAPG Bulletin 66, 2561–2570. Constants from memory.
 *
 * <p><b>Checked</b> in {@code SchmokerHalleyTest}.
 */
public final class SchmokerHalley {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("schmoker-halley", "Schmoker and Halley, carbonates")
          .equation("φ = 41.73 exp(-z/2498)")
          .input("z", "depth", Units.m, Range.from(0))
          .valid(0, 5500)
          .result("φ", "porosity", Units.percent)
          .source("Schmoker and Halley (1982), AAPG Bulletin 66, 2561–2570")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "porosity", "depth", "carbonate", "limestone", "dolomite")
          .note("South Florida, a cool passive margin; not for deep hot basins.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.percent, depth -> percent(depth));

  private SchmokerHalley() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Length depth) {
    return FORMULA.value(depth);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand depth) {
    return FORMULA.series(depth);
  }

  static double percent(double depth) {
    return 41.73 * StrictMath.exp(-depth / 2498);
  }
}
