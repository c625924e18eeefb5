package connate.averages;

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
 * Effective permeability of a lognormal medium by its structure.
 *
 * <pre>
 * isotropic, d dimensions    k = kg exp(σ² (½ − 1/d))
 * anisotropic               k = kg exp(σ² (½ − g))
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>kg</td><td>geometric mean</td><td>mD</td></tr>
 * <tr><td>σ</td><td>standard deviation of ln k</td><td>1</td></tr>
 * <tr><td>d</td><td>dimensions</td><td>1</td></tr>
 * <tr><td>g</td><td>share of the direction, summing to 1; 1/d where isotropic, 1 across perfect layers</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for multi-Gaussian ln k and blocks far larger than the correlation length. Exact
 * in two dimensions, a conjecture in three, exact to order σ² only: at σ² = 9 it is twice the
 * self-consistent value.
 *
 * <p><b>Source</b>: Matheron (1967); Landau and Lifshitz (1960); Gutjahr and others (1978), Water
 * Resour. Res. 14, 953–959; Gelhar and Axness (1983), Water Resour. Res. 19, 161–180; form from
 * memory.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class LognormalMedium {

  /** The facts on the law of Matheron. */
  public static final MethodCard ISOTROPIC =
      MethodCard.named("lognormal-medium", "Lognormal medium")
          .equation("k = kg exp(σ² (½ - 1/d))")
          .input("kg", "geometric mean", Units.mD, Range.POSITIVE)
          .input("σ", "standard deviation of ln k", Units.number, Range.from(0))
          .valid(0, 2)
          .input("d", "dimensions", Units.number, Range.POSITIVE)
          .valid(1, 3)
          .result("k", "effective permeability", Units.mD)
          .source("Matheron (1967), Eléments pour une théorie des milieux poreux")
          .constants(Constants.FROM_MEMORY)
          .topics("averages", "upscaling", "lognormal")
          .note("In three dimensions a conjecture, exact to order σ².")
          .build();

  /** The facts on the law of Gelhar and Axness. */
  public static final MethodCard ANISOTROPIC =
      MethodCard.named("gelhar-axness", "Gelhar–Axness")
          .equation("k = kg exp(σ² (½ - g))")
          .input("kg", "geometric mean", Units.mD, Range.POSITIVE)
          .input("σ", "standard deviation of ln k", Units.number, Range.from(0))
          .valid(0, 2)
          .input("g", "share of the direction", Units.fraction, Range.PART)
          .result("k", "effective permeability", Units.mD)
          .source("Gelhar and Axness (1983), Water Resour. Res. 19, 161–180")
          .constants(Constants.EXACT)
          .topics("averages", "upscaling", "lognormal", "anisotropy")
          .note("The shares of the three directions sum to 1.")
          .build();

  private static final Formula<Permeability> ISOTROPIC_FORMULA =
      Formula.of(
          ISOTROPIC, Units.mD, (kg, sigma, d) -> LognormalMedium.isotropicNumber(kg, sigma, d));

  private static final Formula<Permeability> ANISOTROPIC_FORMULA =
      Formula.of(
          ANISOTROPIC, Units.mD, (kg, sigma, g) -> LognormalMedium.anisotropicNumber(kg, sigma, g));

  private LognormalMedium() {}

  /** Returns the effective permeability of one sample by the law of Matheron. */
  public static Permeability isotropic(
      Permeability geometricMean, double standardDeviationOfLnK, double dimensions) {
    return ISOTROPIC_FORMULA.value(
        geometricMean, Units.number(standardDeviationOfLnK), Units.number(dimensions));
  }

  /** Returns the effective permeability of each row by the law of Matheron. */
  public static Series isotropic(
      Operand geometricMean, Operand standardDeviationOfLnK, Operand dimensions) {
    return ISOTROPIC_FORMULA.series(geometricMean, standardDeviationOfLnK, dimensions);
  }

  static double isotropicNumber(double kg, double sigma, double d) {
    return kg * StrictMath.exp(sigma * sigma * (0.5 - 1 / d));
  }

  /** Returns the effective permeability of one sample by the law of Gelhar and Axness. */
  public static Permeability anisotropic(
      Permeability geometricMean, double standardDeviationOfLnK, Fraction shareOfTheDirection) {
    return ANISOTROPIC_FORMULA.value(
        geometricMean, Units.number(standardDeviationOfLnK), shareOfTheDirection);
  }

  /** Returns the effective permeability of each row by the law of Gelhar and Axness. */
  public static Series anisotropic(
      Operand geometricMean, Operand standardDeviationOfLnK, Operand shareOfTheDirection) {
    return ANISOTROPIC_FORMULA.series(geometricMean, standardDeviationOfLnK, shareOfTheDirection);
  }

  static double anisotropicNumber(double kg, double sigma, double g) {
    return kg * StrictMath.exp(sigma * sigma * (0.5 - g));
  }
}
