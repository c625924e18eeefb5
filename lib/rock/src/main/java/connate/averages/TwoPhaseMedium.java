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
 * Effective permeability of two rocks by their structure: random cells, cylinders in a square
 * array.
 *
 * <pre>
 * self-consistent  Σ f (k − ke)/(k + (d − 1) ke) = 0
 * Rayleigh         k = 1 − 2 f/(T + f − 0.305827 f⁴ T/(T² − 1.402958 f⁸) − 0.013362 f⁸/T),  T = (1 + α)/(1 − α)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>f</td><td>part of the second rock, or of the cylinders</td><td>1</td></tr>
 * <tr><td>d</td><td>dimensions</td><td>1</td></tr>
 * <tr><td>α</td><td>permeability of the cylinders over that of the host</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> self-consistent for cells without order; Rayleigh up to a part of 0.6.
 *
 * <p><b>Source</b>: Bruggeman (1935), Ann. Phys. 24, 636–679; Rayleigh (1892), Phil. Mag. 34,
 * 481–502; Perrins, McKenzie and McPhedran (1979), Proc. R. Soc. A 369, 207–225, constants from
 * memory.
 *
 * <p><b>Checked</b> in {@code MoreAveragesTest}.
 */
public final class TwoPhaseMedium {

  /** The facts on the self-consistent medium. */
  public static final MethodCard SELF_CONSISTENT =
      MethodCard.named("self-consistent", "Self-consistent medium")
          .equation("f1 (k1 - ke)/(k1 + (d - 1) ke) + f2 (k2 - ke)/(k2 + (d - 1) ke) = 0")
          .input("k1", "permeability of one rock", Units.mD, Range.from(0))
          .input("k2", "permeability of the other", Units.mD, Range.from(0))
          .input("f2", "part of the other", Units.fraction, Range.PART)
          .input("d", "dimensions", Units.number, Range.POSITIVE)
          .valid(2, 3)
          .result("ke", "effective permeability", Units.mD)
          .source("Bruggeman (1935), Ann. Phys. 24, 636–679")
          .constants(Constants.EXACT)
          .topics("averages", "upscaling", "mixture")
          .note("Cells without order; it percolates at a part of 1/d.")
          .build();

  /** The facts on the array of Rayleigh. */
  public static final MethodCard RAYLEIGH =
      MethodCard.named("rayleigh-cylinders", "Rayleigh, square array of cylinders")
          .equation(
              "k/km = 1 - 2 f/(T + f - 0.305827 f⁴ T/(T² - 1.402958 f⁸) - 0.013362 f⁸/T), T = (1 + α)/(1 - α)")
          .input("km", "permeability of the host", Units.mD, Range.POSITIVE)
          .input("ki", "permeability of the cylinders", Units.mD, Range.from(0))
          .input("f", "part of the cylinders", Units.fraction, Range.PART)
          .valid(0, 0.6)
          .result("k", "effective permeability", Units.mD)
          .source("Perrins, McKenzie and McPhedran (1979), Proc. R. Soc. A 369, 207–225")
          .constants(Constants.FROM_MEMORY)
          .topics("averages", "upscaling", "inclusions")
          .note("Flow across cylinders in a square array; touching at π/4.")
          .build();

  private static final Formula<Permeability> SELF_CONSISTENT_FORMULA =
      Formula.of(
          SELF_CONSISTENT,
          Units.mD,
          (k1, k2, f, d) -> TwoPhaseMedium.selfConsistentNumber(k1, k2, f, d));

  private static final Formula<Permeability> RAYLEIGH_FORMULA =
      Formula.of(
          RAYLEIGH,
          Units.mD,
          (host, guest, f) -> TwoPhaseMedium.cylinderArrayNumber(host, guest, f));

  private TwoPhaseMedium() {}

  /** Returns the effective permeability of one sample by the self-consistent medium. */
  public static Permeability selfConsistent(
      Permeability permeabilityOfOneRock,
      Permeability permeabilityOfTheOther,
      Fraction partOfTheOther,
      double dimensions) {
    return SELF_CONSISTENT_FORMULA.value(
        permeabilityOfOneRock, permeabilityOfTheOther, partOfTheOther, Units.number(dimensions));
  }

  /** Returns the effective permeability of each row by the self-consistent medium. */
  public static Series selfConsistent(
      Operand permeabilityOfOneRock,
      Operand permeabilityOfTheOther,
      Operand partOfTheOther,
      Operand dimensions) {
    return SELF_CONSISTENT_FORMULA.series(
        permeabilityOfOneRock, permeabilityOfTheOther, partOfTheOther, dimensions);
  }

  static double selfConsistentNumber(double k1, double k2, double f, double d) {
    double b = (d * (1 - f) - 1) * k1 + (d * f - 1) * k2;
    return (b + StrictMath.sqrt(b * b + 4 * (d - 1) * k1 * k2)) / (2 * (d - 1));
  }

  /** Returns the effective permeability of one sample by the array of Rayleigh. */
  public static Permeability cylinderArray(
      Permeability permeabilityOfTheHost,
      Permeability permeabilityOfTheCylinders,
      Fraction partOfTheCylinders) {
    return RAYLEIGH_FORMULA.value(
        permeabilityOfTheHost, permeabilityOfTheCylinders, partOfTheCylinders);
  }

  /** Returns the effective permeability of each row by the array of Rayleigh. */
  public static Series cylinderArray(
      Operand permeabilityOfTheHost,
      Operand permeabilityOfTheCylinders,
      Operand partOfTheCylinders) {
    return RAYLEIGH_FORMULA.series(
        permeabilityOfTheHost, permeabilityOfTheCylinders, partOfTheCylinders);
  }

  static double cylinderArrayNumber(double host, double guest, double f) {
    if (host == guest) {
      return host;
    }
    double t = (host + guest) / (host - guest);
    double f4 = f * f * f * f;
    double f8 = f4 * f4;
    double below = t + f - 0.305827 * f4 * t / (t * t - 1.402958 * f8) - 0.013362 * f8 / t;
    return host * (1 - 2 * f / below);
  }
}
