package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.chance.Distribution;
import connate.chance.Distributions;
import connate.chance.QuantileRule;
import connate.chance.Quantiles;
import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.SharedData;
import connate.series.Labels;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Independent: base R and its package boot; {@code reference.R} made the values. */
class ReferenceTest {

  private static final String ROCK = "spatial-r/rock.csv";

  @Test
  void regressionOfTheRockData() {
    List<String[]> rows = SharedData.csv(ROCK);
    LeastSquares fit =
        LeastSquares.fit(List.of("area", "peri", "shape"), regressors(rows), lnK(rows));
    String[] terms = {"(Intercept)", "area", "peri", "shape"};
    for (int i = 0; i < terms.length; i++) {
      same("rock " + terms[i] + " coef", fit.coefficients()[i], 1e-10);
      same("rock " + terms[i] + " se", fit.standardErrors()[i], 1e-10);
      same("rock " + terms[i] + " t", fit.tValues()[i], 1e-10);
      same("rock " + terms[i] + " p", fit.pValues()[i], 1e-8);
    }
    same("rock s", fit.scatter(), 1e-11);
    same("rock r2", fit.rSquared(), 1e-11);
    same("rock adjusted r2", fit.adjustedRSquared(), 1e-11);
    same("rock rss", fit.residualSquares(), 1e-11);
    same("rock F", fit.fValue(), 1e-10);
    same("rock aic", fit.aic(), 1e-11);
    same("rock logLik", fit.logLikelihood(), 1e-11);
    same("rock press", fit.press(), 1e-10);
  }

  @Test
  void predictionOfTheRockData() {
    List<String[]> rows = SharedData.csv(ROCK);
    LeastSquares fit =
        LeastSquares.fit(List.of("area", "peri", "shape"), regressors(rows), lnK(rows));
    double[] at = {5000, 3000, 0.2};
    double half = fit.predictionHalfWidth(0.8, at);
    same("rock prediction fit", fit.predict(at), 1e-10);
    same("rock prediction low", fit.predict(at) - half, 1e-9);
    same("rock prediction high", fit.predict(at) + half, 1e-9);
    double smearing = Arrays.stream(fit.residuals()).map(StrictMath::exp).average().orElseThrow();
    same("rock smearing", smearing, 1e-10);
  }

  /** 48 slices are 12 cores of four: leaving slices out flatters the fit by 14 %. */
  @Test
  void slicesOfOneCoreAreNotIndependent() {
    List<String[]> rows = SharedData.csv(ROCK);
    String[] core = IntStream.range(0, 48).mapToObj(i -> "core " + i / 4).toArray(String[]::new);
    double naive = LeaveOut.each().error(regressors(rows), lnK(rows));
    double grouped = LeaveOut.of(Labels.of("core", core)).error(regressors(rows), lnK(rows));
    same("rock leave one out rmse", naive, 1e-10);
    same("rock leave core out rmse", grouped, 1e-10);
    assertTrue(grouped > 1.1 * naive);
  }

  @Test
  @Check(
      method = "reduced-major-axis",
      kind = Kind.INDEPENDENT,
      source = "R 4.2.2 on the data set rock")
  void otherLinesOfTheRockData() {
    List<String[]> rows = SharedData.csv(ROCK);
    ReducedMajorAxis line = ReducedMajorAxis.fit(SharedData.column(rows, "peri"), lnK(rows));
    same("rock rma slope", line.slope(), 1e-10);
    double[] k = SharedData.column(rows, "perm");
    Arrays.sort(k);
    same("quantile type 7 p10", Quantiles.of(k, 0.1), 1e-12);
    same("quantile type 6 p10", Quantiles.of(k, 0.1, QuantileRule.WEIBULL), 1e-12);
  }

  @Test
  @Check(
      method = "gaussian-mixture",
      kind = Kind.INDEPENDENT,
      source = "maximum likelihood by R 4.2.2, optim")
  void mixtureReachesTheMaximumOfAGeneralOptimiser() {
    double[] x = DoubleStream.concat(quantiles(-0.5, 0.3, 60), quantiles(0.6, 0.25, 40)).toArray();
    GaussianMixture mixture = GaussianMixture.of(x, 2);
    same("mixture logLik", mixture.logLikelihood(), 1e-8);
    same("mixture weight 1", mixture.weights()[0], 1e-4);
    same("mixture mean 1", mixture.means()[0], 1e-4);
    same("mixture sd 1", mixture.spreads()[0], 1e-3);
    same("mixture mean 2", mixture.means()[1], 1e-4);
    same("mixture sd 2", mixture.spreads()[1], 1e-3);
  }

  /** Both are draws: with B replicates an end wanders by about 4/√(B/1000) here. */
  @Test
  @Check(method = "bootstrap", kind = Kind.INDEPENDENT, source = "R 4.2.2, package boot")
  void bootstrapOfBoot() {
    double[] a = {
      48, 36, 20, 29, 42, 42, 20, 42, 22, 41, 45, 14, 6, 0, 33, 28, 34, 4, 32, 24, 47, 41, 24, 26,
      30, 41
    };
    Bootstrap boot =
        Bootstrap.of(
            a,
            v -> {
              double mean = Arrays.stream(v).average().orElseThrow();
              return Arrays.stream(v).map(x -> (x - mean) * (x - mean)).average().orElseThrow();
            },
            200_000,
            11);
    same("bca acceleration", boot.acceleration(), 1e-10);
    same("bca z0", boot.bias(), 0.05);
    same("bca low", boot.bca(0.9).low(), 0.01);
    same("bca high", boot.bca(0.9).high(), 0.01);
    same("percentile low", boot.percentile(0.9).low(), 0.01);
    same("percentile high", boot.percentile(0.9).high(), 0.01);
  }

  @Test
  void lawsOfChance() {
    Distribution cut = Distributions.normalBetween(0.35, 0.1, 0.1, 0.5);
    same("truncated normal q05", cut.quantile(0.05), 1e-9);
    same("truncated normal q90", cut.quantile(0.9), 1e-9);
    same("truncated normal mean", cut.mean(), 1e-9);
    same("lognormal q10", Distributions.lognormal(10, 1.2).quantile(0.1), 1e-9);
  }

  private static void same(String name, double found, double relative) {
    double expected = Reference.of(name);
    assertEquals(expected, found, relative * StrictMath.abs(expected), name);
  }

  private static DoubleStream quantiles(double mean, double sd, int n) {
    Distribution law = Distributions.normal(mean, sd);
    return IntStream.range(0, n).mapToDouble(i -> law.quantile((i + 0.5) / n));
  }

  private static double[][] regressors(List<String[]> rows) {
    return new double[][] {
      SharedData.column(rows, "area"),
      SharedData.column(rows, "peri"),
      SharedData.column(rows, "shape")
    };
  }

  private static double[] lnK(List<String[]> rows) {
    return Arrays.stream(SharedData.column(rows, "perm")).map(StrictMath::log).toArray();
  }
}
