package connate.well;

import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import connate.table.Table;

/**
 * The path of a hole from a deviation survey, by minimum curvature: between two stations the hole
 * is an arc of a circle that has the stations' directions at its ends.
 *
 * <pre>
 * cos β = t₁ · t₂,  Δr = ΔMD / β · tan(β / 2) · (t₁ + t₂)
 * </pre>
 *
 * <p>t is the unit vector of the direction (north, east, down) at a station, β the angle between
 * two of them, MD the measured depth. Between stations the position on the arc itself is taken, not
 * on its chord. Above the first station the hole is taken to be vertical; below the last one
 * nothing is known and depths are missing.
 *
 * <p><b>Source</b>: Zaremba (1973), SPE 3664; Taylor and Mason (1972), SPE J. 12, 474–488. The
 * geometry is derived here, no constant is quoted.
 *
 * <p><b>Checked</b> in {@code SurveyTest}.
 */
public final class Survey implements Listed {

  /** The facts above for {@code help}, the log and the index. */
  public static final MethodCard CARD =
      MethodCard.named("minimum-curvature", "Minimum curvature")
          .equation("Δr = ΔMD/β · tan(β/2) · (t1 + t2), cos β = t1 · t2")
          .input("MD", "measured depth", Units.m)
          .input("I", "inclination from vertical", Units.degrees)
          .input("A", "azimuth from north", Units.degrees)
          .result("TVD", "vertical depth", Units.m)
          .source("Zaremba (1973), SPE 3664; Taylor and Mason (1972), SPE J. 12, 474–488")
          .constants(Constants.EXACT)
          .topics("survey", "vertical depth", "deviation")
          .note("Vertical above the first station; missing below the last one.")
          .build();

  /** Caution: the first station is deep and inclined, so that the hole above it is a guess. */
  static final String DEEP_START = "W11";

  /** Caution: depths outside the survey. */
  static final String OUTSIDE = "W12";

  private static final double INCLINED = Math.toRadians(5);
  private static final double STRAIGHT = 1e-9;

  private final double[] md;
  private final double[][] tangents;
  private final double[][] places;

  private Survey(double[] md, double[][] tangents, double[][] places) {
    this.md = md;
    this.tangents = tangents;
    this.places = places;
  }

  /**
   * Returns the path of a survey.
   *
   * @param measuredDepth the stations' depths along the hole, rising
   * @param inclination the angle from vertical
   * @param azimuth the direction from north, clockwise
   * @throws IllegalArgumentException if the depths do not rise or a number is missing
   */
  public static Survey of(Series measuredDepth, Series inclination, Series azimuth) {
    double[] md = measuredDepth.in(Units.m);
    double[] dips = inclination.in(Units.radians);
    double[] azimuths = azimuth.in(Units.radians);
    check(measuredDepth, md, dips, azimuths);
    double[][] tangents = new double[md.length][];
    double[][] places = new double[md.length][];
    for (int i = 0; i < md.length; i++) {
      tangents[i] = tangent(dips[i], azimuths[i]);
      places[i] =
          i == 0
              ? new double[] {0, 0, md[0]}
              : plus(places[i - 1], arc(tangents[i - 1], tangents[i], md[i] - md[i - 1], 1));
    }
    Listening.used(CARD);
    if (md[0] > 0 && dips[0] > INCLINED) {
      Listening.caution(
          Caution.of(
              DEEP_START,
              measuredDepth.name(),
              "the survey starts at "
                  + Numbers.text(md[0])
                  + " m with "
                  + Numbers.text(Math.toDegrees(dips[0]))
                  + "° of inclination; the hole above was taken to be vertical"));
    }
    return new Survey(md, tangents, places);
  }

  /** Returns the path of a survey that is given as logs with the roles inclination and azimuth. */
  public static Survey of(Well survey) {
    return of(survey.depth(), survey.get("inclination"), survey.get("azimuth"));
  }

  /** Returns the path of a survey that stands in a table with depth, inclination and azimuth. */
  public static Survey of(Table survey) {
    return of(survey.get("depth"), survey.get("inclination"), survey.get("azimuth"));
  }

  private static void check(Series depth, double[] md, double[] dips, double[] azimuths) {
    if (md.length == 0 || md.length != dips.length || md.length != azimuths.length) {
      throw new IllegalArgumentException(
          "a survey needs as many depths as inclinations and azimuths, and one at least: "
              + md.length
              + ", "
              + dips.length
              + ", "
              + azimuths.length);
    }
    for (int i = 0; i < md.length; i++) {
      if (Double.isNaN(md[i] + dips[i] + azimuths[i])) {
        throw new IllegalArgumentException("station " + (i + 1) + " of the survey lacks a number");
      }
      if (i > 0 && md[i] <= md[i - 1]) {
        throw new IllegalArgumentException(
            "station "
                + (i + 1)
                + " of the survey, at "
                + depth.at(i)
                + ", is not deeper than the one before");
      }
    }
  }

