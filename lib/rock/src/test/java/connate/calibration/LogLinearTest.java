package connate.calibration;

import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Listing;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class LogLinearTest {

  private static Series porosity(double... percent) {
    return Series.of("porosity", Units.percent, percent);
  }

  private static Series bloch(Series porosity) {
    return Series.over(
        "k",
        Units.mD,
        java.util.Arrays.stream(porosity.in(Units.fraction))
            .map(phi -> StrictMath.pow(10, 14.9 * phi - 1.94))
            .toArray(),
        null);
  }

  /**
   * Published: Wangen (2010), p. 18, data of Bloch and others (2002): log10 k = 14.9 φ - 1.94,
   * which is 10.9648 mD at φ = 0.2. Points on the line give the line back.
   */
  @Test
  @Check(
      method = "log-linear",
      kind = Kind.PUBLISHED,
      source = "Wangen (2010), Physical Principles of Sedimentary Basin Analysis, p. 18")
  void pointsOnALineGiveTheLine() {
    Series phi = porosity(8, 12, 17, 24);
    TransformFit fit = LogLinear.fit(phi, bloch(phi));
    assertEquals(14.9, fit.slope(), 1e-12);
    assertEquals(-1.94, fit.intercept(), 1e-12);
    assertEquals(10.9648, fit.median(percent(20)).in(Units.mD), 5e-5);
    assertEquals(1, fit.rSquared(), 1e-12);
  }

  /**
   * Independent: summary of lm(log10(k) ~ phi) for four points, computed by hand: φ 0.1 0.2 0.3
   * 0.4, log10 k 0 1 1 2: slope 6, intercept -0.5, RSS 0.2, s √0.1.
   */
  @Test
  void scatterAndFactors() {
    TransformFit fit =
        LogLinear.fit(porosity(10, 20, 30, 40), Series.of("k", Units.mD, 1, 10, 10, 100));
    assertEquals(6, fit.slope(), 1e-12);
    assertEquals(-0.5, fit.intercept(), 1e-12);
    assertEquals(StrictMath.sqrt(0.1), fit.scatter().value(), 1e-12);
    double s = StrictMath.sqrt(0.1) * StrictMath.log(10);
    assertEquals(StrictMath.exp(s * s / 2), fit.meanFactor(), 1e-12);
    double smearing =
        (StrictMath.pow(10, -0.1)
                + StrictMath.pow(10, 0.3)
                + StrictMath.pow(10, -0.3)
                + StrictMath.pow(10, 0.1))
            / 4;
    assertEquals(smearing, fit.smearingFactor(), 1e-12);
    assertEquals(
        fit.median(percent(20)).in(Units.mD) * fit.meanFactor(),
        fit.expected(percent(20)).in(Units.mD),
        1e-12);
  }

  /** Independent: the closed form of leaving one plug out equals fitting anew without it. */
  @Test
  void leavingOneOutEqualsFittingAnew() {
    Series phi = porosity(8, 12, 17, 24, 28, 14, 10, 21);
    Series k = Series.of("k", Units.mD, 0.3, 2, 5, 80, 300, 1, 2, 30);
    Plugs plugs = Plugs.of(phi, k, x -> x);
    for (var form : java.util.List.of(LogLinear.FORM, connate.permeability.KozenyCarman.FORM)) {
      assertEquals(
          LeaveOut.each().error(form, plugs),
          TransformFit.of(form, phi, k).leaveOneOut().value(),
          1e-12,
          form.name());
    }
  }

  @Test
  void zerosAndBlanksAreCounted() {
    TransformFit fit =
        LogLinear.fit(
            porosity(10, 20, 30, 40, 25, Double.NaN),
            Series.of("k", Units.mD, 1, 10, 10, 100, 0, 5));
    assertEquals(4, fit.n());
    assertTrue(fit.toString().contains("n 4 of 6 (1 zero, 1 blank)"), fit.toString());
  }

  @Test
  void differentStressIsRefused() {
    Series k = Series.of("k", Units.mD, 1, 10, 100).with(Series.STRESS, "in situ");
    Series phi = porosity(10, 20, 30).with(Series.STRESS, "ambient");
    assertThrows(IllegalArgumentException.class, () -> LogLinear.fit(phi, k));
  }

  @Test
  void bandHoldsTheMedianAndWidens() {
    TransformFit fit =
        LogLinear.fit(porosity(10, 20, 30, 40), Series.of("k", Units.mD, 1, 10, 10, 100));
    PredictionBand band = fit.prediction(0.8);
    assertTrue(band.low(0.25) < fit.y(0.25) && fit.y(0.25) < band.high(0.25));
    assertTrue(band.high(0.4) / band.low(0.4) > band.high(0.25) / band.low(0.25));
  }

  @Test
  void comparisonPutsTheTruthFirst() {
    Series phi = porosity(8, 12, 17, 24, 28, 14, 10, 21);
    Labels wells = Labels.of("well", "A", "A", "A", "B", "B", "B", "B", "B");
    Listing table =
        Transforms.compare(
            phi, bloch(phi), Transforms.leaveOut(wells), PowerLaw.FORM, LogLinear.FORM);
    assertEquals("Log-linear transform", table.text(0, 0));
    assertEquals(2, table.rows().size());
  }

  @Test
  void airAndBrineAreNotPooled() {
    Series phi = porosity(10, 20, 30);
    Series k = Series.of("k", Units.mD, 1, 10, 100);
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> LogLinear.fit(phi, k, Labels.of("method", "air", "air", "brine")));
    assertTrue(e.getMessage().contains("mixes air, brine"), e.getMessage());
    assertEquals(3, LogLinear.fit(phi, k, Labels.of("method", "air", "air", "air")).n());
  }
}
