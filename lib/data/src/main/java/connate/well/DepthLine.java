package connate.well;

import java.util.Arrays;

/**
 * The depths of a well's rows, in metres, with what sampling needs: rows in rising order, the usual
 * step. Rows may rise, fall, repeat or stand without order.
 */
final class DepthLine {

  private final double[] depths;
  private final int[] rising;
  private final double step;

  DepthLine(double[] metres) {
    this.depths = metres;
    this.rising = order(metres);
    this.step = usualStep();
  }

  private static int[] order(double[] metres) {
    int[] rows = new int[metres.length];
    int count = 0;
    for (int row = 0; row < metres.length; row++) {
      if (!Double.isNaN(metres[row])) {
        rows[count++] = row;
      }
    }
    int[] present = Arrays.copyOf(rows, count);
    if (isFalling(metres, present)) {
      for (int i = 0; i < count; i++) {
        rows[i] = present[count - 1 - i];
      }
      return Arrays.copyOf(rows, count);
    }
    return isRising(metres, present) ? present : sorted(metres, present);
  }

  private static boolean isRising(double[] metres, int[] rows) {
    for (int i = 1; i < rows.length; i++) {
      if (metres[rows[i]] < metres[rows[i - 1]]) {
        return false;
      }
    }
    return true;
  }

  private static boolean isFalling(double[] metres, int[] rows) {
    for (int i = 1; i < rows.length; i++) {
      if (metres[rows[i]] >= metres[rows[i - 1]]) {
        return false;
      }
    }
    return rows.length > 1;
  }

  private static int[] sorted(double[] metres, int[] rows) {
    return Arrays.stream(rows)
        .boxed()
        .sorted((a, b) -> Double.compare(metres[a], metres[b]))
        .mapToInt(Integer::intValue)
        .toArray();
  }

  private double usualStep() {
    double[] steps = new double[Math.max(0, rising.length - 1)];
    int count = 0;
    for (int i = 1; i < rising.length; i++) {
      double d = depths[rising[i]] - depths[rising[i - 1]];
      if (d > 0) {
        steps[count++] = d;
      }
    }
    if (count == 0) {
      return Double.NaN;
    }
    Arrays.sort(steps, 0, count);
    return steps[count / 2];
  }

  /** Returns the median step between neighbours, NaN where there is none. */
  double step() {
    return step;
  }

  /** Returns the row of the least depth, -1 where there is none. */
  int shallowest() {
    return rising.length == 0 ? -1 : rising[0];
  }

  /** Returns the row of the greatest depth, -1 where there is none. */
  int deepest() {
    return rising.length == 0 ? -1 : rising[rising.length - 1];
  }

  /** Returns the rows from a depth on, to another one included or not, in their own order. */
  int[] rows(double from, double to, boolean withLast) {
    int[] rows = new int[depths.length];
    int count = 0;
    for (int row = 0; row < depths.length; row++) {
      double d = depths[row];
      if (d >= from && (d < to || withLast && d == to)) {
        rows[count++] = row;
      }
    }
    return Arrays.copyOf(rows, count);
  }

  /**
   * Returns values at other depths: linear between the neighbours that have a value, missing where
   * these are more than two steps apart or where there is none on one side.
   *
   * @param values one value per row, NaN for none
   * @param wanted the depths in metres
   */
  double[] sample(double[] values, double[] wanted) {
    int[] nodes = nodes(values);
    double widest = 2 * step * (1 + 1e-9);
    double[] out = new double[wanted.length];
    for (int i = 0; i < wanted.length; i++) {
      out[i] = at(values, nodes, wanted[i], widest);
    }
    return out;
  }

  /** Returns the rows with a value, by rising depth, the first only where a depth comes twice. */
  private int[] nodes(double[] values) {
    int[] nodes = new int[rising.length];
    int count = 0;
    for (int row : rising) {
      boolean isRepeated = count > 0 && depths[nodes[count - 1]] == depths[row];
      if (!Double.isNaN(values[row]) && !isRepeated) {
        nodes[count++] = row;
      }
    }
    return Arrays.copyOf(nodes, count);
  }

  private double at(double[] values, int[] nodes, double wanted, double widest) {
    int below = firstAtOrBelow(nodes, wanted);
    if (below < nodes.length && depths[nodes[below]] == wanted) {
      return values[nodes[below]];
    }
    if (below == 0 || below == nodes.length || Double.isNaN(wanted)) {
      return Double.NaN;
    }
    int upper = nodes[below - 1];
    int lower = nodes[below];
    double width = depths[lower] - depths[upper];
    if (!(width <= widest)) {
      return Double.NaN;
    }
    double part = (wanted - depths[upper]) / width;
    return values[upper] + part * (values[lower] - values[upper]);
  }

  /** Returns the first node whose depth is not less than the wanted one. */
  private int firstAtOrBelow(int[] nodes, double wanted) {
    int low = 0;
    int high = nodes.length;
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (depths[nodes[middle]] < wanted) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }
}
