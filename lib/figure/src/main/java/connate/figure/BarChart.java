package connate.figure;

import connate.quantity.Numbers;
import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.List;

/**
 * Named values side by side: bars from zero, or points where the axis is logarithmic, since a bar
 * has no foot there. Ranges are drawn as lines.
 */
public final class BarChart extends PlottedFigure {

  private static final int ROW = 26;
  private static final int AROUND = 130;
  private static final int MOST = 60;

  private final Labels names;
  private final Series values;
  private final Series low;
  private final Series high;
  private final boolean log;

  private BarChart(Labels names, Series values, Series low, Series high, boolean log) {
    this.names = names;
    this.values = values;
    this.low = low;
    this.high = high;
    this.log = log;
  }

  static BarChart of(Labels names, Series values) {
    if (names.size() != values.size()) {
      throw new IllegalArgumentException(
          "«"
              + names.name()
              + "» has "
              + names.size()
              + " rows, «"
              + values.name()
              + "» "
              + values.size());
    }
    if (names.size() > MOST) {
      throw new IllegalArgumentException(
          names.size() + " bars cannot be read; draw at most " + MOST + ", or a histogram");
    }
    return new BarChart(names, values, null, null, Crossplot.isLog(values.unit()));
  }

  /** Returns it on a log axis. */
  public BarChart logAxis() {
    return new BarChart(names, values, low, high, true);
  }

  /** Returns it on an even axis. */
  public BarChart linearAxis() {
    return new BarChart(names, values, low, high, false);
  }

  /** Returns it with a range for each value. */
  public BarChart range(Series from, Series to) {
    for (Series end : List.of(from, to)) {
      Sampled.check(end.name(), "value", end.unit(), values.unit());
      if (end.size() != values.size()) {
        throw new IllegalArgumentException(
            "«"
                + end.name()
                + "» has "
                + end.size()
                + " rows, «"
                + values.name()
                + "» "
                + values.size());
      }
    }
    return new BarChart(names, values, from, to, log);
  }

  @Override
  Plot plot() {
    double[] all = values.values();
    Rows rows = Rows.of(new boolean[] {log}, all).needing("a bar chart", "«" + values.name() + "»");
    int n = rows.n();
    double[] drawn = new double[n];
    double[] at = new double[n];
    double[][] ends = ends(rows);
    List<String> labels = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      int row = rows.kept()[n - 1 - i];
      drawn[i] = all[row];
      at[i] = i;
      labels.add(names.label(row) == null ? "no name" : names.label(row));
    }
    Scale scale =
        log
            ? LogScale.around(drawn, ends[0], ends[1])
            : LinearScale.fromZero(join(drawn, ends[0], ends[1]));
    List<Layer> layers = new ArrayList<>();
    for (int i = 0; i < ends[0].length; i++) {
      double[] reach = {toEdge(ends[0][i], scale), toEdge(ends[1][i], scale)};
      layers.add(new Layer.Stroke(reach, new double[] {i, i}, Look.of(0).letter('-'), 1.6, ""));
    }
    if (log) {
      layers.add(new Layer.Dots(drawn, at, Look.of(1).round(), 8, ""));
    } else {
      layers.add(0, bars(drawn));
    }
    String quantity = Wording.axis(Wording.quantity(values), log);
    Panel panel = Panel.of(Axis.of(quantity, scale), Axis.of("", new NameScale(labels)), layers);
    String note = rows.note();
    return new Plot(
        values.name() + " by " + names.name(),
        describe(quantity, labels, drawn, note),
        List.of(panel),
        List.of(note),
        Plot.WIDTH,
        AROUND + ROW * n);
  }

  /** Returns low and high ends from the lowest bar up. */
  private double[][] ends(Rows rows) {
    if (low == null) {
      return new double[2][0];
    }
    double[][] out = new double[2][rows.n()];
    double[][] all = {low.in(values.unit()), high.in(values.unit())};
    for (int side = 0; side < 2; side++) {
      for (int i = 0; i < rows.n(); i++) {
        out[side][i] = all[side][rows.kept()[rows.n() - 1 - i]];
      }
    }
    return out;
  }

  /** Returns an end of a range; below all of a log axis where it is zero or negative. */
  private double toEdge(double end, Scale scale) {
    return log && end <= 0 ? scale.value(-0.1) : end;
  }

  private static double[] join(double[]... columns) {
    return java.util.Arrays.stream(columns).flatMapToDouble(java.util.Arrays::stream).toArray();
  }

  private static Layer bars(double[] drawn) {
    int n = drawn.length;
    double[] bottom = new double[n];
    double[] top = new double[n];
    for (int i = 0; i < n; i++) {
      bottom[i] = i - 0.33;
      top[i] = i + 0.33;
    }
    Look look = new Look(Theme.SKY, Look.of(0).mark(), "", '█');
    return new Layer.Boxes(new double[n], drawn, bottom, top, look, 0.9, "");
  }

  private String describe(String quantity, List<String> labels, double[] drawn, String note) {
    int most = 0;
    int least = 0;
    for (int i = 1; i < drawn.length; i++) {
      most = drawn[i] > drawn[most] ? i : most;
      least = drawn[i] < drawn[least] ? i : least;
    }
    String unit = values.unit().suffix();
    return (log ? "Points" : "Bars")
        + " of "
        + quantity
        + " for each "
        + names.name()
        + ". Largest: "
        + labels.get(most)
        + ", "
        + Numbers.text(drawn[most])
        + unit
        + "; smallest: "
        + labels.get(least)
        + ", "
        + Numbers.text(drawn[least])
        + unit
        + ". "
        + note
        + ".";
  }
}
