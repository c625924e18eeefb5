package connate.figure;

import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Curve;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * One or more columns as lines over another: a burial curve, porosity against depth, a sieve curve.
 *
 * <p>Depths grow downwards, ages run from old to young; columns of permeability, hydraulic
 * conductivity and grain size stand on log axes unless told otherwise.
 */
public final class CurvePlot extends PlottedFigure {

  private static final int FEW = 3;

  private final Series x;
  private final List<Series> columns;
  private final Options options;

  private record Options(
      boolean logX,
      boolean logY,
      boolean downwards,
      boolean points,
      String name,
      List<Curve> lines) {}

  private CurvePlot(Series x, List<Series> columns, Options options) {
    this.x = x;
    this.columns = List.copyOf(columns);
    this.options = options;
  }

  static CurvePlot of(Series x, Series... columns) {
    if (columns.length == 0) {
      throw new IllegalArgumentException(
          "name at least one column to draw over «" + x.name() + "»");
    }
    for (Series column : columns) {
      Sampled.check(column.name(), "y", column.unit(), columns[0].unit());
      if (column.size() != x.size()) {
        throw new IllegalArgumentException(
            "«"
                + column.name()
                + "» has "
                + column.size()
                + " rows, «"
                + x.name()
                + "» "
                + x.size());
      }
    }
    boolean down = isDepth(x) && !isDepth(columns[0]);
    Options usual = new Options(isLog(x), isLog(columns[0]), down, false, "", List.of());
    return new CurvePlot(x, List.of(columns), usual);
  }

  private static boolean isLog(Series series) {
    String name = series.name().toLowerCase(Locale.ROOT);
    boolean grain =
        series.unit().dimension() == Length.DIMENSION
            && (name.contains("grain") || name.contains("sieve") || name.contains("mesh"));
    return grain || Crossplot.isLog(series.unit());
  }

  private static boolean isDepth(Series series) {
    String name = series.name().toLowerCase(Locale.ROOT);
    return series.unit().dimension() == Length.DIMENSION
        && (name.contains("depth") || name.equals("dept") || name.contains("burial"));
  }

  private static boolean isAge(Series series) {
    return series.unit().equals(Units.Ma);
  }

  private CurvePlot with(boolean logX, boolean logY, boolean down, boolean points) {
    return new CurvePlot(
        x, columns, new Options(logX, logY, down, points, options.name(), options.lines()));
  }

  /** Returns it with a log axis for the columns. */
  public CurvePlot logAxis() {
    return with(options.logX(), true, options.downwards(), options.points());
  }

  /** Returns it with an even axis for the columns. */
  public CurvePlot linearAxis() {
    return with(options.logX(), false, options.downwards(), options.points());
  }

  /** Returns it with a log axis for the common column. */
  public CurvePlot logX() {
    return with(true, options.logY(), options.downwards(), options.points());
  }

  /** Returns it with an even axis for the common column. */
  public CurvePlot linearX() {
    return with(false, options.logY(), options.downwards(), options.points());
  }

  /** Returns it with the common column growing downwards on the upright axis. */
  public CurvePlot downwards() {
    return with(options.logX(), options.logY(), true, options.points());
  }

  /** Returns it with the common column on the level axis. */
  public CurvePlot across() {
    return with(options.logX(), options.logY(), false, options.points());
  }

  /** Returns it with a point at each row. */
  public CurvePlot points() {
    return with(options.logX(), options.logY(), options.downwards(), true);
  }

  /** Returns it with a name for what all columns measure, such as {@code porosity}. */
  public CurvePlot quantity(String name) {
    Options o = options;
    return new CurvePlot(
        x, columns, new Options(o.logX(), o.logY(), o.downwards(), o.points(), name, o.lines()));
  }

  /** Returns it with the line of a function. */
  public CurvePlot line(Curve curve) {
    Sampled.check(curve.label(), "common", curve.xUnit(), x.unit());
    Sampled.check(curve.label(), "other", curve.yUnit(), columns.get(0).unit());
    List<Curve> all = new ArrayList<>(options.lines());
    all.add(curve);
    return new CurvePlot(
        x,
        columns,
        new Options(
            options.logX(),
            options.logY(),
            options.downwards(),
            options.points(),
            options.name(),
            all));
  }

