package connate.permeability;

import connate.formula.Formula;
import connate.formula.TransformForm;
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
 * Permeability of a bed of equal spheres after Kozeny and Carman.
 *
 * <pre>k = φ³ d² / (180 (1 − φ)²)</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>m²</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>d</td><td>grain diameter</td><td>m</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for creeping flow through unconsolidated, well-sorted grains, φ from 0.26 to
 * 0.48. Not for clays, fractures or cemented rock.
 *
 * <p><b>Source</b>: Kozeny (1927), Sitzungsber. Akad. Wiss. Wien 136, 271–306; Carman (1937),
 * Trans. Inst. Chem. Eng. 15, 150–166; the factor 180 = 36 × 5 holds Carman's empirical constant 5.
 * Worked example in Tiab and Donaldson (2004), Petrophysics, 2nd ed., p. 111.
 *
 * <p><b>Checked</b> in {@code KozenyCarmanTest}.
 */
public final class KozenyCarman {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("kozeny-carman", "Kozeny–Carman")
          .equation("k = φ³ d² / (180 (1 - φ)²)")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.26, 0.48)
          .input("d", "grain diameter", Units.m, Range.POSITIVE)
          .result("k", "permeability", Units.squareMetres)
          .source(
              "Kozeny (1927), Sitzungsber. Akad. Wiss. Wien 136, 271–306; Carman (1937), Trans."
                  + " Inst. Chem. Eng. 15, 150–166")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "grain size", "sand")
          .note("Unconsolidated, well-sorted grains; not for clays, fractures or cemented rock.")
          .build();

  /** The form for a comparison of transforms: log10 k = a + log10 (φ³/(1 − φ)²). */
  public static final TransformForm FORM =
      new TransformForm(CARD, "log10(φ³/(1 - φ)²)", phi -> StrictMath.log10(shape(phi)), false);

  private static final double CARMAN = 180;

  private static final Formula<Permeability> FORMULA =
      Formula.of(CARD, Units.squareMetres, KozenyCarman::squareMetres);

  private KozenyCarman() {}

  /**
   * Returns the permeability of the bed, in mD.
   *
   * @throws IllegalArgumentException if the porosity is not from 0 to below 1: no grains, no bed
   */
  public static Permeability of(Fraction porosity, Length grainDiameter) {
    return FORMULA.value(porosity, grainDiameter).to(Units.mD);
  }

  /** Returns the permeability of each row, in mD. */
  public static Series of(Operand porosity, Operand grainDiameter) {
    return FORMULA.series(porosity, grainDiameter).to(Units.mD);
  }

  static double squareMetres(double phi, double d) {
    return shape(phi) * d * d / CARMAN;
  }

  private static double shape(double phi) {
    double solid = 1 - phi;
    return phi * phi * phi / (solid * solid);
  }
}
