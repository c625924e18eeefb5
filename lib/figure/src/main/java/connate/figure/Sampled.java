package connate.figure;

import connate.quantity.Unit;
import java.util.function.DoubleUnaryOperator;

/** A function at even places along an axis. */
record Sampled(double[] x, double[] y) {

  private static final int PLACES = 160;

  static double[] places(Axis axis) {
    double[] x = new double[PLACES + 1];
    for (int i = 0; i <= PLACES; i++) {
      x[i] = axis.scale().value(i / (double) PLACES);
    }
    return x;
  }

  /**
   * Samples a function over an axis.
   *
   * @param function what is drawn, in its own units
   * @param from the unit of the axis and that of the function's x
   * @param to the unit of the function's y and that of the other axis
   */
  static Sampled of(double[] places, DoubleUnaryOperator function, Unit<?>[] from, Unit<?>[] to) {
    double[] y = new double[places.length];
    for (int i = 0; i < y.length; i++) {
      double value = function.applyAsDouble(from[0].convert(places[i], from[1]));
      y[i] = to[0].convert(value, to[1]);
      if (!Double.isFinite(y[i])) {
        y[i] = Double.NaN;
      }
    }
    return new Sampled(places, y);
  }

  /** Checks that a line can be drawn over an axis. */
  static void check(String label, String axis, Unit<?> line, Unit<?> own) {
    if (line.dimension() != own.dimension()) {
      throw new IllegalArgumentException(
          "«"
              + label
              + "» has "
              + line.dimension()
              + " ("
              + line.symbol()
              + ") where the "
              + axis
              + " axis has "
              + own.dimension()
              + " ("
              + own.symbol()
              + "); are x and y the columns it was fitted to?");
    }
  }
}
