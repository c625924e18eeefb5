package connate.layers;

import static connate.quantity.Units.m;
import static connate.quantity.Units.mDm;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import connate.series.Estimate;
import connate.series.Listing;
import connate.series.Series;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class LayersTest {

  private static Layer layer(String well, double... k) {
    double[] depth = new double[k.length];
    double[] phi = new double[k.length];
    for (int i = 0; i < k.length; i++) {
      depth[i] = 100.5 + i;
      phi[i] = k[i] > 5 ? 20 : 5;
    }
    return Layer.of(
        well,
        "Sand",
        m(100),
        m(100 + k.length),
        Series.of("depth", Units.m, depth),
        Map.of("K", Series.of("K", Units.mD, k), "PHI", Series.of("PHI", Units.percent, phi)));
  }

  /**
   * Published: the means of beds in parallel and in series (Muskat 1937): 10, 100, 1000 mD of equal
   * thickness give 370, 27.027 and, as geometric mean, 100 mD.
   */
  @Test
  void meansOfThreeBeds() {
    Layers layers = Layers.of(List.of(layer("A", 10, 100, 1000)));
    assertEquals(370, layers.arithmetic("K").value().in(Units.mD), 1e-9);
    assertEquals(27.0270, layers.harmonic("K").value().in(Units.mD), 5e-5);
    assertEquals(100, layers.geometric("K").value().in(Units.mD), 1e-9);
    assertEquals(mDm(1110), layers.kh("K").value());
  }

  /** By hand: samples stand for half the way to their neighbours, cut at top and base. */
  @Test
  void thicknessIsCutAtTopAndBase() {
    Layer layer =
        Layer.of(
            "A",
            "Sand",
            m(10.2),
            m(12.7),
            Series.of("depth", Units.m, 10, 11, 12, 13),
            Map.of("K", Series.of("K", Units.mD, 1, 2, 4, 8)));
    assertEquals(2.5, layer.net().metres(), 1e-12);
    double mean = (0.3 * 1 + 1 * 2 + 1 * 4 + 0.2 * 8) / 2.5;
    assertEquals(mean, Layers.of(List.of(layer)).arithmetic("K").value().in(Units.mD), 1e-12);
  }

  /** Independent: an up-log and feet give the same as a down-log in metres. */
  @Test
  void directionAndUnitOfDepthDoNotMatter() {
    Layer up =
        Layer.of(
            "A",
            "Sand",
            m(10.2),
            m(12.7),
            Series.of("depth", Units.ft, 13 / 0.3048, 12 / 0.3048, 11 / 0.3048, 10 / 0.3048),
            Map.of("K", Series.of("K", Units.mD, 8, 4, 2, 1)));
    double mean = (0.3 * 1 + 1 * 2 + 1 * 4 + 0.2 * 8) / 2.5;
    assertEquals(mean, Layers.of(List.of(up)).arithmetic("K").value().in(Units.mD), 1e-9);
  }

  @Test
  void cutoffTakesTightSamplesAway() {
    Layers layers =
        Layers.of(List.of(layer("A", 1, 100, 100, 1))).where("PHI", Cutoff.above(percent(8)));
    assertEquals(m(2), layers.net());
    assertEquals(0.5, layers.netToGross().fraction(), 1e-12);
    Listing steps =
        Layers.of(List.of(layer("A", 1, 100, 100, 1)))
            .sensitivity("PHI", "K", percent(0), percent(8), percent(30));
    assertEquals("100", steps.text(0, 5));
    assertEquals("99.01", steps.text(1, 5));
    assertEquals("0", steps.text(2, 5));
  }

  /** By hand: wells of 10 and 1000 mD: ln differs by 4.605, s/√n = 2.3026, t(0.9, 1) = 3.0777. */
  @Test
  void rangeComesFromTheWells() {
    Layers layers = Layers.of(List.of(layer("A", 10, 10), layer("B", 1000, 1000)));
    Estimate<?> k = layers.arithmetic("K");
    assertEquals(505 * StrictMath.exp(2.302585 * 3.077684), k.high().number(), 505 * 1e-2);
    assertTrue(k.toString().contains("80 % from 2 wells"), k.toString());
    assertTrue(layers.well("A").arithmetic("K").range().contains("no range"));
  }

  @Test
  void testOfAWellIsCompared() {
    Layers layers = Layers.of(List.of(layer("A", 10, 10), layer("B", 11, 11)));
    assertTrue(layers.against("K", mDm(21)).notes().get(1).contains("no correction"));
    assertTrue(layers.against("K", mDm(84)).notes().get(1).contains("multiply k by 4"));
  }

  @Test
  void whatIsNotThereIsNamed() {
    Layers layers = Layers.of(List.of(layer("A", 10, 10)));
    var e = assertThrows(IllegalArgumentException.class, () -> layers.in("Shale"));
    assertTrue(e.getMessage().contains("Sand"), e.getMessage());
    assertThrows(IllegalArgumentException.class, () -> layers.arithmetic("KX"));
    assertThrows(
        IllegalArgumentException.class,
        () -> layers.where("PHI", Cutoff.above(percent(90))).arithmetic("K"));
  }
}
