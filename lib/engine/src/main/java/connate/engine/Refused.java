package connate.engine;

/** A command asked for what the guard does not allow. */
final class Refused extends RuntimeException {

  private static final long serialVersionUID = 1L;

  Refused(String message) {
    super(message);
  }
}
