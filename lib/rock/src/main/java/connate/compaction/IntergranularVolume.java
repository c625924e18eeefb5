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
 * The volume between the grains: what mechanical compaction left, whatever filled it later.
 *
 * <pre>
 * IGV = P + C + M
 * </pre>
 *
 * <p><b>Valid</b> with P, C and M counted between the grains only: no pores inside grains, no
 * cement that replaced grains.
 *
 * <p><b>Source</b>: Houseknecht (1987), AAPG Bulletin 71, 633–642; Paxton and others (2002), AAPG
 * Bulletin 86, 2047–2067.
 *
 * <p><b>Checked</b> in {@code IntergranularVolumeTest}.
 */
public final class IntergranularVolume {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("intergranular-volume", "Intergranular volume")
          .equation("IGV = P + C + M")
          .input("P", "intergranular porosity", Units.fraction, Range.PART)
          .input("C", "intergranular cement", Units.fraction, Range.PART)
          .input("M", "matrix", Units.fraction, Range.PART)
          .result("IGV", "intergranular volume", Units.fraction)
          .source(
              "Houseknecht (1987), AAPG Bulletin 71, 633–642; Paxton and others (2002), AAPG Bulletin 86, 2047–2067")
          .constants(Constants.EXACT)
          .topics("compaction", "cement", "sandstone")
          .build();

  /** The facts on the curve for rigid grains. */
  public static final MethodCard RIGID =
      MethodCard.named("paxton-igv", "Paxton, intergranular volume of rigid sand by depth")
          .equation("IGV from 41 % at the surface to 28 % at 1.5 km and 26 % from 2.25 km down")
          .input("z", "greatest depth", Units.m, Range.from(0))
          .valid(0, 6700)
          .result("IGV", "intergranular volume", Units.fraction)
          .source("Paxton and others (2002), AAPG Bulletin 86, 2047–2067")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "sandstone", "intergranular volume", "depth")
          .note("Straight between three remembered points of a drawn curve; rigid grains only.")
          .build();

  private static final Formula<Fraction> CARD_FORMULA =
      Formula.of(
          CARD, Units.fraction, (porosity, cement, matrix) -> volume(porosity, cement, matrix));
  private static final Formula<Fraction> RIGID_FORMULA =
      Formula.of(RIGID, Units.fraction, depth -> rigidAt(depth));

  private IntergranularVolume() {}

  /** Returns the intergranular volume of one value of each input. */
  public static Fraction of(Fraction porosity, Fraction cement, Fraction matrix) {
    return CARD_FORMULA.value(porosity, cement, matrix);
  }

  /** Returns the intergranular volume of each row. */
  public static Series of(Operand porosity, Operand cement, Operand matrix) {
    return CARD_FORMULA.series(porosity, cement, matrix);
  }

  /**
   * Returns the intergranular volume of rigid sand at a greatest depth of one value of each input.
   */
  public static Fraction rigid(Length depth) {
    return RIGID_FORMULA.value(depth);
  }

  /** Returns the intergranular volume of rigid sand at a greatest depth of each row. */
  public static Series rigid(Operand depth) {
    return RIGID_FORMULA.series(depth);
  }

  static double volume(double porosity, double cement, double matrix) {
    double sum = porosity + cement + matrix;
    if (sum > 1) {
      throw new IllegalArgumentException(
          "porosity, cement and matrix add up to " + sum + " of the rock: more than all");
    }
    return sum;
  }

  static double rigidAt(double depth) {
    if (depth <= 1500) {
      return 0.41 + (0.28 - 0.41) * depth / 1500;
    }
    return depth >= 2250 ? 0.26 : 0.28 + (0.26 - 0.28) * (depth - 1500) / 750;
  }
}
