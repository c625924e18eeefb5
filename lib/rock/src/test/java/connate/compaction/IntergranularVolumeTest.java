package connate.compaction;

import static connate.quantity.Units.m;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class IntergranularVolumeTest {

  /** Independent: closure, and the minus-cement porosity that compaction loss counts with. */
  @Test
  @Check(method = "intergranular-volume", kind = Kind.BY_HAND, source = "15 + 10 + 2 = 27 %")
  void sums() {
    assertEquals(
        27, IntergranularVolume.of(percent(15), percent(10), percent(2)).in(Units.percent), 1e-12);
    Series p = Series.of("P", Units.percent, 15);
    assertEquals(0.27, IntergranularVolume.of(p, percent(10), percent(2)).value(0), 1e-12);
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> IntergranularVolume.of(percent(60), percent(30), percent(20)));
    assertTrue(e.getMessage().contains("more than all"), e.getMessage());
  }

  /**
   * Published: Paxton and others (2002): 40 to 42, 28 and 26 % at 0, 1.5 and below 2.5 km, memory.
   */
  @Test
  @Check(
      method = "paxton-igv",
      kind = Kind.PUBLISHED,
      source = "Paxton and others (2002), 41, 28 and 26 %, from memory")
  void rigidGrains() {
    assertEquals(41, IntergranularVolume.rigid(m(0)).in(Units.percent), 1);
    assertEquals(28, IntergranularVolume.rigid(m(1500)).in(Units.percent), 1e-9);
    assertEquals(26, IntergranularVolume.rigid(m(4000)).in(Units.percent), 1e-9);
    double before = 1;
    for (double z = 0; z < 4000; z += 50) {
      double igv = IntergranularVolume.rigid(m(z)).fraction();
      assertTrue(igv <= before);
      before = igv;
    }
    assertEquals(0.28, IntergranularVolume.rigid(Series.of("z", Units.m, 1500)).value(0), 1e-12);
  }
}
