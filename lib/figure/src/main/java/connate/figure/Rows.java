package connate.figure;

import java.util.ArrayList;
import java.util.List;

/**
 * Which rows can be drawn, and how many cannot for which reason.
 *
 * @param kept the rows that can
 * @param total all rows
 * @param missing rows without one of the values
 * @param notPositive rows with a zero or a negative value on a log axis
 */
record Rows(int[] kept, int total, int missing, int notPositive) {

  /** Sorts the rows of columns of one length. */
  static Rows of(boolean[] log, double[]... columns) {
    int total = columns[0].length;
    int[] kept = new int[total];
    int count = 0;
    int missing = 0;
    int low = 0;
    for (int row = 0; row < total; row++) {
      boolean absent = false;
      boolean below = false;
      for (int c = 0; c < columns.length; c++) {
        double value = columns[c][row];
        absent |= !Double.isFinite(value);
        below |= log[c] && value <= 0;
      }
      if (absent) {
        missing++;
      } else if (below) {
        low++;
      } else {
        kept[count++] = row;
      }
    }
    return new Rows(java.util.Arrays.copyOf(kept, count), total, missing, low);
  }

  /** Returns this if there is a row to draw. */
  Rows needing(String figure, String what) {
    if (kept.length > 0) {
      return this;
    }
    throw new IllegalArgumentException(
        figure + " of " + what + " has nothing to draw: " + (total == 0 ? "no rows" : dropped()));
  }

  int n() {
    return kept.length;
  }

  /** Returns the chosen values of a column. */
  double[] of(double[] column) {
    return pick(column, kept);
  }

  static double[] pick(double[] column, int... rows) {
    double[] out = new double[rows.length];
    for (int i = 0; i < out.length; i++) {
      out[i] = column[rows[i]];
    }
    return out;
  }

  /** Returns the line beneath the figure. */
  String note() {
    return n() == total
        ? "n = " + n()
        : "n = " + n() + " of " + total + "; not drawn: " + dropped();
  }

  private String dropped() {
    List<String> reasons = new ArrayList<>();
    if (missing > 0) {
      reasons.add(missing + " missing");
    }
    if (notPositive > 0) {
      reasons.add(notPositive + " zero or negative on a log axis");
    }
    return String.join(", ", reasons);
  }
}
