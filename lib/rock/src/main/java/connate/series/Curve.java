package connate.series;

import connate.quantity.Unit;

/** A line that can be drawn over a crossplot: y as a function of x, each in its unit. */
public interface Curve {

  /** Returns y at x; NaN where it has none. */
  double y(double x);

  /** Returns the unit of x. */
  Unit<?> xUnit();

  /** Returns the unit of y. */
  Unit<?> yUnit();

  /** Returns the line's name, short enough for a legend. */
  String label();
}
