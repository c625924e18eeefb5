package connate.deposition;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Seeds;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class BimodalMixtureTest {

  private static double n(double c, double ymin) {
    return BimodalMixture.of(fraction(c), fraction(0.4), fraction(0.45), fraction(ymin)).fraction();
  }

  /** By hand: nc 0.40, nf 0.45, ideal and with ymin 0.8. */
  @Test
  @Check(
      method = "bimodal-mixture",
      kind = Kind.BY_HAND,
      source = "volume balance at nc 0.40, nf 0.45, c 0.2, 0.4 and 0.6")
  void volumeBalance() {
    assertEquals(0.29, n(0.2, 1), 1e-12);
    assertEquals(0.31, n(0.2, 0.8), 1e-12);
    assertEquals(0.18, n(0.4, 1), 1e-12);
    assertEquals(0.26, n(0.4, 0.8), 1e-12);
    assertEquals(0.27, n(0.6, 1), 1e-12);
    assertEquals(0.323333, n(0.6, 0.8), 5e-7);
  }

  /** Independent: ends, continuity at c = nc with n = nc (1 + nf − ymin), least porosity there. */
  @Test
  @Check(
      method = "bimodal-mixture",
      kind = Kind.INDEPENDENT,
      source = "ends, continuity at c = nc and the least porosity nc·nf")
  void endsAndMiddle() {
    Random random = Seeds.random("BimodalMixtureTest");
    for (int i = 0; i < 200; i++) {
      double nc = Seeds.between(random, 0.3, 0.45);
      double nf = Seeds.between(random, 0.3, 0.6);
      double y = Seeds.between(random, 0.6, 1);
      assertEquals(nc, BimodalMixture.porosity(0, nc, nf, y), 1e-12);
      assertEquals(nf, BimodalMixture.porosity(1, nc, nf, y), 1e-12);
      double below = BimodalMixture.porosity(nc - 1e-9, nc, nf, y);
      double at = BimodalMixture.porosity(nc, nc, nf, y);
      assertEquals(nc * (1 + nf - y), at, 1e-9);
      assertEquals(at, below, 1e-7);
      double c = random.nextDouble();
      assertTrue(BimodalMixture.porosity(c, nc, nf, 1) >= nc * nf - 1e-12);
    }
  }

  /** Independent: solids must balance: of 1 m³ the fines' solids are their share of the weight. */
  @Test
  void weightIsNotBulkVolume() {
    for (double w : new double[] {0.05, 0.2, 0.5, 0.9}) {
      double c = BimodalMixture.bulkShare(fraction(w), fraction(0.4), fraction(0.45)).fraction();
      double n = n(c, 1);
      double finesSolids = c * 0.55;
      assertEquals(w, finesSolids / (1 - n), 1e-12, "weight share " + w);
      assertTrue(c < 1);
    }
    assertEquals(
        1, BimodalMixture.bulkShare(fraction(1), fraction(0.4), fraction(0.45)).fraction(), 1e-15);
  }

  /** By hand: geometric mean below nc, harmonic above. */
  @Test
  @Check(method = "bimodal-size", kind = Kind.BY_HAND, source = "means of 1 and 0.01 mm")
  void effectiveSize() {
    assertEquals(
        StrictMath.pow(10, -0.4),
        BimodalMixture.size(percent(20), percent(40), mm(1), mm(0.01)).in(Units.mm),
        1e-12);
    assertEquals(
        1 / (0.5 + 50),
        BimodalMixture.size(percent(50), percent(40), mm(1), mm(0.01)).in(Units.mm),
        1e-12);
    Series c = Series.of("c", Units.percent, 20, 60);
    assertEquals(n(0.6, 1), BimodalMixture.of(c, percent(40), percent(45)).value(1), 1e-12);
    assertEquals(
        1 / (0.4 + 60), BimodalMixture.size(c, percent(40), mm(1), mm(0.01)).value(1), 1e-12);
    assertThrows(
        IllegalArgumentException.class,
        () -> BimodalMixture.of(fraction(20), fraction(0.4), fraction(0.45)));
  }
}
