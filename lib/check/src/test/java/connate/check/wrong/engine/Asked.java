package connate.check.wrong.engine;

/** What {@link connate.check.wrong.data.Asking} must not know. */
public final class Asked {

  private Asked() {}

  /** Answers. */
  public static int answer() {
    return 1;
  }
}
