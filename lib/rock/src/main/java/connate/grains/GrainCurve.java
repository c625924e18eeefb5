package connate.grains;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Curve;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.Arrays;
import java.util.Locale;

/**
 * A grain-size analysis by weight as a cumulative curve: the share of the weight that is finer than
 * each size.
 *
 * <p>A pan below the finest sieve and a heap above the coarsest are open-ended: a percentile that
 * falls there is unknown and is refused, unless the end is stated with {@link #withFinest} or
 * {@link #withCoarsest}. Between limits the curve runs straight over the logarithm of size; {@link
 * #with(Between)} chooses otherwise.
 */
public final class GrainCurve implements Curve, Listed {

  /** Caution: a percentile rests on an assumed end. */
  static final String ASSUMED_END = "M12";

  private static final double WHOLE = 100;

  private final String name;
  private final double[] limits;
  private final double[] finer;
  private final Between between;
  private final boolean assumedFinest;
  private final boolean assumedCoarsest;

  GrainCurve(
      String name,
      double[] limits,
      double[] finer,
      Between between,
      boolean assumedFinest,
      boolean assumedCoarsest) {
    this.name = name;
    this.limits = limits;
    this.finer = finer;
    this.between = between;
    this.assumedFinest = assumedFinest;
    this.assumedCoarsest = assumedCoarsest;
  }

