package connate.figure;

import connate.quantity.HydraulicConductivity;
import connate.quantity.Permeability;
import connate.quantity.Unit;
import connate.series.Band;
import connate.series.Curve;
import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.stat.correlation.SpearmansCorrelation;

/**
 * One column against another, with lines and bands over the points.
 *
 * <p>An axis of permeability or hydraulic conductivity is logarithmic unless told otherwise.
 */
public final class Crossplot extends PlottedFigure {

  private final Series x;
  private final Series y;
  private final boolean logX;
  private final boolean logY;
  private final Labels groups;
  private final List<Curve> lines;
  private final List<Band> bands;

  private Crossplot(
      Series x,
      Series y,
      boolean logX,
      boolean logY,
      Labels groups,
      List<Curve> lines,
      List<Band> bands) {
    this.x = x;
    this.y = y;
    this.logX = logX;
    this.logY = logY;
    this.groups = groups;
    this.lines = List.copyOf(lines);
    this.bands = List.copyOf(bands);
  }

  static Crossplot of(Series x, Series y) {
    if (x.size() != y.size()) {
      throw new IllegalArgumentException(
          "a crossplot needs columns of one length: «"
              + x.name()
              + "» has "
              + x.size()
              + " rows, «"
              + y.name()
              + "» "
              + y.size());
    }
    return new Crossplot(x, y, isLog(x.unit()), isLog(y.unit()), null, List.of(), List.of());
  }

  /** Tells whether columns of a unit are drawn on a log axis unless told otherwise. */
  static boolean isLog(Unit<?> unit) {
    return unit.dimension() == Permeability.DIMENSION
        || unit.dimension() == HydraulicConductivity.DIMENSION;
  }

  private Crossplot with(boolean onLogX, boolean onLogY) {
    return new Crossplot(x, y, onLogX, onLogY, groups, lines, bands);
  }

  /** Returns it with a log axis for y. */
  public Crossplot logAxis() {
    return with(logX, true);
  }

  /** Returns it with an even axis for y. */
  public Crossplot linearAxis() {
    return with(logX, false);
  }

  /** Returns it with a log axis for x. */
  public Crossplot logX() {
    return with(true, logY);
  }

  /** Returns it with an even axis for x. */
  public Crossplot linearX() {
    return with(false, logY);
  }

  /** Returns it with the points told apart by words, one for each row. */
  public Crossplot byGroup(Labels words) {
    if (words.size() != x.size()) {
      throw new IllegalArgumentException(
          "«" + words.name() + "» has " + words.size() + " rows, the columns " + x.size());
    }
    return new Crossplot(x, y, logX, logY, words, lines, bands);
  }

  /** Returns it with the points told apart by the values of a column, which must be few. */
  public Crossplot byGroup(Series classes) {
    return byGroup(Groups.words(classes));
  }

  /** Returns it with a line over the points. */
  public Crossplot line(Curve curve) {
    return lines(List.of(curve));
  }

  /** Returns it with several lines over the points. */
  public Crossplot lines(Iterable<? extends Curve> curves) {
    List<Curve> all = new ArrayList<>(lines);
    for (Curve curve : curves) {
      Sampled.check(curve.label(), "x", curve.xUnit(), x.unit());
      Sampled.check(curve.label(), "y", curve.yUnit(), y.unit());
      all.add(curve);
    }
    return new Crossplot(x, y, logX, logY, groups, all, bands);
  }

  /** Returns it with a range behind the points. */
  public Crossplot band(Band band) {
    Sampled.check(band.label(), "x", band.xUnit(), x.unit());
    Sampled.check(band.label(), "y", band.yUnit(), y.unit());
    List<Band> all = new ArrayList<>(bands);
    all.add(band);
    return new Crossplot(x, y, logX, logY, groups, lines, all);
  }

