package connate.compaction;

import static connate.quantity.Units.km;
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

class DecompactionTest {

  private static final SclaterChristie SAND = SclaterChristie.SAND;
  private static final SclaterChristie SHALE = SclaterChristie.SHALE;

  private static double solid(SclaterChristie rock, double top, double base) {
    return Decompaction.solid(rock.initial(), rock.perKm(), km(top), km(base)).in(Units.km);
  }

  /** By hand: a bed from 2 to 3 km brought to the surface. */
  @Test
  @Check(method = "solid-thickness", kind = Kind.BY_HAND, source = "sand and shale from 2 to 3 km")
  @Check(
      method = "decompaction",
      kind = Kind.BY_HAND,
      source = "sand and shale from 2 to 3 km brought to the surface")
  void toTheSurface() {
    assertEquals(0.749755, solid(SAND, 2, 3), 5e-7);
    assertEquals(0.822044, solid(SHALE, 2, 3), 5e-7);
    assertEquals(
        1280.08,
        Decompaction.thickness(SAND.initial(), SAND.perKm(), km(2), km(3), km(0)).in(Units.m),
        0.01);
    assertEquals(
        1475.20,
        Decompaction.thickness(SHALE.initial(), SHALE.perKm(), km(2), km(3), km(0)).in(Units.m),
        0.01);
  }

  /** Independent: Simpson's rule over the solid part; grains conserved; there and back again. */
  @Test
  @Check(
      method = "solid-thickness",
      kind = Kind.INDEPENDENT,
      source = "Simpson's rule over 1 - φ(z)")
  @Check(
      method = "decompaction",
      kind = Kind.INDEPENDENT,
      source = "solids are conserved; there and back again")
  void conservesGrains() {
    Random random = Seeds.random("DecompactionTest");
    for (int i = 0; i < 50; i++) {
      double top = Seeds.between(random, 0, 4);
      double base = top + Seeds.between(random, 0.05, 2);
      double sum = 0;
      int n = 200;
      for (int j = 0; j <= n; j++) {
        double w = j == 0 || j == n ? 1 : j % 2 == 1 ? 4 : 2;
        double z = top + (base - top) * j / n;
        sum += w * (1 - SHALE.at(km(z)).fraction());
      }
      double solid = solid(SHALE, top, base);
      assertEquals(sum * (base - top) / (3 * n), solid, 1e-9);
      double up =
          Decompaction.thickness(SHALE.initial(), SHALE.perKm(), km(top), km(base), km(0))
              .in(Units.km);
      assertTrue(up >= base - top - 1e-9);
      double back =
          Decompaction.thickness(SHALE.initial(), SHALE.perKm(), km(0), km(up), km(top))
              .in(Units.km);
      assertEquals(base - top, back, 1e-8);
    }
  }

  @Test
  void columnsAndTurnedOver() {
    Series base = Series.of("base", Units.km, 3);
    Series solid = Decompaction.solid(SAND.initial(), SAND.perKm(), km(2), base);
    assertEquals(0.749755, solid.value(0), 5e-7);
    Series back = Decompaction.base(SAND.initial(), SAND.perKm(), solid, km(2));
    assertEquals(3, back.value(0), 1e-8);
    assertThrows(IllegalArgumentException.class, () -> solid(SAND, 3, 2));
  }
}
