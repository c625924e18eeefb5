package connate.las;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/** Finds the sections of a file: each starts at a line whose first character is a tilde. */
final class Sections {

  /**
   * A section by its bytes.
   *
   * @param title the title line as it stands
   * @param titleFrom the offset of the tilde
   * @param bodyFrom the offset of the first byte below the title
   * @param bodyTo the offset behind the last byte
   */
  record Raw(String title, int titleFrom, int bodyFrom, int bodyTo) {

    /** Returns the title from its first letter to a blank, bar or colon, in capitals. */
    String word() {
      return wordOf(title);
    }

    /** Returns the letter that decides in versions 1.2 and 2.0, 0 where there is none. */
    char letter() {
      String word = word();
      return word.isEmpty() ? 0 : word.charAt(0);
    }
  }

  private static final Set<String> FULL_NAMES =
      Set.of(
          "VERSION",
          "WELL",
          "CURVE",
          "CURVES",
          "PARAMETER",
          "PARAMETERS",
          "OTHER",
          "ASCII",
          "VERSION_INFORMATION",
          "WELL_INFORMATION",
          "CURVE_INFORMATION",
          "PARAMS",
          "A",
          "C",
          "P",
          "W",
          "V",
          "O");

  /** Searched piece by piece: the JDK looks for a character in a text many bytes at a time. */
  private static final int PIECE = 1 << 16;

  private final LasText text;
  private final List<Raw> found = new ArrayList<>();
  private int titleFrom = -1;
  private int titleTo;
  private String title = "";

  private Sections(LasText text) {
    this.text = text;
  }

  /** Returns the sections in the order of the file. */
  static List<Raw> scan(LasText text) {
    return new Sections(text).run();
  }

  private List<Raw> run() {
    for (int from = text.from; from < text.to; from += PIECE) {
      int length = Math.min(PIECE, text.to - from);
      String piece = new String(text.bytes, from, length, StandardCharsets.ISO_8859_1);
      for (int at = piece.indexOf('~'); at >= 0; at = piece.indexOf('~', at + 1)) {
        if (isFirstInLine(from + at)) {
          open(from + at);
        }
      }
    }
    close(text.to);
    return found;
  }

  private boolean isFirstInLine(int at) {
    int i = at - 1;
    while (i >= text.from && isPadding(text.bytes[i])) {
      i--;
    }
    return i < text.from || text.bytes[i] == '\n' || text.bytes[i] == '\r';
  }

  private static boolean isPadding(byte b) {
    return b == ' ' || b == '\t' || b == '"';
  }

  private void open(int at) {
    int end = text.lineEnd(at);
    String line = text.text(at, end);
    if (isInFreeText() && !FULL_NAMES.contains(wordOf(line))) {
      return;
    }
    close(text.lineStart(at));
    titleFrom = at;
    titleTo = end;
    title = line;
  }

  private boolean isInFreeText() {
    return titleFrom >= 0 && wordOf(title).startsWith("O");
  }

  private void close(int bodyTo) {
    if (titleFrom >= 0) {
      int bodyFrom = Math.min(text.afterLine(titleTo), bodyTo);
      found.add(new Raw(title, titleFrom, bodyFrom, bodyTo));
    }
  }

  private static String wordOf(String title) {
    String rest = title.substring(1).strip();
    int end = 0;
    while (end < rest.length() && " \t|:\"".indexOf(rest.charAt(end)) < 0) {
      end++;
    }
    return rest.substring(0, end).toUpperCase(Locale.ROOT);
  }
}
