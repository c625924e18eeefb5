package connate.grains;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class WentworthTest {

  /** Independent: Krumbein's phi scale was made so that every limit is a whole number. */
  @Test
  @Check(
      method = "wentworth",
      kind = Kind.INDEPENDENT,
      source = "limits are whole numbers of Krumbein's phi scale (1934)")
  void limitsAreWholePhi() {
    for (Wentworth size : Wentworth.values()) {
      if (size != Wentworth.CLAY) {
        double phi = PhiScale.of(size.finest()).value();
        assertEquals(StrictMath.rint(phi), phi, 1e-12, size.toString());
      }
    }
  }

  @Test
  void names() {
    assertEquals(Wentworth.MEDIUM_SAND, Wentworth.of(um(300)));
    assertEquals(Wentworth.SILT, Wentworth.of(um(62)));
    assertEquals(Wentworth.CLAY, Wentworth.of(um(1)));
    assertEquals(Wentworth.BOULDER, Wentworth.of(mm(300)));
    assertEquals("very fine sand", Wentworth.of(um(63)).toString());
    assertThrows(IllegalArgumentException.class, () -> Wentworth.of(mm(0)));
    var words = Wentworth.of(Series.of("d", Units.um, 300, Double.NaN));
    assertEquals("medium sand", words.label(0));
    assertNull(words.label(1));
    assertEquals(Wentworth.SILT.coarsest(), Wentworth.VERY_FINE_SAND.finest());
  }
}
