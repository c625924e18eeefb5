package connate.logs;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.gPerCm3;
import static connate.quantity.Units.kgPerM3;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class DensityPorosityTest {

  /** By hand: (2.65 - 2.40)/1.65 = 0.151515; (2.71 - 2.40)/1.71 = 0.181287. */
  @Test
  @Check(method = "density-porosity", kind = Kind.BY_HAND, source = "volume balance of two parts")
  void sandAndLimestone() {
    assertEquals(0.151515, of(2.40, 2.65), 5e-7);
    assertEquals(0.181287, of(2.40, 2.71), 5e-7);
  }

  /** Independent: a rock mixed of known parts gives its porosity back. */
  @Test
  @Check(
      method = "density-porosity",
      kind = Kind.INDEPENDENT,
      source = "the mixture's own porosity")
  void mixtureGivesItsPorosityBack() {
    for (double phi = 0.01; phi < 0.5; phi += 0.07) {
      assertEquals(phi, of(2.65 * (1 - phi) + phi, 2.65), 1e-12);
    }
  }

  @Test
  void columnEqualsValueAndUnitsDoNotMatter() {
    Series log = Series.of("RHOB", Units.kgPerM3, 2400, Double.NaN, 2200);
    Series phi = DensityPorosity.of(log, gPerCm3(2.65), gPerCm3(1));
    assertEquals(of(2.40, 2.65), phi.value(0), 1e-12);
    assertEquals(Double.NaN, phi.value(1));
    assertEquals(
        of(2.2, 2.65),
        DensityPorosity.of(kgPerM3(2200), kgPerM3(2650), kgPerM3(1000)).in(fraction),
        1e-12);
  }

  @Test
  void impossibleDensityIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> of(0.2, 2.65));
  }

  private static double of(double bulk, double matrix) {
    return DensityPorosity.of(gPerCm3(bulk), gPerCm3(matrix), gPerCm3(1)).in(fraction);
  }
}
