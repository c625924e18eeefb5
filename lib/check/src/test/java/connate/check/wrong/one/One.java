package connate.check.wrong.one;

import connate.check.wrong.two.Two;

/** Breaks a rule on purpose: needs {@link Two}, which needs this. */
public final class One {

  private One() {}

  /** Passes on. */
  public static int next(int steps) {
    return steps == 0 ? 0 : Two.next(steps - 1);
  }
}
