package connate.cementation;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity that takes part in flow: the total less the pores inside clay.
 *
 * <pre>
 * φe = φt − Vclay m
 * </pre>
 *
 * <p><b>Valid</b> with the clay volume counted as its grains and its inner pores together.
 *
 * <p><b>Source</b>: Hurst and Nadeau (1995), AAPG Bulletin 79, 563–573. Constants from memory.
 *
 * <p><b>Checked</b> in {@code MicroporosityTest}.
 */
public final class Microporosity {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("microporosity", "Effective porosity without clay pores")
          .equation("φe = φt - Vclay m")
          .input("φt", "total porosity", Units.fraction, Range.PART)
          .input("V", "clay volume", Units.fraction, Range.PART)
          .input("m", "pores inside the clay", Units.fraction, Range.PART)
          .valid(0.3, 0.7)
          .result("φe", "effective porosity", Units.fraction)
          .source("Hurst and Nadeau (1995), AAPG Bulletin 79, 563–573")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "clay", "cement", "sandstone")
          .note(
              "Inside kaolinite some 0.43, chlorite 0.5, illite 0.6: KAOLINITE, CHLORITE, ILLITE.")
          .build();

  /** Pores inside kaolinite aggregates, from memory 0.40 to 0.45. */
  public static final double KAOLINITE = 0.43;

  /** Pores inside chlorite aggregates. */
  public static final double CHLORITE = 0.5;

  /** Pores inside illite aggregates. */
  public static final double ILLITE = 0.6;

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, (total, clay, inside) -> effective(total, clay, inside));

  private Microporosity() {}

  /** Returns the effective porosity of one value of each input. */
  public static Fraction of(Fraction total, Fraction clay, Fraction inside) {
    return FORMULA.value(total, clay, inside);
  }

  /** Returns the effective porosity of each row. */
  public static Series of(Operand total, Operand clay, Operand inside) {
    return FORMULA.series(total, clay, inside);
  }

  static double effective(double total, double clay, double inside) {
    double pores = total - clay * inside;
    if (pores < 0) {
      throw new IllegalArgumentException(
          "the clay's own pores, "
              + clay * inside
              + ", are more than the total porosity, "
              + total
              + ": total and clay do not belong together");
    }
    return pores;
  }
}
