package connate.logs;

import static connate.quantity.Units.gAPI;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class ShaleVolumeTest {

  private static final String TEXTS =
      "printed laws in open petrophysics texts, evaluated at I = 0.5 by hand";

  /** By hand from the printed laws at I = 0.5, which is 70 gAPI between 20 and 120. */
  @Test
  @Check(method = "shale-volume-linear", kind = Kind.BY_HAND, source = TEXTS)
  @Check(method = "shale-volume-larionov-tertiary", kind = Kind.BY_HAND, source = TEXTS)
  @Check(method = "shale-volume-larionov-older", kind = Kind.BY_HAND, source = TEXTS)
  @Check(method = "shale-volume-steiber", kind = Kind.BY_HAND, source = TEXTS)
  @Check(method = "shale-volume-clavier", kind = Kind.BY_HAND, source = TEXTS)
  void halfWay() {
    assertEquals(0.5, ShaleVolume.linear(gAPI(70), gAPI(20), gAPI(120)).fraction(), 1e-15);
    assertEquals(
        0.216215, ShaleVolume.larionovTertiary(gAPI(70), gAPI(20), gAPI(120)).fraction(), 5e-7);
    assertEquals(0.33, ShaleVolume.larionovOlder(gAPI(70), gAPI(20), gAPI(120)).fraction(), 1e-12);
    assertEquals(0.25, ShaleVolume.steiber(gAPI(70), gAPI(20), gAPI(120)).fraction(), 1e-12);
    assertEquals(0.307161, ShaleVolume.clavier(gAPI(70), gAPI(20), gAPI(120)).fraction(), 5e-7);
  }

  /** Independent: all laws rise, start at 0, end near 1, and keep the published order between. */
  @Test
  @Check(
      method = "shale-volume-clavier",
      kind = Kind.INDEPENDENT,
      source = "published order of the laws at a middling index")
  void lawsRiseAndKeepTheirOrder() {
    double before = -1;
    for (double i = 0; i <= 1.0001; i += 0.05) {
      assertTrue(ShaleVolume.clavier(i) > before);
      before = ShaleVolume.clavier(i);
    }
    double i = 0.5;
    assertTrue(ShaleVolume.linear(i) > ShaleVolume.larionovOlder(i));
    assertTrue(ShaleVolume.larionovOlder(i) > ShaleVolume.clavier(i));
    assertTrue(ShaleVolume.clavier(i) > ShaleVolume.steiber(i));
    assertTrue(ShaleVolume.steiber(i) > ShaleVolume.larionovTertiary(i));
    assertEquals(0.995671, ShaleVolume.larionovTertiary(1), 5e-7);
    assertEquals(0.990, ShaleVolume.larionovOlder(1), 1e-12);
    assertEquals(1, ShaleVolume.steiber(1), 1e-12);
    assertEquals(1, ShaleVolume.clavier(1), 1e-3);
  }

  @Test
  void indexIsCutAndEndsMustDiffer() {
    Series gr = Series.of("GR", Units.gAPI, 5, 70, 300, Double.NaN);
    Series v = ShaleVolume.linear(gr, gAPI(20), gAPI(120));
    assertEquals(0, v.value(0), 0);
    assertEquals(1, v.value(2), 0);
    assertEquals(Double.NaN, v.value(3));
    assertThrows(
        IllegalArgumentException.class, () -> ShaleVolume.linear(gAPI(70), gAPI(120), gAPI(20)));
  }
}
