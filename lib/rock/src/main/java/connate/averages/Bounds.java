package connate.averages;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Estimate;

/**
 * Bounds of the permeability of a mixture of two rocks, whatever its structure.
 *
 * <pre>
 * Wiener             harmonic ≤ k ≤ arithmetic
 * Hashin–Shtrikman   k1 + f2/(1/(k2 − k1) + f1/(d k1)) ≤ k ≤ k2 + f1/(1/(k1 − k2) + f2/(d k2))
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k1, k2</td><td>permeabilities of both rocks, k1 below k2</td><td>mD</td></tr>
 * <tr><td>f1, f2</td><td>their parts of the volume</td><td>1</td></tr>
 * <tr><td>d</td><td>dimensions</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> Wiener for any mixture; Hashin–Shtrikman for an isotropic one.
 *
 * <p><b>Source</b>: Wiener (1912), Abh. Sächs. Ges. Wiss. 32, 509–604; Hashin and Shtrikman (1962),
 * J. Appl. Phys. 33, 3125–3131.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class Bounds {

  /** The bounds of any mixture. */
  public static final MethodCard WIENER =
      card(
          "wiener-bounds",
          "Wiener bounds",
          "harmonic mean ≤ k ≤ arithmetic mean",
          "Wiener (1912), Abh. Sächs. Ges. Wiss. 32, 509–604");

  /** The bounds of an isotropic mixture. */
  public static final MethodCard HASHIN_SHTRIKMAN =
      card(
          "hashin-shtrikman",
          "Hashin–Shtrikman bounds",
          "k1 + f2/(1/(k2 - k1) + f1/(d k1)) ≤ k ≤ k2 + f1/(1/(k1 - k2) + f2/(d k2))",
          "Hashin and Shtrikman (1962), J. Appl. Phys. 33, 3125–3131");

  private Bounds() {}

  private static MethodCard card(String id, String title, String equation, String source) {
    return MethodCard.named(id, title)
        .equation(equation)
        .input("k1", "permeability of one rock", Units.mD, Range.POSITIVE)
        .input("k2", "permeability of the other", Units.mD, Range.POSITIVE)
        .input("f2", "part of the other", Units.fraction, Range.PART)
        .source(source)
        .constants(Constants.EXACT)
        .topics("averages", "bounds", "upscaling")
        .build();
  }

  /** Returns the bounds of any mixture; the value is the geometric mean. */
  public static Estimate<Permeability> wiener(
      Permeability one, Permeability other, Fraction partOfOther) {
    Listening.used(WIENER);
    double[] k = {one.in(Units.mD), other.in(Units.mD)};
    double[] f = parts(partOfOther);
    return Listening.quietly(
        () ->
            new Estimate<>(
                Units.mD(Averages.geometric(k, f)),
                Units.mD(Averages.harmonic(k, f)),
                Units.mD(Averages.arithmetic(k, f)),
                "Wiener bounds"));
  }

  /** Returns the bounds of an isotropic mixture in two or three dimensions. */
  public static Estimate<Permeability> hashinShtrikman(
      Permeability one, Permeability other, Fraction partOfOther, int dimensions) {
    if (dimensions != 2 && dimensions != 3) {
      throw new IllegalArgumentException("two or three dimensions, found " + dimensions);
    }
    Listening.used(HASHIN_SHTRIKMAN);
    double[] f = parts(partOfOther);
    double k1 = one.in(Units.mD);
    double k2 = other.in(Units.mD);
    double a = bound(k1, k2, f[0], f[1], dimensions);
    double b = bound(k2, k1, f[1], f[0], dimensions);
    return new Estimate<>(
        Units.mD(StrictMath.sqrt(a * b)),
        Units.mD(Math.min(a, b)),
        Units.mD(Math.max(a, b)),
        "Hashin–Shtrikman bounds");
  }

  private static double bound(double host, double guest, double ofHost, double ofGuest, int d) {
    return host == guest ? host : host + ofGuest / (1 / (guest - host) + ofHost / (d * host));
  }

  private static double[] parts(Fraction partOfOther) {
    double f = partOfOther.fraction();
    if (!(f >= 0 && f <= 1)) {
      throw new IllegalArgumentException("a part is from 0 to 1, found " + partOfOther);
    }
    return new double[] {1 - f, f};
  }
}
