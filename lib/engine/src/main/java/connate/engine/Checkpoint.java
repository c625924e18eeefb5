package connate.engine;

/**
 * Where a running command may be stopped. The weaver puts a call to {@link #pass} at the start of
 * every method of the user's classes and before every jump backwards.
 */
public final class Checkpoint {

  private static volatile boolean wanted;

  private Checkpoint() {}

  /** Goes on, or throws where the command is to be stopped. */
  public static void pass() {
    if (wanted) {
      throw new Stopped();
    }
  }

  static void want(boolean stop) {
    wanted = stop;
  }

  static boolean isWanted() {
    return wanted;
  }
}
