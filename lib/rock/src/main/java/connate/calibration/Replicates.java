package connate.calibration;

import connate.method.Caution;
import connate.method.Listening;
import connate.series.Series;
import java.util.Arrays;

/**
 * Notices values that repeat as they do where several slices were cut of one core: they are no
 * independent samples, and errors that count them as such are too small.
 */
public final class Replicates {

  /** Caution: fewer independent values than rows. */
  static final String REPEATED = "C03";

  private static final double TELLING = 0.5;

  private Replicates() {}

  /** Returns how many different values a column has. */
  public static int distinct(Series series) {
    return (int) Arrays.stream(series.present()).distinct().count();
  }

  /** Raises a caution where at most half of the values differ, and returns how many do. */
  public static int warn(Series series) {
    int distinct = distinct(series);
    if (distinct <= TELLING * series.count()) {
      Listening.caution(
          Caution.of(
              REPEATED,
              series.name(),
              "only "
                  + distinct
                  + " of "
                  + series.count()
                  + " values of «"
                  + series.name()
                  + "» differ: rows of one core are no independent samples; test by leaving whole"
                  + " cores out"));
    }
    return distinct;
  }
}
