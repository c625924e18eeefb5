package connate.figure;

import connate.chance.Distribution;
import java.math.BigDecimal;
import java.util.Arrays;

/**
 * Bins of one width, in decades on a log axis.
 *
 * @param edges from low to high, one more than there are bins
 * @param log whether the width is in decades
 */
record Bins(double[] edges, boolean log) {

  private static final double[] DECADE_PARTS = {0.05, 0.1, 0.2, 0.25, 0.5, 1};
  private static final int MOST = 60;
  private static final int HALVINGS = 50;

  /**
   * Cuts the range of some values.
   *
   * @param count how many bins, 0 for a number that suits: the cube root rule on whole steps
   */
  static Bins of(double[] values, boolean log, int count) {
    double[] ends = Extent.of(log ? 0 : Double.NEGATIVE_INFINITY, values);
    double low = log ? StrictMath.log10(ends[0]) : ends[0];
    double high = log ? StrictMath.log10(ends[1]) : ends[1];
    if (low == high) {
      double half = log || low == 0 ? 0.5 : Math.abs(low) * 0.05;
      return new Bins(edges(low - half, high + half, Math.max(1, count), log), log);
    }
    if (count > 0) {
      return new Bins(edges(low, high, count, log), log);
    }
    double wanted = Math.max(5, Math.min(MOST, 2 * StrictMath.cbrt(values.length)));
    return whole(low, high, step((high - low) / wanted, log), log);
  }

  private static BigDecimal step(double least, boolean log) {
    if (log) {
      for (double part : DECADE_PARTS) {
        if (part >= least) {
          return BigDecimal.valueOf(part);
        }
      }
    }
    return LinearScale.step(least);
  }

  /** Cuts at whole multiples of a step. */
  private static Bins whole(double low, double high, BigDecimal step, boolean log) {
    double size = step.doubleValue();
    long first = (long) StrictMath.floor(low / size + 1e-9);
    long last = Math.max(first + 1, (long) StrictMath.ceil(high / size - 1e-9));
    double[] edges = new double[(int) (last - first) + 1];
    for (int i = 0; i < edges.length; i++) {
      double at = step.multiply(BigDecimal.valueOf(first + i)).doubleValue();
      edges[i] = log ? StrictMath.pow(10, at) : at;
    }
    return new Bins(edges, log);
  }

  private static double[] edges(double low, double high, int count, boolean log) {
    double[] edges = new double[count + 1];
    for (int i = 0; i <= count; i++) {
      double at = low + (high - low) * i / count;
      edges[i] = log ? StrictMath.pow(10, at) : at;
    }
    return edges;
  }

  int size() {
    return edges.length - 1;
  }

  /** Returns how many values fall into each bin: lower edge in, upper edge out but for the last. */
  double[] count(double[] values) {
    double[] counts = new double[size()];
    for (double value : values) {
      int at = Arrays.binarySearch(edges, value);
      int bin = at >= 0 ? at : -at - 2;
      counts[Math.max(0, Math.min(size() - 1, bin))]++;
    }
    return counts;
  }

  /** Returns the axis on which they stand. */
  Scale scale() {
    double low = edges[0];
    double high = edges[size()];
    double room = 0.03;
    if (log) {
      double wide = StrictMath.log10(high / low) * room;
      return new LogScale(low / StrictMath.pow(10, wide), high * StrictMath.pow(10, wide));
    }
    double wide = (high - low) * room;
    return new LinearScale(low - wide, high + wide);
  }

  /** Returns filled bars. */
  Layer.Boxes boxes(double[] counts) {
    double[] zero = new double[size()];
    Look look = new Look(Theme.SKY, Look.of(0).mark(), "", '█');
    return new Layer.Boxes(
        Arrays.copyOf(edges, size()),
        Arrays.copyOfRange(edges, 1, size() + 1),
        zero,
        counts,
        look,
        0.75,
        "");
  }

  /** Returns the outline of the bars, from the first that is not empty to the last. */
  Layer.Stroke outline(double[] counts, Look look, String label) {
    int first = 0;
    int last = size() - 1;
    while (first < last && counts[first] == 0) {
      first++;
    }
    while (last > first && counts[last] == 0) {
      last--;
    }
    int bins = last - first + 1;
    double[] x = new double[2 * bins + 2];
    double[] y = new double[x.length];
    x[0] = edges[first];
    for (int i = 0; i < bins; i++) {
      x[2 * i + 1] = edges[first + i];
      x[2 * i + 2] = edges[first + i + 1];
      y[2 * i + 1] = counts[first + i];
      y[2 * i + 2] = counts[first + i];
    }
    x[x.length - 1] = edges[last + 1];
    return new Layer.Stroke(x, y, look, Theme.LINE, label);
  }

  /** Returns how many of n values a law puts into a bin around each place of the axis. */
  Sampled expected(Distribution law, int n) {
    double[] x = Sampled.places(Axis.of("", scale()));
    double[] y = new double[x.length];
    double width = log ? StrictMath.sqrt(edges[1] / edges[0]) : (edges[1] - edges[0]) / 2;
    for (int i = 0; i < x.length; i++) {
      double low = log ? x[i] / width : x[i] - width;
      double high = log ? x[i] * width : x[i] + width;
      y[i] = n * (below(law, high) - below(law, low));
    }
    return new Sampled(x, y);
  }

  /** Returns the part of a law below a value, from its quantiles by halving. */
  static double below(Distribution law, double value) {
    double low = 0;
    double high = 1;
    for (int i = 0; i < HALVINGS; i++) {
      double middle = (low + high) / 2;
      if (middle <= 0 || middle >= 1) {
        break;
      }
      if (law.quantile(middle) < value) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }
}