  @Override
  Plot plot() {
    double[] xs = x.values();
    List<double[]> ys = columns.stream().map(c -> c.in(columns.get(0).unit())).toList();
    List<String> notes = new ArrayList<>();
    List<double[]> drawnX = new ArrayList<>();
    List<double[]> drawnY = new ArrayList<>();
    for (int i = 0; i < columns.size(); i++) {
      Rows rows = Rows.of(new boolean[] {options.logX(), options.logY()}, xs, ys.get(i));
      rows.needing("a line", "«" + columns.get(i).name() + "» over «" + x.name() + "»");
      drawnX.add(rows.of(xs));
      drawnY.add(rows.of(ys.get(i)));
      notes.add((columns.size() > 1 ? columns.get(i).name() + ": " : "") + rows.note());
    }
    Axis common = common(drawnX.toArray(new double[0][]));
    Axis other = other(drawnY.toArray(new double[0][]));
    List<Layer> layers = layers(xs, ys);
    lines(common, layers);
    Panel panel =
        Panel.of(
            options.downwards() ? other : common, options.downwards() ? common : other, layers);
    return Plot.of(
        heading(), describe(drawnX, drawnY, notes), panel, List.of(String.join("; ", notes)));
  }

  private Axis common(double[][] drawn) {
    String title = Wording.axis(Wording.quantity(x), options.logX());
    Scale scale = Scale.around(options.logX(), drawn);
    return new Axis(title, scale, options.downwards() || isAge(x));
  }

  private Axis other(double[][] drawn) {
    Series first = columns.get(0);
    boolean log = options.logY();
    String title = Wording.axis(Wording.quantity(quantityName(), first.unit()), log);
    return new Axis(title, Scale.around(log, drawn), isDepth(first) && !options.downwards());
  }

  /** Returns one name for all columns: the given one, or theirs, or their dimension. */
  private String quantityName() {
    if (!options.name().isEmpty()) {
      return options.name();
    }
    return columns.size() <= FEW
        ? Wording.list(columns.stream().map(Series::name).toList())
        : columns.get(0).unit().dimension().name();
  }

  private List<Layer> layers(double[] xs, List<double[]> ys) {
    List<Layer> layers = new ArrayList<>();
    boolean many = columns.size() + options.lines().size() > 1;
    for (int i = 0; i < columns.size(); i++) {
      double[] y = ys.get(i);
      Look look = Look.of(i);
      String label = many ? columns.get(i).name() : "";
      layers.add(new Layer.Stroke(up(xs, y), up(y, xs), look, Theme.LINE, label));
      if (options.points()) {
        layers.add(new Layer.Dots(up(xs, y), up(y, xs), look, Theme.POINT + 2, ""));
      }
    }
    return layers;
  }

  private void lines(Axis common, List<Layer> layers) {
    double[] places = Sampled.places(common);
    int next = columns.size();
    for (Curve curve : options.lines()) {
      Unit<?>[] from = {x.unit(), curve.xUnit()};
      Unit<?>[] to = {curve.yUnit(), columns.get(0).unit()};
      double[] y = Sampled.of(places, curve::y, from, to).y();
      layers.add(
          new Layer.Stroke(
              up(places, y), up(y, places), Look.of(next++), Theme.LINE, curve.label()));
    }
  }

  /** Returns what goes across: the first where the common column does, else the second. */
  private double[] up(double[] first, double[] second) {
    return options.downwards() ? second : first;
  }

  private String heading() {
    return Wording.list(columns.stream().map(Series::name).toList()) + " against " + x.name();
  }

  private String describe(List<double[]> xs, List<double[]> ys, List<String> notes) {
    StringBuilder out = new StringBuilder("Lines over ");
    out.append(Wording.axis(Wording.quantity(x), options.logX())).append(", ");
    out.append(Wording.range(join(xs), x.unit())).append('.');
    for (int i = 0; i < columns.size(); i++) {
      Series column = columns.get(i);
      double[] y = ys.get(i);
      out.append(' ').append(Wording.quantity(column.name(), columns.get(0).unit()));
      out.append(": ").append(Wording.range(y, columns.get(0).unit())).append(", first ");
      out.append(connate.quantity.Numbers.text(y[0])).append(", last ");
      out.append(connate.quantity.Numbers.text(y[y.length - 1])).append('.');
    }
    options.lines().forEach(line -> out.append(" Line: ").append(line.label()).append('.'));
    return out.append(' ').append(String.join("; ", notes)).append('.').toString();
  }

  private static double[] join(List<double[]> columns) {
    return columns.stream().flatMapToDouble(Arrays::stream).toArray();
  }
}
