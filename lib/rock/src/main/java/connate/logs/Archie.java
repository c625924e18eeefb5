package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Resistivity;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Formation factor and water saturation of clean rock, after Archie.
 *
 * <pre>
 * F = a / φ^m
 * Sw = (a Rw / (φ^m Rt))^(1/n)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>F</td><td>formation factor</td><td>1</td></tr>
 * <tr><td>Sw</td><td>water saturation</td><td>1</td></tr>
 * <tr><td>Rw, Rt</td><td>resistivity of water and rock</td><td>ohm·m</td></tr>
 * <tr><td>a, m, n</td><td>constants of the rock: 1, 2, 2; or Humble 0.62, 2.15</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean rock; Rw at the temperature of the rock.
 *
 * <p><b>Source</b>: Archie (1942), Trans. AIME 146, 54–62; Winsauer and others (1952), AAPG
 * Bulletin 36, 253–277.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class Archie {

  /** The facts on Archie. */
  public static final MethodCard FACTOR =
      MethodCard.named("archie-factor", "Archie formation factor")
          .equation("F = a / φ^m")
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("a", "tortuosity factor", Units.number, Range.POSITIVE)
          .valid(0.5, 1.5)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 3)
          .result("F", "formation factor", Units.number)
          .source("Archie (1942), Trans. AIME 146, 54–62")
          .constants(Constants.CHECKED)
          .topics("logs", "resistivity", "formation factor")
          .note("Humble: a 0.62, m 2.15 (Winsauer and others 1952).")
          .build();

  /** The facts on Archie. */
  public static final MethodCard SATURATION =
      MethodCard.named("archie", "Archie saturation")
          .equation("Sw = (a Rw / (φ^m Rt))^(1/n)")
          .input("Rw", "water resistivity", Units.ohmM, Range.POSITIVE)
          .input("Rt", "rock resistivity", Units.ohmM, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("a", "tortuosity factor", Units.number, Range.POSITIVE)
          .valid(0.5, 1.5)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 3)
          .input("n", "saturation exponent", Units.number, Range.POSITIVE)
          .valid(1.5, 10)
          .result("Sw", "water saturation", Units.fraction)
          .source("Archie (1942), Trans. AIME 146, 54–62")
          .constants(Constants.CHECKED)
          .topics("logs", "resistivity", "saturation")
          .note("Clean rock; Rw at the temperature of the rock. Values above 1 are cut to 1.")
          .build();

  private static final Formula<Ratio> FACTOR_FORMULA =
      Formula.of(FACTOR, Units.number, (phi, a, m) -> Archie.factorNumber(phi, a, m));

  private static final Formula<Fraction> SATURATION_FORMULA =
      Formula.ofAny(
          SATURATION,
          Units.fraction,
          in -> Archie.saturationNumber(in[0], in[1], in[2], in[3], in[4], in[5]));

  private Archie() {}

  /** Returns the formation factor of one sample by Archie. */
  public static Ratio factor(
      Fraction porosity, double tortuosityFactor, double cementationExponent) {
    return FACTOR_FORMULA.value(
        porosity, Units.number(tortuosityFactor), Units.number(cementationExponent));
  }

  /** Returns the formation factor of each row by Archie. */
  public static Series factor(
      Operand porosity, double tortuosityFactor, double cementationExponent) {
    return FACTOR_FORMULA.series(
        porosity, Units.number(tortuosityFactor), Units.number(cementationExponent));
  }

  static double factorNumber(double phi, double a, double m) {
    return a * StrictMath.pow(phi, -m);
  }

  /** Returns the water saturation of one sample by Archie. */
  public static Fraction saturation(
      Resistivity waterResistivity,
      Resistivity rockResistivity,
      Fraction porosity,
      double tortuosityFactor,
      double cementationExponent,
      double saturationExponent) {
    return SATURATION_FORMULA.value(
        waterResistivity,
        rockResistivity,
        porosity,
        Units.number(tortuosityFactor),
        Units.number(cementationExponent),
        Units.number(saturationExponent));
  }

  /** Returns the water saturation of each row by Archie. */
  public static Series saturation(
      Operand waterResistivity,
      Operand rockResistivity,
      Operand porosity,
      double tortuosityFactor,
      double cementationExponent,
      double saturationExponent) {
    return SATURATION_FORMULA.series(
        waterResistivity,
        rockResistivity,
        porosity,
        Units.number(tortuosityFactor),
        Units.number(cementationExponent),
        Units.number(saturationExponent));
  }

  static double saturationNumber(double rw, double rt, double phi, double a, double m, double n) {
    return StrictMath.min(1, StrictMath.pow(a * rw / (StrictMath.pow(phi, m) * rt), 1 / n));
  }
}
