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
 * Permeability of a sand of many grain sizes, after Panda and Lake.
 *
 * <pre>
 * k = D² φ³ (g C³ + 3 C² + 1)² / (72 τ (1 − φ)² (1 + C²)²)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>m²</td></tr>
 * <tr><td>D</td><td>mean grain diameter</td><td>m</td></tr>
 * <tr><td>C</td><td>coefficient of variation of the diameters, by number</td><td>1</td></tr>
 * <tr><td>g</td><td>skewness of the diameters, by number</td><td>1</td></tr>
 * <tr><td>τ</td><td>tortuosity, near 2.5</td><td>1</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for unconsolidated sand of spherical grains; C and g of the number distribution
 * in millimetres, not in phi units. Cement needs another surface.
 *
 * <p><b>Source</b>: Panda and Lake (1994), AAPG Bulletin 78, 1028–1039.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class PandaLake {

  /** The facts on the law of Panda and Lake. */
  public static final MethodCard CARD =
      MethodCard.named("panda-lake", "Panda–Lake")
          .equation("k = D² φ³ (g C³ + 3 C² + 1)² / (72 τ (1 - φ)² (1 + C²)²)")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("D", "mean grain diameter", Units.m, Range.POSITIVE)
          .input("C", "coefficient of variation", Units.number, Range.from(0))
          .valid(0, 2)
          .input("g", "skewness", Units.number)
          .input("τ", "tortuosity", Units.number, Range.POSITIVE)
          .valid(1, 10)
          .result("k", "permeability", Units.squareMetres)
          .source("Panda and Lake (1994), AAPG Bulletin 78, 1028–1039")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "grain size", "sorting", "sand")
          .note("C and g by number and in mm, not in phi units.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.ofAny(
          CARD, Units.squareMetres, in -> PandaLake.ofNumber(in[0], in[1], in[2], in[3], in[4]));

  private PandaLake() {}

  /** Returns the permeability of one sample by the law of Panda and Lake. */
  public static Permeability of(
      Fraction porosity,
      Length meanGrainDiameter,
      double coefficientOfVariation,
      double skewness,
      double tortuosity) {
    return CARD_FORMULA.value(
        porosity,
        meanGrainDiameter,
        Units.number(coefficientOfVariation),
        Units.number(skewness),
        Units.number(tortuosity));
  }

  /** Returns the permeability of each row by the law of Panda and Lake. */
  public static Series of(
      Operand porosity,
      Operand meanGrainDiameter,
      double coefficientOfVariation,
      Operand skewness,
      double tortuosity) {
    return CARD_FORMULA.series(
        porosity,
        meanGrainDiameter,
        Units.number(coefficientOfVariation),
        skewness,
        Units.number(tortuosity));
  }

  static double ofNumber(double phi, double d, double c, double g, double tau) {
    double shape = (g * c * c * c + 3 * c * c + 1) / (1 + c * c);
    double solid = 1 - phi;
    return d * d * phi * phi * phi * shape * shape / (72 * tau * solid * solid);
  }
}
