package connate.calibration;

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
 * The mean of a lognormal population from few samples.
 *
 * <pre>
 * Sichel:  exp(m) γ_n(V),  γ_n(V) = ₀F₁(; (n − 1)/2; (n − 1) V / 4)
 * Swanson: 0.3 P10 + 0.4 P50 + 0.3 P90
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>m, V</td><td>mean and variance (divided by n) of ln k</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for lognormal k; Swanson's rule falls below the mean by 5 % at a standard
 * deviation of ln k of 1 and by 42 % at 2, and is refused above 1.
 *
 * <p><b>Source</b>: Sichel (1952), Trans. Inst. Min. Metall. 61, 261–288; Sichel (1966), J. S. Afr.
 * Inst. Min. Metall.; Finney (1941), J. Roy. Stat. Soc. Suppl. 7, 155–161. Swanson's rule: Hurst,
 * Brown and Swanson (2000), AAPG Bull. 84, 1883–1891.
 *
 * <p><b>Checked</b> in {@code LognormalMeanTest}.
 */
public final class LognormalMean {

  /** Sichel's estimator. */
  public static final MethodCard SICHEL =
      MethodCard.named("sichel", "Sichel's mean")
          .equation("mean = exp(m) 0F1(; (n - 1)/2; (n - 1) V / 4)")
          .input("k", "permeability", Units.mD, Range.POSITIVE)
          .result("k", "mean permeability", Units.mD)
          .source("Sichel (1952), Trans. Inst. Min. Metall. 61, 261–288")
          .constants(Constants.EXACT)
          .topics("averages", "lognormal", "mean", "core")
          .note("V is the variance of ln k divided by n, not by n - 1.")
          .build();

  /** Swanson's rule. */
  public static final MethodCard SWANSON =
      MethodCard.named("swanson-mean", "Swanson's rule")
          .equation("mean = 0.3 P10 + 0.4 P50 + 0.3 P90")
          .input("k", "permeability", Units.mD, Range.POSITIVE)
          .result("k", "mean permeability", Units.mD)
          .source("Hurst, Brown and Swanson (2000), AAPG Bull. 84, 1883–1891")
          .constants(Constants.CHECKED)
          .topics("averages", "lognormal", "mean")
          .note("Falls below the mean: by 5 % at a standard deviation of ln k of 1, by 42 % at 2.")
          .build();

  /** Caution: Swanson's rule on a wide spread. */
  static final String WIDE = "C02";

  private LognormalMean() {}

  /**
   * Returns Sichel's mean of measured permeabilities.
   *
   * @throws IllegalArgumentException if fewer than two are present or one is not above zero
   */
  public static Permeability sichel(Series permeability) {
    double[] log = logs(permeability);
    Listening.used(SICHEL);
    double m = Arrays.stream(log).average().orElseThrow();
    double v = Arrays.stream(log).map(x -> (x - m) * (x - m)).average().orElseThrow();
    return Units.mD(StrictMath.exp(m) * sichelFactor(log.length, v));
  }

  /** Returns γ_n(V), the factor from the geometric mean to Sichel's mean. */
  public static double sichelFactor(int n, double variance) {
    double b = (n - 1) / 2.0;
    double z = (n - 1) * variance / 4;
    double term = 1;
    double sum = 1;
    for (int i = 0; i < 10_000 && term > sum * 1e-17; i++) {
      term *= z / ((b + i) * (i + 1));
      sum += term;
    }
    return sum;
  }

  /**
   * Returns Swanson's mean of measured permeabilities.
   *
   * @throws IllegalArgumentException if fewer than two are present or one is not above zero
   */
  public static Permeability swanson(Series permeability) {
    double[] log = logs(permeability);
    Listening.used(SWANSON);
    double m = Arrays.stream(log).average().orElseThrow();
    double s =
        StrictMath.sqrt(Arrays.stream(log).map(x -> (x - m) * (x - m)).sum() / (log.length - 1));
    if (s > 1) {
      Listening.caution(
          Caution.of(
              WIDE,
              SWANSON.id(),
              "Swanson's rule: the standard deviation of ln k is "
                  + connate.quantity.Numbers.text(s)
                  + ", above 1, where the rule falls well below the mean; use Sichel's mean"));
    }
    Arrays.sort(log);
    double p10 = StrictMath.exp(connate.chance.Quantiles.of(log, 0.1));
    double p50 = StrictMath.exp(connate.chance.Quantiles.of(log, 0.5));
    double p90 = StrictMath.exp(connate.chance.Quantiles.of(log, 0.9));
    return Units.mD(0.3 * p10 + 0.4 * p50 + 0.3 * p90);
  }

  private static double[] logs(Series permeability) {
    double[] k = permeability.to(Units.mD).present();
    for (double value : k) {
      if (!(value > 0)) {
        throw new IllegalArgumentException(
            "«"
                + permeability.name()
                + "» holds "
                + value
                + ": a lognormal mean needs values above"
                + " zero; say what a zero stands for first");
      }
    }
    if (k.length < 2) {
      throw new IllegalArgumentException("a mean of logarithms needs at least two values");
    }
    return Arrays.stream(k).map(StrictMath::log).toArray();
  }
}
