package connate.grains;

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

class GrainMomentsTest {

  /** By hand: middles 0.5, 1.5, 2.5, 3.5 phi with 10, 30, 40 and 20 %. */
  @Test
  @Check(
      method = "grain-moments",
      kind = Kind.BY_HAND,
      source = "middles 0.5 to 3.5 phi with 10, 30, 40 and 20 %")
  void fourClasses() {
    GrainCurve curve =
        GrainCurve.of(
            Series.of("d", Units.mm, 1, 0.5, 0.25, 0.125, 0.0625),
            Series.of("sand", Units.percent, 10, 30, 40, 20));
    GrainMoments moments = GrainMoments.of(curve);
    assertEquals(2.2, moments.mean().value(), 1e-12);
    assertEquals(0.9, moments.sorting().value(), 1e-12);
    assertEquals(-0.197531, moments.skewness().value(), 5e-7);
    assertEquals(2.25834, moments.kurtosis().value(), 5e-6);
    assertEquals(2.2, GrainMoments.means(GrainCurves.of(curve)).value(0), 1e-12);
    assertEquals(0.9, GrainMoments.sortings(GrainCurves.of(curve)).value(0), 1e-12);
    assertTrue(moments.toString().contains("kurtosis"));
  }

  /** Independent: the normal law; Sheppard's correction h²/12 is below 1e-4 with these classes. */
  @Test
  @Check(
      method = "grain-moments",
      kind = Kind.INDEPENDENT,
      source = "moments of the normal law: skewness 0, kurtosis 3")
  void normalSizes() {
    GrainMoments moments =
        GrainMoments.of(GrainCurveTest.normal(new NormalDistribution(2.5, 0.7), 0.02));
    assertEquals(2.5, moments.mean().value(), 1e-6);
    assertEquals(0.7, moments.sorting().value(), 1e-4);
    assertEquals(0, moments.skewness().value(), 1e-6);
    assertEquals(3, moments.kurtosis().value(), 1e-3);
  }

  @Test
  void openEndHasNoMiddle() {
    GrainCurve pan =
        GrainCurve.sieve(
            Series.of("opening", Units.um, 500, 250, 0), Series.of("g", Unstated.UNIT, 0, 90, 10));
    assertThrows(IllegalArgumentException.class, () -> GrainMoments.of(pan));
    assertEquals(Double.NaN, GrainMoments.means(GrainCurves.of(pan)).value(0));
    assertTrue(GrainMoments.of(pan.withFinest(Units.um(63))).sorting().value() > 0);
  }
}
