package connate.table;

import connate.method.Caution;
import connate.method.Listening;

/**
 * The lines above a table that start with {@code #} or {@code %}. They are passed over, but for the
 * last where it holds the names of the columns: some programs write {@code # depth, porosity}.
 */
final class CommentLines {

  private CommentLines() {}

  /** Returns the text with its comment lines blank, so that all places stay. */
  static String blanked(String file, String text, char separator) {
    int end = 0;
    int last = -1;
    while (end < text.length() && (isMark(text, end) || Lines.isBreak(text.charAt(end)))) {
      last = isMark(text, end) ? end : last;
      end = next(text, end);
    }
    if (last < 0) {
      return text;
    }
    boolean names = isHeader(line(text, last), line(text, end), separator);
    StringBuilder out = new StringBuilder(text);
    int blank = names ? last : end;
    for (int at = 0; at < blank; at++) {
      if (!Lines.isBreak(out.charAt(at))) {
        out.setCharAt(at, ' ');
      }
    }
    if (names) {
      tell(file, text, last);
      boolean percent = text.charAt(last) == '%' && !Character.isWhitespace(text.charAt(last + 1));
      out.setCharAt(last, percent ? '%' : ' ');
    }
    return out.toString();
  }

  private static void tell(String file, String text, int at) {
    int line = (int) text.substring(0, at).lines().count() + 1;
    Listening.caution(
        Caution.of(
            "T30",
            file,
            file + ": the names of the columns were taken from the comment in line " + line));
  }

  private static boolean isMark(String text, int at) {
    return text.charAt(at) == '#' || text.charAt(at) == '%';
  }

  /** A comment holds the names where it has as many cells as the row of numbers beneath it. */
  private static boolean isHeader(String comment, String row, char separator) {
    int cells = Separator.count(row, separator);
    if (cells == 0 || Separator.count(comment, separator) != cells) {
      return false;
    }
    for (String cell : row.split(java.util.regex.Pattern.quote(String.valueOf(separator)), -1)) {
      String bare = cell.strip();
      if (!Missing.isWord(bare)
          && Double.isNaN(Cells.number(bare, separator != ','))
          && Double.isNaN(Cells.number(bare, false))) {
        return false;
      }
    }
    return true;
  }

  private static String line(String text, int at) {
    int end = at;
    while (end < text.length() && !Lines.isBreak(text.charAt(end))) {
      end++;
    }
    return text.substring(at, end);
  }

  private static int next(String text, int at) {
    return Math.min(text.length(), at + line(text, at).length() + 1);
  }
}
