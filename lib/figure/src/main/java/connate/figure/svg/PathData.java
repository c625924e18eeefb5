package connate.figure.svg;

/**
 * Writes the {@code d} of a path with as few characters as can be: tenths of a pixel, relative
 * moves, no blank where a sign parts two numbers. Positions are kept in whole tenths, so that
 * rounding never adds up along a path.
 */
final class PathData {

  private static final double FARTHEST = 1e6;

  private final StringBuilder out = new StringBuilder();
  private long atX;
  private long atY;
  private long startX;
  private long startY;
  private char last;
  private boolean empty = true;

  /** Starts a new piece of line. */
  void move(double x, double y) {
    long tx = tenths(x);
    long ty = tenths(y);
    out.append(empty ? 'M' : 'm');
    number(empty ? tx : tx - atX, true);
    number(empty ? ty : ty - atY, false);
    atX = tx;
    atY = ty;
    startX = tx;
    startY = ty;
    last = 'm';
    empty = false;
  }

  /** Draws to a point; nothing is written where it rounds to the point before. */
  void line(double x, double y) {
    step(tenths(x) - atX, tenths(y) - atY);
  }

  /** Draws by a step, in pixels. */
  void by(double dx, double dy) {
    step(tenths(dx), tenths(dy));
  }

  /** Draws a stroke of no length: with round or square ends it is a dot. */
  void dot() {
    out.append("h0");
    last = 'h';
  }

  /** Closes the piece. */
  void close() {
    out.append('z');
    atX = startX;
    atY = startY;
    last = 'z';
  }

  boolean isEmpty() {
    return empty;
  }

  private void step(long dx, long dy) {
    if (dx == 0 && dy == 0) {
      return;
    }
    if (dy == 0) {
      command('h');
      number(dx, out.charAt(out.length() - 1) == 'h');
    } else if (dx == 0) {
      command('v');
      number(dy, out.charAt(out.length() - 1) == 'v');
    } else {
      command('l');
      number(dx, out.charAt(out.length() - 1) == 'l');
      number(dy, false);
    }
    atX += dx;
    atY += dy;
  }

  private void command(char c) {
    if (last != c) {
      out.append(c);
      last = c;
    }
  }

  private void number(long tenths, boolean first) {
    if (tenths >= 0 && !first) {
      out.append(' ');
    }
    tenths(out, tenths);
  }

  /** Returns a coordinate in tenths of a pixel. */
  static long tenths(double pixels) {
    if (Double.isNaN(pixels)) {
      throw new IllegalArgumentException("a coordinate of a figure is not a number");
    }
    return Math.round(Math.max(-FARTHEST, Math.min(FARTHEST, pixels)) * 10);
  }

  /** Writes a number of tenths as a decimal, {@code -.5} for -5. */
  static void tenths(StringBuilder out, long tenths) {
    long size = Math.abs(tenths);
    if (tenths < 0) {
      out.append('-');
    }
    if (size >= 10 || size == 0) {
      out.append(size / 10);
    }
    if (size % 10 != 0) {
      out.append('.').append(size % 10);
    }
  }

  /** Returns a coordinate as text. */
  static String text(double pixels) {
    StringBuilder out = new StringBuilder();
    tenths(out, tenths(pixels));
    return out.toString();
  }

  @Override
  public String toString() {
    return out.toString();
  }
}
