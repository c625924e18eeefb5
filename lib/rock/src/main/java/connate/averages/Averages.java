package connate.averages;

import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;

/**
 * The means of permeability over beds, weighted by thickness where it is given.
 *
 * <pre>
 * arithmetic  k = Σ k h / Σ h          flow along the beds
 * harmonic    k = Σ h / Σ (h/k)        flow across the beds
 * geometric   k = exp(Σ h ln k / Σ h)  no order, two dimensions
 * power       k = (Σ h k^ω / Σ h)^(1/ω), ω from −1 to 1
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>h</td><td>thickness</td><td>m</td></tr>
 * <tr><td>ω</td><td>exponent: 1 arithmetic, 0 geometric, −1 harmonic; 1 − 2/d for isotropic lognormal
 * rock in d dimensions</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for beds that run through; a single tight bed rules the harmonic mean, and a bed
 * without permeability makes it 0.
 *
 * <p><b>Source</b>: Muskat (1937), The Flow of Homogeneous Fluids; Matheron (1967); Journel,
 * Deutsch and Desbarats (1986), SPE 15128.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class Averages {

  /** Flow along beds. */
  public static final MethodCard ARITHMETIC =
      card(
          "mean-arithmetic",
          "Arithmetic mean, beds in parallel",
          "k = Σ k h / Σ h",
          "Muskat (1937), The Flow of Homogeneous Fluids");

  /** Flow across beds. */
  public static final MethodCard HARMONIC =
      card(
          "mean-harmonic",
          "Harmonic mean, beds in series",
          "k = Σ h / Σ (h/k)",
          "Muskat (1937), The Flow of Homogeneous Fluids");

  /** No order. */
  public static final MethodCard GEOMETRIC =
      card(
          "mean-geometric",
          "Geometric mean",
          "k = exp(Σ h ln k / Σ h)",
          "Matheron (1967), Eléments pour une théorie des milieux poreux");

  /** In between. */
  public static final MethodCard POWER =
      card(
          "mean-power",
          "Power mean",
          "k = (Σ h k^ω / Σ h)^(1/ω)",
          "Journel, Deutsch and Desbarats (1986), SPE 15128");

  /** Caution: a bed without permeability under a harmonic or geometric mean. */
  static final String ZERO = "A01";

  private Averages() {}

  private static MethodCard card(String id, String title, String equation, String source) {
    return MethodCard.named(id, title)
        .equation(equation)
        .input("k", "permeability", Units.mD, Range.from(0))
        .input("h", "thickness", Units.m, Range.from(0))
        .result("k", "mean permeability", Units.mD)
        .source(source)
        .constants(Constants.EXACT)
        .topics("averages", "upscaling", "permeability", "layers")
        .note(
            "Average after the transform, not before: a mean porosity gives no mean permeability.")
        .build();
  }

  /** Returns the mean for flow along beds of equal thickness. */
  public static Permeability arithmetic(Series k) {
    return arithmetic(k, even(k));
  }

  /** Returns the mean for flow along beds. */
  public static Permeability arithmetic(Series k, Series thickness) {
    return Units.mD(arithmetic(md(k), thickness.in(Units.m)));
  }

  /** Returns the mean for flow across beds of equal thickness. */
  public static Permeability harmonic(Series k) {
    return harmonic(k, even(k));
  }

  /** Returns the mean for flow across beds. */
  public static Permeability harmonic(Series k, Series thickness) {
    return Units.mD(harmonic(md(k), thickness.in(Units.m)));
  }

  /** Returns the geometric mean of beds of equal thickness. */
  public static Permeability geometric(Series k) {
    return geometric(k, even(k));
  }

  /** Returns the geometric mean of beds. */
  public static Permeability geometric(Series k, Series thickness) {
    return Units.mD(geometric(md(k), thickness.in(Units.m)));
  }

  /**
   * Returns the power mean of beds of equal thickness.
   *
   * @param omega the exponent, from -1 to 1
   */
  public static Permeability power(Series k, double omega) {
    return Units.mD(power(md(k), even(k).in(Units.m), omega));
  }

  /** Returns the mean for flow along beds, of plain numbers. */
  public static double arithmetic(double[] k, double[] h) {
    Listening.used(ARITHMETIC);
    return mean(k, h, v -> v);
  }

  /** Returns the mean for flow across beds, of plain numbers. */
  public static double harmonic(double[] k, double[] h) {
    Listening.used(HARMONIC);
    return tellZero(k, "harmonic") ? 0 : 1 / mean(k, h, v -> 1 / v);
  }

  /** Returns the geometric mean, of plain numbers. */
  public static double geometric(double[] k, double[] h) {
    Listening.used(GEOMETRIC);
    return tellZero(k, "geometric") ? 0 : StrictMath.exp(mean(k, h, StrictMath::log));
  }

  /** Returns the power mean, of plain numbers. */
  public static double power(double[] k, double[] h, double omega) {
    if (!(omega >= -1 && omega <= 1)) {
      throw new IllegalArgumentException("the exponent is from -1 to 1, found " + omega);
    }
    Listening.used(POWER);
    if (omega <= 0 && tellZero(k, "power")) {
      return 0;
    }
    return StrictMath.abs(omega) < 1e-12
        ? StrictMath.exp(mean(k, h, StrictMath::log))
        : StrictMath.pow(mean(k, h, v -> StrictMath.pow(v, omega)), 1 / omega);
  }

  private static boolean tellZero(double[] k, String mean) {
    boolean zero = Arrays.stream(k).anyMatch(v -> v == 0);
    if (zero) {
      Listening.caution(
          Caution.of(
              ZERO,
              mean,
              "a value of 0 makes the "
                  + mean
                  + " mean 0: is it below the limit of the instrument?"));
    }
    return zero;
  }

  private static double mean(
      double[] k, double[] h, java.util.function.DoubleUnaryOperator function) {
    if (k.length != h.length) {
      throw new IllegalArgumentException(
          k.length + " permeabilities and " + h.length + " thicknesses do not stand side by side");
    }
    double sum = 0;
    double weights = 0;
    for (int i = 0; i < k.length; i++) {
      if (!Double.isNaN(k[i]) && h[i] > 0) {
        sum += h[i] * function.applyAsDouble(refused(k[i]));
        weights += h[i];
      }
    }
    if (!(weights > 0)) {
      throw new IllegalArgumentException("no bed has a permeability and a thickness");
    }
    return sum / weights;
  }

  private static double refused(double k) {
    if (k < 0) {
      throw new IllegalArgumentException("a permeability of " + k + " is impossible");
    }
    return k;
  }

  private static double[] md(Series k) {
    return k.in(Units.mD);
  }

  private static Series even(Series k) {
    double[] ones = new double[k.size()];
    Arrays.fill(ones, 1);
    return Series.of("thickness", Units.m, ones);
  }
}
