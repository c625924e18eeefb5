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
 * How often values fall into bins of one width; on a log axis the bins are of one width in decades.
 */
public final class Histogram extends PlottedFigure {

  private static final int MOST_BINS = 500;

  private final Series values;
  private final boolean log;
  private final int bins;
  private final Labels groups;
  private final List<Law> laws;

  /** A law over the bins; one without a distribution is fitted to what is drawn. */
  private record Law(String kind, Distribution distribution) {}

  private Histogram(Series values, boolean log, int bins, Labels groups, List<Law> laws) {
    this.values = values;
    this.log = log;
    this.bins = bins;
    this.groups = groups;
    this.laws = List.copyOf(laws);
  }

  static Histogram of(Series values) {
    return new Histogram(values, Crossplot.isLog(values.unit()), 0, null, List.of());
  }

  /** Returns it on a log axis. */
  public Histogram logAxis() {
    return new Histogram(values, true, bins, groups, laws);
  }

  /** Returns it on an even axis. */
  public Histogram linearAxis() {
    return new Histogram(values, false, bins, groups, laws);
  }

  /** Returns it with so many bins. */
  public Histogram bins(int count) {
    if (count < 1 || count > MOST_BINS) {
      throw new IllegalArgumentException(
          "a histogram has 1 to " + MOST_BINS + " bins, found " + count);
    }
    return new Histogram(values, log, count, groups, laws);
  }

  /** Returns it with an outline for each of the words, one for each row. */
  public Histogram byGroup(Labels words) {
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
    return new Histogram(values, log, bins, words, laws);
  }

  /** Returns it with an outline for each value of a column, which must have few. */
  public Histogram byGroup(Series classes) {
    return byGroup(Groups.words(classes));
  }

  /** Returns it with the normal law of the same mean and standard deviation. */
  public Histogram normal() {
    return law(new Law("normal", null));
  }

  /** Returns it with the lognormal law of the same mean and standard deviation of logarithms. */
  public Histogram lognormal() {
    return law(new Law("lognormal", null));
  }

  /** Returns it with a law whose numbers are in the unit of the values. */
  public Histogram law(Distribution distribution) {
    return law(new Law(distribution.words(), distribution));
  }

  private Histogram law(Law law) {
    List<Law> all = new ArrayList<>(laws);
    all.add(law);
    return new Histogram(values, log, bins, groups, all);
  }

  @Override
  Plot plot() {
    double[] all = values.values();
    Rows rows = Rows.of(new boolean[] {log}, all).needing("a histogram", "«" + values.name() + "»");
    double[] drawn = rows.of(all);
    Bins cut = Bins.of(drawn, log, bins);
    List<Layer> layers = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    notes.add(rows.note());
    double highest = bars(rows, all, cut, layers, notes);
    highest = Math.max(highest, curves(drawn, cut, layers));
    Axis across = Axis.of(Wording.axis(Wording.quantity(values), log), cut.scale());
    Axis up = Axis.of("rows in a bin", LinearScale.fromZero(highest));
    String title = "How " + values.name() + " is distributed";
    return Plot.of(title, describe(drawn, cut, notes, layers), Panel.of(across, up, layers), notes);
  }

  private double bars(Rows rows, double[] all, Bins cut, List<Layer> layers, List<String> notes) {
    if (groups == null) {
      double[] counts = cut.count(rows.of(all));
      layers.add(cut.boxes(counts));
      return Arrays.stream(counts).max().orElse(1);
    }
    Groups found = Groups.of(groups, rows.kept());
    double highest = 1;
    int next = 0;
    for (Map.Entry<String, int[]> group : found.rows().entrySet()) {
      double[] counts = cut.count(Rows.pick(all, group.getValue()));
      highest = Math.max(highest, Arrays.stream(counts).max().orElse(1));
      layers.add(cut.outline(counts, Look.of(next++), group.getKey()));
    }
    notes.add(found.sizes());
    return highest;
  }

  private double curves(double[] drawn, Bins cut, List<Layer> layers) {
    double highest = 0;
    int next = 0;
    for (Law law : laws) {
      Distribution distribution = law.distribution() == null ? fit(law, drawn) : law.distribution();
      Sampled curve = cut.expected(distribution, drawn.length);
      highest = Math.max(highest, Arrays.stream(curve.y()).max().orElse(0));
      Look look = new Look(Theme.LINES[2 + next % 2], Look.of(0).mark(), Look.of(next).dash(), '*');
      layers.add(new Layer.Stroke(curve.x(), curve.y(), look, Theme.LINE, distribution.words()));
      next++;
    }
    return highest;
  }

  private Distribution fit(Law law, double[] drawn) {
    boolean lognormal = law.kind().equals("lognormal");
    double[] used = lognormal ? logs(drawn) : drawn;
    double mean = Arrays.stream(used).average().orElseThrow();
    double squares = Arrays.stream(used).map(v -> (v - mean) * (v - mean)).sum();
    double sd = StrictMath.sqrt(squares / (used.length - 1));
    if (!(sd > 0)) {
      throw new IllegalArgumentException(
          "no law can be fitted to «" + values.name() + "»: its values do not vary");
    }
    return lognormal
        ? Distributions.lognormal(StrictMath.exp(mean), sd)
        : Distributions.normal(mean, sd);
  }

  private double[] logs(double[] drawn) {
    double[] out = new double[drawn.length];
    for (int i = 0; i < out.length; i++) {
      if (!(drawn[i] > 0)) {
        throw new IllegalArgumentException(
            "a lognormal law has no value at or below 0; «"
                + values.name()
                + "» has "
                + Numbers.text(drawn[i])
                + values.unit().suffix()
                + ": draw it on a log axis");
      }
      out[i] = StrictMath.log(drawn[i]);
    }
    return out;
  }

  private String describe(double[] drawn, Bins cut, List<String> notes, List<Layer> layers) {
    double[] sorted = drawn.clone();
    Arrays.sort(sorted);
    StringBuilder out = new StringBuilder("Histogram of ");
    out.append(Wording.axis(Wording.quantity(values), log)).append(", ");
    out.append(Wording.range(drawn, values.unit())).append(" in ");
    out.append(Wording.count(cut.size(), "bin")).append(". Half of the values lie below ");
    out.append(Numbers.text(median(sorted))).append(values.unit().suffix()).append('.');
    for (Layer layer : layers) {
      if (layer instanceof Layer.Stroke stroke && groups == null) {
        out.append(" Law: ").append(stroke.label()).append('.');
      }
    }
    return out.append(' ').append(String.join(". ", notes)).append('.').toString();
  }

  private static double median(double[] sorted) {
    int half = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
  }
}
