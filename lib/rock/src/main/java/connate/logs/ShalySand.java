package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Resistivity;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Water saturation of shaly sand, after Simandoux and by the Indonesian equation, with a = 1, m = n
 * = 2.
 *
 * <pre>
 * Simandoux           1/Rt = φ² Sw²/Rw + V Sw/Rsh
 * modified            1/Rt = φ² Sw²/(Rw (1 − V)) + V Sw/Rsh
 * Indonesia           1/√Rt = (V^(1 − V/2)/√Rsh + φ/√Rw) Sw
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>Sw</td><td>water saturation</td><td>1</td></tr>
 * <tr><td>V</td><td>shale volume</td><td>1</td></tr>
 * <tr><td>Rsh</td><td>resistivity of shale</td><td>ohm·m</td></tr>
 * </table>
 *
 * <p><b>Valid</b> all three become Archie where V is 0. Several variants of both terms are in
 * print.
 *
 * <p><b>Source</b>: Simandoux (1963), Rev. Inst. Fr. Pétrole 18 (suppl.), 193–215; Poupon and
 * Leveaux (1971), SPWLA 12th Annual Logging Symposium; first two from memory.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class ShalySand {

  /** The facts on Simandoux. */
  public static final MethodCard SIMANDOUX =
      MethodCard.named("simandoux", "Simandoux")
          .equation("1/Rt = φ² Sw²/Rw + V Sw/Rsh")
          .input("Rw", "water resistivity", Units.ohmM, Range.POSITIVE)
          .input("Rt", "rock resistivity", Units.ohmM, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("V", "shale volume", Units.fraction, Range.PART)
          .input("Rsh", "shale resistivity", Units.ohmM, Range.POSITIVE)
          .result("Sw", "water saturation", Units.fraction)
          .source("Simandoux (1963), Rev. Inst. Fr. Pétrole 18 (suppl.), 193–215")
          .constants(Constants.FROM_MEMORY)
          .topics("logs", "resistivity", "saturation", "shale volume")
          .note("a 1, m and n 2. Several variants are in print.")
          .build();

  /** The facts on the modified form. */
  public static final MethodCard MODIFIED =
      MethodCard.named("simandoux-modified", "Simandoux, modified")
          .equation("1/Rt = φ² Sw²/(Rw (1 - V)) + V Sw/Rsh")
          .input("Rw", "water resistivity", Units.ohmM, Range.POSITIVE)
          .input("Rt", "rock resistivity", Units.ohmM, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("V", "shale volume", Units.fraction, Range.PART)
          .input("Rsh", "shale resistivity", Units.ohmM, Range.POSITIVE)
          .result("Sw", "water saturation", Units.fraction)
          .source("modified form of Simandoux (1963)")
          .constants(Constants.FROM_MEMORY)
          .topics("logs", "resistivity", "saturation", "shale volume")
          .note("a 1, m and n 2.")
          .build();

  /** The facts on the Indonesian equation. */
  public static final MethodCard INDONESIA =
      MethodCard.named("indonesia", "Indonesian equation")
          .equation("1/√Rt = (V^(1 - V/2)/√Rsh + φ/√Rw) Sw")
          .input("Rw", "water resistivity", Units.ohmM, Range.POSITIVE)
          .input("Rt", "rock resistivity", Units.ohmM, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("V", "shale volume", Units.fraction, Range.PART)
          .input("Rsh", "shale resistivity", Units.ohmM, Range.POSITIVE)
          .result("Sw", "water saturation", Units.fraction)
          .source("Poupon and Leveaux (1971), SPWLA 12th Annual Logging Symposium")
          .constants(Constants.CHECKED)
          .topics("logs", "resistivity", "saturation", "shale volume")
          .note("a 1, m and n 2.")
          .build();

  private static final Formula<Fraction> SIMANDOUX_FORMULA =
      Formula.ofAny(
          SIMANDOUX,
          Units.fraction,
          in -> ShalySand.simandouxNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Fraction> MODIFIED_FORMULA =
      Formula.ofAny(
          MODIFIED,
          Units.fraction,
          in -> ShalySand.modifiedSimandouxNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Fraction> INDONESIA_FORMULA =
      Formula.ofAny(
          INDONESIA,
          Units.fraction,
          in -> ShalySand.indonesiaNumber(in[0], in[1], in[2], in[3], in[4]));

  private ShalySand() {}

  /** Returns the water saturation of one sample by Simandoux. */
  public static Fraction simandoux(
      Resistivity waterResistivity,
      Resistivity rockResistivity,
      Fraction porosity,
      Fraction shaleVolume,
      Resistivity shaleResistivity) {
    return SIMANDOUX_FORMULA.value(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  /** Returns the water saturation of each row by Simandoux. */
  public static Series simandoux(
      Operand waterResistivity,
      Operand rockResistivity,
      Operand porosity,
      Operand shaleVolume,
      Operand shaleResistivity) {
    return SIMANDOUX_FORMULA.series(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  static double simandouxNumber(double rw, double rt, double phi, double v, double rsh) {
    return quadratic(phi * phi / rw, v / rsh, 1 / rt);
  }

  /** Returns the water saturation of one sample by the modified form. */
  public static Fraction modifiedSimandoux(
      Resistivity waterResistivity,
      Resistivity rockResistivity,
      Fraction porosity,
      Fraction shaleVolume,
      Resistivity shaleResistivity) {
    return MODIFIED_FORMULA.value(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  /** Returns the water saturation of each row by the modified form. */
  public static Series modifiedSimandoux(
      Operand waterResistivity,
      Operand rockResistivity,
      Operand porosity,
      Operand shaleVolume,
      Operand shaleResistivity) {
    return MODIFIED_FORMULA.series(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  static double modifiedSimandouxNumber(double rw, double rt, double phi, double v, double rsh) {
    return quadratic(phi * phi / (rw * (1 - v)), v / rsh, 1 / rt);
  }

  /** Returns the water saturation of one sample by the Indonesian equation. */
  public static Fraction indonesia(
      Resistivity waterResistivity,
      Resistivity rockResistivity,
      Fraction porosity,
      Fraction shaleVolume,
      Resistivity shaleResistivity) {
    return INDONESIA_FORMULA.value(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  /** Returns the water saturation of each row by the Indonesian equation. */
  public static Series indonesia(
      Operand waterResistivity,
      Operand rockResistivity,
      Operand porosity,
      Operand shaleVolume,
      Operand shaleResistivity) {
    return INDONESIA_FORMULA.series(
        waterResistivity, rockResistivity, porosity, shaleVolume, shaleResistivity);
  }

  static double indonesiaNumber(double rw, double rt, double phi, double v, double rsh) {
    double shale = v == 0 ? 0 : StrictMath.pow(v, 1 - v / 2) / StrictMath.sqrt(rsh);
    return StrictMath.min(1, 1 / (StrictMath.sqrt(rt) * (shale + phi / StrictMath.sqrt(rw))));
  }

  /** The positive root of a S² + b S = c, cut at 1. */
  private static double quadratic(double a, double b, double c) {
    return StrictMath.min(1, 2 * c / (b + StrictMath.sqrt(b * b + 4 * a * c)));
  }
}
