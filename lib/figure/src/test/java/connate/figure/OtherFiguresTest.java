package connate.figure;

import static connate.figure.Figures.bars;
import static connate.figure.Figures.boxes;
import static connate.figure.Figures.curves;
import static connate.figure.Figures.lorenzPlot;
import static connate.figure.Figures.probabilityPlot;
import static connate.figure.Figures.tornado;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.chance.Tornado;
import connate.heterogeneity.Lorenz;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import java.util.List;
import org.junit.jupiter.api.Test;

class OtherFiguresTest {

  private static final Series AGE = Series.of("age", Units.Ma, 120, 60, 0);
  private static final Series BURIAL = Series.of("burial depth", Units.m, 0, 1500, 4100);

  @Test
  void burialRunsDownAndTowardsThePresent() {
    Panel panel = curves(AGE, BURIAL).plot().panels().get(0);
    assertTrue(panel.x().at(120) < panel.x().at(0));
    assertTrue(panel.y().at(0) > panel.y().at(4100));
    SvgRules.check(curves(AGE, BURIAL).points());
  }

  @Test
  void porosityStandsAcrossItsDepth() {
    Series depth = Series.of("depth", Units.m, 0, 1000, 2000);
    Series phi = Series.of("porosity", Units.percent, 45, 30, 20);
    Panel panel = curves(depth, phi).plot().panels().get(0);
    assertEquals("porosity (%)", panel.x().title());
    assertEquals("depth (m)", panel.y().title());
    assertTrue(panel.y().at(0) > panel.y().at(2000));
    assertEquals("depth (m)", curves(depth, phi).across().plot().panels().get(0).x().title());
  }

  @Test
  void sievesStandOnALogAxis() {
    Series sieve = Series.of("sieve opening", Units.mm, 0.063, 0.25, 1, 4);
    Series passing = Series.of("passing", Units.percent, 2, 30, 90, 100);
    Figure figure = curves(sieve, passing);
    assertTrue(figure.description().contains("sieve opening (mm), log scale"));
    SvgRules.check(figure);
  }

  /** By hand: the second column is in percent, drawn in fractions; one of its rows is missing. */
  @Test
  void linesShareOneUnit() {
    Series x = Series.of("x", Units.number, 1, 2, 3);
    Series a = Series.of("a", Units.fraction, 0.1, 0.2, 0.3);
    Series b = Series.of("b", Units.percent, 10, Double.NaN, 30);
    Figure figure = curves(x, a, b).quantity("porosity");
    assertEquals(List.of("a: n = 3; b: n = 2 of 3; not drawn: 1 missing"), figure.notes());
    assertTrue(figure.description().contains("b (fraction): from 0.1 to 0.3"));
    assertTrue(figure.svg("a").contains(">porosity (fraction)<"));
    Series time = Series.of("t", Units.days, 1, 2, 3);
    assertThrows(IllegalArgumentException.class, () -> curves(x, a, time));
    assertThrows(IllegalArgumentException.class, () -> curves(x));
  }

  /**
   * Independent: normal scores drawn over their own percentages stand on a straight line, since
   * that is what the scale is for.
   */
  @Test
  void normalScaleMakesANormalLawStraight() {
    NormalScale scale = new NormalScale(0.5, 99.5);
    double from = NormalScale.z(0.5);
    double to = NormalScale.z(99.5);
    for (double percent : new double[] {2, 10, 31, 50, 77, 98}) {
      double straight = (NormalScale.z(percent) - from) / (to - from);
      assertEquals(straight, scale.position(percent), 1e-12);
      assertEquals(percent, scale.value(scale.position(percent)), 1e-9);
    }
  }

  @Test
  void probabilityPlotTellsZeros() {
    Figure figure = probabilityPlot(Series.of("k", Units.mD, 0, 1, 10, 100)).law();
    assertEquals(
        List.of("n = 3 of 4; not drawn: 1 zero or negative on a log axis"), figure.notes());
    assertTrue(figure.description().contains("lognormal, median 10"), figure.description());
    SvgRules.check(figure);
  }

  private static Tornado drawn(double low) {
    return new Tornado(
        "permeability",
        Units.mD(10),
        List.of(
            new Tornado.Bar("cement", Units.mD(low), Units.mD(30)),
            new Tornado.Bar("grain size", Units.mD(12), Units.mD(8))));
  }

