package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of loose clean sand from mean grain size and sorting, after Krumbein and Monk.
 *
 * <pre>
 * k = 760 d² exp(−1.31 s)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>D</td></tr>
 * <tr><td>d</td><td>geometric mean diameter</td><td>mm</td></tr>
 * <tr><td>s</td><td>sorting, the standard deviation in phi units</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for loose clean sands of a porosity near 0.40 and s up to 1.5. Some texts print
 * +1.31 or a mean in phi units: both are wrong.
 *
 * <p><b>Source</b>: Krumbein and Monk (1943), Trans. AIME 151, 153–163; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class KrumbeinMonk {

  /** The facts on the law of Krumbein and Monk. */
  public static final MethodCard CARD =
      MethodCard.named("krumbein-monk", "Krumbein–Monk")
          .equation("k = 760 d² exp(-1.31 s)")
          .input("d", "mean grain diameter", Units.mm, Range.POSITIVE)
          .input("s", "sorting in phi units", Units.number, Range.from(0))
          .valid(0, 1.5)
          .result("k", "permeability", Units.darcy)
          .source("Krumbein and Monk (1943), Trans. AIME 151, 153–163")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "grain size", "sorting", "sand")
          .note("Loose clean sand of a porosity near 0.40; not for buried or cemented rock.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.darcy, (d, s) -> KrumbeinMonk.ofNumber(d, s));

  private KrumbeinMonk() {}

  /** Returns the permeability of one sample by the law of Krumbein and Monk. */
  public static Permeability of(Length meanGrainDiameter, double sortingInPhiUnits) {
    return CARD_FORMULA.value(meanGrainDiameter, Units.number(sortingInPhiUnits));
  }

  /** Returns the permeability of each row by the law of Krumbein and Monk. */
  public static Series of(Operand meanGrainDiameter, Operand sortingInPhiUnits) {
    return CARD_FORMULA.series(meanGrainDiameter, sortingInPhiUnits);
  }

  static double ofNumber(double d, double s) {
    return 760 * d * d * StrictMath.exp(-1.31 * s);
  }
}
