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
 * Porosity lost by compaction and by cement, in parts of the original bulk volume, after Lundegard
 * and Ehrenberg.
 *
 * <pre>
 * Pmc = P + C
 * COPL = Pi − (100 − Pi) Pmc / (100 − Pmc)
 * CEPL = (Pi − COPL) C / Pmc
 * ICOMPACT = COPL / (COPL + CEPL)
 * </pre>
 *
 * <p><b>Valid</b> for intergranular porosity P and cement C in percent of the present bulk; COPL
 * and CEPL are percent of the original bulk. Grains must not have dissolved or been replaced.
 *
 * <p><b>Source</b>: Lundegard (1992), J. Sedimentary Petrology 62, 250–260; Ehrenberg (1989), AAPG
 * Bulletin 73, 1274–1276. Constants from memory.
 *
 * <p><b>Checked</b> in {@code CompactionLossTest}.
 */
public final class CompactionLoss {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("compaction-loss", "Porosity lost by compaction (COPL)")
          .equation("COPL = Pi - (100 - Pi) Pmc/(100 - Pmc)")
          .input("Pi", "porosity at deposition", Units.percent, Range.above(0).below(100))
          .valid(30, 50)
          .input("P", "intergranular porosity", Units.percent, Range.of(0, 100))
          .input("C", "intergranular cement", Units.percent, Range.of(0, 100))
          .result("COPL", "porosity lost by compaction", Units.percent)
          .source(
              "Lundegard (1992), J. Sedimentary Petrology 62, 250–260; Ehrenberg (1989), AAPG Bulletin 73, 1274–1276")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "cement", "sandstone", "porosity")
          .note("Percent of the original bulk volume; negative where Pi was chosen too small.")
          .build();

  /** The facts on loss by cement. */
  public static final MethodCard CEMENT =
      MethodCard.named("cement-loss", "Porosity lost by cement (CEPL)")
          .equation("CEPL = (Pi - COPL) C/Pmc")
          .input("Pi", "porosity at deposition", Units.percent, Range.above(0).below(100))
          .valid(30, 50)
          .input("P", "intergranular porosity", Units.percent, Range.of(0, 100))
          .input("C", "intergranular cement", Units.percent, Range.of(0, 100))
          .result("CEPL", "porosity lost by cement", Units.percent)
          .source(
              "Lundegard (1992), J. Sedimentary Petrology 62, 250–260; Ehrenberg (1989), AAPG Bulletin 73, 1274–1276")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "cement", "sandstone", "porosity")
          .build();

  /** The facts on the compaction index. */
  public static final MethodCard INDEX =
      MethodCard.named("compaction-index", "Compaction index (ICOMPACT)")
          .equation("ICOMPACT = COPL/(COPL + CEPL)")
          .input("Pi", "porosity at deposition", Units.percent, Range.above(0).below(100))
          .valid(30, 50)
          .input("P", "intergranular porosity", Units.percent, Range.of(0, 100))
          .input("C", "intergranular cement", Units.percent, Range.of(0, 100))
          .result("ICOMPACT", "share of the loss by compaction", Units.fraction)
          .source(
              "Lundegard (1992), J. Sedimentary Petrology 62, 250–260; Ehrenberg (1989), AAPG Bulletin 73, 1274–1276")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "cement", "sandstone", "porosity")
          .build();

  private static final Formula<Fraction> CARD_FORMULA =
      Formula.of(
          CARD, Units.percent, (initial, porosity, cement) -> copl(initial, porosity, cement));
  private static final Formula<Fraction> CEMENT_FORMULA =
      Formula.of(
          CEMENT, Units.percent, (initial, porosity, cement) -> cepl(initial, porosity, cement));
  private static final Formula<Fraction> INDEX_FORMULA =
      Formula.of(
          INDEX,
          Units.fraction,
          (initial, porosity, cement) -> icompact(initial, porosity, cement));

  private CompactionLoss() {}

  /** Returns the porosity lost by compaction of one value of each input. */
  public static Fraction byCompaction(Fraction initial, Fraction porosity, Fraction cement) {
    return CARD_FORMULA.value(initial, porosity, cement);
  }

  /** Returns the porosity lost by compaction of each row. */
  public static Series byCompaction(Operand initial, Operand porosity, Operand cement) {
    return CARD_FORMULA.series(initial, porosity, cement);
  }

  /** Returns the porosity lost by cement of one value of each input. */
  public static Fraction byCement(Fraction initial, Fraction porosity, Fraction cement) {
    return CEMENT_FORMULA.value(initial, porosity, cement);
  }

  /** Returns the porosity lost by cement of each row. */
  public static Series byCement(Operand initial, Operand porosity, Operand cement) {
    return CEMENT_FORMULA.series(initial, porosity, cement);
  }

  /** Returns the share of the loss by compaction of one value of each input. */
  public static Fraction index(Fraction initial, Fraction porosity, Fraction cement) {
    return INDEX_FORMULA.value(initial, porosity, cement);
  }

  /** Returns the share of the loss by compaction of each row. */
  public static Series index(Operand initial, Operand porosity, Operand cement) {
    return INDEX_FORMULA.series(initial, porosity, cement);
  }

  /** The minus-cement porosity, which is the intergranular volume without matrix. */
  private static double minusCement(double porosity, double cement) {
    double now = porosity + cement;
    if (now >= 100) {
      throw new IllegalArgumentException(
          "porosity " + porosity + " % and cement " + cement + " % leave no grains");
    }
    return now;
  }

  static double copl(double initial, double porosity, double cement) {
    double now = minusCement(porosity, cement);
    return initial - (100 - initial) * now / (100 - now);
  }

  static double cepl(double initial, double porosity, double cement) {
    double now = minusCement(porosity, cement);
    return now == 0 ? 0 : (initial - copl(initial, porosity, cement)) * cement / now;
  }

  static double icompact(double initial, double porosity, double cement) {
    double copl = copl(initial, porosity, cement);
    return copl / (copl + cepl(initial, porosity, cement));
  }
}
