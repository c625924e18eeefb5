package connate.calibration;

import connate.fault.NoConvergence;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import java.util.Arrays;

/**
 * Groups in one variable as a sum of normal laws, their number chosen by the Bayesian information
 * criterion.
 *
 * <pre>
 * f(x) = Σ w_j N(x; μ_j, σ_j),  found by expectation and maximisation
 * BIC  = p ln n − 2 ln L,  p = 3 g − 1 for g groups (smaller is better)
 * </pre>
 *
 * <p>The start is fixed: the sorted values cut into g equal parts, so the result does not depend on
 * chance. No group may be narrower than a thousandth of the whole spread, which keeps a group from
 * shrinking onto one value.
 *
 * <p><b>Valid</b> where groups are separated by more than their spread and n is some tens.
 *
 * <p><b>Source</b>: Dempster, Laird and Rubin (1977), J. Roy. Stat. Soc. B 39, 1–38; Schwarz
 * (1978), Ann. Stat. 6, 461–464.
 *
 * <p><b>Checked</b> in {@code GaussianMixtureTest}.
 */
public final class GaussianMixture implements Listed {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("gaussian-mixture", "Gaussian mixture")
          .equation("f(x) = Σ w N(x; μ, σ); BIC = (3 g - 1) ln n - 2 ln L")
          .input("x", "values", Units.number)
          .source(
              "Dempster, Laird and Rubin (1977), J. Roy. Stat. Soc. B 39, 1–38; Schwarz (1978), Ann."
                  + " Stat. 6, 461–464")
          .constants(Constants.EXACT)
          .topics("rock type", "clusters", "calibration")
          .note("The number of groups with the smallest BIC; they must make sense as rock too.")
          .build();

  private static final int STEPS = 5000;
  private static final double SETTLED = 1e-8;
  private static final double NARROWEST = 1e-3;
  private static final double HALF_LOG_TWO_PI = 0.5 * StrictMath.log(2 * StrictMath.PI);

  private final double[] weights;
  private final double[] means;
  private final double[] spreads;
  private final double logLikelihood;
  private final int n;

  private GaussianMixture(double[] w, double[] m, double[] s, double logLikelihood, int n) {
    this.weights = w;
    this.means = m;
    this.spreads = s;
    this.logLikelihood = logLikelihood;
    this.n = n;
  }

  /**
   * Returns the mixture whose number of groups has the smallest BIC.
   *
   * @param values the values, none missing
   * @param most the largest number of groups that is tried
   */
  public static GaussianMixture choose(double[] values, int most) {
    GaussianMixture best = of(values, 1);
    for (int groups = 2; groups <= most && 3 * groups <= values.length; groups++) {
      GaussianMixture next = of(values, groups);
      best = next.bic() < best.bic() ? next : best;
    }
    return best;
  }

  /**
   * Returns the mixture of a given number of groups, by rising mean.
   *
   * @throws IllegalArgumentException if there are fewer than three values for each group
   * @throws NoConvergence if expectation and maximisation do not settle
   */
  public static GaussianMixture of(double[] values, int groups) {
    if (groups < 1 || values.length < 3 * groups) {
      throw new IllegalArgumentException(
          groups + " groups need at least " + 3 * groups + " values, found " + values.length);
    }
    Listening.used(CARD);
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    State state = State.start(sorted, groups);
    double before = Double.NEGATIVE_INFINITY;
    double change = Double.NaN;
    for (int step = 0; step < STEPS; step++) {
      double now = state.improve(sorted);
      change = now - before;
      if (StrictMath.abs(change) <= SETTLED * (1 + StrictMath.abs(now))) {
        return state.mixture(now, sorted.length);
      }
      before = now;
    }
    throw new NoConvergence("the mixture of " + groups + " groups", STEPS, change, before);
  }

  /** Returns the number of groups. */
  public int groups() {
    return means.length;
  }

  /** Returns the part of the values in each group. */
  public double[] weights() {
    return weights.clone();
  }

  /** Returns the means, rising. */
  public double[] means() {
    return means.clone();
  }

  /** Returns the standard deviations. */
  public double[] spreads() {
    return spreads.clone();
  }

  /** Returns the natural logarithm of the likelihood. */
  public double logLikelihood() {
    return logLikelihood;
  }

  /** Returns the Bayesian information criterion; smaller is better. */
  public double bic() {
    return (3.0 * groups() - 1) * StrictMath.log(n) - 2 * logLikelihood;
  }

