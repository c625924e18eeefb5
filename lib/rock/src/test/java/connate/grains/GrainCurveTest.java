package connate.grains;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Seeds;
import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import java.util.Random;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class GrainCurveTest {

  private static final Series LIMITS = Series.of("d", Units.um, 62.5, 125, 250, 500, 1000);
  private static final Series WEIGHTS = Series.of("sand", Units.percent, 10, 40, 30, 20);

  /** By hand: d10 is the limit itself; d30 half way from 125 to 250 µm. */
  @Test
  void percentilesBetweenLimits() {
    GrainCurve curve = GrainCurve.of(LIMITS, WEIGHTS);
    assertEquals(0.125, curve.d(10).in(Units.mm), 1e-15);
    assertEquals(0.125 * StrictMath.sqrt(2), curve.d(30).in(Units.mm), 1e-12);
    assertEquals(0.1875, curve.with(Between.LINEAR).d(30).in(Units.mm), 1e-12);
    assertEquals(2.5, curve.phi(70).value(), 1e-12);
    assertEquals(30, curve.finer(mm(0.125 * StrictMath.sqrt(2))).in(Units.percent), 1e-9);
    assertEquals(0, curve.finer(um(10)).fraction(), 0);
    assertEquals(1, curve.finer(mm(3)).fraction(), 0);
  }

  /** Independent: Commons Math's normal law; classes of 0.02 phi, so that steps do not show. */
  @Test
  void percentilesOfNormalSizes() {
    NormalDistribution normal = new NormalDistribution(2.1, 0.6);
    GrainCurve curve = normal(normal, 0.02);
    for (double p : new double[] {5, 10, 16, 25, 50, 60, 75, 84, 95}) {
      double expected = normal.inverseCumulativeProbability(p / 100);
      assertEquals(expected, curve.phi(p).value(), 2e-4, "phi" + p);
    }
  }

  static GrainCurve normal(NormalDistribution law, double step) {
    int n = (int) StrictMath.round(10 * law.getStandardDeviation() / step);
    double[] limits = new double[n + 1];
    double[] weights = new double[n];
    double low = law.getMean() - n * step / 2;
    for (int i = 0; i <= n; i++) {
      limits[n - i] = PhiScale.mm(low + i * step);
    }
    for (int i = 0; i < n; i++) {
      weights[n - 1 - i] = law.probability(low + i * step, low + (i + 1) * step) * 100;
    }
    return GrainCurve.of(
        Series.of("d", Units.mm, limits), Series.of("normal", Unstated.UNIT, weights));
  }

  @Test
  void orderOfLimitsIsFree() {
    GrainCurve down =
        GrainCurve.of(
            Series.of("d", Units.mm, 1, 0.5, 0.25, 0.125, 0.0625),
            Series.of("sand", Units.percent, 20, 30, 40, 10));
    assertEquals(GrainCurve.of(LIMITS, WEIGHTS).d(37), down.d(37));
  }

  /** By hand: 20 + 50 + 25 + 5 g on sieves in any order; the pan is open. */
  @Test
  void sievesWithPan() {
    GrainCurve curve =
        GrainCurve.sieve(
            Series.of("opening", Units.mm, 0.5, 0.063, 0.25, 0, 1),
            Series.of("g", Unstated.UNIT, 100, 250, 125, 25, 0));
    assertEquals(5, curve.pan().in(Units.percent), 1e-12);
    assertEquals(0.25, curve.d(55).in(Units.mm), 1e-12);
    assertFalse(curve.isOpen(99));
    assertTrue(curve.isOpen(4));
    var e = assertThrows(IllegalArgumentException.class, () -> curve.d(4));
    assertTrue(e.getMessage().contains("open-ended class below 0.063 mm"), e.getMessage());
    assertTrue(e.getMessage().contains("withFinest"), e.getMessage());
    assertEquals(0.063, curve.d(5).in(Units.mm), 1e-12);
    assertFalse(curve.with(Between.LINEAR).isOpen(4));
  }

  @Test
  void assumedEndIsTold() {
    GrainCurve curve =
        GrainCurve.sieve(
            Series.of("opening", Units.mm, 1, 0.063, 0), Series.of("g", Unstated.UNIT, 10, 80, 10));
    assertThrows(IllegalArgumentException.class, () -> curve.d(95));
    try (Told told = new Told()) {
      double d95 = curve.withFinest(um(2)).withCoarsest(mm(2)).d(95).in(Units.mm);
      assertEquals(StrictMath.sqrt(2), d95, 1e-12);
      assertTrue(told.says("M12", "assumed end"), told.toString());
    }
    try (Told told = new Told()) {
      curve.withFinest(um(2)).d(50);
      assertTrue(told.codes().isEmpty());
    }
    assertThrows(IllegalArgumentException.class, () -> curve.withFinest(um(80)));
    assertThrows(IllegalArgumentException.class, () -> curve.withCoarsest(um(80)));
    assertThrows(
        IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, WEIGHTS).withFinest(um(2)));
  }

  @Test
  void badWeightsAreRefused() {
    Series short90 = Series.of("sand", Units.percent, 10, 30, 30, 20);
    var e = assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, short90));
    assertTrue(e.getMessage().contains("add up to 90.00"), e.getMessage());
    try (Told told = new Told()) {
      GrainCurve.of(LIMITS, Series.of("sand", Unstated.UNIT, 10, 32, 30, 20));
      assertTrue(told.says("M11", "taken as masses"), told.toString());
    }
    for (double bad : new double[] {-1, Double.NaN}) {
      Series weights = Series.of("sand", Unstated.UNIT, bad, 41, 30, 30);
      assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, weights));
    }
    Series none = Series.of("sand", Unstated.UNIT, 0, 0, 0, 0);
    assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, none));
    Series three = Series.of("sand", Units.percent, 50, 50);
    assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, three));
    Series twice = Series.of("d", Units.um, 62, 125, 125, 500, 1000);
    assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(twice, WEIGHTS));
    assertThrows(IllegalArgumentException.class, () -> GrainCurve.of(LIMITS, WEIGHTS).d(100));
  }

  /** Independent: finer rises, d and finer are inverses, for random analyses and both ways. */
  @Test
  void risesAndInverts() {
    Random random = Seeds.random("GrainCurveTest");
    for (int run = 0; run < 100; run++) {
      double[] weights = new double[4];
      for (int i = 0; i < 4; i++) {
        weights[i] = random.nextInt(3) == 0 ? 0 : random.nextDouble();
      }
      weights[random.nextInt(4)] += 0.5;
      for (Between way : Between.values()) {
        GrainCurve curve = GrainCurve.of(LIMITS, Series.of("g", Unstated.UNIT, weights)).with(way);
        double before = 0;
        for (double p = 0.5; p < 100; p += 0.5) {
          double d = curve.d(p).in(Units.mm);
          assertTrue(d >= before);
          assertEquals(p, curve.finer(mm(d)).in(Units.percent), 1e-8);
          before = d;
        }
      }
    }
  }

  @Test
  void shows() {
    GrainCurve curve = GrainCurve.of(LIMITS, WEIGHTS);
    assertEquals("sand, 4 size classes, logarithmic between the limits", curve.toString());
    assertEquals(5, curve.listing().rows().size());
    assertEquals("sand", curve.label());
    assertEquals(Units.percent, curve.yUnit());
    assertEquals(100, curve.cumulative().value(4), 0);
    assertEquals(1, curve.limits().value(4), 0);
  }
}
