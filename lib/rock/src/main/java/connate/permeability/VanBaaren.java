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
 * Permeability of consolidated sandstone from dominant grain size, porosity and sorting, after van
 * Baaren.
 *
 * <pre>
 * k = 10 d² φ^(3.64 + m) C^(−3.64)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>d</td><td>dominant grain diameter</td><td>µm</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>m</td><td>cementation exponent</td><td>1</td></tr>
 * <tr><td>C</td><td>sorting, from 0.70 extremely well to 1.0 poorly sorted</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for consolidated sandstone with one dominant grain size.
 *
 * <p><b>Source</b>: van Baaren (1979), SPWLA 6th European Formation Evaluation Symposium, Paris;
 * constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class VanBaaren {

  /** The facts on the law of van Baaren. */
  public static final MethodCard CARD =
      MethodCard.named("van-baaren", "van Baaren")
          .equation("k = 10 d² φ^(3.64 + m) C^-3.64")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("d", "dominant grain diameter", Units.um, Range.POSITIVE)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 2.2)
          .input("C", "sorting", Units.number, Range.POSITIVE)
          .valid(0.7, 1.0)
          .result("k", "permeability", Units.mD)
          .source("van Baaren (1979), SPWLA 6th European Formation Evaluation Symposium, Paris")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "grain size", "sorting", "sandstone")
          .note("C runs from 0.70, extremely well sorted, to 1.0, poorly sorted.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, d, m, sorting) -> VanBaaren.ofNumber(phi, d, m, sorting));

  private VanBaaren() {}

  /** Returns the permeability of one sample by the law of van Baaren. */
  public static Permeability of(
      Fraction porosity, Length dominantGrainDiameter, double cementationExponent, double sorting) {
    return CARD_FORMULA.value(
        porosity, dominantGrainDiameter, Units.number(cementationExponent), Units.number(sorting));
  }

  /** Returns the permeability of each row by the law of van Baaren. */
  public static Series of(
      Operand porosity, Operand dominantGrainDiameter, double cementationExponent, double sorting) {
    return CARD_FORMULA.series(
        porosity, dominantGrainDiameter, Units.number(cementationExponent), Units.number(sorting));
  }

  static double ofNumber(double phi, double d, double m, double sorting) {
    return 10 * d * d * StrictMath.pow(phi, 3.64 + m) * StrictMath.pow(sorting, -3.64);
  }
}
