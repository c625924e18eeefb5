package connate.chance;

import connate.quantity.Numbers;
import connate.quantity.Quantity;
import connate.series.Series;
import java.util.Arrays;
import org.apache.commons.math3.distribution.NormalDistribution;

/** The laws of chance that estimates of rock use, for pure numbers and for quantities. */
public final class Distributions {

  private static final NormalDistribution STANDARD = new NormalDistribution(null, 0, 1);

  private Distributions() {}

  /** Returns the normal law. */
  public static Distribution normal(double mean, double standardDeviation) {
    positive("the standard deviation", standardDeviation);
    return new Law(
        p -> mean + standardDeviation * standard(p),
        mean,
        "normal, mean " + Numbers.text(mean) + ", sd " + Numbers.text(standardDeviation));
  }

  /** Returns the normal law of a quantity; the spread is stated in the mean's unit or another. */
  public static <Q extends Quantity<Q>> Uncertain<Q> normal(Q mean, Q standardDeviation) {
    return new Uncertain<>(normal(mean.number(), standardDeviation.in(mean.unit())), mean.unit());
  }

  /**
   * Returns the normal law between two ends; what lies outside is cut off and the rest scaled up.
   *
   * @throws IllegalArgumentException if the ends are not in order
   */
  public static Distribution normalBetween(
      double mean, double standardDeviation, double low, double high) {
    positive("the standard deviation", standardDeviation);
    ordered(low, high);
    double below = STANDARD.cumulativeProbability((low - mean) / standardDeviation);
    double above = STANDARD.cumulativeProbability((high - mean) / standardDeviation);
    if (!(above - below > 1e-12)) {
      throw new IllegalArgumentException(
          "hardly any of the normal law lies between " + low + " and " + high);
    }
    double a = (low - mean) / standardDeviation;
    double b = (high - mean) / standardDeviation;
    double shift = (STANDARD.density(a) - STANDARD.density(b)) / (above - below);
    return new Law(
        p ->
            StrictMath.min(
                high,
                StrictMath.max(
                    low, mean + standardDeviation * standard(below + p * (above - below)))),
        mean + standardDeviation * shift,
        "normal, mean "
            + Numbers.text(mean)
            + ", sd "
            + Numbers.text(standardDeviation)
            + ", between "
            + Numbers.text(low)
            + " and "
            + Numbers.text(high));
  }

  /** Returns the normal law of a quantity between two ends. */
  public static <Q extends Quantity<Q>> Uncertain<Q> normalBetween(
      Q mean, Q standardDeviation, Q low, Q high) {
    var unit = mean.unit();
    return new Uncertain<>(
        normalBetween(mean.number(), standardDeviation.in(unit), low.in(unit), high.in(unit)),
        unit);
  }

  /**
   * Returns the lognormal law.
   *
   * @param median the median, above 0
   * @param sdOfLn the standard deviation of the natural logarithm
   */
  public static Distribution lognormal(double median, double sdOfLn) {
    positive("the median", median);
    positive("the standard deviation", sdOfLn);
    return new Law(
        p -> median * StrictMath.exp(sdOfLn * standard(p)),
        median * StrictMath.exp(sdOfLn * sdOfLn / 2),
        "lognormal, median " + Numbers.text(median) + ", sd of ln " + Numbers.text(sdOfLn));
  }

  /** Returns the lognormal law of a quantity. */
  public static <Q extends Quantity<Q>> Uncertain<Q> lognormal(Q median, double sdOfLn) {
    return new Uncertain<>(lognormal(median.number(), sdOfLn), median.unit());
  }

  /** Returns the uniform law. */
  public static Distribution uniform(double low, double high) {
    ordered(low, high);
    return new Law(
        p -> low + p * (high - low),
        (low + high) / 2,
        "uniform, " + Numbers.text(low) + " to " + Numbers.text(high));
  }

  /** Returns the uniform law of a quantity. */
  public static <Q extends Quantity<Q>> Uncertain<Q> uniform(Q low, Q high) {
    return new Uncertain<>(uniform(low.number(), high.in(low.unit())), low.unit());
  }

  /** Returns the triangular law. */
  public static Distribution triangular(double low, double mode, double high) {
    ordered(low, high);
    if (!(mode >= low && mode <= high)) {
      throw new IllegalArgumentException("the mode " + mode + " is outside " + low + " to " + high);
    }
    double width = high - low;
    double turn = (mode - low) / width;
    return new Law(
        p ->
            p < turn
                ? low + StrictMath.sqrt(p * width * (mode - low))
                : high - StrictMath.sqrt((1 - p) * width * (high - mode)),
        (low + mode + high) / 3,
        "triangular, " + Numbers.text(low) + ", " + Numbers.text(mode) + ", " + Numbers.text(high));
  }

  /** Returns the triangular law of a quantity. */
  public static <Q extends Quantity<Q>> Uncertain<Q> triangular(Q low, Q mode, Q high) {
    var unit = low.unit();
    return new Uncertain<>(triangular(low.number(), mode.in(unit), high.in(unit)), unit);
  }

  /** Returns the law of what was observed: quantiles between the sorted values (type 7). */
  public static Distribution observed(Series series) {
    double[] sorted = series.present();
    if (sorted.length == 0) {
      throw new IllegalArgumentException("«" + series.name() + "» has no value to draw from");
    }
    Arrays.sort(sorted);
    return new Law(
        p -> Quantiles.of(sorted, p),
        Arrays.stream(sorted).average().orElseThrow(),
        "as observed in " + sorted.length + " values of " + series.name());
  }

  static double standard(double probability) {
    return STANDARD.inverseCumulativeProbability(probability);
  }

  static double cumulative(double score) {
    return STANDARD.cumulativeProbability(score);
  }

  private static void positive(String what, double value) {
    if (!(value > 0)) {
      throw new IllegalArgumentException(what + " must be above 0, found " + value);
    }
  }

  private static void ordered(double low, double high) {
    if (!(low < high)) {
      throw new IllegalArgumentException("the low end " + low + " is not below " + high);
    }
  }

  /** A law by its quantile function. */
  private record Law(java.util.function.DoubleUnaryOperator inverse, double mean, String words)
      implements Distribution {

    @Override
    public double quantile(double probability) {
      if (!(probability > 0 && probability < 1)) {
        throw new IllegalArgumentException(
            "a probability is above 0 and below 1, found " + probability);
      }
      return inverse.applyAsDouble(probability);
    }

    @Override
    public String toString() {
      return words;
    }
  }
}
