package connate.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class ScaleTest {

  private static List<String> labels(Scale scale, int wanted) {
    return scale.ticks(wanted).stream().filter(Tick::isMajor).map(Tick::plain).toList();
  }

  /** By hand. */
  @Test
  void evenMarksAreWhole() {
    assertEquals(List.of("0", "0.1", "0.2", "0.3"), labels(new LinearScale(0, 0.31), 4));
    assertEquals(List.of("2000", "2020", "2040"), labels(new LinearScale(1995, 2049), 4));
    assertEquals(List.of("−1", "0", "1"), labels(new LinearScale(-1.5, 1.5), 3));
  }

  /** By hand: decades where there are enough, steps inside them where there are not. */
  @Test
  void logMarksAreDecades() {
    assertEquals(List.of("0.1", "1", "10", "100", "1000"), labels(new LogScale(0.05, 3000), 8));
    assertEquals(List.of("30", "100", "300"), labels(new LogScale(15, 400), 6));
    assertEquals(
        List.of("1e-9", "1e-8", "1e-7", "1e-6", "1e-5"), labels(new LogScale(5e-10, 5e-5), 8));
    assertTrue(labels(new LogScale(1e-15, 1e12), 6).size() <= 8);
  }

  /** Independent: position and value undo each other; marks stay few and inside. */
  @Test
  void anyRangeHasMarks() {
    SplittableRandom random = new SplittableRandom(11);
    for (int i = 0; i < 2000; i++) {
      double a = StrictMath.pow(10, random.nextDouble(-12, 12));
      double b = a * (1 + StrictMath.pow(10, random.nextDouble(-6, 6)));
      for (Scale scale : List.of(new LinearScale(a, b), new LogScale(a, b))) {
        List<Tick> ticks = scale.ticks(6);
        long major = ticks.stream().filter(Tick::isMajor).count();
        assertTrue(major >= 1 && major <= 14, scale + " has " + major);
        for (Tick tick : ticks) {
          double at = scale.position(tick.value());
          assertTrue(at > -1e-6 && at < 1 + 1e-6, scale + " " + tick);
        }
        assertEquals(0.3, scale.position(scale.value(0.3)), 1e-6);
      }
    }
  }

  @Test
  void nothingHasNoRange() {
    assertThrows(
        IllegalArgumentException.class, () -> LinearScale.around(new double[] {Double.NaN}));
    assertThrows(IllegalArgumentException.class, () -> LogScale.around(new double[] {0, -1}));
  }
}
