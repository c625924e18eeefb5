package connate.series;

import connate.quantity.Unit;

/** A range that can be drawn over a crossplot: low and high of y as functions of x. */
public interface Band {

  /** Returns the low end at x. */
  double low(double x);

  /** Returns the high end at x. */
  double high(double x);

  /** Returns the unit of x. */
  Unit<?> xUnit();

  /** Returns the unit of y. */
  Unit<?> yUnit();

  /** Returns what the range means, such as {@code 80 % prediction}. */
  String label();
}
