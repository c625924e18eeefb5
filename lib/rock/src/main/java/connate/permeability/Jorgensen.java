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
 * Permeability from porosity and the cementation exponent, after Jorgensen.
 *
 * <pre>
 * k = 84105 φ^(m + 2) / (1 − φ)²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>m</td><td>cementation exponent</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean rock with a known cementation exponent; 17 sets of data.
 *
 * <p><b>Source</b>: Jorgensen (1989), U.S. Geological Survey Water-Supply Paper 2321; exponent from
 * memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Jorgensen {

  /** The facts on the law of Jorgensen. */
  public static final MethodCard CARD =
      MethodCard.named("jorgensen", "Jorgensen")
          .equation("k = 84105 φ^(m + 2) / (1 - φ)²")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 2.5)
          .result("k", "permeability", Units.mD)
          .source("Jorgensen (1989), U.S. Geological Survey Water-Supply Paper 2321")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "resistivity", "aquifer")
          .note("The constant was read in the abstract, the exponent only in part.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, m) -> Jorgensen.ofNumber(phi, m));

  private Jorgensen() {}

  /** Returns the permeability of one sample by the law of Jorgensen. */
  public static Permeability of(Fraction porosity, double cementationExponent) {
    return CARD_FORMULA.value(porosity, Units.number(cementationExponent));
  }

  /** Returns the permeability of each row by the law of Jorgensen. */
  public static Series of(Operand porosity, double cementationExponent) {
    return CARD_FORMULA.series(porosity, Units.number(cementationExponent));
  }

  static double ofNumber(double phi, double m) {
    return 84105 * StrictMath.pow(phi, m + 2) / ((1 - phi) * (1 - phi));
  }
}
