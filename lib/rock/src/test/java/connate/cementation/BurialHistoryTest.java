package connate.cementation;

import static connate.quantity.Units.Ma;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.degCPerKm;
import static connate.quantity.Units.kgPerM3;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class BurialHistoryTest {

  private static Series ages(double... ma) {
    return Series.of("age", Units.Ma, ma);
  }

  private static Series depths(double... m) {
    return Series.of("depth", Units.m, m);
  }

  private static Series temperatures(double... c) {
    return Series.of("temperature", Units.degC, c);
  }

  /** By hand: half way from 40 Ma at 2,000 m and 70 °C to the present at 3,000 m and 100 °C. */
  @Test
  void sortsAndRunsStraight() {
    BurialHistory history =
        BurialHistory.of(ages(0, 100, 40), depths(3000, 0, 2000), temperatures(100, 10, 70));
    assertEquals(100, history.ages().value(0), 0);
    assertEquals(0, history.ages().value(2), 0);
    assertEquals(2500, history.depth(Ma(20)).in(Units.m), 1e-9);
    assertEquals(85, history.temperature(Ma(20)).in(Units.degC), 1e-9);
    assertEquals(3, history.listing().rows().size());
    assertEquals(2000, history.depths().value(1), 0);
    assertEquals(70, history.temperatures().value(1), 0);
    assertThrows(IllegalArgumentException.class, () -> history.depth(Ma(120)));
  }

  @Test
  void gradientGivesTemperatures() {
    BurialHistory history =
        BurialHistory.of(ages(100, 0), depths(0, 2500), degC(10), degCPerKm(30));
    assertEquals(85, history.temperature(Ma(0)).in(Units.degC), 1e-9);
  }

  @Test
  void impossiblePointsAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> BurialHistory.of(ages(100), depths(0), temperatures(10)));
    assertThrows(
        IllegalArgumentException.class,
        () -> BurialHistory.of(ages(100, 0), depths(0), temperatures(10, 20)));
    var sign =
        assertThrows(
            IllegalArgumentException.class,
            () -> BurialHistory.of(ages(-100, 0), depths(0, 100), temperatures(10, 20)));
    assertTrue(sign.getMessage().contains("count back from the present"), sign.getMessage());
    assertThrows(
        IllegalArgumentException.class,
        () -> BurialHistory.of(ages(100, 0), depths(0, -100), temperatures(10, 20)));
    assertThrows(
        IllegalArgumentException.class,
        () -> BurialHistory.of(ages(100, 0), depths(0, Double.NaN), temperatures(10, 20)));
    assertThrows(
        IllegalArgumentException.class,
        () -> BurialHistory.of(ages(50, 50), depths(0, 100), temperatures(10, 20)));
  }

  @Test
  void doubtfulPointsAreTold() {
    try (Told told = new Told()) {
      BurialHistory.of(ages(100, 5), depths(0, 100), temperatures(10, 20));
      assertTrue(told.says("M30", "present is not reached"), told.toString());
    }
    try (Told told = new Told()) {
      BurialHistory.of(ages(100, 0), depths(900, 1000), temperatures(10, 20));
      assertTrue(told.says("M30", "not near the surface"), told.toString());
    }
    try (Told told = new Told()) {
      BurialHistory.of(ages(100_000, 0), depths(0, 1000), temperatures(10, 20));
      assertTrue(told.says("M30", "older than the Earth"), told.toString());
    }
  }

  @Test
  void overpressureAndDensities() {
    BurialHistory history = BurialHistory.of(ages(100, 0), depths(0, 3000), temperatures(10, 90));
    assertEquals(1.270 * 9.80665 * 3, history.point(0, 1).stress(), 1e-9);
    Series some = Series.of("over", Units.MPa, 0, 20);
    assertEquals(
        1.270 * 9.80665 * 3 - 20, history.withOverpressure(some).point(0, 1).stress(), 1e-9);
    Series most = Series.of("over", Units.MPa, 0, 40);
    assertThrows(IllegalArgumentException.class, () -> history.withOverpressure(most));
    Series one = Series.of("over", Units.MPa, 0);
    assertThrows(IllegalArgumentException.class, () -> history.withOverpressure(one));
    assertEquals(
        1.4 * 9.80665 * 3,
        history.withDensities(kgPerM3(2400), kgPerM3(1000)).point(0, 1).stress(),
        1e-9);
    assertThrows(
        IllegalArgumentException.class, () -> history.withDensities(kgPerM3(1000), kgPerM3(1000)));
  }
}
