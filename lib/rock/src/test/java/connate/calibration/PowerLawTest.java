package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class PowerLawTest {

  /**
   * Published: Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524: k = 0.303 φ%^3.05 mD, from
   * which points on the law give exponent 3.05 and, for φ as a fraction, the factor 0.303 ·
   * 100^3.05.
   */
  @Test
  @Check(
      method = "power-law",
      kind = Kind.PUBLISHED,
      source = "Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524")
  void pointsOnThePublishedLawGiveItBack() {
    double[] percent = {9, 12, 18, 27};
    double[] k =
        java.util.Arrays.stream(percent).map(p -> 0.303 * StrictMath.pow(p, 3.05)).toArray();
    TransformFit fit =
        PowerLaw.fit(Series.of("phi", Units.percent, percent), Series.of("k", Units.mD, k));
    assertEquals(3.05, fit.slope(), 1e-11);
    assertEquals(StrictMath.log10(0.303) + 2 * 3.05, fit.intercept(), 1e-11);
  }
}