  private static double[] tangent(double dip, double azimuth) {
    double across = StrictMath.sin(dip);
    return new double[] {
      across * StrictMath.cos(azimuth), across * StrictMath.sin(azimuth), StrictMath.cos(dip)
    };
  }

  /**
   * Returns the way along an arc.
   *
   * @param from the direction at its start
   * @param to the direction at its end
   * @param length its length
   * @param part the part of it that is gone, 0 to 1
   */
  private static double[] arc(double[] from, double[] to, double length, double part) {
    double angle = angle(from, to);
    double[] way = new double[3];
    for (int k = 0; k < 3; k++) {
      if (angle < STRAIGHT) {
        way[k] = length * part * (from[k] + to[k]) / 2;
      } else {
        double start = StrictMath.cos((1 - part) * angle) - StrictMath.cos(angle);
        double end = 1 - StrictMath.cos(part * angle);
        way[k] = length / (angle * StrictMath.sin(angle)) * (start * from[k] + end * to[k]);
      }
    }
    return way;
  }

  /** Returns the angle between unit vectors, exact also where it is small. */
  private static double angle(double[] a, double[] b) {
    double sum = 0;
    double difference = 0;
    for (int k = 0; k < 3; k++) {
      sum += (a[k] + b[k]) * (a[k] + b[k]);
      difference += (a[k] - b[k]) * (a[k] - b[k]);
    }
    return 2 * StrictMath.atan2(StrictMath.sqrt(difference), StrictMath.sqrt(sum));
  }

  private static double[] plus(double[] a, double[] b) {
    return new double[] {a[0] + b[0], a[1] + b[1], a[2] + b[2]};
  }

  /** Returns the place at a depth along the hole: north, east, down, in metres. */
  private double[] place(double depth) {
    if (depth <= md[0]) {
      return new double[] {0, 0, depth};
    }
    if (Double.isNaN(depth) || depth > md[md.length - 1]) {
      return new double[] {Double.NaN, Double.NaN, Double.NaN};
    }
    int i = 1;
    int high = md.length - 1;
    while (i < high) {
      int middle = (i + high) >>> 1;
      if (md[middle] < depth) {
        i = middle + 1;
      } else {
        high = middle;
      }
    }
    double length = md[i] - md[i - 1];
    double part = (depth - md[i - 1]) / length;
    return plus(places[i - 1], arc(tangents[i - 1], tangents[i], length, part));
  }

  /**
   * Returns the vertical depth of a measured depth.
   *
   * @throws IllegalArgumentException if it lies below the last station
   */
  public Length vertical(Length measuredDepth) {
    double down = place(measuredDepth.metres())[2];
    if (Double.isNaN(down)) {
      throw new IllegalArgumentException(
          measuredDepth
              + " lies below the last station of the survey, at "
              + Units.m(md[md.length - 1]).to(unitOf(measuredDepth)));
    }
    return Units.m(down).to(unitOf(measuredDepth));
  }

  private static Unit<Length> unitOf(Length length) {
    return Length.DIMENSION.find(length.unit().symbol()).orElse(Units.m);
  }

  /** Returns the vertical depths of measured depths, in their unit. */
  public Series vertical(Series measuredDepths) {
    return along(measuredDepths, "TVD", 2);
  }

  /** Returns how far north of the well's head the hole is. */
  public Series north(Series measuredDepths) {
    return along(measuredDepths, "north", 0);
  }

  /** Returns how far east of the well's head the hole is. */
  public Series east(Series measuredDepths) {
    return along(measuredDepths, "east", 1);
  }

  private Series along(Series depths, String name, int component) {
    double[] metres = depths.in(Units.m);
    double[] out = new double[metres.length];
    int outside = 0;
    for (int row = 0; row < out.length; row++) {
      double place = place(metres[row])[component];
      outside += Double.isNaN(place) && !Double.isNaN(metres[row]) ? 1 : 0;
      out[row] = Units.m.convert(place, depths.unit());
    }
    if (outside > 0) {
      Listening.caution(
          Caution.of(
              OUTSIDE,
              depths.name(),
              outside
                  + " of "
                  + out.length
                  + " depths lie below the last station of the survey at "
                  + Numbers.text(Units.m.convert(md[md.length - 1], depths.unit()))
                  + " "
                  + depths.unit().symbol()
                  + ": their "
                  + name
                  + " is missing"));
    }
    return Series.over(name, depths.unit(), out, depths.depth().isPresent() ? depths : null);
  }

  /** Returns the number of stations. */
  public int size() {
    return md.length;
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("survey of " + md.length + " stations, by minimum curvature")
            .column("measured depth", Units.m)
            .column("inclination", Units.degrees)
            .column("vertical depth", Units.m)
            .column("north", Units.m)
            .column("east", Units.m);
    for (int i = 0; i < md.length; i++) {
      double across = StrictMath.hypot(tangents[i][0], tangents[i][1]);
      table.row(
          Units.m(md[i]),
          Units.radians(StrictMath.atan2(across, tangents[i][2])).to(Units.degrees),
          Units.m(places[i][2]),
          Units.m(places[i][0]),
          Units.m(places[i][1]));
    }
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
