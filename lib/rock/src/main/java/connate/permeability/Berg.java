package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of clean sandstone from porosity, median grain and sorting, after Berg.
 *
 * <pre>
 * k = 80.8 φ^5.1 d² exp(−1.385 p)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>d</td><td>median grain diameter</td><td>µm</td></tr>
 * <tr><td>p</td><td>percentile deviation P90 − P10 in phi units</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean quartz sands above a porosity of 0.30 and p below 2; tight rock comes
 * out too permeable. With d in millimetres the same factor would be a thousand times too small.
 *
 * <p><b>Source</b>: Berg (1970), Trans. Gulf Coast Assoc. Geol. Soc. 20, 303–317; constants from
 * memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Berg {

  /** The facts on the law of Berg. */
  public static final MethodCard CARD =
      MethodCard.named("berg", "Berg")
          .equation("k = 80.8 φ^5.1 d² exp(-1.385 p)")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.3, 0.45)
          .input("d", "grain diameter", Units.um, Range.POSITIVE)
          .input("p", "percentile deviation", Units.number, Range.from(0))
          .valid(0, 2)
          .result("k", "permeability", Units.mD)
          .source("Berg (1970), Trans. Gulf Coast Assoc. Geol. Soc. 20, 303–317")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "grain size", "sorting", "sand")
          .note(
              "d in µm gives mD; texts that print d in mm with the factor 80.8 are 1000 times low.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, d, p) -> Berg.ofNumber(phi, d, p));

  private Berg() {}

  /** Returns the permeability of one sample by the law of Berg. */
  public static Permeability of(
      Fraction porosity, Length grainDiameter, double percentileDeviation) {
    return CARD_FORMULA.value(porosity, grainDiameter, Units.number(percentileDeviation));
  }

  /** Returns the permeability of each row by the law of Berg. */
  public static Series of(Operand porosity, Operand grainDiameter, Operand percentileDeviation) {
    return CARD_FORMULA.series(porosity, grainDiameter, percentileDeviation);
  }

  static double ofNumber(double phi, double d, double p) {
    return 80.8 * StrictMath.pow(phi, 5.1) * d * d * StrictMath.exp(-1.385 * p);
  }
}
