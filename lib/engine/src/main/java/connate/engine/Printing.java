package connate.engine;

import connate.protocol.Event;
import java.io.ByteArrayOutputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;

/** Standard output or error of the user's commands, told line by line. */
final class Printing extends OutputStream {

  private static final int CHUNK = 8192;
  private static final int MOST = 1 << 20;

  private final Teller teller;
  private final boolean error;
  private final ByteArrayOutputStream line = new ByteArrayOutputStream();
  private int told;

  Printing(Teller teller, boolean error) {
    this.teller = teller;
    this.error = error;
  }

  @Override
  public synchronized void write(int b) {
    line.write(b);
    if (b == '\n' || line.size() >= CHUNK && b >= 0) {
      flushLine();
    }
  }

  @Override
  public synchronized void write(byte[] bytes, int offset, int length) {
    int last = offset + length;
    int from = offset;
    for (int at = offset; at < last; at++) {
      if (bytes[at] == '\n') {
        line.write(bytes, from, at + 1 - from);
        flushLine();
        from = at + 1;
      }
    }
    line.write(bytes, from, last - from);
    if (line.size() >= CHUNK) {
      flushLine();
    }
  }

  /** Tells what is left; a command ends. */
  synchronized void end() {
    flushLine();
    told = 0;
  }

  private void flushLine() {
    if (line.size() == 0) {
      return;
    }
    String text = line.toString(StandardCharsets.UTF_8);
    line.reset();
    if (told < MOST) {
      told += text.length();
      String cut = told < MOST ? text : text + "\n(what it printed after this is not shown)\n";
      teller.tell(new Event.Printed(cut, error));
    }
  }
}
