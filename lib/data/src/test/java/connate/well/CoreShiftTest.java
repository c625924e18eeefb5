package connate.well;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.gPerCm3;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class CoreShiftTest {

  private static final int ROWS = 800;

  /** An invented density log: smooth random beds at 0.125 m, with its depths. */
  private static Series log(long seed, double noise) {
    Random random = new Random(seed);
    double[] depths = new double[ROWS];
    double[] values = new double[ROWS];
    double bed = 2.3;
    for (int i = 0; i < ROWS; i++) {
      depths[i] = 2000 + 0.125 * i;
      bed = 2.3 + 0.97 * (bed - 2.3) + 0.02 * random.nextGaussian();
      values[i] = bed + noise * random.nextGaussian();
    }
    return Series.of("RHOB", gPerCm3, values).atDepth(Series.of("depth", m, depths));
  }

  /** Plugs every 0.5 m whose porosity follows the log at the plug's depth plus a shift. */
  private static Series core(Series log, double shift, int count, double scatter) {
    Random random = new Random(5);
    double[] depths = new double[count];
    double[] values = new double[count];
    for (int i = 0; i < count; i++) {
      depths[i] = 2020 + 0.5 * i;
      int row = (int) Math.round((depths[i] + shift - 2000) / 0.125);
      values[i] = (2.65 - log.value(row)) / 1.65 + scatter * random.nextGaussian();
    }
    return Series.of("porosity", fraction, values).atDepth(Series.of("depth", m, depths));
  }

  /** Independent: the shift with which the core was made. */
  @Test
  void findsTheShiftThatWasPutIn() {
    Series log = log(1, 0.002);
    for (double shift : new double[] {-2.5, 0, 1.375, 3}) {
      CoreShift found = CoreShift.best(log, core(log, shift, 80, 0.002), m(4));
      assertEquals(shift, found.shift().metres(), 1e-9);
      assertTrue(found.correlation() < -0.98, found.toString());
      assertEquals(80, found.pairs());
      assertTrue(found.doubts().isEmpty(), found.doubts().toString());
    }
  }

  @Test
  void movesTheCore() {
    Series log = log(1, 0);
    Series core = core(log, 1.5, 40, 0);
    CoreShift shift = CoreShift.best(log, core, m(3));
    Series moved = shift.moved(core);
    assertEquals(2021.5, moved.depth().orElseThrow().value(0), 1e-9);
    assertArrayEquals(core.values(), moved.values());
    assertEquals(2021.5, shift.moved(core.depth().orElseThrow()).value(0), 1e-9);
    assertEquals(-1, shift.correlation(), 1e-9);
    assertTrue(Math.abs(shift.correlationBefore()) < 0.99);
    assertEquals(49, shift.trials().size());
    assertEquals(49, shift.correlations().size());
  }

  @Test
  void givenShiftTellsItsCorrelation() {
    Series log = log(1, 0);
    CoreShift given = CoreShift.given(m(1.5), log, core(log, 1.5, 40, 0));
    assertEquals(-1, given.correlation(), 1e-9);
    assertEquals(40, given.pairs());
  }

  @Test
  void edgeFlatAndFewAreTold() {
    Series log = log(1, 0.002);
    CoreShift edge = CoreShift.best(log, core(log, 3, 80, 0.002), m(2.5));
    assertTrue(edge.doubts().toString().contains("largest that was tried"), edge.toString());
    CoreShift flat = CoreShift.best(log(1, 0), core(log(2, 0), 0, 120, 1), m(1));
    assertTrue(flat.doubts().toString().contains("no shift stands out"), flat.toString());
    CoreShift few = CoreShift.best(log, core(log, 1, 5, 0), m(2));
    assertTrue(few.doubts().toString().contains("only 5 pairs"), few.toString());
  }

  /** By hand: where the log has a long gap, plugs have no partner. */
  @Test
  void neverAcrossGaps() {
    Series log = log(1, 0);
    double[] values = log.values();
    for (int i = 200; i < 240; i++) {
      values[i] = Double.NaN;
    }
    Series gappy = Series.of("RHOB", gPerCm3, values).atDepth(log.depth().orElseThrow());
    CoreShift given = CoreShift.given(m(0), gappy, core(log, 0, 40, 0));
    assertEquals(30, given.pairs());
  }

  @Test
  void refusals() {
    Series log = log(1, 0);
    Series core = core(log, 0, 40, 0);
    Series bare = Series.of("x", fraction, core.values());
    assertThrows(IllegalArgumentException.class, () -> CoreShift.best(log, bare, m(2)));
    assertThrows(IllegalArgumentException.class, () -> CoreShift.best(log, core, m(0)));
    assertThrows(IllegalArgumentException.class, () -> CoreShift.best(log, core, m(0.01)));
    assertThrows(IllegalArgumentException.class, () -> CoreShift.best(log, core, m(5000)));
    Series far = core.atDepth(core.depth().orElseThrow().map(d -> d + 5000));
    assertThrows(IllegalArgumentException.class, () -> CoreShift.best(log, far, m(2)));
  }
}