  /**
   * Returns the curve of weights in classes.
   *
   * @param limits the limits of the classes, one more than there are weights, ascending or
   *     descending; 0 for a pan
   * @param weights the weight in each class, in percent or as masses
   * @throws IllegalArgumentException if limits are not in order, a weight is negative or missing,
   *     or percents do not add up to 100
   */
  public static GrainCurve of(Series limits, Series weights) {
    double[] mm = limits.in(Units.mm);
    double[] share = Weights.percents(weights);
    if (mm.length != share.length + 1) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "%d limits enclose %d classes, found %d weights",
              mm.length,
              mm.length - 1,
              share.length));
    }
    if (mm[0] > mm[mm.length - 1]) {
      Weights.reverse(mm);
      Weights.reverse(share);
    }
    Weights.checkAscending(mm);
    return new GrainCurve(
        weights.name(), mm, Weights.cumulate(share), Between.LOGARITHMIC, false, false);
  }

  /**
   * Returns the curve of a sieving: what each sieve held back, in any order of the sieves.
   *
   * @param openings the opening of each sieve; 0 for the pan
   * @param retained the weight on each sieve, in percent or as masses
   * @throws IllegalArgumentException if two sieves are equal, a weight is negative or missing, or
   *     percents do not add up to 100
   */
  public static GrainCurve sieve(Series openings, Series retained) {
    double[] mm = openings.in(Units.mm);
    double[] share = Weights.percents(retained);
    if (mm.length != share.length) {
      throw new IllegalArgumentException(
          mm.length + " sieves and " + share.length + " weights: each sieve has one");
    }
    double[] low = mm.clone();
    Arrays.sort(low);
    double[] limits = Arrays.copyOf(low, low.length + 1);
    limits[low.length] = Double.POSITIVE_INFINITY;
    Weights.checkAscending(limits);
    double[] sorted = new double[share.length];
    for (int i = 0; i < share.length; i++) {
      sorted[Arrays.binarySearch(low, mm[i])] += share[i];
    }
    return new GrainCurve(
        retained.name(), limits, Weights.cumulate(sorted), Between.LOGARITHMIC, false, false);
  }

  /** Returns the curve with another way between the limits. */
  public GrainCurve with(Between way) {
    return new GrainCurve(name, limits, finer, way, assumedFinest, assumedCoarsest);
  }

  /** Returns the curve with a stated fine end of its pan: an assumption, and flagged as one. */
  public GrainCurve withFinest(Length finest) {
    double mm = finest.in(Units.mm);
    if (limits[0] > 0 || !(mm > 0 && mm < limits[1])) {
      throw new IllegalArgumentException(
          "the fine end " + finest + " does not lie in an open class below " + limits[1] + " mm");
    }
    double[] ends = limits.clone();
    ends[0] = mm;
    return new GrainCurve(name, ends, finer, between, true, assumedCoarsest);
  }

  /** Returns the curve with a stated coarse end: an assumption, and flagged as one. */
  public GrainCurve withCoarsest(Length coarsest) {
    double mm = coarsest.in(Units.mm);
    int last = limits.length - 1;
    if (Double.isFinite(limits[last]) || !(mm > limits[last - 1] && Double.isFinite(mm))) {
      throw new IllegalArgumentException(
          "the coarse end "
              + coarsest
              + " does not lie in an open class above "
              + limits[last - 1]
              + " mm");
    }
    double[] ends = limits.clone();
    ends[last] = mm;
    return new GrainCurve(name, ends, finer, between, assumedFinest, true);
  }

  /** Returns the name. */
  public String name() {
    return name;
  }

  /**
   * Returns the size than which the given percentage of the weight is finer: {@code d(10)}.
   *
   * @throws IllegalArgumentException if the percentage is not between 0 and 100, or falls into an
   *     open-ended class
   */
  public Length d(double percentFiner) {
    double mm = sizeMm(percentFiner);
    if (Double.isNaN(mm)) {
      throw new IllegalArgumentException(openEnd(percentFiner));
    }
    tellAssumed(percentFiner);
    return Units.mm(mm);
  }

  /**
   * Returns the phi value than which the given percentage is coarser, as Folk and Ward count.
   *
   * @throws IllegalArgumentException as {@link #d}
   */
  public Ratio phi(double percentCoarser) {
    return Units.number(PhiScale.phi(d(WHOLE - percentCoarser).in(Units.mm)));
  }

  /** Returns whether a percentile falls into an open-ended class. */
  public boolean isOpen(double percentFiner) {
    return Double.isNaN(sizeMm(percentFiner));
  }

  /** Returns the weight that is finer than a size, in percent. */
  public Fraction finer(Length size) {
    return Units.percent(y(size.in(Units.mm)));
  }

  /** Returns the weight in the open fine end, 0 where there is none. */
  public Fraction pan() {
    return Units.percent(limits[0] == 0 ? finer[1] : 0);
  }

  /** Returns the limits of the classes, finest first. */
  public Series limits() {
    return Series.of("grain size", Units.mm, limits);
  }

  /** Returns the weight finer than each limit. */
  public Series cumulative() {
    return Series.of("finer", Units.percent, finer);
  }

  double sizeMm(double percentFiner) {
    if (!(percentFiner > 0 && percentFiner < WHOLE)) {
      throw new IllegalArgumentException(
          "a percentile is above 0 and below 100, found " + Numbers.text(percentFiner));
    }
    int j = 1;
    while (j < finer.length - 1 && finer[j] < percentFiner) {
      j++;
    }
    double a = limits[j - 1];
    double b = limits[j];
    if (!Double.isFinite(b) || a == 0 && between == Between.LOGARITHMIC) {
      return finer[j] == percentFiner && Double.isFinite(b) ? b : Double.NaN;
    }
    double share = (percentFiner - finer[j - 1]) / (finer[j] - finer[j - 1]);
    return share == 1 ? b : between.at(a, b, share);
  }

  double phiCoarser(double percentCoarser) {
    return PhiScale.phi(sizeMm(WHOLE - percentCoarser));
  }

  int classes() {
    return limits.length - 1;
  }

  double lowMm(int size) {
    return limits[size];
  }

  double highMm(int size) {
    return limits[size + 1];
  }

  double percent(int size) {
    return finer[size + 1] - finer[size];
  }

  /** Returns whether a class with weight has no end, so that it has no middle. */
  boolean hasOpenWeight() {
    int last = classes() - 1;
    return limits[0] == 0 && percent(0) > 0
        || Double.isInfinite(limits[last + 1]) && percent(last) > 0;
  }

  String openEnd() {
    return String.format(
        Locale.ROOT,
        "%s has an open-ended class with weight in it: state the end with"
            + " withFinest(um(2)) or withCoarsest(mm(4))",
        name);
  }

  private String openEnd(double percentFiner) {
    boolean fine = percentFiner <= finer[1];
    double weight = fine ? finer[1] : WHOLE - finer[finer.length - 2];
    return String.format(
        Locale.ROOT,
        "d%s of %s falls into the open-ended class %s %s mm, which holds %s %% of the weight; state"
            + " its end, such as %s",
        Numbers.text(percentFiner),
        name,
        fine ? "below" : "above",
        Numbers.text(fine ? limits[1] : limits[limits.length - 2]),
        Numbers.text(weight),
        fine ? "withFinest(um(2))" : "withCoarsest(mm(4))");
  }

  private void tellAssumed(double percentFiner) {
    boolean fine = assumedFinest && percentFiner <= finer[1];
    boolean coarse = assumedCoarsest && percentFiner > finer[finer.length - 2];
    if (fine || coarse) {
      Listening.caution(
          Caution.of(
              ASSUMED_END,
              name,
              "d"
                  + Numbers.text(percentFiner)
                  + " of "
                  + name
                  + " lies beyond the last sieve and rests on the assumed end of the class"));
    }
  }

  @Override
  public double y(double mm) {
    if (!(mm > limits[0])) {
      return mm >= 0 ? 0 : Double.NaN;
    }
    int last = limits.length - 1;
    if (mm >= limits[last]) {
      return WHOLE;
    }
    int j = 1;
    while (limits[j] < mm) {
      j++;
    }
    double a = limits[j - 1];
    double b = limits[j];
    if (mm == b || finer[j] == finer[j - 1]) {
      return finer[j];
    }
    if (Double.isInfinite(b) || a == 0 && between == Between.LOGARITHMIC) {
      return Double.NaN;
    }
    return finer[j - 1] + between.share(a, b, mm) * (finer[j] - finer[j - 1]);
  }

  @Override
  public Unit<?> xUnit() {
    return Units.mm;
  }

  @Override
  public Unit<?> yUnit() {
    return Units.percent;
  }

  @Override
  public String label() {
    return name;
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("grain-size curve " + name + ", " + between)
            .column("size", Units.mm)
            .column("finer", Units.percent);
    for (int i = 0; i < limits.length; i++) {
      if (limits[i] > 0 && Double.isFinite(limits[i])) {
        table.row(Units.mm(limits[i]), Units.percent(finer[i]));
      }
    }
    return table.build();
  }

  @Override
  public String toString() {
    return name + ", " + classes() + " size classes, " + between;
  }
}
