package connate.layers;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Permeability;
import connate.quantity.PermeabilityThickness;
import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Estimate;
import connate.series.Listed;
import connate.series.Listing;
import connate.table.Table;
import connate.well.Tops;
import connate.well.Well;
import connate.well.Wells;
import connate.well.Zone;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.distribution.TDistribution;

/**
 * The zones of several wells, each with its log samples, and what they come to: thickness-weighted
 * means of the samples that count as net.
 *
 * <p>Along the layers flow sees the arithmetic mean of k, across them the harmonic mean; the truth
 * for a block lies between. A value over several wells is the mean over the wells weighted by net
 * thickness; its range is the 80 % interval of that mean from the differences between the wells
 * (Student's t on the logarithm for permeability). One well gives no range.
 */
public final class Layers implements Listed {

  /** Caution: a layer without a sample that counts. */
  static final String NO_NET = "Y01";

  /** Caution: a harmonic mean over a sample without permeability. */
  static final String ZERO = "Y02";

  private static final double LEVEL = 0.80;

  private final List<Layer> layers;
  private final String cutoffs;

  private Layers(List<Layer> layers, String cutoffs) {
    this.layers = List.copyOf(layers);
    this.cutoffs = cutoffs;
  }

  /** Returns the given layers. */
  public static Layers of(List<Layer> layers) {
    if (layers.isEmpty()) {
      throw new IllegalArgumentException("no layer: do the wells of tops and logs have one name?");
    }
    return new Layers(layers, "");
  }

  /**
   * Returns the zones of all wells that have tops, with the logs in them.
   *
   * @throws IllegalArgumentException if no well of the logs has tops
   */
  public static Layers of(Wells wells, Tops tops) {
    List<Layer> layers = new ArrayList<>();
    for (Well well : wells) {
      if (tops.has(well.name())) {
        for (Zone zone : tops.zones(well)) {
          layers.add(
              Layer.of(
                  well.name(), zone.name(), zone.top(), zone.base(), well.depth(), well.curves()));
        }
      }
    }
    return of(layers);
  }

  /** Returns the zones of all wells that a table of tops knows, with the logs in them. */
  public static Layers of(Wells wells, Table tops) {
    return of(wells, Tops.of(tops));
  }

  /** Returns the layers. */
  public List<Layer> layers() {
    return layers;
  }

  /** Returns the layers with only those samples counting as net that a cutoff admits. */
  public Layers where(String curve, Cutoff cutoff) {
    String words = curve + " " + cutoff;
    return new Layers(
        layers.stream().map(l -> l.where(curve, cutoff)).toList(),
        cutoffs.isEmpty() ? words : cutoffs + ", " + words);
  }

  /** Returns the layers of one zone. */
  public Layers in(String zone) {
    return chosen("zone", zone, layers.stream().filter(l -> l.zone().equals(zone)).toList());
  }

  /** Returns the layers of one well. */
  public Layers well(String well) {
    return chosen("well", well, layers.stream().filter(l -> l.well().equals(well)).toList());
  }

  private Layers chosen(String what, String name, List<Layer> some) {
    if (some.isEmpty()) {
      List<String> known =
          layers.stream().map(what.equals("zone") ? Layer::zone : Layer::well).distinct().toList();
      throw new IllegalArgumentException(
          "no " + what + " «" + name + "», but " + String.join(", ", known));
    }
    return new Layers(some, cutoffs);
  }

  /** Returns the mean permeability for flow along the layers. */
  public Estimate<Permeability> arithmetic(String curve) {
    return permeability(curve, Weighted::along);
  }

  /** Returns the mean permeability for flow across the layers. */
  public Estimate<Permeability> harmonic(String curve) {
    Estimate<Permeability> k = permeability(curve, Weighted::across);
    if (k.value().si() == 0) {
      Listening.caution(
          Caution.of(
              ZERO,
              curve,
              "a sample without permeability stops all flow across the layers: the"
                  + " harmonic mean is 0"));
    }
    return k;
  }

  /** Returns the geometric mean permeability. */
  public Estimate<Permeability> geometric(String curve) {
    return permeability(curve, Weighted::geometric);
  }

  /** Returns the mean of a fraction such as porosity. */
  public Estimate<Fraction> mean(String curve) {
    return overWells(curve, Units.fraction, Weighted::arithmetic, false);
  }

