package connate.console;

/** Exit statuses. */
final class Exit {

  static final int DONE = 0;
  static final int FAILED = 1;
  static final int USAGE = 2;
  static final int BAD_INPUT = 3;
  static final int REFUSED = 4;
  static final int OUR_FAULT = 70;
  static final int INTERRUPTED = 130;

  private Exit() {}
}
