package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.chance.Distributions;
import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class GaussianMixtureTest {

  private static DoubleStream quantiles(double mean, double sd, int n) {
    var law = Distributions.normal(mean, sd);
    return IntStream.range(0, n).mapToDouble(i -> law.quantile((i + 0.5) / n));
  }

  /** Independent: two normal laws far apart come back with their parts, means and spreads. */
  @Test
  void twoGroupsComeBack() {
    double[] x = DoubleStream.concat(quantiles(0, 1, 300), quantiles(10, 2, 100)).toArray();
    GaussianMixture mixture = GaussianMixture.choose(x, 5);
    assertEquals(2, mixture.groups());
    assertEquals(0.75, mixture.weights()[0], 0.01);
    assertEquals(0, mixture.means()[0], 0.05);
    assertEquals(10, mixture.means()[1], 0.1);
    assertEquals(2, mixture.spreads()[1], 0.1);
    assertEquals(0, mixture.groupOf(1));
    assertEquals(1, mixture.groupOf(9));
  }

  /** Independent: one group is the normal law of maximum likelihood, with its closed likelihood. */
  @Test
  void oneGroupIsTheNormalLaw() {
    double[] x = quantiles(3, 2, 50).toArray();
    GaussianMixture one = GaussianMixture.of(x, 1);
    double variance = Arrays.stream(x).map(v -> (v - 3) * (v - 3)).average().orElseThrow();
    assertEquals(3, one.means()[0], 1e-9);
    assertEquals(
        -25 * (StrictMath.log(2 * StrictMath.PI * variance) + 1), one.logLikelihood(), 1e-6);
    assertEquals(1, GaussianMixture.choose(x, 4).groups());
  }

  @Test
  void valuesAllAlikeAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> GaussianMixture.of(new double[] {1, 1, 1, 1, 1, 1}, 2));
  }
}
