package connate.heterogeneity;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Numbers;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;
import org.apache.commons.math3.stat.StatUtils;

/**
 * The coefficient of variation of permeability, and how many samples its mean needs.
 *
 * <pre>Cv = s / mean;  N0 = (10 Cv)²</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>s</td><td>standard deviation of the samples</td><td>mD</td></tr>
 * <tr><td>N0</td><td>samples for a mean within 20 % with 95 % confidence</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for independent samples; Cv from fewer than N0 samples comes out too low. The
 * exact factor is (1.96/0.2)² = 96.04, which the rule rounds to 100.
 *
 * <p><b>Source</b>: Corbett and Jensen (1992), First Break 10, 11–20; classes from memory.
 *
 * <p><b>Checked</b> in {@code VariationTest}.
 *
 * @param coefficient the coefficient of variation
 * @param samples the number of samples behind it
 */
public record Variation(double coefficient, int samples) {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("coefficient-of-variation", "Coefficient of variation and sample number")
          .equation("Cv = s / mean; N0 = (10 Cv)²")
          .input("k", "permeability", Units.mD, Range.from(0))
          .result("Cv", "coefficient of variation", Units.number)
          .source("Corbett and Jensen (1992), First Break 10, 11–20")
          .constants(Constants.FROM_MEMORY)
          .topics("heterogeneity", "sampling", "core")
          .note("Independent samples; from fewer than N0 samples Cv comes out too low.")
          .build();

  /** Returns the variation of measured permeabilities. */
  public static Variation of(Series permeability) {
    double[] k = permeability.to(Units.mD).present();
    if (k.length < 2 || !(StatUtils.mean(k) > 0)) {
      throw new IllegalArgumentException(
          "a variation needs at least two values with a mean above zero");
    }
    Listening.used(CARD);
    return new Variation(StrictMath.sqrt(StatUtils.variance(k)) / StatUtils.mean(k), k.length);
  }

  /** Returns the coefficient of a lognormal permeability: √(exp(σ²) − 1). */
  public static Ratio ofLogSpread(double sdOfLn) {
    Listening.used(CARD);
    return Units.number(StrictMath.sqrt(StrictMath.expm1(sdOfLn * sdOfLn)));
  }

  /** Returns the number of samples for a mean within 20 % at 95 % confidence, rounded up. */
  public int samplesNeeded() {
    double ten = 10 * coefficient;
    return (int) Math.ceil(ten * ten - 1e-9);
  }

  /** Returns whether there are as many samples as the mean needs. */
  public boolean isSampledEnough() {
    return samples >= samplesNeeded();
  }

  /** Returns the grade: below 0.5 homogeneous, to 1 heterogeneous, above it very heterogeneous. */
  public String grade() {
    if (coefficient < 0.5) {
      return "homogeneous";
    }
    return coefficient <= 1 ? "heterogeneous" : "very heterogeneous";
  }

  @Override
  public String toString() {
    return "Cv "
        + Numbers.text(coefficient)
        + ", "
        + grade()
        + "; "
        + samples
        + " samples, "
        + samplesNeeded()
        + " needed for a mean within 20 %";
  }
}
