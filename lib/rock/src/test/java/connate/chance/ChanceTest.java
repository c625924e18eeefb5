package connate.chance;

import static connate.chance.Distributions.lognormal;
import static connate.chance.Distributions.normal;
import static connate.chance.Distributions.normalBetween;
import static connate.chance.Distributions.triangular;
import static connate.chance.Distributions.uniform;
import static connate.chance.Sampling.seed;
import static connate.chance.Simulation.simulate;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import java.util.Arrays;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

class ChanceTest {

  private static final Function<Draw, Outcome> SUM =
      draw -> Outcome.of("sum", draw.of("a", normal(0, 1)) + 2 * draw.of("b", normal(0, 1)));

  /**
   * Published: standard normal table, z(0.9) = 1.2816 (any handbook); lognormal P90/P50 from it.
   */
  @Test
  void quantilesOfTheLaws() {
    assertEquals(1.2816, normal(0, 1).quantile(0.9), 5e-5);
    assertEquals(10 * StrictMath.exp(1.2 * 1.281552), lognormal(10, 1.2).quantile(0.9), 1e-4);
    assertEquals(0.3, uniform(0.1, 0.5).quantile(0.5), 1e-15);
    assertEquals(1, triangular(0, 1, 3).quantile(1.0 / 3), 1e-12);
    assertEquals(4.0 / 3, triangular(0, 1, 3).mean(), 1e-15);
    assertEquals(percent(18), normal(percent(18), percent(2)).quantile(0.5));
  }

  /** Published: catalogue value from a statistics text: median 10, s 1.2 has the mean 20.5443. */
  @Test
  void meanOfALognormal() {
    assertEquals(20.5443, lognormal(10, 1.2).mean(), 5e-5);
  }

  /** Independent: the half normal has the mean √(2/π). */
  @Test
  void cutNormalHasTheMeanOfTheHalfNormal() {
    assertEquals(StrictMath.sqrt(2 / StrictMath.PI), normalBetween(0, 1, 0, 40).mean(), 1e-9);
    assertTrue(normalBetween(0, 1, 0, 40).quantile(1e-9) >= 0);
  }

  @Test
  void threadsDoNotMatter() {
    double[] one = simulate(5000, seed(7), SUM, 1).get("sum").values();
    double[] three = simulate(5000, seed(7), SUM, 3).get("sum").values();
    assertArrayEquals(one, three, 0);
  }

  /** Independent: variance of a + 2b is 5; the error of a sample variance of n is about √(2/n). */
  @Test
  void varianceOfASum() {
    Runs runs = simulate(40_000, seed(11), SUM);
    double[] v = runs.get("sum").values();
    double mean = Arrays.stream(v).average().orElseThrow();
    double variance = Arrays.stream(v).map(x -> (x - mean) * (x - mean)).sum() / (v.length - 1);
    assertEquals(5, variance, 5 * 4 * StrictMath.sqrt(2.0 / v.length));
    assertEquals(0, mean, 4 * StrictMath.sqrt(5.0 / v.length));
  }

  /** Independent: one value falls in each of n slices, so the mean is far closer than by chance. */
  @Test
  void latinHypercubeFillsEachSlice() {
    int n = 1000;
    Runs runs =
        simulate(
            n, seed(3).byLatinHypercube(), draw -> Outcome.of("u", draw.of("u", uniform(0, 1))));
    double[] v = runs.get("u").values();
    Arrays.sort(v);
    for (int i = 0; i < n; i++) {
      assertTrue(v[i] > i / (double) n && v[i] < (i + 1) / (double) n, "slice " + i);
    }
  }

  /**
   * Independent: normal scores keep the correlation that was asked for, within 4 standard errors.
   */
  @Test
  void correlationIsKept() {
    Runs runs =
        simulate(
            20_000,
            seed(5).correlated("a", "b", 0.6),
            draw -> {
              draw.of("b", normal(0, 1));
              return Outcome.of("x", draw.of("a", normal(0, 1)));
            });
    double[] a = runs.input("a").values();
    double[] b = runs.input("b").values();
    double r =
        new org.apache.commons.math3.stat.correlation.PearsonsCorrelation().correlation(a, b);
    assertEquals(0.6, r, 4 * (1 - 0.36) / StrictMath.sqrt(a.length));
  }

  @Test
  void contradictingCorrelationsAreRefused() {
    Sampling sampling =
        seed(1).correlated("a", "b", 0.9).correlated("b", "c", 0.9).correlated("a", "c", -0.9);
    assertThrows(IllegalArgumentException.class, () -> simulate(10, sampling, SUM));
  }

  /** By hand: of 1 … 9 half exceed 5; type 7 puts the 90 % point at 1 + 0.1 · 8 = 1.8. */
  @Test
  void exceedanceSaysWhichEnd() {
    Sample sample = Sample.of(connate.series.Series.of("k", Units.mD, 9, 1, 8, 2, 7, 3, 6, 4, 5));
    assertEquals(mD(5), sample.exceededBy(50));
    assertEquals(1.8, sample.exceededBy(90).number(), 1e-12);
    assertEquals(
        "1.8 mD (exceeded by 90 %), 5 mD (exceeded by 50 %), 8.2 mD (exceeded by 10 %)",
        sample.exceedance(90, 50, 10).toString());
  }

  /** By hand: at one standard-normal P10/P90 each, b moves the sum twice as far as a. */
  @Test
  void tornadoPutsTheLongerBarFirst() {
    Tornado tornado = Tornado.of(simulate(10, seed(1), SUM), "sum");
    assertEquals("b", tornado.bars().get(0).input());
    assertEquals(2 * 1.281552, tornado.bars().get(0).atHigh().number(), 1e-5);
    assertEquals(-1.281552, tornado.bars().get(1).atLow().number(), 1e-5);
  }

  /**
   * Published: Ishigami and Homma (1990) function with a = 7, b = 0.1: first-order indices 0.3139,
   * 0.4424, 0 and total 0.5576, 0.4424, 0.2437 (closed form, quoted in Saltelli and others 2010).
   */
  @Test
  void sobolIndicesOfIshigami() {
    Distribution angle = uniform(-StrictMath.PI, StrictMath.PI);
    Runs runs =
        simulate(
            2,
            seed(1),
            draw -> {
              double x = draw.of("x1", angle);
              double y = draw.of("x2", angle);
              double z = draw.of("x3", angle);
              double sinY = StrictMath.sin(y);
              return Outcome.of(
                  "f",
                  StrictMath.sin(x) + 7 * sinY * sinY + 0.1 * z * z * z * z * StrictMath.sin(x));
            });
    Sobol sobol = Sobol.of(runs, "f", 40_000, 9);
    double[] first = {0.3139, 0.4424, 0};
    double[] total = {0.5576, 0.4424, 0.2437};
    for (int i = 0; i < 3; i++) {
      assertEquals(first[i], sobol.inputs().get(i).first(), 0.02, "first order of input " + i);
      assertEquals(total[i], sobol.inputs().get(i).total(), 0.02, "total of input " + i);
    }
  }

  @Test
  void failingRunIsNamed() {
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                simulate(
                    5,
                    seed(1),
                    draw -> {
                      if (draw.run() == 3) {
                        throw new IllegalArgumentException("porosity is 1");
                      }
                      return Outcome.of("x", 1);
                    },
                    1));
    assertTrue(e.getMessage().startsWith("run 3 "), e.getMessage());
  }
}
