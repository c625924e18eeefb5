package connate.table;

/** The lines of a text, found when a message needs one: most files are read without. */
final class Lines {

  private final String text;

  Lines(String text) {
    this.text = text;
  }

  /**
   * Where a cell begins.
   *
   * @param line its line, counted from 1
   * @param column its first character in that line, counted from 1
   * @param text the line
   */
  record Place(int line, int column, String text) {}

  /**
   * Returns where a cell of a row begins, blanks and a quote left aside. It may be on a later line
   * than the row: a quoted cell before it can hold line breaks.
   *
   * @param line the line on which the row begins
   * @param cell the number of the cell, counted from 0
   */
  Place place(int line, int cell, char separator) {
    int at = start(line);
    for (int i = 0; i < cell; i++) {
      at = nextCell(at, separator);
    }
    int first = pastBlanks(at, separator);
    int start = first;
    while (start > 0 && !isBreak(text.charAt(start - 1))) {
      start--;
    }
    return new Place(lineAt(first), first - start + 1, text.substring(start, end(start)));
  }

  /** Returns a line. */
  String line(int line) {
    int start = start(line);
    return text.substring(start, end(start));
  }

  /** Returns where the next cell begins; only a quote at a cell's start quotes. */
  private int nextCell(int from, char separator) {
    int at = from;
    while (at < text.length() && text.charAt(at) == ' ') {
      at++;
    }
    boolean quoted = at < text.length() && text.charAt(at) == '"';
    boolean open = quoted;
    at += quoted ? 1 : 0;
    while (at < text.length() && (open || text.charAt(at) != separator)) {
      char c = text.charAt(at);
      if (!open && isBreak(c)) {
        return at;
      }
      open ^= quoted && c == '"';
      at++;
    }
    return Math.min(text.length(), at + 1);
  }

  private int pastBlanks(int from, char separator) {
    int at = from;
    while (at < text.length() && text.charAt(at) != separator && isBlank(text.charAt(at))) {
      at++;
    }
    return at < text.length() && text.charAt(at) == '"' ? at + 1 : at;
  }

  private static boolean isBlank(char c) {
    return c == ' ' || c == '\t';
  }

  private int lineAt(int offset) {
    int line = 1;
    for (int at = end(0); at < offset; at = end(pastBreak(at))) {
      line++;
    }
    return line;
  }

  private int start(int line) {
    int at = 0;
    for (int here = 1; here < line && at < text.length(); here++) {
      at = pastBreak(end(at));
    }
    return at;
  }

  private int end(int start) {
    int at = start;
    while (at < text.length() && !isBreak(text.charAt(at))) {
      at++;
    }
    return at;
  }

  private int pastBreak(int at) {
    boolean pair = at + 1 < text.length() && text.charAt(at) == '\r' && text.charAt(at + 1) == '\n';
    return Math.min(text.length(), at + (pair ? 2 : 1));
  }

  static boolean isBreak(char c) {
    return c == '\n' || c == '\r';
  }
}