  @Test
  void tornadoNamesTheLongestBar() {
    Figure figure = tornado(drawn(3)).logAxis();
    assertTrue(figure.description().contains("cement moves it most"));
    SvgRules.check(figure);
    SvgRules.check(tornado(drawn(0)));
    TornadoChart onLog = tornado(drawn(0)).logAxis();
    assertThrows(IllegalArgumentException.class, () -> onLog.svg("a"));
    Tornado none = new Tornado("k", Units.mD(1), List.of());
    assertThrows(IllegalArgumentException.class, () -> tornado(none));
  }

  /** By hand: two equal layers of one porosity, all flow in one: half the storage has all of it. */
  @Test
  void lorenzSaysWhatTheFirstHalfCarries() {
    Lorenz lorenz =
        Lorenz.of(
            Series.of("k", Units.mD, 0, 100),
            Series.of("phi", Units.fraction, 0.2, 0.2),
            Series.of("h", Units.m, 1, 1));
    Figure figure = lorenzPlot(lorenz);
    assertTrue(figure.description().contains("carries 100 % of the flow"), figure.description());
    assertEquals(List.of("n = 2 layers; Lorenz coefficient 0.5"), figure.notes());
    SvgRules.check(figure);
  }

  @Test
  void barsStartAtZeroAndPointsStandForThemOnALogAxis() {
    Labels names = Labels.of("formula", "Hazen", "Beyer", null);
    Series value = Series.of("K", Units.mPerDay, 12, 8, 15);
    Series low = Series.of("low", Units.mPerDay, 8, 0, 11);
    Series high = Series.of("high", Units.mPerDay, 17, 12, 19);
    BarChart figure = bars(names, value).range(low, high);
    assertTrue(figure.description().startsWith("Points of K, hydraulic conductivity (m/d), log"));
    assertTrue(figure.description().contains("Largest: no name, 15 m/d"), figure.description());
    SvgRules.check(figure);
    Panel even = figure.linearAxis().plot().panels().get(0);
    assertEquals(0, even.x().scale().position(0), 1e-12);
    SvgRules.check(figure.linearAxis());
  }

  /**
   * Independent: R 4, boxplot.stats and quantile type 7 of c(1:10, 50): quarters 3.5 and 8.5,
   * median 6, whiskers 1 and 10, beyond 50. (boxplot.stats takes Tukey's hinges, here equal.)
   */
  @Test
  void boxesAgreeWithR() {
    double[] values = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 50};
    BoxPlot.Five five = BoxPlot.Five.of(values, false);
    assertArrayEquals(
        new double[] {1, 3.5, 6, 8.5, 10},
        new double[] {
          five.low(), five.quarter(), five.median(), five.threeQuarters(), five.high()
        });
    assertArrayEquals(new double[] {50}, five.beyond());
  }

  @Test
  void boxesTellGroupsAndZeros() {
    Series k = Series.of("k", Units.mD, 1, 5, 9, 0, 80, Double.NaN);
    Figure figure = boxes(k, Labels.of("facies", "a", "a", "a", "b", "b", null));
    assertEquals(
        "n = 4 of 6; not drawn: 1 missing, 1 zero or negative on a log axis",
        figure.notes().get(0));
    assertTrue(figure.svg("a").contains(">a (3)<"));
    SvgRules.check(figure);
  }

  @Test
  void sketchesHaveTheSizeAskedFor() {
    for (Figure figure : List.of(curves(AGE, BURIAL), tornado(drawn(3)), probabilityPlot(BURIAL))) {
      List<String> lines = figure.sketch(70, 20).lines().toList();
      assertTrue(lines.size() <= 20, figure.title() + " " + lines.size());
      assertTrue(lines.stream().allMatch(line -> line.length() <= 70), figure.title());
      assertFalse(figure.sketch(5, 2).isEmpty());
    }
  }

  /** Independent: no text of a figure starts or ends outside it, however long its names are. */
  @Test
  void longNamesStayInside() {
    String name = "permeability to brine at in situ stress of the plugs from the northern wells ";
    Series x = Invented.porosity(30).named(name + name);
    Series y = Invented.permeability(30).named(name + name);
    Figure figure = Figures.crossplot(x, y).byGroup(Invented.facies(30, name + "a", name + "b"));
    SvgRules.check(figure);
    String upright = figure.svg("a").split("rotate\\(-90\\)\">")[1].split("<")[0];
    assertTrue(Theme.AXIS.width(upright) <= figure.height(), upright);
    assertTrue(upright.endsWith("…"), upright);
  }
}
