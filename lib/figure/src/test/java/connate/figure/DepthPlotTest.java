package connate.figure;

import static connate.figure.Figures.depthPlot;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import connate.well.Tops;
import connate.well.Well;
import org.junit.jupiter.api.Test;

class DepthPlotTest {

  @Test
  void depthGrowsDownwards() {
    Panel panel = depthPlot(Invented.porosity(50)).plot().panels().get(0);
    assertTrue(panel.y().at(2000) > panel.y().at(2020));
    assertTrue(panel.y().at(2000) <= 1 && panel.y().at(2024.5) >= 0);
  }

  @Test
  void permeabilityAndResistivityStandOnLogAxes() {
    Series r =
        Series.of("RT", Units.ohmM, 1, 20, 3).atDepth(Series.of("d", Units.m, 2000, 2001, 2002));
    DepthPlot plot = depthPlot(Invented.porosity(50), r, Invented.permeability(50));
    assertEquals(
        "false true true",
        plot.plot().panels().stream()
            .map(p -> Boolean.toString(p.x().scale().isLog()))
            .reduce((a, b) -> a + " " + b)
            .orElseThrow());
    SvgRules.check(plot);
    SvgRules.check(plot.linearAxis());
  }

  /** By hand: 1,000 ft are 304.8 m; the points stand in the depth unit of the first track. */
  @Test
  void convertsDepthsAndUnitsOfPoints() {
    Series log =
        Series.of("PHI", Units.fraction, 0.1, 0.2).atDepth(Series.of("d", Units.m, 300, 310));
    Series core = Series.of("core", Units.percent, 15).atDepth(Series.of("d", Units.ft, 1000));
    Panel panel = depthPlot().track(log, core).plot().panels().get(0);
    Layer.Dots dots =
        panel.layers().stream()
            .filter(Layer.Dots.class::isInstance)
            .map(Layer.Dots.class::cast)
            .findFirst()
            .orElseThrow();
    assertEquals(304.8, dots.y()[0], 1e-9);
    assertEquals(0.15, dots.x()[0], 1e-12);
  }

  @Test
  void countsWhatIsNotDrawn() {
    Series k =
        Series.of("K", Units.mD, 0, 5, Double.NaN, 7).atDepth(Series.of("d", Units.m, 1, 2, 3, 4));
    assertEquals(
        "K n = 2 of 4 (not drawn: 1 missing, 1 zero or negative on a log axis)",
        depthPlot(k).between(Units.m(0), Units.m(5)).notes().get(0));
  }

  @Test
  void asksForADepth() {
    Series bare = Series.of("PHI", Units.fraction, 0.1, 0.2);
    String message =
        assertThrows(IllegalArgumentException.class, () -> depthPlot(bare)).getMessage();
    assertTrue(message.contains("«PHI» does not know the depth of its rows"), message);
  }

  @Test
  void saysWhatIsEmpty() {
    Series empty = Series.of("K", Units.mD, 0, 0).atDepth(Series.of("d", Units.m, 1, 2));
    assertThrows(IllegalArgumentException.class, () -> depthPlot().svg("a"));
    String message =
        assertThrows(IllegalArgumentException.class, () -> depthPlot(empty).svg("a")).getMessage();
    assertTrue(message.contains("2 zero or negative on a log axis"), message);
  }

  @Test
  void namesZonesInsideTheDepthsDrawn() {
    Figure figure =
        depthPlot(Invented.porosity(50))
            .zone("Upper", Units.m(1990), Units.m(2010))
            .zone("Lower", Units.ft(6600), Units.ft(6630))
            .zone("Elsewhere", Units.m(3000), Units.m(3010));
    assertTrue(figure.description().contains("Zones: Upper, Lower."), figure.description());
    assertTrue(figure.svg("a").contains(">Upper<"));
    SvgRules.check(figure);
  }

  /** Independent: what thinning leaves out cannot be seen, so each pixel row keeps its extremes. */
  @Test
  void thinningKeepsTheExtremesOfEachRow() {
    int n = 20_000;
    double[] y = new double[n];
    double[] x = Invented.uniform("x", n, 0, 100, 4).values();
    for (int i = 0; i < n; i++) {
      y[i] = i * 0.03;
    }
    double[][] thin = Thinning.of(x, y);
    assertTrue(thin[0].length < n / 3, "kept " + thin[0].length);
    for (int row = 0; row < 600; row++) {
      for (int sign : new int[] {-1, 1}) {
        assertEquals(most(x, y, row, sign), most(thin[0], thin[1], row, sign));
      }
    }
  }

  private static double most(double[] x, double[] y, int row, int sign) {
    double most = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < x.length; i++) {
      if (y[i] >= row && y[i] < row + 1) {
        most = Math.max(most, sign * x[i]);
      }
    }
    return most;
  }

  /** A long log in five tracks; the page must not suffer. Measured: 163 KB. */
  @Test
  void longLogsStaySmall() {
    Series phi = Invented.porosity(20_000);
    DepthPlot plot = depthPlot(phi, phi, phi, phi, Invented.permeability(20_000));
    int size = plot.svg("a").length();
    assertTrue(size < 400_000, "size " + size);
  }

  private static Well well() {
    Series depth = Invented.depth(50, 2000, 0.5);
    Well well = Well.of("TH-1", depth);
    well.add("GR", Series.of("GR", Units.gAPI, Invented.uniform("g", 50, 20, 120, 2).values()));
    well.add("PHI", Series.of("PHI", Units.fraction, Invented.porosity(50).values()));
    return well;
  }

  @Test
  void takesCurvesAndZonesFromAWell() {
    Tops tops =
        Tops.of(
            Labels.of("well", "TH-1", "TH-1"),
            Labels.of("top", "Upper", "Lower"),
            Series.of("depth", Units.m, 2005, 2015));
    Figure figure = depthPlot(well()).track("gr").track("PHI", Invented.porosity(9)).zones(tops);
    assertEquals("TH-1: GR, PHI against depth", figure.title());
    assertTrue(figure.description().contains("Zones: Upper, Lower."), figure.description());
    SvgRules.check(figure);
  }

  @Test
  void showsTheUsualCurvesWhereNoneIsAskedFor() {
    assertEquals("TH-1: GR, PHI against depth", depthPlot(well()).title());
  }

  @Test
  void saysWhatIsAskedOfNoWell() {
    String message =
        assertThrows(
                IllegalArgumentException.class, () -> depthPlot(Invented.porosity(9)).track("GR"))
            .getMessage();
    assertTrue(message.contains("not of a well"), message);
    assertThrows(IllegalArgumentException.class, () -> depthPlot(well()).track("RHOB"));
  }
}
