package connate.method;

import connate.quantity.Numbers;

/**
 * An interval of numbers, either end open or closed.
 *
 * @param low the low end
 * @param high the high end
 * @param lowOpen whether the low end itself is outside
 * @param highOpen whether the high end itself is outside
 */
public record Range(double low, double high, boolean lowOpen, boolean highOpen) {

  /** Every finite number. */
  public static final Range ANY =
      new Range(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, true, true);

  /** Above zero. */
  public static final Range POSITIVE = above(0);

  /** A part of a whole, from 0 to 1. */
  public static final Range PART = of(0, 1);

  /** Checks the order of the ends. */
  public Range {
    if (!(low <= high)) {
      throw new IllegalArgumentException("a range from " + low + " to " + high);
    }
  }

  /** Returns the closed interval. */
  public static Range of(double low, double high) {
    return new Range(low, high, false, false);
  }

  /** Returns the numbers above an open low end. */
  public static Range above(double low) {
    return new Range(low, Double.POSITIVE_INFINITY, true, true);
  }

  /** Returns the numbers from a closed low end upwards. */
  public static Range from(double low) {
    return new Range(low, Double.POSITIVE_INFINITY, false, true);
  }

  /** Returns the numbers up to a closed high end. */
  public static Range upTo(double high) {
    return new Range(Double.NEGATIVE_INFINITY, high, true, false);
  }

  /** Returns this interval with an open high end. */
  public Range below(double end) {
    return new Range(low, end, lowOpen, true);
  }

  /** Returns this interval with a closed high end. */
  public Range to(double end) {
    return new Range(low, end, lowOpen, false);
  }

  /** Returns whether a number is inside; NaN never is. */
  public boolean contains(double value) {
    return (lowOpen ? value > low : value >= low) && (highOpen ? value < high : value <= high);
  }

  /** Returns the interval in words. */
  @Override
  public String toString() {
    boolean bounded = Double.isFinite(high);
    if (!Double.isFinite(low)) {
      return bounded ? (highOpen ? "below " : "up to ") + Numbers.text(high) : "any";
    }
    if (!bounded) {
      return (lowOpen ? "above " : "from ") + Numbers.text(low);
    }
    return (lowOpen ? "above " : "")
        + Numbers.text(low)
        + (highOpen ? " to below " : " to ")
        + Numbers.text(high);
  }
}
