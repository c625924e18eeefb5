package connate.figure;

import java.util.Arrays;

/**
 * Leaves out points of a line that no eye can miss. Of a run of points within half a pixel of one
 * direction only the first, the last and the two extremes of the other stay, in their order.
 */
final class Thinning {

  private static final int FEW = 600;
  private static final double CELL = 2;

  private final double[] x;
  private final double[] y;
  private final double[] along;
  private final double[] across;
  private final double[] outX;
  private final double[] outY;
  private int count;

  private Thinning(double[] x, double[] y) {
    this.x = x;
    this.y = y;
    boolean upright = span(y) > span(x);
    this.along = upright ? y : x;
    this.across = upright ? x : y;
    this.outX = new double[x.length];
    this.outY = new double[x.length];
  }

  /** Returns the points that stay: x and y. */
  static double[][] of(double[] x, double[] y) {
    return x.length <= FEW ? new double[][] {x, y} : new Thinning(x, y).run();
  }

  /** Returns how many steps forward outweigh those back, so that the axis of a log is found. */
  private static double span(double[] values) {
    double up = 0;
    double all = 0;
    for (int i = 1; i < values.length; i++) {
      double step = values[i] - values[i - 1];
      if (!Double.isNaN(step) && step != 0) {
        up += Math.signum(step);
        all++;
      }
    }
    return all == 0 ? 0 : Math.abs(up) / all;
  }

  private double[][] run() {
    int start = 0;
    for (int i = 1; i <= x.length; i++) {
      if (i == x.length || cell(i) != cell(start)) {
        keep(start, i - 1);
        start = i;
      }
    }
    return new double[][] {Arrays.copyOf(outX, count), Arrays.copyOf(outY, count)};
  }

  private long cell(int i) {
    boolean gap = Double.isNaN(x[i]) || Double.isNaN(y[i]);
    return gap ? Long.MIN_VALUE : (long) StrictMath.floor(along[i] * CELL);
  }

  private void keep(int first, int last) {
    int low = first;
    int high = first;
    for (int i = first; i <= last; i++) {
      low = across[i] < across[low] ? i : low;
      high = across[i] > across[high] ? i : high;
    }
    int[] kept = {first, Math.min(low, high), Math.max(low, high), last};
    for (int k = 0; k < kept.length; k++) {
      if (k == 0 || kept[k] != kept[k - 1]) {
        outX[count] = x[kept[k]];
        outY[count++] = y[kept[k]];
      }
    }
  }
}
