package connate.figure;

import connate.quantity.Unit;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A track as it is drawn.
 *
 * @param panel the panel
 * @param notes how many rows of each column it shows
 * @param words axis and range
 */
record TrackPanel(Panel panel, List<String> notes, String words) {

  /** Lays out a track over a depth axis. */
  static TrackPanel of(Track track, Axis depth, Unit<?> depthUnit, List<Layer.Zone> bands) {
    LinearScale ends = (LinearScale) depth.scale();
    Unit<?> unit = track.first().unit();
    List<Layer> layers = new ArrayList<>(bands);
    List<String> notes = new ArrayList<>();
    List<double[]> drawn = new ArrayList<>();
    if (track.log() != null) {
      Cut cut = Cut.of(track.log(), unit, depthUnit, ends, track.onLog());
      layers.add(new Layer.Stroke(cut.x(), cut.depth(), logLook(), Theme.LOG_LINE, ""));
      drawn.add(cut.x());
      notes.add(cut.note(track.log().name()));
    }
    for (Series points : track.points()) {
      Cut cut = Cut.of(points, unit, depthUnit, ends, track.onLog());
      Look look = pointLook(layers.size() - bands.size());
      layers.add(new Layer.Dots(cut.x(), cut.depth(), look, Theme.POINT + 1, label(track, points)));
      drawn.add(cut.x());
      notes.add(cut.note(points.name()));
    }
    double[] all = drawn.stream().flatMapToDouble(Arrays::stream).toArray();
    if (Arrays.stream(all).allMatch(Double::isNaN)) {
      throw new IllegalArgumentException(
          "a track of «"
              + track.first().name()
              + "» has nothing to draw: "
              + String.join("; ", notes));
    }
    String head = Wording.axis(Wording.quantity(track.first()), track.onLog());
    Panel panel =
        new Panel(Axis.of(head, Scale.around(track.onLog(), all)), depth, layers, 1, true);
    return new TrackPanel(panel, notes, head + ": " + Wording.range(all, unit));
  }

  private static String label(Track track, Series points) {
    boolean alone = track.log() == null && track.points().size() == 1;
    return alone ? "" : points.name() + " (points over " + track.first().name() + ")";
  }

  private static Look logLook() {
    return new Look(Theme.LINES[0], Look.of(0).mark(), "", '*');
  }

  private static Look pointLook(int index) {
    Look look = Look.of(Math.max(0, index - 1));
    return new Look(Theme.LINES[1 + index % 4], look.mark(), "", look.letter());
  }

  /** The rows of a column inside the depths that are drawn; what cannot be drawn is NaN. */
  private record Cut(double[] x, double[] depth, int n, int missing, int notPositive) {

    static Cut of(Series series, Unit<?> unit, Unit<?> depthUnit, LinearScale ends, boolean log) {
      double[] at = Track.depth(series).in(depthUnit);
      double[] values = series.unit().equals(unit) ? series.values() : series.in(unit);
      int count = 0;
      int n = 0;
      int missing = 0;
      int low = 0;
      for (int row = 0; row < at.length; row++) {
        if (Double.isNaN(at[row]) || at[row] < ends.low() || at[row] > ends.high()) {
          continue;
        }
        boolean absent = !Double.isFinite(values[row]);
        boolean below = !absent && log && values[row] <= 0;
        missing += absent ? 1 : 0;
        low += below ? 1 : 0;
        n += absent || below ? 0 : 1;
        values[count] = absent || below ? Double.NaN : values[row];
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
}