  /** Returns permeability times net thickness, the mean over the wells. */
  public Estimate<PermeabilityThickness> kh(String curve) {
    Sums sums = new Sums(LEVEL);
    withNet(curve, Units.mD).forEach(w -> sums.add(w.sumOfProducts(), 1));
    return sums.estimate(Units.mDm, true);
  }

  /** Returns net over gross thickness, all wells together. */
  public Fraction netToGross() {
    return Fraction.of(
        net().metres() / layers.stream().mapToDouble(l -> l.gross().metres()).sum(),
        Units.fraction);
  }

  /** Returns the net thickness, all wells together. */
  public Length net() {
    return Units.m(layers.stream().mapToDouble(l -> l.net().metres()).sum());
  }

  /** Returns well by well what the layers come to, for a porosity and a permeability log. */
  public Listing summary(String porosity, String permeability) {
    Listing.Builder table =
        Listing.titled("layers" + (cutoffs.isEmpty() ? "" : ", net where " + cutoffs))
            .column("zone")
            .column("well")
            .column("gross", Units.m)
            .column("net", Units.m)
            .column("net/gross", Units.percent)
            .column("mean " + porosity, Units.percent)
            .column(porosity + "·h", Units.m)
            .column("k along", Units.mD)
            .column("k across", Units.mD)
            .column("kv/kh")
            .column("kh", Units.mDm);
    for (Layer layer : layers) {
      addRow(table, layer, porosity, permeability);
    }
    return table.build();
  }

  private static void addRow(
      Listing.Builder table, Layer layer, String porosity, String permeability) {
    Weighted phi = layer.weighted(porosity, Units.fraction);
    Weighted k = layer.weighted(permeability, Units.mD);
    double ratio = layer.net().metres() / layer.gross().metres();
    if (phi.isEmpty() || k.isEmpty()) {
      table.row(
          layer.zone(),
          layer.well(),
          layer.gross(),
          layer.net(),
          Units.percent(100 * ratio),
          null,
          null,
          null,
          null,
          null,
          null);
      return;
    }
    table.row(
        layer.zone(),
        layer.well(),
        layer.gross(),
        layer.net(),
        Units.percent(100 * ratio),
        Fraction.of(phi.arithmetic(), Units.fraction),
        Units.m(phi.sumOfProducts()),
        Units.mD(k.along()),
        Units.mD(k.across()),
        k.across() / k.along(),
        Units.mDm(k.sumOfProducts()));
  }

  /**
   * Tells how net thickness, porosity-thickness and kh fall as a porosity cutoff rises, all wells
   * together.
   */
  public Listing sensitivity(String porosity, String permeability, Fraction... limits) {
    Listing.Builder table =
        Listing.titled("what a cutoff on " + porosity + " takes away")
            .column("cutoff", Units.percent)
            .column("net", Units.m)
            .column("net/gross", Units.percent)
            .column(porosity + "·h", Units.m)
            .column("kh", Units.mDm)
            .column("of the kh without a cutoff", Units.percent);
    double all = khOf(this, permeability);
    for (Fraction limit : limits) {
      Layers cut = where(porosity, Cutoff.above(limit));
      double kh = khOf(cut, permeability);
      table.row(
          limit,
          cut.net(),
          cut.netToGross().to(Units.percent),
          Units.m(sum(cut, porosity, Units.fraction)),
          Units.mDm(kh),
          Units.percent(100 * kh / all));
    }
    return table.build();
  }

  private static double khOf(Layers layers, String permeability) {
    return sum(layers, permeability, Units.mD);
  }

  private static double sum(Layers layers, String curve, Unit<?> unit) {
    return layers.layers.stream()
        .map(l -> l.weighted(curve, unit))
        .mapToDouble(Weighted::sumOfProducts)
        .sum();
  }

  private Estimate<Permeability> permeability(String curve, ToDoubleFunction<Weighted> mean) {
    return overWells(curve, Units.mD, mean, true);
  }

  private <Q extends Quantity<Q>> Estimate<Q> overWells(
      String curve, Unit<Q> unit, ToDoubleFunction<Weighted> mean, boolean logarithmic) {
    Sums sums = new Sums(LEVEL);
    withNet(curve, unit).forEach(w -> sums.add(mean.applyAsDouble(w), w.total()));
    return sums.estimate(unit, logarithmic);
  }

