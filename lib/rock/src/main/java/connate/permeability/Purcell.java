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
 * Permeability from a mercury capillary curve as a bundle of tubes, after Purcell.
 *
 * <pre>
 * k = c λ ∫ dS / P²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>c</td><td>10.6573 by exact unit arithmetic with (480 mN/m · cos 140°)²/2; Purcell printed 10.24 · (γ cos θ)²</td><td>mD psi²</td></tr>
 * <tr><td>λ</td><td>lithology factor, near 0.216</td><td>1</td></tr>
 * <tr><td>∫ dS/P²</td><td>area under the curve of saturation over pressure squared</td><td>1/psi²</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for conformance- and closure-corrected curves; λ is to be calibrated.
 *
 * <p><b>Source</b>: Purcell (1949), Trans. AIME 186, 39–48; λ from memory.
 *
 * <p><b>Checked</b> in {@code MoreLawsTest}.
 */
public final class Purcell {

  /** The facts on the bundle of Purcell. */
  public static final MethodCard CARD =
      MethodCard.named("purcell", "Purcell")
          .equation("k = 10.6573 λ φ (γ cos θ)² ∫ dS/P², γ in dyn/cm, P in psi")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("γcosθ", "tension times cosine in dyn/cm", Units.number, Range.POSITIVE)
          .valid(100, 400)
          .input("∫dS/P²", "integral in 1/psi²", Units.number, Range.from(0))
          .input("λ", "lithology factor", Units.number, Range.POSITIVE)
          .valid(0.05, 0.5)
          .result("k", "permeability", Units.mD)
          .source("Purcell (1949), Trans. AIME 186, 39–48")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "mercury", "capillary pressure", "core")
          .note("The exact constant is 10.6573; Purcell printed 10.24, 4 % lower.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(
          CARD,
          Units.mD,
          (phi, tension, integral, lambda) -> Purcell.ofNumber(phi, tension, integral, lambda));

  private Purcell() {}

  /** Returns the permeability of one sample by the bundle of Purcell. */
  public static Permeability of(
      Fraction porosity,
      double tensionTimesCosineInDynCm,
      double integralIn1Psi,
      double lithologyFactor) {
    return CARD_FORMULA.value(
        porosity,
        Units.number(tensionTimesCosineInDynCm),
        Units.number(integralIn1Psi),
        Units.number(lithologyFactor));
  }

  /** Returns the permeability of each row by the bundle of Purcell. */
  public static Series of(
      Operand porosity,
      Operand tensionTimesCosineInDynCm,
      Operand integralIn1Psi,
      double lithologyFactor) {
    return CARD_FORMULA.series(
        porosity, tensionTimesCosineInDynCm, integralIn1Psi, Units.number(lithologyFactor));
  }

  static double ofNumber(double phi, double tension, double integral, double lambda) {
    return 10.6573 * lambda * phi * tension * tension * integral;
  }
}
