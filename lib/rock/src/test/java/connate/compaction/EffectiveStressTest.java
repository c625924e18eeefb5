package connate.compaction;

import static connate.quantity.Units.MPa;
import static connate.quantity.Units.kgPerM3;
import static connate.quantity.Units.km;
import static connate.quantity.Units.number;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class EffectiveStressTest {

  /**
   * Independent: at normal pressure and constant densities it is the law over depth, with b = c/((ρ
   * - ρw) g).
   */
  @Test
  @Check(
      method = "effective-stress-compaction",
      kind = Kind.INDEPENDENT,
      source = "the law of depth at normal pressure")
  void isTheLawOfDepthAtNormalPressure() {
    double b = EffectiveStress.perMPa(number(0.27), kgPerM3(2300), kgPerM3(1030)).value();
    assertEquals(0.27 / (1.270 * 9.80665), b, 1e-12);
    for (double z = 0; z < 6; z += 0.5) {
      double overburden = 2.300 * 9.80665 * z;
      double water = 1.030 * 9.80665 * z;
      assertEquals(
          Athy.of(percent(49), number(0.27), km(z)).fraction(),
          EffectiveStress.of(percent(49), number(b), MPa(overburden), MPa(water)).fraction(),
          1e-12);
    }
  }

  /** Overpressure keeps pores open; a pressure above the overburden is impossible. */
  @Test
  void overpressure() {
    double normal = EffectiveStress.of(percent(49), number(0.03), MPa(60), MPa(30)).fraction();
    double over = EffectiveStress.of(percent(49), number(0.03), MPa(60), MPa(50)).fraction();
    assertTrue(over > normal);
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> EffectiveStress.of(percent(49), number(0.03), MPa(60), MPa(61)));
    assertTrue(e.getMessage().contains("above the overburden"), e.getMessage());
    assertThrows(
        IllegalArgumentException.class,
        () -> EffectiveStress.perMPa(number(0.3), kgPerM3(1000), kgPerM3(1030)));
    Series column =
        EffectiveStress.of(percent(49), number(0.03), Series.of("S", Units.MPa, 60), MPa(30));
    assertEquals(normal, column.value(0), 1e-12);
  }
}