  private List<Weighted> withNet(String curve, Unit<?> unit) {
    List<Layer> empty = layers.stream().filter(l -> l.weighted(curve, unit).isEmpty()).toList();
    for (Layer layer : empty) {
      Listening.caution(
          Caution.of(
              NO_NET,
              layer.well(),
              layer.zone()
                  + " in "
                  + layer.well()
                  + " has no net sample of "
                  + curve
                  + " and does not count"));
    }
    List<Weighted> out =
        layers.stream().map(l -> l.weighted(curve, unit)).filter(w -> !w.isEmpty()).toList();
    if (out.isEmpty()) {
      throw new IllegalArgumentException(
          "no layer has a net sample of «" + curve + "»: is the cutoff too high?");
    }
    return out;
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(
                layers.size() + " layers" + (cutoffs.isEmpty() ? "" : ", net where " + cutoffs))
            .column("zone")
            .column("well")
            .column("gross", Units.m)
            .column("net", Units.m);
    layers.forEach(l -> table.row(l.zone(), l.well(), l.gross(), l.net()));
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  /** Values of several wells with their weights. */
  private static final class Sums {
    private final double level;
    private double[] values = new double[0];
    private double[] weights = new double[0];

    Sums(double level) {
      this.level = level;
    }

    void add(double value, double weight) {
      values = Arrays.copyOf(values, values.length + 1);
      weights = Arrays.copyOf(weights, weights.length + 1);
      values[values.length - 1] = value;
      weights[weights.length - 1] = weight;
    }

    <Q extends Quantity<Q>> Estimate<Q> estimate(Unit<Q> unit, boolean logarithmic) {
      double value = new Weighted(values, weights).arithmetic();
      int n = values.length;
      boolean ranged = n > 1 && !(logarithmic && Arrays.stream(values).anyMatch(v -> v <= 0));
      if (!ranged) {
        Q only = unit.of(value);
        return new Estimate<>(only, only, only, n == 1 ? "one well, no range" : "no range");
      }
      double[] x = logarithmic ? Arrays.stream(values).map(StrictMath::log).toArray() : values;
      double half = halfWidth(x);
      double low = logarithmic ? value / StrictMath.exp(half) : value - half;
      double high = logarithmic ? value * StrictMath.exp(half) : value + half;
      return new Estimate<>(
          unit.of(value),
          unit.of(low),
          unit.of(high),
          Numbers.text(100 * level) + " % from " + n + " wells");
    }

    private double halfWidth(double[] x) {
      double mean = Arrays.stream(x).average().orElseThrow();
      double squares = Arrays.stream(x).map(v -> (v - mean) * (v - mean)).sum();
      double error = StrictMath.sqrt(squares / (x.length - 1) / x.length);
      TDistribution t = new TDistribution(null, x.length - 1.0);
      return error * t.inverseCumulativeProbability(0.5 + level / 2);
    }
  }

  /**
   * Compares the kh of the layers with that of a well test.
   *
   * @param curve the permeability log
   * @param test the kh of the test
   */
  public Listing against(String curve, PermeabilityThickness test) {
    Objects.requireNonNull(test, "test");
    Estimate<PermeabilityThickness> logs = kh(curve);
    double factor = test.ratioTo(logs.value());
    boolean inside = !test.isBelow(logs.low()) && !test.isAbove(logs.high());
    return Listing.titled("kh of logs and test")
        .column("")
        .column("kh", Units.mDm)
        .column("low", Units.mDm)
        .column("high", Units.mDm)
        .row("logs", logs.value(), logs.low(), logs.high())
        .row("test", test, null, null)
        .note("test over logs " + Numbers.text(factor))
        .note(verdict(factor, inside))
        .build();
  }

  private static String verdict(double factor, boolean inside) {
    if (inside) {
      return "the test lies in the range between the wells: the transform needs no correction";
    }
    String words =
        factor > 1
            ? "the test sees more: fractures, beds too thin for the logs, or a transform too low"
            : "the test sees less: damage, relative permeability, or a transform too high";
    return words + "; to match, multiply k by " + Numbers.text(factor);
  }
}
