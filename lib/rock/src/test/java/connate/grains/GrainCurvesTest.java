package connate.grains;

import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import java.util.List;
import org.junit.jupiter.api.Test;

class GrainCurvesTest {

  private static final List<Series> COLUMNS =
      List.of(
          Series.of("depth", Units.m, 1, 2, 3, 4),
          Series.of("125-250", Unstated.UNIT, 40, 25, 0, 40),
          Series.of("<63", Unstated.UNIT, 5, 25, 0, 5),
          Series.of("63-125", Unstated.UNIT, 15, 25, 0, 15),
          Series.of("250-500", Unstated.UNIT, 40, 25, 0, 60));

  /** By hand: 5, 20, 60, 100 % finer than the limits; row 3 is empty, row 4 adds up to 120. */
  @Test
  void columnsMakeCurves() {
    try (Told told = new Told()) {
      GrainCurves curves = GrainCurves.of(COLUMNS, Units.um);
      assertEquals(4, curves.size());
      assertEquals(2, curves.count());
      assertTrue(told.says("M11", "1 of 4 rows"), told.toString());
      Series d20 = curves.d(20);
      assertEquals(0.125, d20.value(0), 1e-12);
      assertEquals(Double.NaN, d20.value(1));
      assertTrue(told.says("M10", "d20 of 1 of 2 curves"), told.toString());
      assertEquals(curves.curve(0).d(50).in(Units.mm), curves.d(50).value(0), 0);
      assertEquals(2, curves.phi(40).value(0), 1e-12);
      assertEquals(60, curves.finer(um(250)).value(0), 1e-12);
      assertTrue(curves.withFinest(um(2)).d(20).value(1) < 0.063);
      assertThrows(IllegalArgumentException.class, () -> curves.curve(2));
      assertEquals(3, curves.withFinest(um(2)).with(Between.LINEAR).listing().heads().size() - 1);
    }
  }

  @Test
  void massesMayAddUpToAnything() {
    assertEquals(3, GrainCurves.ofMasses(COLUMNS, Units.um).count());
  }

  @Test
  void statedUnitsAreTaken() {
    GrainCurves curves =
        GrainCurves.of(
            List.of(
                Series.of("0-63 µm", Units.fraction, 0.2),
                Series.of("63-500 µm", Units.fraction, 0.8)));
    assertEquals(0.063, curves.d(20).value(0), 1e-12);
    GrainCurves headed =
        GrainCurves.of(
            List.of(Series.of("0.063-0.5", Units.mm, 60), Series.of("0.5-1", Units.mm, 40)));
    assertEquals(0.5, headed.d(60).value(0), 1e-12);
  }

  @Test
  void gapsOverlapsAndStrangersAreRefused() {
    var gap =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                GrainCurves.of(
                    List.of(
                        Series.of("0-63 um", Units.percent, 50),
                        Series.of("75-90 um", Units.percent, 50))));
    assertTrue(gap.getMessage().contains("leave a gap"), gap.getMessage());
    var overlap =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                GrainCurves.of(
                    List.of(
                        Series.of("0-63 um", Units.percent, 50),
                        Series.of("50-90 um", Units.percent, 50))));
    assertTrue(overlap.getMessage().contains("overlap"), overlap.getMessage());
    assertThrows(
        IllegalArgumentException.class,
        () -> GrainCurves.of(List.of(Series.of("depth", Units.m, 1))));
    var unit = assertThrows(IllegalArgumentException.class, () -> GrainCurves.of(COLUMNS));
    assertTrue(unit.getMessage().contains("has no unit"), unit.getMessage());
    assertThrows(IllegalArgumentException.class, () -> GrainCurves.of(new GrainCurve[0]));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            GrainCurves.of(
                List.of(
                    Series.of("0-63 um", Units.percent, 5),
                    Series.of("63-90 um", Units.percent, 5))));
  }
}
