package connate.figure;

import connate.quantity.Numbers;
import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * The spread of a column in each group: a box from quarter to quarter with the median in it, a line
 * to the farthest values within one and a half box lengths (Tukey 1977), points beyond.
 */
public final class BoxPlot extends PlottedFigure {

  private static final int ROW = 34;
  private static final int AROUND = 140;
  private static final double REACH = 1.5;

  private final Series values;
  private final Labels groups;
  private final boolean log;

  private BoxPlot(Series values, Labels groups, boolean log) {
    this.values = values;
    this.groups = groups;
    this.log = log;
  }

  static BoxPlot of(Series values, Labels groups) {
    if (groups.size() != values.size()) {
      throw new IllegalArgumentException(
          "«"
              + groups.name()
              + "» has "
              + groups.size()
              + " rows, «"
              + values.name()
              + "» "
              + values.size());
    }
    return new BoxPlot(values, groups, Crossplot.isLog(values.unit()));
  }

  /** Returns it on a log axis; boxes and reach are then those of the logarithms. */
  public BoxPlot logAxis() {
    return new BoxPlot(values, groups, true);
  }

  /** Returns it on an even axis. */
  public BoxPlot linearAxis() {
    return new BoxPlot(values, groups, false);
  }

  /**
   * Five numbers and what lies outside.
   *
   * @param low the end of the lower line
   * @param quarter the lower end of the box
   * @param median the middle
   * @param threeQuarters the upper end of the box
   * @param high the end of the upper line
   * @param beyond what lies outside the lines
   */
  record Five(
      double low,
      double quarter,
      double median,
      double threeQuarters,
      double high,
      double[] beyond) {

    /** Sums up values; on a log axis the reach is measured in decades. */
    static Five of(double[] values, boolean log) {
      double[] sorted =
          Arrays.stream(values).map(v -> log ? StrictMath.log10(v) : v).sorted().toArray();
      double q1 = quantile(sorted, 0.25);
      double q3 = quantile(sorted, 0.75);
      double reach = REACH * (q3 - q1);
      double[] inside =
          Arrays.stream(sorted).filter(v -> v >= q1 - reach && v <= q3 + reach).toArray();
      double[] outside =
          Arrays.stream(sorted).filter(v -> v < q1 - reach || v > q3 + reach).toArray();
      return new Five(
          back(inside[0], log),
          back(q1, log),
          back(quantile(sorted, 0.5), log),
          back(q3, log),
          back(inside[inside.length - 1], log),
          Arrays.stream(outside).map(v -> back(v, log)).toArray());
    }

    private static double back(double value, boolean log) {
      return log ? StrictMath.pow(10, value) : value;
    }

    /** Linear between order statistics: type 7 of Hyndman and Fan (1996). */
    private static double quantile(double[] sorted, double p) {
      double at = p * (sorted.length - 1);
      int below = (int) at;
      int above = Math.min(below + 1, sorted.length - 1);
      return sorted[below] + (at - below) * (sorted[above] - sorted[below]);
    }
  }

  @Override
  Plot plot() {
    double[] all = values.values();
    Rows rows = Rows.of(new boolean[] {log}, all).needing("a box plot", "«" + values.name() + "»");
    Groups found = Groups.of(groups, rows.kept());
    List<String> names = new ArrayList<>();
    List<Layer> layers = new ArrayList<>();
    StringBuilder words = new StringBuilder();
    int at = found.rows().size();
    for (Map.Entry<String, int[]> group : found.rows().entrySet()) {
      at--;
      double[] own = Rows.pick(all, group.getValue());
      Five five = Five.of(own, log);
      names.add(0, group.getKey() + " (" + own.length + ")");
      draw(five, at, layers);
      words.append(' ').append(group.getKey()).append(": median ");
      words.append(Numbers.text(five.median())).append(values.unit().suffix()).append('.');
    }
    String quantity = Wording.axis(Wording.quantity(values), log);
    Panel panel =
        Panel.of(
            Axis.of(quantity, Scale.around(log, rows.of(all))),
            Axis.of("", new NameScale(names)),
            layers);
    List<String> notes =
        List.of(
            rows.note(),
            "box: middle half and median; line: to the farthest value within 1.5 box lengths");
    return new Plot(
        values.name() + " by " + groups.name(),
        "Box plot of " + quantity + "." + words + " " + String.join("; ", notes) + ".",
        List.of(panel),
        notes,
        Plot.WIDTH,
        AROUND + ROW * names.size());
  }

  private static void draw(Five five, int at, List<Layer> layers) {
    Look black = Look.of(0);
    Look sky = new Look(Theme.SKY, black.mark(), "", '█');
    layers.add(
        new Layer.Stroke(
            new double[] {five.low(), five.high()},
            new double[] {at, at},
            black.letter('-'),
            1.2,
            ""));
    layers.add(
        new Layer.Boxes(
            new double[] {five.quarter()},
            new double[] {five.threeQuarters()},
            new double[] {at - 0.3},
            new double[] {at + 0.3},
            sky,
            1,
            ""));
    layers.add(
        new Layer.Stroke(
            new double[] {five.median(), five.median()},
            new double[] {at - 0.3, at + 0.3},
            black.letter('|'),
            2,
            ""));
    double[] places = new double[five.beyond().length];
    Arrays.fill(places, at);
    layers.add(new Layer.Dots(five.beyond(), places, black, Theme.POINT, ""));
  }
}
