package connate.heterogeneity;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * The Lorenz curve of flow capacity over storage capacity, and its coefficient: 0 for a uniform
 * rock, towards 1 where a thin part carries the flow.
 *
 * <pre>L = 2 (∫ F dC − 1/2),  F = Σ k h / total,  C = Σ φ h / total</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k, φ, h</td><td>permeability, porosity, thickness of a layer</td><td>mD, 1, m</td></tr>
 * <tr><td>F, C</td><td>cumulative flow and storage capacity</td><td>1</td></tr>
 * </table>
 *
 * <p>The classic curve takes the layers by k/φ, largest first; the modified curve takes them from
 * the top down, so that its slope shows the speed of each flow unit, and its area may be negative.
 *
 * <p><b>Valid</b> for layers of one reservoir; few layers underestimate L.
 *
 * <p><b>Source</b>: Schmalz and Rahme (1950), Producers Monthly 15(9), 9–12; in depth order: Gunter
 * and others (1997), SPE 38679.
 *
 * <p><b>Checked</b> in {@code LorenzTest}.
 */
public final class Lorenz implements Listed {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("lorenz", "Lorenz coefficient")
          .equation("L = 2 (∫ F dC - 1/2), F = Σ k h / total, C = Σ φ h / total")
          .input("k", "permeability", Units.mD, Range.from(0))
          .input("φ", "porosity", Units.fraction, Range.PART)
          .input("h", "thickness", Units.m, Range.POSITIVE)
          .result("L", "Lorenz coefficient", Units.number)
          .source(
              "Schmalz and Rahme (1950), Producers Monthly 15(9), 9–12; in depth order Gunter and"
                  + " others (1997), SPE 38679")
          .constants(Constants.EXACT)
          .topics("heterogeneity", "flow capacity", "storage capacity", "layers")
          .note("Layers by k/φ, not by k. Not unique: different rocks may share one L.")
          .build();

  private final double[] storage;
  private final double[] flow;
  private final boolean byDepth;

  private Lorenz(double[] storage, double[] flow, boolean byDepth) {
    this.storage = storage;
    this.flow = flow;
    this.byDepth = byDepth;
  }

  /** Returns the curve with the layers by k/φ, largest first. */
  public static Lorenz of(Series permeability, Series porosity, Series thickness) {
    return curve(permeability, porosity, thickness, false);
  }

  /** Returns the curve with the layers in the order in which they stand, from the top down. */
  public static Lorenz inDepthOrder(Series permeability, Series porosity, Series thickness) {
    return curve(permeability, porosity, thickness, true);
  }

  /** Returns the coefficient of a lognormal k/φ: erf(σ/2). */
  public static Ratio ofLogSpread(double sdOfLn) {
    Listening.used(CARD);
    return Units.number(org.apache.commons.math3.special.Erf.erf(sdOfLn / 2));
  }

  /** Returns twice the area between curve and diagonal. */
  public Ratio coefficient() {
    double area = 0;
    for (int i = 1; i < flow.length; i++) {
      area += (storage[i] - storage[i - 1]) * (flow[i] + flow[i - 1]) / 2;
    }
    return Units.number(2 * (area - 0.5));
  }

  /** Returns the cumulative storage capacity, from 0 to 1. */
  public Series storage() {
    return Series.of("storage capacity", Units.fraction, storage);
  }

  /** Returns the cumulative flow capacity, from 0 to 1. */
  public Series flow() {
    return Series.of("flow capacity", Units.fraction, flow);
  }

  /** Returns whether the layers stand in the order of depth. */
  public boolean isByDepth() {
    return byDepth;
  }

  private static Lorenz curve(Series k, Series phi, Series h, boolean byDepth) {
    double[] perm = k.in(Units.mD);
    double[] por = phi.in(Units.fraction);
    double[] thick = h.in(Units.m);
    if (perm.length != por.length || perm.length != thick.length) {
      throw new IllegalArgumentException(
          "permeability, porosity and thickness have "
              + perm.length
              + ", "
              + por.length
              + " and "
              + thick.length
              + " rows");
    }
    int[] order =
        IntStream.range(0, perm.length)
            .filter(i -> perm[i] >= 0 && por[i] > 0 && thick[i] > 0)
            .boxed()
            .sorted(
                byDepth
                    ? Comparator.naturalOrder()
                    : Comparator.comparingDouble(i -> -perm[i] / por[i]))
            .mapToInt(Integer::intValue)
            .toArray();
    if (order.length < 2) {
      throw new IllegalArgumentException("a Lorenz curve needs at least two layers");
    }
    Listening.used(CARD);
    return cumulate(order, perm, por, thick, byDepth);
  }

  private static Lorenz cumulate(
      int[] order, double[] k, double[] phi, double[] h, boolean byDepth) {
    double[] c = new double[order.length + 1];
    double[] f = new double[order.length + 1];
    for (int i = 0; i < order.length; i++) {
      int row = order[i];
      c[i + 1] = c[i] + phi[row] * h[row];
      f[i + 1] = f[i] + k[row] * h[row];
    }
    double allStorage = c[order.length];
    double allFlow = f[order.length];
    if (!(allFlow > 0)) {
      throw new IllegalArgumentException("no layer has a permeability above zero");
    }
    for (int i = 0; i < c.length; i++) {
      c[i] /= allStorage;
      f[i] /= allFlow;
    }
    return new Lorenz(c, f, byDepth);
  }

  @Override
  public Listing listing() {
    return Listing.titled("Lorenz curve" + (byDepth ? ", layers from the top down" : ""))
        .column("layers")
        .column("coefficient")
        .row(flow.length - 1, coefficient())
        .build();
  }

  @Override
  public String toString() {
    return "Lorenz coefficient " + coefficient() + " of " + (flow.length - 1) + " layers";
  }
}
