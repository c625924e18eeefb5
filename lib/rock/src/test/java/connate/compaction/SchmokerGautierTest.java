package connate.compaction;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.km;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class SchmokerGautierTest {

  /**
   * Independent: with a maturity that grows exponentially with depth it is exponential in depth, as
   * the paper says.
   */
  @Test
  @Check(
      method = "schmoker-gautier",
      kind = Kind.INDEPENDENT,
      source = "exponential in depth where maturity is, as the paper says")
  void specialCase() {
    for (double z = 0; z < 5; z += 0.5) {
      double maturity = 0.2 * StrictMath.exp(0.5 * z);
      double phi = SchmokerGautier.of(fraction(0.1), number(maturity), number(-0.8)).fraction();
      double surface = SchmokerGautier.of(fraction(0.1), number(0.2), number(-0.8)).fraction();
      assertEquals(Athy.of(fraction(surface), number(0.4), km(z)).fraction(), phi, 1e-12);
    }
    assertEquals(
        0.1,
        SchmokerGautier.of(fraction(0.1), Series.of("Ro", Units.number, 1), number(-1)).value(0),
        1e-12);
    assertThrows(
        IllegalArgumentException.class,
        () -> SchmokerGautier.of(fraction(0.1), number(1), number(0.5)));
  }
}
