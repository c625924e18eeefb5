package connate.figure;

import connate.quantity.HydraulicConductivity;
import connate.quantity.Permeability;
import connate.quantity.Resistivity;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.List;

/**
 * A log, which may be absent, with points over it.
 *
 * @param log the line, {@code null} for none
 * @param points columns that are drawn as points
 * @param onLog whether the axis is logarithmic
 */
record Track(Series log, List<Series> points, boolean onLog) {

  /** Returns the column that names the track and gives its unit. */
  Series first() {
    return log == null ? points.get(0) : log;
  }

  /** Tells whether columns of a unit are drawn on a log axis unless told otherwise. */
  static boolean isLog(Unit<?> unit) {
    return unit.dimension() == Permeability.DIMENSION
        || unit.dimension() == HydraulicConductivity.DIMENSION
        || unit.dimension() == Resistivity.DIMENSION;
  }

  /** Returns the depths of a column's rows. */
  static Series depth(Series series) {
    return series
        .depth()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "«"
                        + series.name()
                        + "» does not know the depth of its rows: give it with"
                        + " .atDepth(depth)"));
  }
}
