package connate.chance;

/** Quantiles of values. Rules: Hyndman and Fan (1996), Am. Stat. 50, 361–365. */
public final class Quantiles {

  private Quantiles() {}

  /** Returns the quantile of sorted values by the linear rule (type 7). */
  public static double of(double[] sorted, double probability) {
    return of(sorted, probability, QuantileRule.LINEAR);
  }

  /**
   * Returns the quantile of sorted values.
   *
   * @param sorted values in rising order, at least one
   * @param probability the part that lies below, from 0 to 1
   * @param rule how it is read between two values
   */
  public static double of(double[] sorted, double probability, QuantileRule rule) {
    if (sorted.length == 0 || !(probability >= 0 && probability <= 1)) {
      throw new IllegalArgumentException(
          "a quantile of " + sorted.length + " values at " + probability);
    }
    double at =
        StrictMath.min(sorted.length - 1.0, Math.max(0, rule.position(sorted.length, probability)));
    int below = (int) at;
    int above = Math.min(sorted.length - 1, below + 1);
    return sorted[below] + (at - below) * (sorted[above] - sorted[below]);
  }
}
