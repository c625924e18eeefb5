package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity falls exponentially with depth after Athy.
 *
 * <pre>
 * φ = φ0 exp(−c z)
 * </pre>
 *
 * <p><b>Valid</b> for mechanical compaction at normal pressure. Depth is below the sea floor or the
 * ground, not below the rig or the sea level; after uplift it is the greatest the rock has seen.
 * Under overpressure use {@link EffectiveStress}.
 *
 * <p><b>Source</b>: Athy (1930), AAPG Bulletin 14, 1–24.
 *
 * <p><b>Checked</b> in {@code AthyTest}.
 */
public final class Athy {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("athy", "Athy, exponential compaction")
          .equation("φ = φ0 exp(-c z)")
          .input("φ0", "porosity at the surface", Units.fraction, Range.above(0).below(1))
          .input("c", "compaction coefficient per km", Units.number, Range.from(0))
          .valid(0.1, 1.5)
          .input("z", "depth below the sea floor or ground", Units.km, Range.from(0))
          .result("φ", "porosity", Units.fraction)
          .source("Athy (1930), AAPG Bulletin 14, 1–24")
          .constants(Constants.EXACT)
          .topics("compaction", "porosity", "depth", "sand", "shale")
          .note(
              "Greatest depth below the sea floor, not present depth, after uplift; not for overpressured rock.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, (initial, perKm, depth) -> porosity(initial, perKm, depth));

  private Athy() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Fraction initial, Ratio perKm, Length depth) {
    return FORMULA.value(initial, perKm, depth);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand initial, Operand perKm, Operand depth) {
    return FORMULA.series(initial, perKm, depth);
  }

  static double porosity(double initial, double perKm, double depth) {
    return initial * StrictMath.exp(-perKm * depth);
  }
}
