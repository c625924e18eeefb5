package connate.heterogeneity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DykstraParsonsTest {

  /** Independent: V = 1 - exp(-σ) for a lognormal permeability, by algebra. */
  @ParameterizedTest
  @CsvSource({"0.5, 0.3934693", "1, 0.6321206", "1.5, 0.7768698", "2, 0.8646647", "1.203973, 0.7"})
  void lognormal(double sigma, double v) {
    assertEquals(v, DykstraParsons.ofLogSpread(sigma).value(), 1e-7, "printed to seven digits");
  }

  /** Independent: samples at the exact quantiles i/(n+1) lie on the line, which gives σ back. */
  @Test
  @Check(
      method = "dykstra-parsons",
      kind = Kind.INDEPENDENT,
      source = "exact quantiles of a lognormal law")
  void quantilesOfALognormalGiveItsSpread() {
    NormalDistribution normal = new NormalDistribution(null, 0, 1);
    double[] k =
        IntStream.rangeClosed(1, 49)
            .mapToDouble(
                i -> StrictMath.exp(4 + 1.2 * normal.inverseCumulativeProbability(i / 50.0)))
            .toArray();
    assertEquals(
        1 - StrictMath.exp(-1.2), DykstraParsons.of(Series.of("k", Units.mD, k)).value(), 1e-9);
  }

  /** Independent: the unit of permeability does not matter. */
  @Test
  void unitDoesNotMatter() {
    double inMd = DykstraParsons.of(Series.of("k", Units.mD, 1, 5, 20, 300)).value();
    double inDarcy = DykstraParsons.of(Series.of("k", Units.darcy, 1, 5, 20, 300)).value();
    assertEquals(inMd, inDarcy, 1e-12);
  }

  @Test
  void uniformRockIsZeroAndTwoSamplesAreRefused() {
    assertEquals(0, DykstraParsons.of(Series.of("k", Units.mD, 7, 7, 7, 7)).value(), 1e-12);
    assertThrows(
        IllegalArgumentException.class, () -> DykstraParsons.of(Series.of("k", Units.mD, 1, 2)));
  }
}
