package connate.figure;

import static connate.figure.Figures.histogram;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.chance.Distributions;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class HistogramTest {

  /** By hand: 1 is a lower edge and counts upwards; 2 is the last upper edge and counts in. */
  @Test
  void countsEdgesOnce() {
    Bins bins = Bins.of(new double[] {0, 0.5, 1, 1.5, 2}, false, 2);
    assertArrayEquals(new double[] {0, 1, 2}, bins.edges());
    assertArrayEquals(new double[] {2, 3}, bins.count(new double[] {0, 0.5, 1, 1.5, 2}));
  }

  @Test
  void countsEveryValueOnce() {
    double[] values = Invented.permeability(999).values();
    for (boolean log : new boolean[] {false, true}) {
      for (int count : new int[] {0, 1, 7, 100}) {
        double[] counts = Bins.of(values, log, count).count(values);
        assertEquals(999, Arrays.stream(counts).sum());
      }
    }
  }

  @Test
  void cutsDecadesAtWholeParts() {
    double[] edges = Bins.of(new double[] {0.3, 5, 80, 900}, true, 0).edges();
    assertTrue(Arrays.stream(edges).anyMatch(e -> Math.abs(e - 10) < 1e-9));
    assertEquals(edges[1] / edges[0], edges[2] / edges[1], 1e-9);
  }

  /** Independent: the expected counts of a law over bins side by side add up to n. */
  @Test
  void lawAddsUpToN() {
    double[] drawn = Invented.uniform("z", 500, -3, 3, 3).values();
    Bins bins = Bins.of(drawn, false, 24);
    Sampled curve = bins.expected(Distributions.normal(0, 0.8), 500);
    double step = curve.x()[1] - curve.x()[0];
    double width = bins.edges()[1] - bins.edges()[0];
    assertEquals(500, Arrays.stream(curve.y()).sum() * step / width, 1);
  }

  /** Independent: Commons Math's normal distribution function. */
  @Test
  void partBelowAgreesWithTheDistributionFunction() {
    NormalDistribution normal = new NormalDistribution(null, 2, 3);
    for (double x : new double[] {-4, 0, 2, 3.3, 9}) {
      assertEquals(
          normal.cumulativeProbability(x), Bins.below(Distributions.normal(2, 3), x), 1e-9);
    }
  }

  @Test
  void tellsZerosOnALogAxis() {
    Figure figure = histogram(Series.of("k", Units.mD, 0, 1, 10, Double.NaN, 100));
    assertEquals(
        List.of("n = 3 of 5; not drawn: 1 missing, 1 zero or negative on a log axis"),
        figure.notes());
    SvgRules.check(figure);
  }

  @Test
  void refusesALognormalLawOverZeros() {
    Histogram figure = histogram(Series.of("k", Units.mD, 0, 1, 10)).linearAxis().lognormal();
    assertThrows(IllegalArgumentException.class, () -> figure.svg("a"));
  }

  /** By hand: mean 3 and standard deviation √2.5 of 1 to 5. */
  @Test
  void namesTheFittedLaw() {
    Figure figure = histogram(Series.of("x", Units.number, 1, 2, 3, 4, 5)).normal();
    String words = figure.description();
    assertTrue(words.contains("normal, mean 3, sd 1.581"), words);
    assertTrue(words.contains("Half of the values lie below 3"), words);
  }

  @Test
  void drawsOneValueAndEqualValues() {
    SvgRules.check(histogram(Series.of("x", Units.number, 4)));
    SvgRules.check(histogram(Series.of("x", Units.number, 0, 0, 0)));
    SvgRules.check(histogram(Series.of("k", Units.mD, 7, 7)));
    Histogram flat = histogram(Series.of("x", Units.number, 4, 4)).normal();
    assertThrows(IllegalArgumentException.class, () -> flat.svg("a"));
  }

  @Test
  void saysWhyThereIsNothingToDraw() {
    Histogram empty = histogram(Series.of("k", Units.mD, Double.NaN, 0));
    String message =
        assertThrows(IllegalArgumentException.class, () -> empty.svg("a")).getMessage();
    assertTrue(message.startsWith("a histogram of «k» has nothing to draw: 1 missing, 1 zero"));
    assertThrows(IllegalArgumentException.class, () -> empty.bins(0));
  }
}
