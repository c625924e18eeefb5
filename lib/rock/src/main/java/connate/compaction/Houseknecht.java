package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * How much of the first porosity compaction and cement destroyed, after Houseknecht.
 *
 * <pre>
 * by compaction (40 − IGV) / 40,  by cement C / 40
 * </pre>
 *
 * <p><b>Valid</b> for clean sand that began with 40 %. The shrinking of the bulk volume is left
 * out, so the shares differ from those of {@link CompactionLoss}: say which.
 *
 * <p><b>Source</b>: Houseknecht (1987), AAPG Bulletin 71, 633–642.
 *
 * <p><b>Checked</b> in {@code HouseknechtTest}.
 */
public final class Houseknecht {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("houseknecht-compaction", "Houseknecht, porosity destroyed by compaction")
          .equation("share = (40 - IGV)/40")
          .input("IGV", "intergranular volume", Units.percent, Range.of(0, 100))
          .valid(0, 40)
          .result("share", "share of the first porosity destroyed", Units.percent)
          .source("Houseknecht (1987), AAPG Bulletin 71, 633–642")
          .constants(Constants.CHECKED)
          .topics("compaction", "cement", "sandstone", "porosity")
          .note("Bulk shrinkage is left out: not the same as COPL.")
          .build();

  /** The facts on cement. */
  public static final MethodCard CEMENT =
      MethodCard.named("houseknecht-cement", "Houseknecht, porosity destroyed by cement")
          .equation("share = C/40")
          .input("C", "cement", Units.percent, Range.of(0, 100))
          .valid(0, 40)
          .result("share", "share of the first porosity destroyed", Units.percent)
          .source("Houseknecht (1987), AAPG Bulletin 71, 633–642")
          .constants(Constants.CHECKED)
          .topics("compaction", "cement", "sandstone", "porosity")
          .note("Bulk shrinkage is left out: not the same as CEPL.")
          .build();

  private static final Formula<Fraction> CARD_FORMULA =
      Formula.of(CARD, Units.percent, volume -> compaction(volume));
  private static final Formula<Fraction> CEMENT_FORMULA =
      Formula.of(CEMENT, Units.percent, cement -> cementation(cement));

  private Houseknecht() {}

  /** Returns the share destroyed by compaction of one value of each input. */
  public static Fraction byCompaction(Fraction volume) {
    return CARD_FORMULA.value(volume);
  }

  /** Returns the share destroyed by compaction of each row. */
  public static Series byCompaction(Operand volume) {
    return CARD_FORMULA.series(volume);
  }

  /** Returns the share destroyed by cement of one value of each input. */
  public static Fraction byCement(Fraction cement) {
    return CEMENT_FORMULA.value(cement);
  }

  /** Returns the share destroyed by cement of each row. */
  public static Series byCement(Operand cement) {
    return CEMENT_FORMULA.series(cement);
  }

  static double compaction(double volume) {
    return (40 - volume) / 40 * 100;
  }

  static double cementation(double cement) {
    return cement / 40 * 100;
  }
}
