package connate.engine;

/** Unwinds a command that is to be stopped. */
final class Stopped extends Error {

  private static final long serialVersionUID = 1L;

  Stopped() {
    super("stopped", null, false, false);
  }
}
