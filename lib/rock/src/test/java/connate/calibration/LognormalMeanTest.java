package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.chance.Distributions;
import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LognormalMeanTest {

  /** Independent: the hypergeometric 0F1 as evaluated by another program; the limit is exp(V/2). */
  @ParameterizedTest
  @CsvSource({
    "5, 0.5, 1.27172",
    "5, 1, 1.59064",
    "5, 2, 2.39483",
    "10, 1, 1.61501",
    "20, 2, 2.60435",
    "1000, 1, 1.64831"
  })
  void factor(int n, double v, double expected) {
    assertEquals(expected, LognormalMean.sichelFactor(n, v), 5e-6);
  }

  /**
   * Independent: Sichel's mean is unbiased: over 40,000 seeded sets of five with σ = 1 it averages
   * exp(1/2) = 1.6487, within four standard errors.
   */
  @Test
  @Check(
      method = "sichel",
      kind = Kind.INDEPENDENT,
      source = "mean of 40,000 seeded lognormal sets")
  void unbiased() {
    int sets = 40_000;
    double[] means = new double[sets];
    var law = Distributions.lognormal(1, 1);
    var random = java.util.random.RandomGeneratorFactory.of("L64X128MixRandom").create(42);
    for (int i = 0; i < sets; i++) {
      double[] k = new double[5];
      for (int j = 0; j < 5; j++) {
        k[j] = law.quantile(Math.max(1e-12, random.nextDouble()));
      }
      means[i] = LognormalMean.sichel(Series.of("k", Units.mD, k)).in(Units.mD);
    }
    double mean = Arrays.stream(means).average().orElseThrow();
    double sd =
        StrictMath.sqrt(Arrays.stream(means).map(x -> (x - mean) * (x - mean)).sum() / (sets - 1));
    assertEquals(StrictMath.exp(0.5), mean, 4 * sd / StrictMath.sqrt(sets));
  }

  /**
   * Published: Swanson's rule against the exact mean at σ = 1: ratio 0.948583 (Hurst et al 2000).
   */
  @Test
  @Check(method = "swanson-mean", kind = Kind.INDEPENDENT, source = "exact mean of a lognormal law")
  void swansonFallsShort() {
    int n = 4001;
    double[] k = new double[n];
    var law = Distributions.lognormal(1, 1);
    for (int i = 0; i < n; i++) {
      k[i] = law.quantile(Math.min(1 - 1e-9, Math.max(1e-9, i / (n - 1.0))));
    }
    double ratio =
        LognormalMean.swanson(Series.of("k", Units.mD, k)).in(Units.mD) / StrictMath.exp(0.5);
    assertEquals(0.948583, ratio, 5e-7);
  }

  @Test
  void zeroIsRefused() {
    assertThrows(
        IllegalArgumentException.class, () -> LognormalMean.sichel(Series.of("k", Units.mD, 0, 1)));
  }
}
