package connate.heterogeneity;

import connate.calibration.LeastSquares;
import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * The coefficient of permeability variation of Dykstra and Parsons: 0 for a uniform rock, near 1
 * for a very uneven one.
 *
 * <pre>V = (k50 − k84.1) / k50 = 1 − exp(−σ)</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>V</td><td>coefficient of variation</td><td>1</td></tr>
 * <tr><td>k50</td><td>permeability that half of the samples exceed</td><td>mD</td></tr>
 * <tr><td>k84.1</td><td>permeability that 84.1 % of the samples exceed</td><td>mD</td></tr>
 * <tr><td>σ</td><td>slope of ln k on the normal score of the rank i/(n + 1)</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for lognormal permeability of samples of equal support. Permeability from a
 * transform varies less than rock does, so its V is a lower value.
 *
 * <p><b>Source</b>: Dykstra and Parsons (1950), Secondary Recovery of Oil in the United States, 2nd
 * ed., American Petroleum Institute, 160–174.
 *
 * <p><b>Checked</b> in {@code DykstraParsonsTest}.
 */
public final class DykstraParsons {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("dykstra-parsons", "Dykstra–Parsons coefficient")
          .equation("V = (k50 - k84.1) / k50 = 1 - exp(-σ)")
          .input("σ", "slope of ln k on normal scores", Units.number, Range.from(0))
          .result("V", "Dykstra-Parsons coefficient", Units.number)
          .source(
              "Dykstra and Parsons (1950), Secondary Recovery of Oil in the United States, API,"
                  + " 160–174")
          .constants(Constants.EXACT)
          .topics("heterogeneity", "permeability variation", "layers", "core")
          .note("From k, not ln k, read on a straight line over normal scores.")
          .note("Permeability from a transform varies less than the rock: its V is a lower value.")
          .build();

  /** Caution: zeros cannot stand on a logarithmic line. */
  static final String ZEROS = "H01";

  private static final NormalDistribution STANDARD = new NormalDistribution(null, 0, 1);

  private DykstraParsons() {}

  /** Returns the coefficient of a lognormal permeability. */
  public static Ratio ofLogSpread(double sdOfLn) {
    if (!(sdOfLn >= 0)) {
      throw new IllegalArgumentException("a standard deviation is not below 0: " + sdOfLn);
    }
    Listening.used(CARD);
    return Units.number(1 - StrictMath.exp(-sdOfLn));
  }

  /**
   * Returns the coefficient of measured permeabilities.
   *
   * @throws IllegalArgumentException if fewer than three are above zero
   */
  public static Ratio of(Series permeability) {
    double[] k = permeability.to(Units.mD).present();
    double[] log = Arrays.stream(k).filter(v -> v > 0).map(StrictMath::log).sorted().toArray();
    if (log.length < 3) {
      throw new IllegalArgumentException(
          "Dykstra–Parsons needs at least three permeabilities above zero, found " + log.length);
    }
    if (log.length < k.length) {
      Listening.caution(
          Caution.of(
              ZEROS,
              CARD.id(),
              (k.length - log.length)
                  + " of "
                  + k.length
                  + " permeabilities are not above zero and are left out: V is a lower value"));
    }
    double[] score = new double[log.length];
    for (int i = 0; i < score.length; i++) {
      score[i] = STANDARD.inverseCumulativeProbability((i + 1.0) / (log.length + 1));
    }
    LeastSquares line = LeastSquares.fit(List.of("score"), new double[][] {score}, log);
    return ofLogSpread(Math.max(0, line.coefficients()[1]));
  }
}
