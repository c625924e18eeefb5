package connate.calibration;

import connate.formula.TransformForm;
import connate.series.Labels;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.function.IntUnaryOperator;
import java.util.stream.IntStream;

/**
 * A way of testing a fit on plugs that it has not seen: each plug left out in turn, or each group,
 * such as a well or a core, as a whole. Plugs of one core resemble each other, so leaving one plug
 * out flatters.
 */
public final class LeaveOut {

  private final Labels groups;

  private LeaveOut(Labels groups) {
    this.groups = groups;
  }

  /** Returns the test that leaves out each plug in turn. */
  public static LeaveOut each() {
    return new LeaveOut(null);
  }

  /** Returns the test that leaves out each group in turn. */
  public static LeaveOut of(Labels groups) {
    return new LeaveOut(Objects.requireNonNull(groups, "groups"));
  }

  /** Returns what is left out, in words. */
  public String words() {
    return groups == null ? "leaving one plug out" : "leaving one " + groups.name() + " out";
  }

  /**
   * Returns the root mean square error of a least-squares fit on the rows that were left out.
   *
   * @param columns one array for each regressor, without the intercept
   * @param y the variable
   */
  public double error(double[][] columns, double[] y) {
    double sum = 0;
    for (int[] held : folds(y.length, y.length, i -> i)) {
      int[] seen = others(y.length, held);
      LeastSquares fit =
          LeastSquares.fit(
              IntStream.range(0, columns.length).mapToObj(i -> "x" + i).toList(),
              Arrays.stream(columns).map(c -> chosen(c, seen)).toArray(double[][]::new),
              chosen(y, seen));
      for (int i : held) {
        double e = y[i] - fit.predict(Arrays.stream(columns).mapToDouble(c -> c[i]).toArray());
        sum += e * e;
      }
    }
    return StrictMath.sqrt(sum / y.length);
  }

  /** Returns the root mean square error in decades of the plugs that were left out. */
  double error(TransformForm form, Plugs plugs) {
    double sum = 0;
    for (int[] held : folds(plugs.size(), plugs.total(), plugs::row)) {
      LogLine line = LogLine.of(form, plugs.some(others(plugs.size(), held)));
      for (int i : held) {
        double e = plugs.logK(i) - line.at(form.function().applyAsDouble(plugs.porosity(i)));
        sum += e * e;
      }
    }
    return StrictMath.sqrt(sum / plugs.size());
  }

  private List<int[]> folds(int size, int total, IntUnaryOperator row) {
    if (groups == null) {
      return IntStream.range(0, size).mapToObj(i -> new int[] {i}).toList();
    }
    if (groups.size() != total) {
      throw new IllegalArgumentException(
          "«" + groups.name() + "» has " + groups.size() + " rows, the samples " + total);
    }
    List<int[]> folds = new ArrayList<>();
    for (String word : groups.distinct()) {
      int[] held =
          IntStream.range(0, size)
              .filter(i -> word.equals(groups.label(row.applyAsInt(i))))
              .toArray();
      if (held.length > 0) {
        folds.add(held);
      }
    }
    return checked(folds, size);
  }

  private List<int[]> checked(List<int[]> folds, int size) {
    int held = folds.stream().mapToInt(f -> f.length).sum();
    if (folds.size() < 2 || held < size) {
      throw new IllegalArgumentException(
          "«"
              + groups.name()
              + "» has "
              + folds.size()
              + " groups and names "
              + held
              + " of "
              + size
              + " samples: at least two groups that name every sample are needed");
    }
    return folds;
  }

  private static int[] others(int size, int... held) {
    boolean[] out = new boolean[size];
    for (int i : held) {
      out[i] = true;
    }
    int[] others = IntStream.range(0, size).filter(i -> !out[i]).toArray();
    if (others.length < Plugs.FEWEST) {
      throw new IllegalArgumentException(
          "too few samples are left when a group is out: " + others.length);
    }
    return others;
  }

  private static double[] chosen(double[] values, int... rows) {
    return Arrays.stream(rows).mapToDouble(row -> values[row]).toArray();
  }
}