  /** Returns the most likely group of a value, from 0. */
  public int groupOf(double value) {
    int best = 0;
    for (int j = 1; j < groups(); j++) {
      best =
          logDensity(value, weights[j], means[j], spreads[j])
                  > logDensity(value, weights[best], means[best], spreads[best])
              ? j
              : best;
    }
    return best;
  }

  private static double logDensity(double x, double w, double m, double s) {
    double z = (x - m) / s;
    return StrictMath.log(w) - StrictMath.log(s) - HALF_LOG_TWO_PI - z * z / 2;
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(groups() + " groups of " + n + " values")
            .column("group")
            .column("part", Units.percent)
            .column("mean")
            .column("standard deviation");
    for (int j = 0; j < groups(); j++) {
      table.row(j + 1, Units.percent(100 * weights[j]), means[j], spreads[j]);
    }
    return table.note("BIC " + connate.quantity.Numbers.text(bic())).build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  /** The groups while they are being found. */
  private static final class State {
    private final double[] w;
    private final double[] m;
    private final double[] s;
    private final double floor;

    private State(int groups, double floor) {
      this.w = new double[groups];
      this.m = new double[groups];
      this.s = new double[groups];
      this.floor = floor;
    }

    static State start(double[] sorted, int groups) {
      double all = spread(sorted, 0, sorted.length);
      if (!(all > 0)) {
        throw new IllegalArgumentException("the values are all alike: there is one group");
      }
      State state = new State(groups, NARROWEST * all);
      for (int j = 0; j < groups; j++) {
        int from = j * sorted.length / groups;
        int to = (j + 1) * sorted.length / groups;
        state.w[j] = (to - from) / (double) sorted.length;
        state.m[j] = Arrays.stream(sorted, from, to).average().orElseThrow();
        state.s[j] = Math.max(state.floor, spread(sorted, from, to));
      }
      return state;
    }

    /** One step of expectation and maximisation; returns the likelihood before it. */
    double improve(double[] x) {
      double[] sum = new double[w.length];
      double[] first = new double[w.length];
      double[] second = new double[w.length];
      double likelihood = 0;
      double[] share = new double[w.length];
      double[] constant = new double[w.length];
      for (int j = 0; j < w.length; j++) {
        constant[j] = StrictMath.log(w[j]) - StrictMath.log(s[j]) - HALF_LOG_TWO_PI;
      }
      for (double value : x) {
        likelihood += share(value, constant, share);
        for (int j = 0; j < w.length; j++) {
          double d = value - m[j];
          sum[j] += share[j];
          first[j] += share[j] * d;
          second[j] += share[j] * d * d;
        }
      }
      for (int j = 0; j < w.length; j++) {
        double shift = first[j] / sum[j];
        w[j] = sum[j] / x.length;
        s[j] = Math.max(floor, StrictMath.sqrt(Math.max(0, second[j] / sum[j] - shift * shift)));
        m[j] += shift;
      }
      return likelihood;
    }

    private double share(double value, double[] constant, double[] share) {
      double top = Double.NEGATIVE_INFINITY;
      for (int j = 0; j < w.length; j++) {
        double z = (value - m[j]) / s[j];
        share[j] = constant[j] - z * z / 2;
        top = Math.max(top, share[j]);
      }
      double sum = 0;
      for (int j = 0; j < w.length; j++) {
        share[j] = StrictMath.exp(share[j] - top);
        sum += share[j];
      }
      for (int j = 0; j < w.length; j++) {
        share[j] /= sum;
      }
      return top + StrictMath.log(sum);
    }

    GaussianMixture mixture(double likelihood, int n) {
      Integer[] order = new Integer[w.length];
      Arrays.setAll(order, j -> j);
      Arrays.sort(order, (a, b) -> Double.compare(m[a], m[b]));
      double[][] out = new double[3][w.length];
      for (int j = 0; j < w.length; j++) {
        out[0][j] = w[order[j]];
        out[1][j] = m[order[j]];
        out[2][j] = s[order[j]];
      }
      return new GaussianMixture(out[0], out[1], out[2], likelihood, n);
    }

    private static double spread(double[] x, int from, int to) {
      double mean = Arrays.stream(x, from, to).average().orElseThrow();
      double sum = Arrays.stream(x, from, to).map(v -> (v - mean) * (v - mean)).sum();
      return StrictMath.sqrt(sum / (to - from));
    }
  }
}
