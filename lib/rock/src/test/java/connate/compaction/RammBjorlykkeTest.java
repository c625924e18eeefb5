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

class RammBjorlykkeTest {

  /** Independent: without clay it is the exponential law; clay only speeds it up. */
  @Test
  @Check(
      method = "ramm-bjorlykke",
      kind = Kind.INDEPENDENT,
      source = "exponential law for clean sand; clay adds β CI")
  void cleanSand() {
    for (double z = 0; z < 3; z += 0.25) {
      double clean =
          RammBjorlykke.of(fraction(0.45), number(0.27), number(0.1), number(0), km(z)).fraction();
      assertEquals(Athy.of(fraction(0.45), number(0.27), km(z)).fraction(), clean, 1e-12);
      double clayey =
          RammBjorlykke.of(fraction(0.45), number(0.27), number(0.1), number(2), km(z)).fraction();
      assertEquals(Athy.of(fraction(0.45), number(0.47), km(z)).fraction(), clayey, 1e-12);
    }
    Series column =
        RammBjorlykke.of(
            fraction(0.45), number(0.27), number(0.1), number(0), Series.of("z", Units.km, 1));
    assertEquals(0.45 * StrictMath.exp(-0.27), column.value(0), 1e-12);
    assertThrows(
        IllegalArgumentException.class,
        () -> RammBjorlykke.of(fraction(0.45), number(0.27), number(0.1), number(-1), km(1)));
  }
}
