package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of shale with depth after Baldwin and Butler: a power of the solid part.
 *
 * <pre>
 * normal shale       z = 6.02 S^6.35,  φ = 1 − S
 * undercompacted     z = 15 S^8
 * </pre>
 *
 * <p><b>Valid</b> for shale, the second law for thick beds (over 200 m) that could not lose their
 * water.
 *
 * <p><b>Source</b>: Baldwin and Butler (1985), AAPG Bulletin 69, 622–626. Constants from memory.
 *
 * <p><b>Checked</b> in {@code BaldwinButlerTest}.
 */
public final class BaldwinButler {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("baldwin-butler", "Baldwin and Butler, normal shale")
          .equation("φ = 1 - (z/6.02)^(1/6.35)")
          .input("z", "depth below the sea floor or ground", Units.km, Range.of(0, 6.02))
          .result("φ", "porosity", Units.fraction)
          .source("Baldwin and Butler (1985), AAPG Bulletin 69, 622–626")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "porosity", "depth", "shale")
          .build();

  /** The facts on thick, undercompacted shale. */
  public static final MethodCard UNDERCOMPACTED =
      MethodCard.named("baldwin-butler-undercompacted", "Baldwin and Butler, undercompacted shale")
          .equation("φ = 1 - (z/15)^(1/8)")
          .input("z", "depth below the sea floor or ground", Units.km, Range.of(0, 15))
          .result("φ", "porosity", Units.fraction)
          .source("Baldwin and Butler (1985), AAPG Bulletin 69, 622–626")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "porosity", "depth", "shale", "overpressure")
          .note("Beds over 200 m thick.")
          .build();

  private static final Formula<Fraction> CARD_FORMULA =
      Formula.of(CARD, Units.fraction, depth -> normal(depth));
  private static final Formula<Fraction> UNDERCOMPACTED_FORMULA =
      Formula.of(UNDERCOMPACTED, Units.fraction, depth -> thick(depth));

  private BaldwinButler() {}

  /** Returns the porosity of normal shale of one value of each input. */
  public static Fraction of(Length depth) {
    return CARD_FORMULA.value(depth);
  }

  /** Returns the porosity of normal shale of each row. */
  public static Series of(Operand depth) {
    return CARD_FORMULA.series(depth);
  }

  /** Returns the porosity of thick, undercompacted shale of one value of each input. */
  public static Fraction undercompacted(Length depth) {
    return UNDERCOMPACTED_FORMULA.value(depth);
  }

  /** Returns the porosity of thick, undercompacted shale of each row. */
  public static Series undercompacted(Operand depth) {
    return UNDERCOMPACTED_FORMULA.series(depth);
  }

  /** Returns the depth at which normal shale has a porosity. */
  public static Length depth(Fraction porosity) {
    Listening.used(CARD);
    return Units.km(6.02 * StrictMath.pow(porosity.rest().fraction(), 6.35));
  }

  /** Returns the depth at which thick, undercompacted shale has a porosity. */
  public static Length undercompactedDepth(Fraction porosity) {
    Listening.used(UNDERCOMPACTED);
    return Units.km(15 * StrictMath.pow(porosity.rest().fraction(), 8));
  }

  static double normal(double depth) {
    return 1 - StrictMath.pow(depth / 6.02, 1 / 6.35);
  }

  static double thick(double depth) {
    return 1 - StrictMath.pow(depth / 15, 1.0 / 8);
  }
}
