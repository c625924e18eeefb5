package connate.layers;

import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * One zone in one well: the log samples that lie in it, each with the thickness that it stands for,
 * which is half the way to its neighbours, cut at the zone's top and base.
 */
public final class Layer {

  private final String well;
  private final String zone;
  private final double gross;
  private final double[] thickness;
  private final boolean[] net;
  private final Map<String, Series> curves;

  private Layer(
      String well,
      String zone,
      double gross,
      double[] thickness,
      boolean[] net,
      Map<String, Series> curves) {
    this.well = well;
    this.zone = zone;
    this.gross = gross;
    this.thickness = thickness;
    this.net = net;
    this.curves = curves;
  }

  /**
   * Cuts a layer out of a well's logs.
   *
   * @param well the well's name
   * @param zone the zone's name
   * @param top the depth of its top
   * @param base the depth of its base
   * @param depth the depth of each sample, rising or falling
   * @param curves the logs by name, as long as depth
   * @throws IllegalArgumentException if the base is not below the top
   */
  public static Layer of(
      String well, String zone, Length top, Length base, Series depth, Map<String, Series> curves) {
    if (!top.isBelow(base)) {
      throw new IllegalArgumentException(
          well + ": the top of " + zone + " at " + top + " is not above its base at " + base);
    }
    double from = top.metres();
    double to = base.metres();
    double[] thickness = thicknesses(depth.in(Units.m), from, to);
    boolean[] net = new boolean[thickness.length];
    for (int row = 0; row < net.length; row++) {
      net[row] = thickness[row] > 0;
    }
    return new Layer(well, zone, to - from, thickness, net, new TreeMap<>(curves));
  }

  /** Returns the well's name. */
  public String well() {
    return well;
  }

  /** Returns the zone's name. */
  public String zone() {
    return zone;
  }

  /** Returns the thickness from top to base. */
  public Length gross() {
    return Units.m(gross);
  }

  /** Returns the thickness of the samples that count. */
  public Length net() {
    double sum = 0;
    for (int row = 0; row < net.length; row++) {
      sum += net[row] ? thickness[row] : 0;
    }
    return Units.m(sum);
  }

  /** Returns the names of the logs. */
  public Set<String> curves() {
    return Set.copyOf(curves.keySet());
  }

  /**
   * Returns the layer with only those samples counting that a cutoff admits; missing ones do not.
   */
  Layer where(String curve, Cutoff cutoff) {
    Series series = curve(curve);
    double limit = inUnitOf(series, cutoff);
    boolean[] next = new boolean[net.length];
    for (int row = 0; row < next.length; row++) {
      double value = series.value(row);
      next[row] = net[row] && cutoff.admits(value, limit);
    }
    return new Layer(well, zone, gross, thickness, next, curves);
  }

  private static double inUnitOf(Series series, Cutoff cutoff) {
    return Series.of("cutoff", cutoff.limit().unit(), cutoff.limit().number()).in(series.unit())[0];
  }

  /** Returns values and thicknesses of the samples that count and have a value. */
  Weighted weighted(String curve, Unit<?> unit) {
    double[] values = curve(curve).in(unit);
    double[] v = new double[values.length];
    double[] w = new double[values.length];
    int n = 0;
    for (int row = 0; row < values.length; row++) {
      if (net[row] && !Double.isNaN(values[row])) {
        v[n] = values[row];
        w[n++] = thickness[row];
      }
    }
    return new Weighted(java.util.Arrays.copyOf(v, n), java.util.Arrays.copyOf(w, n));
  }

  private Series curve(String name) {
    Series series = curves.get(name);
    if (series == null) {
      throw new IllegalArgumentException(
          well + " has no log «" + name + "», but " + String.join(", ", curves.keySet()));
    }
    return series;
  }

  private static double[] thicknesses(double[] depth, double from, double to) {
    double[] out = new double[depth.length];
    for (int row = 0; row < depth.length; row++) {
      double before = row > 0 ? (depth[row - 1] + depth[row]) / 2 : edge(depth, row, 1);
      double after =
          row < depth.length - 1 ? (depth[row] + depth[row + 1]) / 2 : edge(depth, row, -1);
      double low = Math.max(from, Math.min(before, after));
      double high = Math.min(to, Math.max(before, after));
      out[row] = Math.max(0, high - low);
    }
    return out;
  }

  /** At the ends of a log a sample reaches as far outwards as inwards. */
  private static double edge(double[] depth, int row, int inwards) {
    return depth.length == 1 ? depth[row] : depth[row] - (depth[row + inwards] - depth[row]) / 2;
  }

  @Override
  public String toString() {
    return zone + " in " + well + ": gross " + gross() + ", net " + net();
  }
}
