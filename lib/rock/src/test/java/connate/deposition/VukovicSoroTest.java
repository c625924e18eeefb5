package connate.deposition;

import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class VukovicSoroTest {

  /**
   * Published: the sands of the Groundwater Project's exercise 6 were measured at 0.26 (Cu 1.96)
   * and 0.30 (Cu 4.6): the formula lies 0.17 and 0.06 above, which the card tells.
   */
  @Test
  @Check(
      method = "vukovic-soro",
      kind = Kind.PUBLISHED,
      source = "measured porosities of the Groundwater Project's exercise 6, which lie lower")
  void measuredSands() {
    assertEquals(0.172, VukovicSoro.of(number(1.96)).fraction() - 0.26, 0.001);
    assertEquals(0.063, VukovicSoro.of(number(4.6)).fraction() - 0.30, 0.001);
  }

  /** By hand, and the limit of the densest packing, 0.255, that wide curves approach. */
  @Test
  @Check(method = "vukovic-soro", kind = Kind.BY_HAND, source = "Cu 1, 2, 5, 10; limit 0.255")
  void values() {
    double[][] pairs = {{1, 0.46665}, {2, 0.430669}, {5, 0.355446}, {10, 0.294566}};
    double before = 1;
    for (double[] pair : pairs) {
      double n = VukovicSoro.of(number(pair[0])).fraction();
      assertEquals(pair[1], n, 5e-7);
      assertTrue(n < before);
      before = n;
    }
    assertEquals(0.255, VukovicSoro.of(number(100)).fraction(), 1e-6);
    Series n = VukovicSoro.of(Series.of("Cu", Units.number, 1));
    assertEquals(0.46665, n.value(0), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> VukovicSoro.of(number(0.5)));
  }
}
