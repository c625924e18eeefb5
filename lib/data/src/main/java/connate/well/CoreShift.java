package connate.well;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * By how much the depths of a core must move to fit a log. A positive shift moves the core down.
 *
 * <p>The best shift is the one at which log and core correlate most, by Pearson's r, whatever its
 * sign: porosity against bulk density falls, against sonic it rises. Shifts are tried at the finer
 * of the two samplings; the log is read between its samples, never across a gap. A shift counts
 * only while it leaves most of the pairs that the best placed shift has.
 *
 * <p>Common practice, no source: the correlation is a help to the eye, no proof. The result says
 * when it is flat, at the edge of what was tried, or stands on few pairs.
 */
public final class CoreShift implements Listed {

  /** Caution: no shift is much better than the others. */
  static final String FLAT = "W31";

  /** Caution: the best shift is the largest one tried. */
  static final String EDGE = "W32";

  /** Caution: few pairs. */
  static final String FEW = "W33";

  private static final int ENOUGH = 10;
  private static final double MOST_PAIRS = 0.8;
  private static final double WEAK = 0.3;
  private static final double LEAD = 0.1;
  private static final int MOST_SHIFTS = 20_000;

  private final Unit<Length> unit;
  private final double shift;
  private final double correlation;
  private final int pairs;
  private final double before;
  private final List<String> doubts;
  private final double[][] tried;

  private CoreShift(
      Unit<Length> unit,
      double shift,
      double correlation,
      int pairs,
      double before,
      List<String> doubts,
      double[][] tried) {
    this.unit = unit;
    this.shift = shift;
    this.correlation = correlation;
    this.pairs = pairs;
    this.before = before;
    this.doubts = List.copyOf(doubts);
    this.tried = tried;
  }

  /**
   * Finds the shift at which core and log correlate most.
   *
   * @param log a log that stands at depths
   * @param core a core measurement that stands at depths
   * @param most the largest shift to be tried, up and down
   * @throws IllegalArgumentException if one of them has no depths, or fewer than three pairs meet
   */
  public static CoreShift best(Series log, Series core, Length most) {
    Fit fit = new Fit(log, core);
    double step = fit.finerStep();
    int steps = (int) Math.floor(most.metres() / step + 1e-9);
    if (!(most.metres() > 0) || steps < 1) {
      throw new IllegalArgumentException(
          "the largest shift is "
              + most
              + ", less than one sample of "
              + Numbers.text(step)
              + " m");
    }
    if (2L * steps + 1 > MOST_SHIFTS) {
      throw new IllegalArgumentException(
          "a shift of " + most + " means " + (2L * steps + 1) + " trials: try less");
    }
    double[][] tried = new double[2 * steps + 1][];
    for (int i = -steps; i <= steps; i++) {
      tried[i + steps] = fit.at(i * step);
    }
    int best = best(tried);
    if (best < 0) {
      throw new IllegalArgumentException(
          log.name()
              + " and "
              + core.name()
              + " have fewer than three pairs at every shift: "
              + "do their depths have the same datum and unit?");
    }
    double[] found = tried[best];
    List<String> doubts = new ArrayList<>();
    doubt(
        doubts,
        EDGE,
        best == 0 || best == tried.length - 1,
        core,
        "the best shift is the largest that was tried: look further");
    doubt(
        doubts,
        FLAT,
        isFlat(tried, best),
        core,
        "no shift stands out: the correlation is "
            + Numbers.text(found[1])
            + " at best and much the same elsewhere");
    return of(log, core, found, tried[steps][1], doubts, tried);
  }

  /** Returns a shift that is known, with the correlation it gives. */
  public static CoreShift given(Length shift, Series log, Series core) {
    Fit fit = new Fit(log, core);
    double[] found = fit.at(shift.metres());
    return of(log, core, found, fit.at(0)[1], new ArrayList<>(), new double[][] {found});
  }

  private static CoreShift of(
      Series log,
      Series core,
      double[] found,
      double before,
      List<String> doubts,
      double[][] tried) {
    int pairs = (int) found[2];
    doubt(
        doubts,
        FEW,
        pairs < ENOUGH,
        core,
        "only " + pairs + " pairs of " + core.name() + " and " + log.name() + " meet");
    Unit<Length> unit =
        Length.DIMENSION.find(core.depth().orElseThrow().unit().symbol()).orElse(Units.m);
    return new CoreShift(unit, found[0], found[1], pairs, before, doubts, tried);
  }

  private static void doubt(
      List<String> doubts, String code, boolean holds, Series core, String words) {
    if (holds) {
      doubts.add(words);
      Listening.caution(Caution.of(code, core.name(), "core shift: " + words));
    }
  }

