package connate.figure;

import connate.chance.Distribution;
import connate.chance.Distributions;
import connate.quantity.Numbers;
import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * Values in rising order over the part of them that is not larger, on a scale on which a normal law
 * is a straight line; on a log axis a lognormal law is.
 *
 * <p>The i-th of n values stands at (i − 1/2)/n (Hazen 1914, Trans. Am. Soc. Civ. Eng. 77,
 * 1539–1640; citation from memory).
 */
public final class ProbabilityPlot extends PlottedFigure {

  private final Series values;
  private final boolean log;
  private final Labels groups;
  private final boolean law;

  private ProbabilityPlot(Series values, boolean log, Labels groups, boolean law) {
    this.values = values;
    this.log = log;
    this.groups = groups;
    this.law = law;
  }

  static ProbabilityPlot of(Series values) {
    return new ProbabilityPlot(values, Crossplot.isLog(values.unit()), null, false);
  }

  /** Returns it on a log axis. */
  public ProbabilityPlot logAxis() {
    return new ProbabilityPlot(values, true, groups, law);
  }

  /** Returns it on an even axis. */
  public ProbabilityPlot linearAxis() {
    return new ProbabilityPlot(values, false, groups, law);
  }

  /** Returns it with the points told apart by words, one for each row. */
  public ProbabilityPlot byGroup(Labels words) {
    if (words.size() != values.size()) {
      throw new IllegalArgumentException(
          "«"
              + words.name()
              + "» has "
              + words.size()
              + " rows, «"
              + values.name()
              + "» "
              + values.size());
    }
    return new ProbabilityPlot(values, log, words, law);
  }

  /** Returns it with the law of the same mean and spread: normal, or lognormal on a log axis. */
  public ProbabilityPlot law() {
    return new ProbabilityPlot(values, log, groups, true);
  }

  @Override
  Plot plot() {
    double[] all = values.values();
    Rows rows =
        Rows.of(new boolean[] {log}, all).needing("a probability plot", "«" + values.name() + "»");
    double[] drawn = rows.of(all);
    List<Layer> layers = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    notes.add(rows.note());
    if (groups == null) {
      layers.add(points(drawn, Look.of(0), ""));
    } else {
      Groups found = Groups.of(groups, rows.kept());
      int next = 0;
      for (Map.Entry<String, int[]> group : found.rows().entrySet()) {
        layers.add(points(Rows.pick(all, group.getValue()), Look.of(next++), group.getKey()));
      }
      notes.add(found.sizes());
    }
    double edge = Math.min(1, 40.0 / drawn.length);
    NormalScale percent = new NormalScale(edge, 100 - edge);
    String words = law ? line(drawn, percent, layers) : "";
    Axis across = Axis.of("part not above (%), normal scale", percent);
    String quantity = Wording.axis(Wording.quantity(values), log);
    Axis up = Axis.of(quantity, Scale.around(log, drawn));
    return Plot.of(
        "How much of " + values.name() + " lies below a value",
        describe(quantity, drawn, words, notes),
        Panel.of(across, up, layers),
        notes);
  }

  private static Layer points(double[] drawn, Look look, String label) {
    double[] sorted = drawn.clone();
    Arrays.sort(sorted);
    double[] percent = new double[sorted.length];
    for (int i = 0; i < sorted.length; i++) {
      percent[i] = 100 * (i + 0.5) / sorted.length;
    }
    return new Layer.Dots(percent, sorted, look, Theme.POINT, label);
  }

  private String line(double[] drawn, NormalScale percent, List<Layer> layers) {
    double[] used = log ? Arrays.stream(drawn).map(StrictMath::log).toArray() : drawn;
    double mean = Arrays.stream(used).average().orElseThrow();
    double squares = Arrays.stream(used).map(v -> (v - mean) * (v - mean)).sum();
    double sd = StrictMath.sqrt(squares / Math.max(1, used.length - 1));
    if (!(sd > 0)) {
      throw new IllegalArgumentException(
          "no law can be fitted to «" + values.name() + "»: its values do not vary");
    }
    Distribution fitted =
        log ? Distributions.lognormal(StrictMath.exp(mean), sd) : Distributions.normal(mean, sd);
    double[] ends = {percent.low(), percent.high()};
    double[] y = {fitted.quantile(ends[0] / 100), fitted.quantile(ends[1] / 100)};
    layers.add(new Layer.Stroke(ends, y, Look.of(2).whole(), Theme.LINE, fitted.words()));
    return " Line: " + fitted.words() + ".";
  }

  private String describe(String quantity, double[] drawn, String line, List<String> notes) {
    double[] sorted = drawn.clone();
    Arrays.sort(sorted);
    return "Probability plot of "
        + quantity
        + ", "
        + Wording.range(drawn, values.unit())
        + ". A tenth lies at or below "
        + Numbers.text(sorted[(sorted.length - 1) / 10])
        + ", half at or below "
        + Numbers.text(sorted[(sorted.length - 1) / 2])
        + ", nine tenths at or below "
        + Numbers.text(sorted[(sorted.length - 1) * 9 / 10])
        + values.unit().suffix()
        + "."
        + line
        + " "
        + String.join(". ", notes)
        + ".";
  }
}
