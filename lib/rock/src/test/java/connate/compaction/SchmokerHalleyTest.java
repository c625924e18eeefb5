package connate.compaction;

import static connate.quantity.Units.km;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class SchmokerHalleyTest {

  /** By hand at 0 to 3 km; the porosity halves over 2498 ln 2 = 1731 m. */
  @Test
  @Check(
      method = "schmoker-halley",
      kind = Kind.BY_HAND,
      source = "0, 1, 2 and 3 km; halves over 1731.5 m")
  void carbonates() {
    double[] phi = {41.73, 27.9635, 18.7385, 12.5568};
    for (int i = 0; i < phi.length; i++) {
      assertEquals(phi[i], SchmokerHalley.of(km(i)).in(Units.percent), 6e-5);
    }
    assertEquals(41.73 / 2, SchmokerHalley.of(m(2498 * StrictMath.log(2))).in(Units.percent), 1e-9);
    assertEquals(
        27.9635, SchmokerHalley.of(Series.of("z", Units.m, 1000)).in(Units.percent)[0], 6e-5);
  }

  @Test
  void deeperThanTheDataIsTold() {
    try (Told told = new Told()) {
      SchmokerHalley.of(km(6));
      assertTrue(told.says("M01", "depth"), told.toString());
    }
    assertThrows(IllegalArgumentException.class, () -> SchmokerHalley.of(km(-1)));
  }
}