  /**
   * Returns the trial of the largest |r| among those with enough pairs, the smallest shift first.
   */
  private static int best(double[][] tried) {
    double mostPairs = Arrays.stream(tried).mapToDouble(t -> t[2]).max().orElse(0);
    int best = -1;
    for (int i = 0; i < tried.length; i++) {
      double[] t = tried[i];
      if (t[2] < Math.max(3, MOST_PAIRS * mostPairs) || Double.isNaN(t[1])) {
        continue;
      }
      boolean isBetter =
          best < 0
              || Math.abs(t[1]) > Math.abs(tried[best][1]) + 1e-12
              || Math.abs(Math.abs(t[1]) - Math.abs(tried[best][1])) <= 1e-12
                  && Math.abs(t[0]) < Math.abs(tried[best][0]);
      best = isBetter ? i : best;
    }
    return best;
  }

  private static boolean isFlat(double[][] tried, int best) {
    double[] sizes =
        Arrays.stream(tried)
            .mapToDouble(t -> Math.abs(t[1]))
            .filter(r -> !Double.isNaN(r))
            .sorted()
            .toArray();
    double top = Math.abs(tried[best][1]);
    return top < WEAK || top - sizes[sizes.length / 2] < LEAD;
  }

  /** Returns the shift; positive moves the core down. */
  public Length shift() {
    return Units.m(shift).to(unit);
  }

  /** Returns Pearson's r of log and core at the shift. */
  public double correlation() {
    return correlation;
  }

  /** Returns Pearson's r of log and core as they stood, NaN where they did not meet. */
  public double correlationBefore() {
    return before;
  }

  /** Returns the number of pairs at the shift. */
  public int pairs() {
    return pairs;
  }

  /** Returns what speaks against the shift, nothing where it is clear. */
  public List<String> doubts() {
    return doubts;
  }

  /** Returns the shifts that were tried. */
  public Series trials() {
    double[] shifts = Arrays.stream(tried).mapToDouble(t -> t[0]).toArray();
    return Series.of("shift", Units.m, shifts).to(unit);
  }

  /** Returns the correlation at each shift of {@link #trials()}. */
  public Series correlations() {
    double[] r = Arrays.stream(tried).mapToDouble(t -> t[1]).toArray();
    return Series.of("correlation", Units.number, r);
  }

  /** Returns a core measurement, or its depths themselves, moved by the shift. */
  public Series moved(Series core) {
    Series depth = core.depth().orElse(core);
    double by = Units.m.convert(shift, depth.unit());
    Series moved = depth.map(d -> d + by);
    return core.depth().isPresent() ? core.atDepth(moved) : moved;
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("shift of the core")
            .column("shift", unit)
            .column("correlation")
            .column("pairs")
            .column("correlation before");
    table.row(shift(), correlation, pairs, before);
    doubts.forEach(table::note);
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  /** Correlates core and log at a shift. */
  private static final class Fit {

    private final DepthLine logLine;
    private final DepthLine coreLine;
    private final double[] log;
    private final double[] core;
    private final double[] depths;

    Fit(Series log, Series core) {
      this.log = log.values();
      this.core = core.values();
      this.logLine = new DepthLine(depths(log));
      this.depths = depths(core);
      this.coreLine = new DepthLine(depths);
    }

    private static double[] depths(Series series) {
      return series
          .depth()
          .orElseThrow(
              () ->
                  new IllegalArgumentException(
                      series.name() + " stands at no depths: give them with atDepth(…)"))
          .in(Units.m);
    }

    double finerStep() {
      double step = Math.min(logLine.step(), coreLine.step());
      return Double.isNaN(step) ? logLine.step() : step;
    }

    /** Returns shift, r and number of pairs. */
    double[] at(double shift) {
      double[] wanted = new double[depths.length];
      for (int i = 0; i < wanted.length; i++) {
        wanted[i] = depths[i] + shift;
      }
      double[] there = logLine.sample(log, wanted);
      return correlate(shift, there);
    }

    private double[] correlate(double shift, double[] there) {
      int n = 0;
      double meanX = 0;
      double meanY = 0;
      double xx = 0;
      double yy = 0;
      double xy = 0;
      for (int i = 0; i < there.length; i++) {
        if (Double.isNaN(there[i]) || Double.isNaN(core[i])) {
          continue;
        }
        n++;
        double dx = there[i] - meanX;
        double dy = core[i] - meanY;
        meanX += dx / n;
        meanY += dy / n;
        xx += dx * (there[i] - meanX);
        yy += dy * (core[i] - meanY);
        xy += dx * (core[i] - meanY);
      }
      double r = n < 3 ? Double.NaN : xy / StrictMath.sqrt(xx * yy);
      return new double[] {shift, r, n};
    }
  }
}
