package connate.compaction;

import static connate.quantity.Units.Ma;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.km;
import static connate.quantity.Units.m;
import static connate.quantity.Units.number;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class SchererTest {

  /** By hand: 80 % quartz, So 1.3, 2 km, 50 Ma. */
  @Test
  @Check(
      method = "scherer",
      kind = Kind.BY_HAND,
      source = "80 % quartz, So 1.3, 2 km, 50 Ma: 26.8976 %")
  void byHand() {
    double phi = Scherer.of(percent(80), number(1.3), km(2), Ma(50)).in(Units.percent);
    assertEquals(26.8976, phi, 6e-5);
    assertEquals(
        phi, Scherer.of(fraction(0.8), number(1.3), m(2000), Ma(50)).in(Units.percent), 1e-9);
    Series column = Scherer.of(percent(80), number(1.3), Series.of("z", Units.km, 2), Ma(50));
    assertEquals(phi, column.in(Units.percent)[0], 1e-9);
  }

  /** Independent: falls with depth, age and So, rises with quartz; never below 0. */
  @Test
  @Check(
      method = "scherer",
      kind = Kind.INDEPENDENT,
      source = "signs of the effects of quartz, sorting, depth and age")
  void signs() {
    double middle = Scherer.of(percent(60), number(1.5), km(2), Ma(50)).fraction();
    assertTrue(Scherer.of(percent(80), number(1.5), km(2), Ma(50)).fraction() > middle);
    assertTrue(Scherer.of(percent(60), number(2.5), km(2), Ma(50)).fraction() < middle);
    assertTrue(Scherer.of(percent(60), number(1.5), km(3), Ma(50)).fraction() < middle);
    assertTrue(Scherer.of(percent(60), number(1.5), km(2), Ma(150)).fraction() < middle);
    assertEquals(0, Scherer.of(percent(5), number(4), km(7), Ma(500)).fraction(), 0);
    assertThrows(
        IllegalArgumentException.class, () -> Scherer.of(percent(60), number(0.8), km(2), Ma(50)));
  }

  /** A quartz content of 0.8 % is a fraction taken for percent, most likely: it is flagged. */
  @Test
  void quartzAsFractionIsFlagged() {
    try (Told told = new Told()) {
      Scherer.of(percent(0.8), number(1.3), km(2), Ma(50));
      assertTrue(told.says("M01", "quartz"), told.toString());
    }
  }
}