  @Override
  Plot plot() {
    double[] xs = x.values();
    double[] ys = y.values();
    String what = "«" + y.name() + "» against «" + x.name() + "»";
    Rows rows = Rows.of(new boolean[] {logX, logY}, xs, ys).needing("a crossplot", what);
    Axis across = axis(x, logX, rows.of(xs));
    Axis up = axis(y, logY, rows.of(ys));
    List<Layer> layers = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    notes.add(rows.note());
    int next = points(rows, xs, ys, layers, notes);
    over(across, next, layers);
    return Plot.of(
        y.name() + " against " + x.name(),
        describe(rows, xs, ys, notes),
        Panel.of(across, up, layers),
        notes);
  }

  private static Axis axis(Series series, boolean log, double[] drawn) {
    return Axis.of(Wording.axis(Wording.quantity(series), log), Scale.around(log, drawn));
  }

  /** Adds the points and returns how many looks are taken. */
  private int points(Rows rows, double[] xs, double[] ys, List<Layer> layers, List<String> notes) {
    if (groups == null) {
      layers.add(new Layer.Dots(rows.of(xs), rows.of(ys), Look.of(0), Theme.POINT, ""));
      return 1;
    }
    Groups found = Groups.of(groups, rows.kept());
    int next = 0;
    for (Map.Entry<String, int[]> group : found.rows().entrySet()) {
      double[] gx = Rows.pick(xs, group.getValue());
      double[] gy = Rows.pick(ys, group.getValue());
      layers.add(new Layer.Dots(gx, gy, Look.of(next++), Theme.POINT + 1, group.getKey()));
    }
    notes.add(found.sizes());
    return next;
  }

  /** Adds bands beneath and lines above the points. */
  private void over(Axis across, int next, List<Layer> layers) {
    double[] places = Sampled.places(across);
    int first = groups == null ? next : 0;
    for (int i = 0; i < bands.size(); i++) {
      Band band = bands.get(i);
      Unit<?>[] from = {x.unit(), band.xUnit()};
      Unit<?>[] to = {band.yUnit(), y.unit()};
      double[] low = Sampled.of(places, band::low, from, to).y();
      double[] high = Sampled.of(places, band::high, from, to).y();
      layers.add(i, new Layer.Ribbon(places, low, high, Look.of(first + i), band.label()));
    }
    for (int i = 0; i < lines.size(); i++) {
      Curve curve = lines.get(i);
      Unit<?>[] from = {x.unit(), curve.xUnit()};
      Unit<?>[] to = {curve.yUnit(), y.unit()};
      double[] at = Sampled.of(places, curve::y, from, to).y();
      layers.add(new Layer.Stroke(places, at, lineLook(first + i, i), Theme.LINE, curve.label()));
    }
  }

  /** Returns the look of a line: colours go on, the first line is always whole. */
  private static Look lineLook(int look, int line) {
    Look colour = Look.of(look);
    return new Look(colour.colour(), colour.mark(), Look.of(line).dash(), "-=~:".charAt(line % 4));
  }

  private String describe(Rows rows, double[] xs, double[] ys, List<String> notes) {
    StringBuilder out = new StringBuilder("Crossplot. Across: ");
    out.append(Wording.axis(Wording.quantity(x), logX)).append(", ");
    out.append(Wording.range(rows.of(xs), x.unit())).append(". Up: ");
    out.append(Wording.axis(Wording.quantity(y), logY)).append(", ");
    out.append(Wording.range(rows.of(ys), y.unit())).append(". ");
    out.append(finding(rows.of(xs), rows.of(ys)));
    lines.forEach(line -> out.append(" Line: ").append(line.label()).append('.'));
    bands.forEach(band -> out.append(" Band: ").append(band.label()).append('.'));
    return out.append(' ').append(String.join(". ", notes)).append('.').toString();
  }

  private String finding(double[] xs, double[] ys) {
    if (xs.length < 3) {
      return "Too few points for a trend.";
    }
    double rho = new SpearmansCorrelation().correlation(xs, ys);
    if (Double.isNaN(rho)) {
      return "One of the two does not vary.";
    }
    String rank =
        " (rank correlation "
            + connate.quantity.Numbers.text(StrictMath.rint(rho * 100) / 100)
            + ").";
    if (Math.abs(rho) < 0.2) {
      return y.name() + " shows no clear trend with " + x.name() + rank;
    }
    return y.name() + (rho > 0 ? " rises with " : " falls with ") + x.name() + rank;
  }
}
