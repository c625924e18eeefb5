package connate.conductivity;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class HazenSimpleTest {

  /** By hand: the sands of the Groundwater Project's exercise 6, d10 0.66 and 0.058 mm, in cm/s. */
  @Test
  @Check(
      method = "hazen-simple",
      kind = Kind.BY_HAND,
      source = "sands of the Groundwater Project's exercise 6")
  void exercise() {
    assertEquals(0.4356, HazenSimple.of(mm(0.66), number(100)).in(Units.cmPerSecond), 1e-12);
    assertEquals(0.52272, HazenSimple.of(mm(0.66), number(120)).in(Units.cmPerSecond), 1e-12);
    assertEquals(0.00201840, HazenSimple.of(mm(0.058), number(60)).in(Units.cmPerSecond), 1e-12);
    Series column = HazenSimple.of(Series.of("d10", Units.mm, 0.66), number(100));
    assertEquals(0.4356 * 864, column.value(0), 1e-9);
  }

  /** The factor of a guide that is ten times too high (144000 mm/h per mm²: C 400) is flagged. */
  @Test
  void tenfoldFactorIsFlagged() {
    try (Told told = new Told()) {
      HazenSimple.of(mm(0.3), number(400));
      assertTrue(told.says("M01", "factor"), told.toString());
    }
  }
}
