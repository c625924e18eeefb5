package connate.figure;

import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Permeability;
import connate.quantity.Resistivity;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.UnaryOperator;

/**
 * Logs side by side over one depth that grows downwards, with core points over the logs and zones
 * as bands through all tracks.
 *
 * <p>Tracks of permeability, hydraulic conductivity and resistivity are logarithmic unless told
 * otherwise.
 */
public final class DepthPlot extends PlottedFigure {

  private static final int HEIGHT = 720;
  private static final int TRACK = 130;
  private static final int MOST_TRACKS = 8;
  private static final double NAME_WEIGHT = 0.62;

  private final String name;
  private final Unit<?> depthUnit;
  private final List<Track> tracks;
  private final List<Layer.Zone> zones;
  private final double[] between;

  /** A log, which may be absent, with points over it. */
  private record Track(Series log, List<Series> points, boolean onLog) {

    Series first() {
      return log == null ? points.get(0) : log;
    }
  }

  private DepthPlot(
      String name,
      Unit<?> depthUnit,
      List<Track> tracks,
      List<Layer.Zone> zones,
      double[] between) {
    this.name = name;
    this.depthUnit = depthUnit;
    this.tracks = List.copyOf(tracks);
    this.zones = List.copyOf(zones);
    this.between = between;
  }

  static DepthPlot of(Series... logs) {
    DepthPlot plot = new DepthPlot("", null, List.of(), List.of(), null);
    for (Series log : logs) {
      plot = plot.track(log);
    }
    return plot;
  }

  /** Returns it under the name of a well. */
  public DepthPlot named(String well) {
    return new DepthPlot(well, depthUnit, tracks, zones, between);
  }

  /**
   * Returns it with one more track: a log as a line, and what lies over it as points.
   *
   * @param log a column that knows the depth of its rows
   * @param points columns that know theirs, such as core values
   * @throws IllegalArgumentException if one has no depth, or there are too many tracks
   */
  public DepthPlot track(Series log, Series... points) {
    return added(log, points);
  }

  /** Returns it with one more track that has points only. */
  public DepthPlot points(Series... points) {
    if (points.length == 0) {
      throw new IllegalArgumentException("name at least one column of points");
    }
    return added(null, points);
  }

  private DepthPlot added(Series log, Series... points) {
    if (tracks.size() == MOST_TRACKS) {
      throw new IllegalArgumentException(
          "a depth plot has room for " + MOST_TRACKS + " tracks; draw a second one");
    }
    List<Track> all = new ArrayList<>(tracks);
    Track track = new Track(log, List.of(points), isLog((log == null ? points[0] : log).unit()));
    all.add(track);
    Unit<?> unit = depthUnit == null ? depth(track.first()).unit() : depthUnit;
    for (Series series : points) {
      depth(series);
      Sampled.check(series.name(), track.first().name(), series.unit(), track.first().unit());
    }
    return new DepthPlot(name, unit, all, zones, between);
  }

  private static boolean isLog(Unit<?> unit) {
    return unit.dimension() == Permeability.DIMENSION
        || unit.dimension() == HydraulicConductivity.DIMENSION
        || unit.dimension() == Resistivity.DIMENSION;
  }

