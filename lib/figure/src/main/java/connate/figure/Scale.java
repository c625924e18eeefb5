package connate.figure;

import java.util.List;

/** How the values of an axis become positions from 0 to 1. */
interface Scale {

  /** Returns the position of a value: 0 at the low end, 1 at the high end. */
  double position(double value);

  /** Returns the value at a position. */
  double value(double position);

  /** Returns whether a value has a position at all. */
  boolean holds(double value);

  /**
   * Returns the marks, from low to high.
   *
   * @param wanted about how many with labels there is room for
   */
  List<Tick> ticks(int wanted);

  /** Returns whether it is logarithmic. */
  default boolean isLog() {
    return false;
  }

  /** Returns a scale that holds some values with a little room at both ends. */
  static Scale around(boolean log, double[]... columns) {
    return log ? LogScale.around(columns) : LinearScale.around(columns);
  }
}
