package connate.console;

import connate.text.Ink;
import connate.text.ItemText;
import java.io.PrintWriter;
import java.util.function.IntSupplier;

/** Where the console writes: lines of a terminal or of a pipe. */
final class Screen {

  private final PrintWriter out;
  private final IntSupplier width;
  private final Ink ink;
  private final boolean moving;
  private boolean statusShown;

  /**
   * Makes a screen.
   *
   * @param moving whether a line may be drawn over, as on a terminal that is not dumb
   */
  Screen(PrintWriter out, IntSupplier width, Ink ink, boolean moving) {
    this.out = out;
    this.width = width;
    this.ink = ink;
    this.moving = moving;
  }

  Ink ink() {
    return ink;
  }

  /** Returns what sets items for the width that the terminal has now. */
  ItemText setter() {
    return new ItemText(width(), ink);
  }

  int width() {
    int known = width.getAsInt();
    return known > 0 ? known : 80;
  }

  /** Writes a line, or several. */
  synchronized void line(String text) {
    clearStatus();
    out.println(text);
    out.flush();
  }

  /** Writes as it comes, without an end of line. */
  synchronized void raw(String text) {
    clearStatus();
    out.print(text);
    out.flush();
  }

  /** Shows how far something is, in one line that the next line replaces. */
  synchronized void status(String text) {
    if (moving) {
      String cut = text.length() < width() ? text : text.substring(0, width() - 1);
      out.print("\r\u001b[K" + ink.faint(cut));
      out.flush();
      statusShown = true;
    }
  }

  /** Takes the status line away. */
  synchronized void clearStatus() {
    if (statusShown) {
      out.print("\r\u001b[K");
      out.flush();
      statusShown = false;
    }
  }
}
