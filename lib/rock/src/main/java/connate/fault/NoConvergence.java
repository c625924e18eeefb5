package connate.fault;

/** A computation by steps that did not settle. */
public final class NoConvergence extends RuntimeException {

  private static final long serialVersionUID = 1L;

  private final int iterations;
  private final double residual;
  private final double best;

  /**
   * Makes the exception.
   *
   * @param what the computation in words
   * @param iterations the number of steps made
   * @param residual what was left at the end
   * @param best the best value reached, NaN where there is none to tell
   */
  public NoConvergence(String what, int iterations, double residual, double best) {
    super(
        what
            + " did not settle in "
            + iterations
            + " steps: residual "
            + residual
            + ", best "
            + best);
    this.iterations = iterations;
    this.residual = residual;
    this.best = best;
  }

  /** Returns the number of steps made. */
  public int iterations() {
    return iterations;
  }

  /** Returns what was left at the end. */
  public double residual() {
    return residual;
  }

  /** Returns the best value reached. */
  public double best() {
    return best;
  }
}
