package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of mudstone across the bedding from void ratio and clay fraction, after Yang and
 * Aplin.
 *
 * <pre>
 * ln k = −69.59 − 26.79 C + 44.07 √C
 *      + (−53.61 − 80.03 C + 132.78 √C) e
 *      + (86.61 + 81.91 C − 163.61 √C) √e,  e = φ/(1 − φ)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability across the bedding</td><td>m²</td></tr>
 * <tr><td>C</td><td>mass fraction of grains below 2 µm, not shale volume</td><td>1</td></tr>
 * <tr><td>e</td><td>void ratio</td><td>1</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for fine-grained clastic rock, C from 0.12 to 0.97, φ from 0.04 to 0.78; across
 * the bedding.
 *
 * <p><b>Source</b>: Yang and Aplin (2010), Marine and Petroleum Geology 27, 1692–1697, abstract.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class YangAplin {

  /** The facts on the law of Yang and Aplin. */
  public static final MethodCard CARD =
      MethodCard.named("yang-aplin", "Yang–Aplin")
          .equation(
              "ln k = -69.59 - 26.79 C + 44.07 √C + (-53.61 - 80.03 C + 132.78 √C) e + (86.61 + 81.91 C - 163.61 √C) √e, e = φ/(1 - φ)")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.04, 0.78)
          .input("C", "clay fraction", Units.fraction, Range.PART)
          .valid(0.12, 0.97)
          .result("k", "permeability across bedding", Units.squareMetres)
          .source("Yang and Aplin (2010), Marine and Petroleum Geology 27, 1692–1697")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "mudstone", "clay", "shale")
          .note(
              "C is the mass fraction below 2 µm, not shale volume. Divide by the anisotropy for flow along the bedding the other way round.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.squareMetres, (phi, c) -> YangAplin.ofNumber(phi, c));

  private YangAplin() {}

  /** Returns the permeability across bedding of one sample by the law of Yang and Aplin. */
  public static Permeability of(Fraction porosity, Fraction clayFraction) {
    return CARD_FORMULA.value(porosity, clayFraction);
  }

  /** Returns the permeability across bedding of each row by the law of Yang and Aplin. */
  public static Series of(Operand porosity, Operand clayFraction) {
    return CARD_FORMULA.series(porosity, clayFraction);
  }

  static double ofNumber(double phi, double c) {
    double e = phi / (1 - phi);
    double r = StrictMath.sqrt(c);
    double ln =
        -69.59
            - 26.79 * c
            + 44.07 * r
            + (-53.61 - 80.03 * c + 132.78 * r) * e
            + (86.61 + 81.91 * c - 163.61 * r) * StrictMath.sqrt(e);
    return StrictMath.exp(ln);
  }
}
