package connate.chance;

import java.util.ArrayList;
import java.util.List;

/**
 * How runs are drawn: the seed, plain or Latin hypercube, and which inputs go together. Results
 * depend on these and on nothing else, in particular not on the number of threads.
 *
 * @param seed the seed
 * @param latinHypercube whether each input is drawn once from each of n equal slices
 * @param correlations the pairs that go together
 */
public record Sampling(long seed, boolean latinHypercube, List<Correlation> correlations) {

  /**
   * Two inputs that go together.
   *
   * @param first one input
   * @param second the other
   * @param rho the correlation of their normal scores, between -1 and 1
   */
  public record Correlation(String first, String second, double rho) {

    /** Checks the correlation. */
    public Correlation {
      if (!(rho > -1 && rho < 1)) {
        throw new IllegalArgumentException("a correlation is between -1 and 1, found " + rho);
      }
      if (first.equals(second)) {
        throw new IllegalArgumentException("«" + first + "» goes with itself already");
      }
    }
  }

  /** Copies the list. */
  public Sampling {
    correlations = List.copyOf(correlations);
  }

  /** Returns plain independent draws. */
  public static Sampling seed(long seed) {
    return new Sampling(seed, false, List.of());
  }

  /** Returns the same with each input drawn once from each of n equal slices. */
  public Sampling byLatinHypercube() {
    return new Sampling(seed, true, correlations);
  }

  /** Returns the same with two inputs going together; slices no longer hold for the second. */
  public Sampling correlated(String first, String second, double rho) {
    List<Correlation> more = new ArrayList<>(correlations);
    more.add(new Correlation(first, second, rho));
    return new Sampling(seed, latinHypercube, more);
  }

  @Override
  public String toString() {
    return "seed " + seed + (latinHypercube ? ", Latin hypercube" : "");
  }
}
