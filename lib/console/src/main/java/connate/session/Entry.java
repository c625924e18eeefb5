package connate.session;

/**
 * One line of a journal.
 *
 * @param kind what it tells
 * @param number the number of the command that it concerns, 0 where it concerns none
 * @param text the text typed, or what went wrong
 */
record Entry(Kind kind, int number, String text) {

  /** What a line of a journal tells, with the character that it starts with. */
  enum Kind {
    TYPED('>'),
    WORKED('='),
    FAILED('!'),
    UNDONE('-'),
    SAVED('s'),
    FOLDER('@'),
    CLOSED('.');

    private final char mark;

    Kind(char mark) {
      this.mark = mark;
    }
  }

  /** Returns the entry as one line without its end. */
  String line() {
    return kind.mark + " " + number + " " + escaped(text);
  }

  /** Reads a line; returns {@code null} for one that was cut off or is none of ours. */
  static Entry read(String line) {
    int gap = line.indexOf(' ', 2);
    if (line.length() < 4 || line.charAt(1) != ' ' || gap < 0) {
      return null;
    }
    for (Kind kind : Kind.values()) {
      if (kind.mark == line.charAt(0)) {
        return read(kind, line.substring(2, gap), line.substring(gap + 1));
      }
    }
    return null;
  }

  private static Entry read(Kind kind, String number, String text) {
    try {
      return new Entry(kind, Integer.parseInt(number), plain(text));
    } catch (NumberFormatException e) {
      return null;
    }
  }

  private static String escaped(String text) {
    return text.replace("\\", "\\\\").replace("\r", "\\r").replace("\n", "\\n");
  }

  private static String plain(String text) {
    StringBuilder out = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '\\' && i + 1 < text.length()) {
        char next = text.charAt(++i);
        out.append(next == 'n' ? '\n' : next == 'r' ? '\r' : next);
      } else {
        out.append(c);
      }
    }
    return out.toString();
  }
}
