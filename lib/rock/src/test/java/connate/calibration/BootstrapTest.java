package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

class BootstrapTest {

  private static final double[] SPATIAL = {
    48, 36, 20, 29, 42, 42, 20, 42, 22, 41, 45, 14, 6, 0, 33, 28, 34, 4, 32, 24, 47, 41, 24, 26, 30,
    41
  };

  private static double plugInVariance(double[] v) {
    double mean = Arrays.stream(v).average().orElseThrow();
    return Arrays.stream(v).map(x -> (x - mean) * (x - mean)).average().orElseThrow();
  }

  /**
   * Published: Efron and Tibshirani (1993), table 14.2, spatial test data A, plug-in variance:
   * 171.5; 90 % BCa (115.8, 259.6), percentile (100.8, 233.9), acceleration 0.061 from B = 2000
   * replicates; R's boot with B = 20000 gives BCa (116.2, 264.0). Tolerance 5 as these differ.
   */
  @Test
  @Check(
      method = "bootstrap",
      kind = Kind.PUBLISHED,
      source = "Efron and Tibshirani (1993), An Introduction to the Bootstrap, table 14.2")
  void spatialTestData() {
    Bootstrap boot = Bootstrap.of(SPATIAL, BootstrapTest::plugInVariance, 20_000, 3);
    assertEquals(171.5, boot.estimate(), 0.05);
    assertEquals(0.061, boot.acceleration(), 5e-4);
    assertEquals(115.8, boot.bca(0.90).low(), 5);
    assertEquals(261, boot.bca(0.90).high(), 5);
    assertEquals(99, boot.percentile(0.90).low(), 5);
    assertEquals(234.5, boot.percentile(0.90).high(), 5);
  }

  /** Independent: the standard error of a mean is s/√n, with the plug-in s. */
  @Test
  void standardErrorOfAMean() {
    Bootstrap boot =
        Bootstrap.of(SPATIAL, v -> Arrays.stream(v).average().orElseThrow(), 20_000, 5);
    double expected = StrictMath.sqrt(plugInVariance(SPATIAL) / SPATIAL.length);
    assertEquals(expected, boot.standardError(), 0.03 * expected);
  }

  /** Independent: groups of equal values, drawn whole, act as one sample each. */
  @Test
  void groupsAreDrawnWhole() {
    List<double[]> cores = List.of(new double[] {1, 1, 1}, new double[] {5, 5, 5});
    Bootstrap boot =
        Bootstrap.ofGroups(cores, v -> Arrays.stream(v).average().orElseThrow(), 1000, 5);
    assertEquals(1, boot.percentile(0.9).low(), 0);
    assertEquals(5, boot.percentile(0.9).high(), 0);
  }

  @Test
  void tooFewAreRefused() {
    assertThrows(
        IllegalArgumentException.class, () -> Bootstrap.of(new double[] {1}, v -> v[0], 1000, 1));
  }
}
