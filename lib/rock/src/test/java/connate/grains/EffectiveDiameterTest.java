package connate.grains;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Seeds;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;

class EffectiveDiameterTest {

  private static final Series LIMITS = Series.of("d", Units.mm, 0.1, 0.2, 0.5, 1);
  private static final Series WEIGHTS = Series.of("sand", Units.percent, 20, 50, 30);

  /** Mean of 1/d over the classes with the weight spread by a substitution, by Simpson's rule. */
  private static double integrated(DoubleUnaryOperator to, DoubleUnaryOperator from) {
    double sum = 0;
    for (int i = 0; i < 3; i++) {
      double a = to.applyAsDouble(LIMITS.value(i));
      double b = to.applyAsDouble(LIMITS.value(i + 1));
      int n = 2000;
      double part = 0;
      for (int j = 0; j <= n; j++) {
        double weight = j == 0 || j == n ? 1 : j % 2 == 1 ? 4 : 2;
        part += weight / from.applyAsDouble(a + (b - a) * j / n);
      }
      sum += WEIGHTS.value(i) / 100 * part / (3.0 * n);
    }
    return 1 / sum;
  }

  /** Independent: Simpson's rule over weight even in d (Zamarin) and in ln d (Zunker). */
  @Test
  @Check(
      method = "effective-diameter-zamarin",
      kind = Kind.INDEPENDENT,
      source = "Simpson's rule over 1/d with the weight even in d")
  @Check(
      method = "effective-diameter-zunker",
      kind = Kind.INDEPENDENT,
      source = "Simpson's rule over 1/d with the weight even in ln d")
  void harmonicMeansByIntegration() {
    GrainCurve curve = GrainCurve.of(LIMITS, WEIGHTS);
    assertEquals(integrated(d -> d, d -> d), EffectiveDiameter.zamarin(curve).in(Units.mm), 1e-9);
    assertEquals(
        integrated(StrictMath::log, StrictMath::exp),
        EffectiveDiameter.zunker(curve).in(Units.mm),
        1e-9);
  }

  /** By hand: 1/de = 2 (0.2/0.3 + 0.5/0.7 + 0.3/1.5). */
  @Test
  @Check(
      method = "effective-diameter-kruger",
      kind = Kind.BY_HAND,
      source = "1/de = 2 (0.2/0.3 + 0.5/0.7 + 0.3/1.5)")
  void krugerByHand() {
    double expected = 1 / (2 * (0.2 / 0.3 + 0.5 / 0.7 + 0.3 / 1.5));
    GrainCurve curve = GrainCurve.of(LIMITS, WEIGHTS);
    assertEquals(expected, EffectiveDiameter.kruger(curve).in(Units.mm), 1e-12);
  }

  /** By hand: a pan of 10 % below 0.1 mm counts with 1.5/0.1, or with its middle 0.05 mm. */
  @Test
  void finestClassFromZero() {
    GrainCurve curve =
        GrainCurve.of(
            Series.of("d", Units.mm, 0, 0.1, 0.1000001), Series.of("x", Units.percent, 10, 90));
    double rest = 0.9 / 0.1;
    assertEquals(1 / (rest + 1.5), EffectiveDiameter.zunker(curve).in(Units.mm), 1e-6);
    assertEquals(1 / (rest + 1.5), EffectiveDiameter.zamarin(curve).in(Units.mm), 1e-6);
    assertEquals(1 / (rest + 2), EffectiveDiameter.kruger(curve).in(Units.mm), 1e-6);
  }

  /** Independent: one narrow class is its own size; Krüger ≥ Zamarin ≥ Zunker; columns agree. */
  @Test
  void orderAndLimit() {
    GrainCurve narrow =
        GrainCurve.of(Series.of("d", Units.mm, 0.3, 0.300001), Series.of("x", Units.percent, 100));
    assertEquals(0.3, EffectiveDiameter.zunker(narrow).in(Units.mm), 1e-6);
    Random random = Seeds.random("EffectiveDiameterTest");
    for (int i = 0; i < 100; i++) {
      Series g =
          Series.of(
              "g", Unstated.UNIT, random.nextDouble(), random.nextDouble(), random.nextDouble());
      GrainCurve curve = GrainCurve.of(LIMITS, g);
      double kruger = EffectiveDiameter.kruger(curve).in(Units.mm);
      double zamarin = EffectiveDiameter.zamarin(curve).in(Units.mm);
      double zunker = EffectiveDiameter.zunker(curve).in(Units.mm);
      assertTrue(kruger > zamarin && zamarin > zunker);
      GrainCurves curves = GrainCurves.of(curve);
      assertEquals(kruger, EffectiveDiameter.kruger(curves).value(0), 0);
      assertEquals(zamarin, EffectiveDiameter.zamarin(curves).value(0), 0);
      assertEquals(zunker, EffectiveDiameter.zunker(curves).value(0), 0);
    }
  }

  @Test
  void openCoarseEndIsRefused() {
    GrainCurve curve =
        GrainCurve.sieve(
            Series.of("o", Units.mm, 1, 0.1, 0), Series.of("g", Unstated.UNIT, 10, 80, 10));
    assertThrows(IllegalArgumentException.class, () -> EffectiveDiameter.kruger(curve));
  }
}
