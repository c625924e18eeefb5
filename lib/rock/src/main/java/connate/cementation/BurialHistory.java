package connate.cementation;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Density;
import connate.quantity.Length;
import connate.quantity.Temperature;
import connate.quantity.ThermalGradient;
import connate.quantity.Time;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.Comparator;
import java.util.Locale;
import java.util.stream.IntStream;

/**
 * The way of a bed through depth and temperature: points of age, depth and temperature, with
 * straight lines between them.
 *
 * <p>Ages count back from the present, so they are positive; the points may come in any order.
 * Depth is below the sea floor or the ground.
 */
public final class BurialHistory implements Listed {

  /** Caution: something about the points that the reader must know. */
  static final String POINTS = "M30";

  private static final double GRAVITY = 9.80665;
  private static final double SUSPICIOUS_AGE = 4600;

  private final double[] age;
  private final double[] depth;
  private final double[] celsius;
  private final double[] overpressure;
  private final double stressPerKm;

  private BurialHistory(
      double[] age, double[] depth, double[] celsius, double[] overpressure, double stressPerKm) {
    this.age = age;
    this.depth = depth;
    this.celsius = celsius;
    this.overpressure = overpressure;
    this.stressPerKm = stressPerKm;
  }

  /**
   * Returns the history of the given points.
   *
   * @throws IllegalArgumentException if there are fewer than two points, a value is missing, two
   *     ages are the same, or an age or a depth is negative
   */
  public static BurialHistory of(Series ages, Series depths, Series temperatures) {
    double[] t = ages.in(Units.Ma);
    double[] z = depths.in(Units.m);
    double[] c = temperatures.in(Units.degC);
    if (t.length != z.length || t.length != c.length || t.length < 2) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "a burial history needs two points or more, each with age, depth and temperature;"
                  + " found %d ages, %d depths, %d temperatures",
              t.length,
              z.length,
              c.length));
    }
    int[] order =
        IntStream.range(0, t.length)
            .boxed()
            .sorted(Comparator.comparingDouble(i -> -t[i]))
            .mapToInt(Integer::intValue)
            .toArray();
    double[] age = pick(t, order);
    double[] depth = pick(z, order);
    double[] celsius = pick(c, order);
    check(age, depth, celsius);
    return new BurialHistory(age, depth, celsius, new double[age.length], stress(2300, 1030));
  }

  /** Returns the history of ages and depths with a steady gradient of temperature. */
  public static BurialHistory of(
      Series ages, Series depths, Temperature surface, ThermalGradient gradient) {
    return of(ages, depths, Geotherm.of(surface, gradient, depths));
  }

  /** Returns the history with other mean densities of overburden and water: 2.30 and 1.03 g/cm³. */
  public BurialHistory withDensities(Density bulk, Density water) {
    double rock = bulk.in(Units.kgPerM3);
    double fluid = water.in(Units.kgPerM3);
    if (!(rock > fluid)) {
      throw new IllegalArgumentException(
          "rock of " + bulk + " is not heavier than water of " + water);
    }
    return new BurialHistory(age, depth, celsius, overpressure, stress(rock, fluid));
  }

  /**
   * Returns the history with a pore pressure above that of a column of water, at each point in the
   * order of age, oldest first.
   *
   * @throws IllegalArgumentException if it is negative or above the effective stress of the depth
   */
  public BurialHistory withOverpressure(Series pressures) {
    double[] mpa = pressures.in(Units.MPa);
    if (mpa.length != age.length) {
      throw new IllegalArgumentException(
          age.length + " points and " + mpa.length + " overpressures: one for each");
    }
    for (int i = 0; i < mpa.length; i++) {
      double most = stressPerKm * depth[i] / 1000;
      if (!(mpa[i] >= 0 && mpa[i] <= most)) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "an overpressure of %.3g MPa at %.0f m is impossible: the rock above carries %.3g",
                mpa[i],
                depth[i],
                most));
      }
    }
    return new BurialHistory(age, depth, celsius, mpa, stressPerKm);
  }

  private static double stress(double rock, double fluid) {
    return (rock - fluid) * GRAVITY * 1e-3;
  }

  private static double[] pick(double[] values, int... order) {
    return IntStream.of(order).mapToDouble(i -> values[i]).toArray();
  }

  private static void check(double[] age, double[] depth, double... celsius) {
    for (int i = 0; i < age.length; i++) {
      boolean bad = !(age[i] >= 0) || !(depth[i] >= 0) || !(celsius[i] > -50 && celsius[i] < 500);
      if (bad) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "a point of a burial history is impossible or incomplete: age %s Ma, depth %s m, %s"
                    + " °C; ages count back from the present, depths down from the ground",
                age[i],
                depth[i],
                celsius[i]));
      }
      if (i > 0 && age[i] == age[i - 1]) {
        throw new IllegalArgumentException("two points of a burial history have age " + age[i]);
      }
    }
    tell(age, depth);
  }

  private static void tell(double[] age, double... depth) {
    int last = age.length - 1;
    if (age[0] > SUSPICIOUS_AGE) {
      caution("the oldest age is " + age[0] + " Ma, older than the Earth: in years or ka?");
    }
    if (age[last] > 0) {
      caution("the youngest point is " + age[last] + " Ma old: the present is not reached");
    }
    if (depth[0] > 200) {
      caution(
          "the oldest point lies at "
              + depth[0]
              + " m, not near the surface: what happened before is left out");
    }
  }

  private static void caution(String text) {
    Listening.caution(Caution.of(POINTS, "burial history", text));
  }

  /** Returns the number of points. */
  public int size() {
    return age.length;
  }

  /** Returns the ages, oldest first. */
  public Series ages() {
    return Series.of("age", Units.Ma, age);
  }

  /** Returns the depths. */
  public Series depths() {
    return Series.of("depth", Units.m, depth);
  }

  /** Returns the temperatures. */
  public Series temperatures() {
    return Series.of("temperature", Units.degC, celsius);
  }

  /** Returns the depth at an age. */
  public Length depth(Time at) {
    return Units.m(at(depth, at.in(Units.Ma)));
  }

  /** Returns the temperature at an age. */
  public Temperature temperature(Time at) {
    return Units.degC(at(celsius, at.in(Units.Ma)));
  }

  private double at(double[] values, double ma) {
    if (!(ma <= age[0] && ma >= age[age.length - 1])) {
      throw new IllegalArgumentException(
          "the burial history runs from " + age[0] + " to " + age[age.length - 1] + " Ma");
    }
    int i = 1;
    while (age[i] > ma) {
      i++;
    }
    double share = (age[i - 1] - ma) / (age[i - 1] - age[i]);
    return values[i - 1] + share * (values[i] - values[i - 1]);
  }

  /** One instant of the history. */
  record Point(double age, double depth, double celsius, double stress) {}

  Point point(int leg, double share) {
    double z = along(depth, leg, share);
    double stress = stressPerKm * z / 1000 - along(overpressure, leg, share);
    return new Point(along(age, leg, share), z, along(celsius, leg, share), stress);
  }

  private static double along(double[] values, int leg, double share) {
    return values[leg] + share * (values[leg + 1] - values[leg]);
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("burial history")
            .column("age", Units.Ma)
            .column("depth", Units.m)
            .column("temperature", Units.degC);
    for (int i = 0; i < age.length; i++) {
      table.row(Units.Ma(age[i]), Units.m(depth[i]), Units.degC(celsius[i]));
    }
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
