package connate.figure;

import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.series.Series;
import connate.well.Tops;
import connate.well.Well;
import connate.well.Zone;
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
  private static final int FEW = 5;
  private static final List<String> USUAL =
      List.of(
          "gamma ray",
          "deep resistivity",
          "bulk density",
          "neutron porosity",
          "sonic",
          "porosity",
          "permeability");

  private final Well well;
  private final String name;
  private final Unit<?> depthUnit;
  private final List<Track> tracks;
  private final List<Layer.Zone> zones;
  private final double[] between;

  private DepthPlot(
      Well well,
      String name,
      Unit<?> depthUnit,
      List<Track> tracks,
      List<Layer.Zone> zones,
      double[] between) {
    this.well = well;
    this.name = name;
    this.depthUnit = depthUnit;
    this.tracks = List.copyOf(tracks);
    this.zones = List.copyOf(zones);
    this.between = between;
  }

  static DepthPlot of(Series... logs) {
    DepthPlot plot = new DepthPlot(null, "", null, List.of(), List.of(), null);
    for (Series log : logs) {
      plot = plot.track(log);
    }
    return plot;
  }

  static DepthPlot of(Well well) {
    return new DepthPlot(well, well.name(), well.depth().unit(), List.of(), List.of(), null);
  }

  /** Returns it under another name. */
  public DepthPlot named(String other) {
    return new DepthPlot(well, other, depthUnit, tracks, zones, between);
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

  /**
   * Returns it with one more track: a curve of the well as a line, and what lies over it as points.
   *
   * @param curve the curve's mnemonic or role
   * @param points columns that know their depth, such as core values
   * @throws IllegalArgumentException if the plot is not of a well, or the well has no such curve
   */
  public DepthPlot track(String curve, Series... points) {
    return added(needWell("a curve by its name").get(curve), points);
  }

  private Well needWell(String what) {
    if (well == null) {
      throw new IllegalArgumentException(
          "this depth plot is not of a well, so it cannot find "
              + what
              + ": give a column, or"
              + " start with depthPlot(well)");
    }
    return well;
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
    Track track =
        new Track(log, List.of(points), Track.isLog((log == null ? points[0] : log).unit()));
    all.add(track);
    Unit<?> unit = depthUnit == null ? Track.depth(track.first()).unit() : depthUnit;
    for (Series series : points) {
      Track.depth(series);
      Sampled.check(series.name(), track.first().name(), series.unit(), track.first().unit());
    }
    return new DepthPlot(well, name, unit, all, zones, between);
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
    return new DepthPlot(well, name, depthUnit, all, zones, between);
  }

  /** Returns it with one more zone. */
  public DepthPlot zone(String zone, Length top, Length base) {
    List<Layer.Zone> all = new ArrayList<>(zones);
    all.add(new Layer.Zone(top.metres(), base.metres(), zone, all.size() % 2 == 0, false));
    return new DepthPlot(well, name, depthUnit, tracks, all, between);
  }

  /** Returns it with zones, such as those of a well from its tops. */
  public DepthPlot zones(Iterable<Zone> some) {
    DepthPlot plot = this;
    for (Zone zone : some) {
      plot = plot.zone(zone.name(), zone.top(), zone.base());
    }
    return plot;
  }

  /** Returns it with the zones of its well. */
  public DepthPlot zones(Tops tops) {
    return zones(tops.zones(needWell("its zones")));
  }

  /** Returns only the part between two depths. */
  public DepthPlot between(Length top, Length base) {
    if (!(top.metres() < base.metres())) {
      throw new IllegalArgumentException("the top at " + top + " is not above the base at " + base);
    }
    return new DepthPlot(
        well, name, depthUnit, tracks, zones, new double[] {top.metres(), base.metres()});
  }

  @Override
  Plot plot() {
    if (tracks.isEmpty()) {
      return usual().plot();
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
      TrackPanel drawn = TrackPanel.of(track, depth, depthUnit, bands);
      panels.add(drawn.panel());
      notes.addAll(drawn.notes());
      out.append(' ').append(drawn.words()).append('.');
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

  /** Returns the curves that a well is usually looked at by, or else its first ones. */
  private DepthPlot usual() {
    if (well == null) {
      throw new IllegalArgumentException("a depth plot needs a track: add one with .track(…)");
    }
    DepthPlot plot = this;
    for (String role : USUAL) {
      if (well.has(role) && well.get(role).count() > 0) {
        plot = plot.track(role);
      }
    }
    if (plot.tracks.isEmpty()) {
      for (Series curve : well.curves().values()) {
        plot = plot.tracks.size() < FEW && curve.count() > 0 ? plot.track(curve) : plot;
      }
    }
    if (plot.tracks.isEmpty()) {
      throw new IllegalArgumentException("well " + well.name() + " has no curve with a value");
    }
    return plot;
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
    double[] at = Track.depth(series).in(depthUnit);
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
