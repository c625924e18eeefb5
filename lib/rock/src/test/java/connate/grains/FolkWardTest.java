package connate.grains;

import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class FolkWardTest {

  /**
   * Independent: for normal sizes the measures follow from the normal quantiles 0.994458, 1.644854
   * and 0.674490: σI = 0.995669 s, KG = 0.999452; mean and symmetry are exact.
   */
  @Test
  @Check(
      method = "folk-ward",
      kind = Kind.INDEPENDENT,
      source = "quantiles of the normal law: σI = 0.995669 s, SkI = 0, KG = 0.999452")
  void normalSizes() {
    FolkWard measures = FolkWard.of(GrainCurveTest.normal(new NormalDistribution(1.7, 0.8), 0.02));
    assertEquals(1.7, measures.mean().value(), 1e-4);
    assertEquals(0.995669 * 0.8, measures.sorting().value(), 2e-4);
    assertEquals(0, measures.skewness().value(), 1e-4);
    assertEquals(0.999452, measures.kurtosis().value(), 2e-4);
    assertEquals("moderately sorted, near symmetrical, mesokurtic", measures.words());
  }

  /** By hand: the equations at seven round values. */
  @Test
  @Check(method = "folk-ward", kind = Kind.BY_HAND, source = "the equations at seven round values")
  void sevenValues() {
    FolkWard measures =
        FolkWard.of(
            number(0.25),
            number(0.80),
            number(1.05),
            number(1.60),
            number(2.30),
            number(2.75),
            number(3.65));
    assertEquals(1.71667, measures.mean().value(), 5e-6);
    assertEquals(1.00265, measures.sorting().value(), 5e-6);
    assertEquals(0.192685, measures.skewness().value(), 5e-7);
    assertEquals(1.11475, measures.kurtosis().value(), 5e-6);
    assertEquals("poorly sorted, fine skewed, leptokurtic", measures.words());
    assertEquals(StrictMath.pow(2, -1.716667), measures.meanSize().in(Units.mm), 1e-6);
    assertTrue(measures.toString().contains("fine skewed"));
  }

  /** Finer and coarser mixed up: the values fall instead of rising, and the call says so. */
  @Test
  void countingFromTheWrongSideIsNoticed() {
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                FolkWard.of(
                    number(3.65),
                    number(2.75),
                    number(2.30),
                    number(1.60),
                    number(1.05),
                    number(0.80),
                    number(0.25)));
    assertTrue(e.getMessage().contains("finer side"), e.getMessage());
  }

  /** A tail of fines gives a skewness above 0; the open pan is not extrapolated. */
  @Test
  void fineTailIsPositiveAndPanIsRefused() {
    Series openings = Series.of("opening", Units.um, 500, 250, 125, 63, 0);
    GrainCurve fines = GrainCurve.sieve(openings, Series.of("g", Unstated.UNIT, 0, 60, 25, 11, 4));
    assertTrue(FolkWard.of(fines).skewness().value() > 0.1);
    GrainCurve pan = GrainCurve.sieve(openings, Series.of("g", Unstated.UNIT, 0, 50, 25, 15, 10));
    assertThrows(IllegalArgumentException.class, () -> FolkWard.of(pan));
    Series both = FolkWard.sortings(GrainCurves.of(fines, pan));
    assertEquals(FolkWard.of(fines).sorting().value(), both.value(0), 1e-12);
    assertEquals(Double.NaN, both.value(1));
  }

  @Test
  void columnEqualsValue() {
    GrainCurve curve = GrainCurveTest.normal(new NormalDistribution(2.2, 0.5), 0.1);
    GrainCurves curves = GrainCurves.of(curve);
    FolkWard one = FolkWard.of(curve);
    assertEquals(one.mean().value(), FolkWard.means(curves).value(0), 1e-12);
    assertEquals(one.sorting().value(), FolkWard.sortings(curves).value(0), 1e-12);
    assertEquals(one.skewness().value(), FolkWard.skewnesses(curves).value(0), 1e-12);
    assertEquals(one.kurtosis().value(), FolkWard.kurtoses(curves).value(0), 1e-12);
  }
}
