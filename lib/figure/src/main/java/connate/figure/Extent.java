package connate.figure;

import java.math.MathContext;

/** From where to where values go. */
final class Extent {

  static final MathContext DIGITS = new MathContext(6);

  private Extent() {}

  /**
   * Returns the least and the greatest finite value above a bound.
   *
   * @throws IllegalArgumentException if there is none
   */
  static double[] of(double above, double[]... columns) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (double[] column : columns) {
      for (double value : column) {
        if (Double.isFinite(value) && value > above) {
          low = Math.min(low, value);
          high = Math.max(high, value);
        }
      }
    }
    if (low > high) {
      throw new IllegalArgumentException("there is no value to draw");
    }
    return new double[] {low, high};
  }
}
