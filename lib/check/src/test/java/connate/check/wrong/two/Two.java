package connate.check.wrong.two;

import connate.check.wrong.one.One;

/** Breaks a rule on purpose: needs {@link One}, which needs this. */
public final class Two {

  private Two() {}

  /** Passes on. */
  public static int next(int steps) {
    return steps == 0 ? 0 : One.next(steps - 1);
  }
}
