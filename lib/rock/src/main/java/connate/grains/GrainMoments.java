package connate.grains;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;

/**
 * Moments of a grain-size analysis in phi, with the weight of each class at its middle in phi.
 *
 * <pre>
 * mean = Σ w φ,  s² = Σ w (φ − mean)²
 * skewness = Σ w (φ − mean)³ / s³,  kurtosis = Σ w (φ − mean)⁴ / s⁴,  Σ w = 1
 * </pre>
 *
 * <p><b>Valid</b> where no weight lies in an open-ended class. The sum of squares is divided by the
 * whole weight, not by one less. The kurtosis of a normal curve is 3.
 *
 * <p><b>Source</b>: Krumbein and Pettijohn (1938), Manual of Sedimentary Petrography, ch. 9.
 *
 * <p><b>Checked</b> in {@code GrainMomentsTest}.
 */
public final class GrainMoments implements Listed {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("grain-moments", "Moments of a grain-size curve")
          .equation("mean = Σ w φ; s² = Σ w (φ - mean)²; Sk = Σ w (φ - mean)³/s³; Ku = Σ w (…)⁴/s⁴")
          .input("φ", "middle of a class in phi", Units.number)
          .source("Krumbein and Pettijohn (1938), Manual of Sedimentary Petrography, ch. 9")
          .constants(Constants.EXACT)
          .topics("grain size", "sorting", "skewness", "kurtosis", "grains")
          .note("Divided by the whole weight, not by one less; no weight in an open-ended class.")
          .build();

  private final double[] moments;

  private GrainMoments(double[] moments) {
    this.moments = moments;
  }

  /**
   * Returns the moments of a curve.
   *
   * @throws IllegalArgumentException if an open-ended class holds weight: it has no middle
   */
  public static GrainMoments of(GrainCurve curve) {
    if (curve.hasOpenWeight()) {
      throw new IllegalArgumentException(curve.openEnd());
    }
    Listening.used(CARD);
    return new GrainMoments(moments(curve));
  }

  /** Returns the mean of each curve in phi; missing where an open-ended class holds weight. */
  public static Series means(GrainCurves curves) {
    Listening.used(CARD);
    return curves.map(
        "mean size", Units.number, c -> c.hasOpenWeight() ? Double.NaN : moments(c)[0]);
  }

  /** Returns the standard deviation of each curve in phi. */
  public static Series sortings(GrainCurves curves) {
    Listening.used(CARD);
    return curves.map("sorting", Units.number, c -> c.hasOpenWeight() ? Double.NaN : moments(c)[1]);
  }

  private static double[] moments(GrainCurve curve) {
    int n = curve.classes();
    double[] middles = new double[n];
    double[] weights = new double[n];
    double mean = 0;
    for (int i = 0; i < n; i++) {
      weights[i] = curve.percent(i) / 100;
      if (weights[i] > 0) {
        middles[i] = (PhiScale.phi(curve.lowMm(i)) + PhiScale.phi(curve.highMm(i))) / 2;
        mean += weights[i] * middles[i];
      }
    }
    return moments(mean, middles, weights);
  }

  static double[] moments(double mean, double[] middles, double[] weights) {
    double[] sums = new double[5];
    for (int i = 0; i < middles.length; i++) {
      double off = middles[i] - mean;
      sums[2] += weights[i] * off * off;
      sums[3] += weights[i] * off * off * off;
      sums[4] += weights[i] * off * off * off * off;
    }
    double s = StrictMath.sqrt(sums[2]);
    return new double[] {mean, s, sums[3] / (s * s * s), sums[4] / (sums[2] * sums[2])};
  }

  /** Returns the mean in phi. */
  public Ratio mean() {
    return Units.number(moments[0]);
  }

  /** Returns the standard deviation in phi. */
  public Ratio sorting() {
    return Units.number(moments[1]);
  }

  /** Returns the skewness: above 0 with a tail of fines; no number where all lies in one class. */
  public Ratio skewness() {
    return Units.number(moments[2]);
  }

  /** Returns the kurtosis: 3 for a normal curve; no number where all lies in one class. */
  public Ratio kurtosis() {
    return Units.number(moments[3]);
  }

  @Override
  public Listing listing() {
    return Listing.titled("moments, in phi")
        .column("mean")
        .column("sorting")
        .column("skewness")
        .column("kurtosis")
        .row(moments[0], moments[1], moments[2], moments[3])
        .build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
