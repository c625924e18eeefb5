package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Compressibility;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Simple laws of permeability under stress, beside that of Jones.
 *
 * <pre>
 * exponential  k = k0 exp(−γ σ)
 * power        k = k0 (φ/φ0)^e
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k, k0</td><td>permeability with and without stress</td><td>mD</td></tr>
 * <tr><td>γ</td><td>stress sensitivity</td><td>1/psi</td></tr>
 * <tr><td>σ</td><td>net stress</td><td>psi</td></tr>
 * <tr><td>φ, φ0</td><td>porosity with and without stress</td><td>1</td></tr>
 * <tr><td>e</td><td>exponent, 3 for a cubic law</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> between the stresses of the measurements that gave γ or e.
 *
 * <p><b>Source</b>: common practice; cubic law: McKee, Bumb and Koenig (1988), SPE Formation
 * Evaluation 3, 81–91.
 *
 * <p><b>Checked</b> in {@code CoreLawsTest}.
 */
public final class StressLaws {

  /** The facts on the exponential law. */
  public static final MethodCard EXPONENTIAL =
      MethodCard.named("stress-exponential", "Exponential stress law")
          .equation("k = k0 exp(-γ σ)")
          .input("k0", "permeability without stress", Units.mD, Range.from(0))
          .input("γ", "stress sensitivity", Units.perPsi, Range.from(0))
          .input("σ", "net stress", Units.psi, Range.from(0))
          .result("k", "permeability in situ", Units.mD)
          .source("common practice, no source")
          .constants(Constants.EXACT)
          .topics("core", "stress", "permeability")
          .note("γ from two measurements of the same plug.")
          .build();

  /** The facts on the power law. */
  public static final MethodCard POWER =
      MethodCard.named("stress-power", "Power stress law")
          .equation("k = k0 (φ/φ0)^e")
          .input("k0", "permeability without stress", Units.mD, Range.from(0))
          .input("φ", "porosity under stress", Units.fraction, Range.PART)
          .input("φ0", "porosity without stress", Units.fraction, Range.above(0).to(1))
          .input("e", "exponent", Units.number, Range.POSITIVE)
          .valid(2, 20)
          .result("k", "permeability in situ", Units.mD)
          .source("cubic law: McKee, Bumb and Koenig (1988), SPE Formation Evaluation 3, 81–91")
          .constants(Constants.EXACT)
          .topics("core", "stress", "permeability", "porosity")
          .note("e is 3 for a cubic law.")
          .build();

  private static final Formula<Permeability> EXPONENTIAL_FORMULA =
      Formula.of(
          EXPONENTIAL,
          Units.mD,
          (k0, gamma, stress) -> StressLaws.exponentialNumber(k0, gamma, stress));

  private static final Formula<Permeability> POWER_FORMULA =
      Formula.of(POWER, Units.mD, (k0, phi, phi0, e) -> StressLaws.powerNumber(k0, phi, phi0, e));

  private StressLaws() {}

  /** Returns the permeability in situ of one sample by the exponential law. */
  public static Permeability exponential(
      Permeability permeabilityWithoutStress,
      Compressibility stressSensitivity,
      Pressure netStress) {
    return EXPONENTIAL_FORMULA.value(permeabilityWithoutStress, stressSensitivity, netStress);
  }

  /** Returns the permeability in situ of each row by the exponential law. */
  public static Series exponential(
      Operand permeabilityWithoutStress, Operand stressSensitivity, Operand netStress) {
    return EXPONENTIAL_FORMULA.series(permeabilityWithoutStress, stressSensitivity, netStress);
  }

  static double exponentialNumber(double k0, double gamma, double stress) {
    return k0 * StrictMath.exp(-gamma * stress);
  }

  /** Returns the permeability in situ of one sample by the power law. */
  public static Permeability power(
      Permeability permeabilityWithoutStress,
      Fraction porosityUnderStress,
      Fraction porosityWithoutStress,
      double exponent) {
    return POWER_FORMULA.value(
        permeabilityWithoutStress,
        porosityUnderStress,
        porosityWithoutStress,
        Units.number(exponent));
  }

  /** Returns the permeability in situ of each row by the power law. */
  public static Series power(
      Operand permeabilityWithoutStress,
      Operand porosityUnderStress,
      Operand porosityWithoutStress,
      Operand exponent) {
    return POWER_FORMULA.series(
        permeabilityWithoutStress, porosityUnderStress, porosityWithoutStress, exponent);
  }

  static double powerNumber(double k0, double phi, double phi0, double e) {
    return k0 * StrictMath.pow(phi / phi0, e);
  }
}
