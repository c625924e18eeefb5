package connate.protocol;

import java.io.IOException;

/** What came from the other process is no frame of this protocol. */
public final class BadFrame extends IOException {

  private static final long serialVersionUID = 1L;

  /** Makes the exception. */
  public BadFrame(String found) {
    super("bad frame: " + found);
  }
}
