package connate.permeability;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class TimurTest {

  /** Published: Tiab and Donaldson (2004), p. 133: φ 24 %, S 30 % give 179 mD. */
  @Test
  @Check(
      method = "timur",
      kind = Kind.PUBLISHED,
      source = "Tiab and Donaldson (2004), Petrophysics, 2nd ed., eq. 3.64, p. 133")
  void exampleOfTheTextbook() {
    assertEquals(178.742, Timur.of(percent(24), percent(30)).in(Units.mD), 5e-4);
    assertEquals(
        178.742, Timur.of(fraction(0.24), fraction(0.3)).in(Units.mD), 5e-4, "unit invariance");
  }

  @Test
  void risesWithPorosityAndFallsWithWater() {
    Series k = Timur.of(Series.of("phi", Units.percent, 10, 20, 30), percent(25));
    assertTrue(k.value(0) < k.value(1) && k.value(1) < k.value(2));
    assertTrue(Timur.of(percent(20), percent(50)).isBelow(Timur.of(percent(20), percent(25))));
    assertThrows(IllegalArgumentException.class, () -> Timur.of(percent(20), percent(0)));
  }
}
