package connate.compaction;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.km;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class BaldwinButlerTest {

  /** By hand: z = 6.02 S^6.35 and z = 15 S^8 at S = 0.8, and the inverse at 1, 2 and 3 km. */
  @Test
  @Check(method = "baldwin-butler", kind = Kind.BY_HAND, source = "S = 0.8 and 1, 2, 3 km")
  @Check(method = "baldwin-butler-undercompacted", kind = Kind.BY_HAND, source = "S = 0.8")
  void shale() {
    assertEquals(1.45955, BaldwinButler.depth(percent(20)).in(Units.km), 5e-6);
    assertEquals(2.51658, BaldwinButler.undercompactedDepth(percent(20)).in(Units.km), 5e-6);
    assertEquals(0.246247, BaldwinButler.of(km(1)).fraction(), 5e-7);
    assertEquals(0.159311, BaldwinButler.of(km(2)).fraction(), 5e-7);
    assertEquals(0.103880, BaldwinButler.of(km(3)).fraction(), 5e-7);
    assertEquals(0.2, BaldwinButler.undercompacted(km(2.51658)).fraction(), 1e-6);
  }

  /**
   * Independent: inverses of each other; undercompacted shale keeps more pores below the crossing
   * of the laws, 15 S^8 = 6.02 S^6.35, S = 0.575, at 0.18 km.
   */
  @Test
  @Check(
      method = "baldwin-butler",
      kind = Kind.INDEPENDENT,
      source = "inverse of depth; near the shale of Sclater and Christie")
  void inverseAndOrder() {
    for (double z = 0.2; z < 6; z += 0.2) {
      double normal = BaldwinButler.of(km(z)).fraction();
      assertEquals(z, BaldwinButler.depth(fraction(normal)).in(Units.km), 1e-9);
      assertTrue(BaldwinButler.undercompacted(km(z)).fraction() > normal);
    }
    for (double z = 1; z <= 4; z++) {
      assertEquals(
          SclaterChristie.SHALE.at(km(z)).fraction(), BaldwinButler.of(km(z)).fraction(), 0.14);
    }
    Series column = BaldwinButler.of(Series.of("z", Units.m, 1000));
    assertEquals(0.246247, column.value(0), 5e-7);
    assertEquals(
        BaldwinButler.undercompacted(km(1)).fraction(),
        BaldwinButler.undercompacted(Series.of("z", Units.m, 1000)).value(0),
        1e-12);
    assertThrows(IllegalArgumentException.class, () -> BaldwinButler.of(km(7)));
  }
}
