package connate.series;

import static connate.quantity.Units.mD;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class SeriesTest {

  private final Series phi = Series.of("phi", Units.percent, 20, Double.NaN, 30);

  /** By hand. */
  @Test
  void summaryLeavesMissingOut() {
    assertEquals(percent(25), phi.mean());
    assertEquals(percent(20), phi.min());
    assertEquals(2, phi.count());
    assertTrue(phi.toString().contains("1 missing"), phi.toString());
  }

  /** By hand: 20 % - 0.05 × 12 % = 19.4 %. */
  @Test
  void sumsConvertUnits() {
    Series shale = Series.of("vsh", Units.fraction, 0.05, 0, 1);
    Series out = phi.less(shale.times(percent(12)));
    assertEquals(19.4, out.value(0), 1e-12);
    assertEquals(Units.percent, out.unit());
    assertEquals(18, out.value(2), 1e-12);
  }

  @Test
  void anotherDimensionIsRefusedInWords() {
    var e = assertThrows(IllegalArgumentException.class, () -> phi.in(Units.mD));
    assertTrue(e.getMessage().contains("permeability was expected"), e.getMessage());
    assertThrows(IllegalArgumentException.class, () -> phi.plus(mD(3)));
  }

  @Test
  void rowsKeepTheirDepth() {
    Series depth = Series.of("depth", Units.m, 100, 101, 102);
    Series some = phi.atDepth(depth).rows(2, 0);
    assertArrayEquals(new double[] {30, 20}, some.values());
    assertArrayEquals(new double[] {102, 100}, some.depth().orElseThrow().values());
  }

  @Test
  void traitsStay() {
    Series air = Series.of("k", Units.mD, 1, 2).with(Series.FLUID, "air");
    assertEquals("air", air.times(2).traits().get(Series.FLUID));
    assertEquals("air", air.named("x").traits().get(Series.FLUID));
  }

  @Test
  void listingIsAligned() {
    Listing listing =
        Listing.titled("two rows")
            .column("well")
            .column("k", Units.mD)
            .row("A", mD(3.14159))
            .row("long name", Units.darcy(1))
            .note("a note")
            .build();
    assertEquals(
        String.join(
            "\n",
            "two rows",
            "  well           k",
            "                mD",
            "  A          3.142",
            "  long name   1000",
            "  a note"),
        listing.toString());
  }
}
