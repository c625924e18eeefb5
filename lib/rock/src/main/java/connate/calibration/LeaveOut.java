package connate.calibration;

import connate.formula.TransformForm;
import connate.series.Labels;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
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

  /** Returns the root mean square error in decades of the plugs that were left out. */
  double error(TransformForm form, Plugs plugs) {
    double sum = 0;
    for (int[] held : folds(plugs)) {
      LogLine line = LogLine.of(form, plugs.some(others(plugs, held)));
      for (int i : held) {
        double e = plugs.logK(i) - line.at(form.function().applyAsDouble(plugs.porosity(i)));
        sum += e * e;
      }
    }
    return StrictMath.sqrt(sum / plugs.size());
  }

  private List<int[]> folds(Plugs plugs) {
    if (groups == null) {
      return IntStream.range(0, plugs.size()).mapToObj(i -> new int[] {i}).toList();
    }
    if (groups.size() != plugs.total()) {
      throw new IllegalArgumentException(
          "«" + groups.name() + "» has " + groups.size() + " rows, the plugs " + plugs.total());
    }
    List<int[]> folds = new ArrayList<>();
    for (String word : groups.distinct()) {
      int[] held =
          IntStream.range(0, plugs.size())
              .filter(i -> word.equals(groups.label(plugs.row(i))))
              .toArray();
      if (held.length > 0) {
        folds.add(held);
      }
    }
    return checked(folds, plugs);
  }

  private List<int[]> checked(List<int[]> folds, Plugs plugs) {
    int held = folds.stream().mapToInt(f -> f.length).sum();
    if (folds.size() < 2 || held < plugs.size()) {
      throw new IllegalArgumentException(
          "«"
              + groups.name()
              + "» has "
              + folds.size()
              + " groups and names "
              + held
              + " of "
              + plugs.size()
              + " plugs: at least two groups that name every plug are needed");
    }
    return folds;
  }

  private static int[] others(Plugs plugs, int... held) {
    boolean[] out = new boolean[plugs.size()];
    for (int i : held) {
      out[i] = true;
    }
    int[] others = IntStream.range(0, out.length).filter(i -> !out[i]).toArray();
    if (others.length < Plugs.FEWEST) {
      throw new IllegalArgumentException(
          "too few plugs are left when a group is out: " + others.length);
    }
    return others;
  }
}
