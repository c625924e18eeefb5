package connate.grains;

import static connate.quantity.Units.mm;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class UniformityTest {

  /** Published: two sands of the Groundwater Project's exercise 6, Cu 1.96 and 4.6 as printed. */
  @Test
  @Check(
      method = "uniformity-coefficient",
      kind = Kind.PUBLISHED,
      source = "Groundwater Project, exercise 6: Cu 1.96 and 4.6")
  void sandsOfTheExercise() {
    assertEquals(1.96, Uniformity.of(mm(1.3), mm(0.66)).value(), 0.01);
    assertEquals(4.6, Uniformity.of(mm(0.27), mm(0.058)).value(), 0.06);
  }

  /** By hand: sizes 1, 0.5 and 0.25 mm give Cu 4 and Cc 1. */
  @Test
  @Check(method = "curvature-coefficient", kind = Kind.BY_HAND, source = "0.25, 0.5, 1 mm give 1")
  void curvature() {
    assertEquals(1, Uniformity.curvature(mm(1), mm(0.5), mm(0.25)).value(), 1e-12);
    Series cc = Uniformity.curvature(Series.of("d60", Units.mm, 1), mm(0.5), mm(0.25));
    assertEquals(1, cc.value(0), 1e-12);
  }

  /** By hand: 60 and 10 % finer are limits of the classes. */
  @Test
  void ofCurve() {
    GrainCurve curve =
        GrainCurve.of(
            Series.of("d", Units.mm, 0.05, 0.1, 0.2, 0.4, 0.8),
            Series.of("sand", Units.percent, 10, 20, 30, 40));
    assertEquals(4, Uniformity.of(curve).value(), 1e-12);
    assertEquals(1, Uniformity.curvature(curve).value(), 1e-12);
    assertEquals(4, Uniformity.of(GrainCurves.of(curve)).value(0), 1e-12);
    assertEquals(4, Uniformity.of(Series.of("d60", Units.mm, 0.4), mm(0.1)).value(0), 1e-12);
  }

  @Test
  void countedFromTheCoarseSide() {
    var e = assertThrows(IllegalArgumentException.class, () -> Uniformity.of(mm(0.1), mm(0.4)));
    assertTrue(e.getMessage().contains("coarse side"), e.getMessage());
  }
}
