package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import org.junit.jupiter.api.Test;

class LinesTest {

  /** By hand: x 1 2 3 4, y 2 4 5 8: s_x 1.290994, s_y 2.5, r 0.968246 → slope 1.936492. */
  @Test
  @Check(method = "reduced-major-axis", kind = Kind.BY_HAND, source = "four points")
  void reducedMajorAxis() {
    ReducedMajorAxis line =
        ReducedMajorAxis.fit(new double[] {1, 2, 3, 4}, new double[] {2, 4, 5, 8});
    assertEquals(1.936492, line.slope(), 5e-7);
    assertEquals(4.75 - 2.5 * 1.936492, line.intercept(), 5e-6);
  }

  /** By hand: one wild point of five does not move the median slope from 2. */
  @Test
  @Check(method = "theil-sen", kind = Kind.BY_HAND, source = "five points, one wild")
  void theilSenHoldsAgainstAWildPoint() {
    TheilSen line = TheilSen.fit(new double[] {1, 2, 3, 4, 5}, new double[] {3, 5, 7, 9, 500});
    assertEquals(2, line.slope(), 1e-12);
    assertEquals(1, line.intercept(), 1e-12);
  }

  @Test
  void verticalPointsAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> TheilSen.fit(new double[] {1, 1, 1}, new double[] {1, 2, 3}));
  }
}