  private static Series depth(Series series) {
    return series
        .depth()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "«"
                        + series.name()
                        + "» does not know the depth of its rows: give it with"
                        + " .atDepth(depth)"));
  }

  /** Returns it with the last track on a log axis. */
  public DepthPlot logAxis() {
    return last(t -> new Track(t.log(), t.points(), true));
  }

  /** Returns it with the last track on an even axis. */
  public DepthPlot linearAxis() {
    return last(t -> new Track(t.log(), t.points(), false));
  }

  private DepthPlot last(UnaryOperator<Track> change) {
    if (tracks.isEmpty()) {
      throw new IllegalArgumentException("there is no track yet: add one with .track(…)");
    }
    List<Track> all = new ArrayList<>(tracks);
    all.set(all.size() - 1, change.apply(all.get(all.size() - 1)));
    return new DepthPlot(name, depthUnit, all, zones, between);
  }

  /** Returns it with one more zone. */
  public DepthPlot zone(String zone, Length top, Length base) {
    List<Layer.Zone> all = new ArrayList<>(zones);
    all.add(new Layer.Zone(top.metres(), base.metres(), zone, all.size() % 2 == 0, false));
    return new DepthPlot(name, depthUnit, tracks, all, between);
  }

  /** Returns only the part between two depths. */
  public DepthPlot between(Length top, Length base) {
    if (!(top.metres() < base.metres())) {
      throw new IllegalArgumentException("the top at " + top + " is not above the base at " + base);
    }
    return new DepthPlot(
        name, depthUnit, tracks, zones, new double[] {top.metres(), base.metres()});
  }

  @Override
  Plot plot() {
    if (tracks.isEmpty()) {
      throw new IllegalArgumentException("a depth plot needs a track: add one with .track(…)");
    }
    Axis depth = depthAxis();
    List<Panel> panels = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    List<Layer.Zone> bands = bands(depth);
    if (!bands.isEmpty()) {
      panels.add(new Panel(names(), depth, named(bands), NAME_WEIGHT, true));
    }
    StringBuilder out = new StringBuilder("Depth plot");
    out.append(name.isEmpty() ? "" : " of " + name).append(", ");
    out.append(Wording.range(ends(depth), depthUnit)).append('.');
    for (Track track : tracks) {
      panels.add(panel(track, depth, bands, notes, out));
    }
    if (!bands.isEmpty()) {
      out.append(" Zones: ");
      out.append(Wording.list(bands.stream().map(Layer.Zone::name).toList())).append('.');
    }
    String logs = Wording.list(tracks.stream().map(t -> t.first().name()).toList());
    List<String> note = List.of(String.join("; ", notes));
    return new Plot(
        (name.isEmpty() ? "" : name + ": ") + logs + " against depth",
        out + " " + note.get(0) + ".",
        panels,
        note,
        Math.max(Plot.WIDTH, 120 + TRACK * panels.size()),
        HEIGHT);
  }

  private static Axis names() {
    return Axis.of("", new NameScale(List.of("")));
  }

  private static double[] ends(Axis depth) {
    LinearScale scale = (LinearScale) depth.scale();
    return new double[] {scale.low(), scale.high()};
  }

  private static List<Layer> named(List<Layer.Zone> bands) {
    List<Layer> named = new ArrayList<>();
    for (Layer.Zone b : bands) {
      named.add(new Layer.Zone(b.from(), b.to(), b.name(), b.shaded(), true));
    }
    return named;
  }

  private Axis depthAxis() {
    List<double[]> depths = new ArrayList<>();
    for (Track track : tracks) {
      if (track.log() != null) {
        depths.add(depthsWithValue(track.log()));
      }
      track.points().forEach(p -> depths.add(depthsWithValue(p)));
    }
    double[] ends;
    if (between != null) {
      ends = new double[] {fromMetres(between[0]), fromMetres(between[1])};
    } else {
      if (depths.stream().allMatch(d -> d.length == 0)) {
        throw new IllegalArgumentException("a depth plot has nothing to draw: no row has a value");
      }
      ends = Extent.of(Double.NEGATIVE_INFINITY, depths.toArray(new double[0][]));
    }
    double room = between != null ? 0 : Math.max((ends[1] - ends[0]) * 0.01, 1e-3);
    String title = "depth" + Wording.unit(depthUnit);
    return new Axis(title, new LinearScale(ends[0] - room, ends[1] + room), true);
  }

  private double[] depthsWithValue(Series series) {
    double[] at = depth(series).in(depthUnit);
    double[] out = new double[at.length];
    int count = 0;
    for (int row = 0; row < at.length; row++) {
      if (Double.isFinite(series.value(row)) && Double.isFinite(at[row])) {
        out[count++] = at[row];
      }
    }
    return Arrays.copyOf(out, count);
  }

  private double fromMetres(double metres) {
    return connate.quantity.Units.m.convert(metres, depthUnit);
  }

  private List<Layer.Zone> bands(Axis depth) {
    double[] ends = ends(depth);
    List<Layer.Zone> bands = new ArrayList<>();
    for (Layer.Zone zone : zones) {
      double from = Math.max(ends[0], fromMetres(zone.from()));
      double to = Math.min(ends[1], fromMetres(zone.to()));
      if (from < to) {
        bands.add(new Layer.Zone(from, to, zone.name(), zone.shaded(), false));
      }
    }
    return bands;
  }

  private Panel panel(
      Track track, Axis depth, List<Layer.Zone> bands, List<String> notes, StringBuilder out) {
    double[] ends = ends(depth);
    List<Layer> layers = new ArrayList<>(bands);
    List<double[]> drawn = new ArrayList<>();
    Unit<?> unit = track.first().unit();
    int look = 0;
    if (track.log() != null) {
      Cut cut = Cut.of(track.log(), unit, depthUnit, ends, track.onLog());
      layers.add(new Layer.Stroke(cut.x(), cut.depth(), logLook(), Theme.LOG_LINE, ""));
      drawn.add(cut.x());
      notes.add(cut.note(track.log().name()));
    }
    for (Series points : track.points()) {
      Cut cut = Cut.of(points, unit, depthUnit, ends, track.onLog());
      String label =
          track.log() == null ? "" : points.name() + " (points over " + track.log().name() + ")";
      layers.add(new Layer.Dots(cut.x(), cut.depth(), pointLook(look++), Theme.POINT + 1, label));
      drawn.add(cut.x());
      notes.add(cut.note(points.name()));
    }
    double[][] columns = drawn.toArray(new double[0][]);
    boolean empty = Arrays.stream(columns).flatMapToDouble(Arrays::stream).allMatch(Double::isNaN);
    if (empty) {
      throw new IllegalArgumentException(
          "a track of «"
              + track.first().name()
              + "» has nothing to draw: "
              + String.join("; ", notes.subList(notes.size() - columns.length, notes.size())));
    }
    String head = Wording.axis(Wording.quantity(track.first()), track.onLog());
    out.append(' ').append(head).append(": ");
    out.append(
        Wording.range(Arrays.stream(columns).flatMapToDouble(Arrays::stream).toArray(), unit));
    out.append('.');
    return new Panel(Axis.of(head, Scale.around(track.onLog(), columns)), depth, layers, 1, true);
  }

  private static Look logLook() {
    return new Look(Theme.LINES[0], Look.of(0).mark(), "", '*');
  }

  private static Look pointLook(int index) {
    Look look = Look.of(index);
    return new Look(Theme.LINES[2 - index % 3], look.mark(), "", look.letter());
  }

  /** The rows of a column inside the depths that are drawn; what cannot be drawn is NaN. */
  private record Cut(double[] x, double[] depth, int n, int missing, int notPositive) {

    static Cut of(Series series, Unit<?> unit, Unit<?> depthUnit, double[] ends, boolean log) {
      double[] at = DepthPlot.depth(series).in(depthUnit);
      double[] values = series.unit().equals(unit) ? series.values() : series.in(unit);
      int count = 0;
      int n = 0;
      int missing = 0;
      int low = 0;
      for (int row = 0; row < at.length; row++) {
        if (Double.isNaN(at[row]) || at[row] < ends[0] || at[row] > ends[1]) {
          continue;
        }
        double value = values[row];
        boolean absent = !Double.isFinite(value);
        boolean below = !absent && log && value <= 0;
        missing += absent ? 1 : 0;
        low += below ? 1 : 0;
        n += absent || below ? 0 : 1;
        values[count] = absent || below ? Double.NaN : value;
        at[count++] = at[row];
      }
      return new Cut(Arrays.copyOf(values, count), Arrays.copyOf(at, count), n, missing, low);
    }

    String note(String name) {
      StringBuilder out = new StringBuilder(name).append(" n = ").append(n);
      if (n < x.length) {
        out.append(" of ").append(x.length).append(" (not drawn:");
        out.append(missing > 0 ? " " + missing + " missing" : "");
        out.append(missing > 0 && notPositive > 0 ? "," : "");
        out.append(notPositive > 0 ? " " + notPositive + " zero or negative on a log axis" : "");
        out.append(')');
      }
      return out.toString();
    }
  }

  /** Returns what it is, with the number of tracks. */
  @Override
  public String toString() {
    return "depth plot"
        + (name.isEmpty() ? "" : " of " + name)
        + ", "
        + Numbers.text(tracks.size())
        + " tracks";
  }
}
