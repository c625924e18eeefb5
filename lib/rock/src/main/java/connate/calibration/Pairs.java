package connate.calibration;

import java.util.Arrays;

/** The rows of two variables in which both are present and vary. */
record Pairs(double[] x, double[] y) {

  static Pairs of(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          "two variables of " + x.length + " and " + y.length + " rows are no pairs");
    }
    double[] a = new double[x.length];
    double[] b = new double[x.length];
    int n = 0;
    for (int row = 0; row < x.length; row++) {
      if (Double.isFinite(x[row]) && Double.isFinite(y[row])) {
        a[n] = x[row];
        b[n++] = y[row];
      }
    }
    Pairs pairs = new Pairs(Arrays.copyOf(a, n), Arrays.copyOf(b, n));
    if (n < 3 || Arrays.stream(pairs.x).distinct().count() < 2) {
      throw new IllegalArgumentException(
          "a line needs at least three pairs whose x differs, found " + n);
    }
    return pairs;
  }

  int size() {
    return x.length;
  }

  double meanX() {
    return Arrays.stream(x).average().orElseThrow();
  }

  double meanY() {
    return Arrays.stream(y).average().orElseThrow();
  }
}
