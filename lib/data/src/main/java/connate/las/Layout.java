package connate.las;

import java.util.ArrayList;
import java.util.List;

/**
 * How the values of the data stand: one row a line or wrapped, split by blanks, commas or tabs,
 * with a point or a comma for decimals. Header and data often disagree; the data win where they are
 * clear, with a caution.
 *
 * @param delimiter the byte between values, 0 for a run of blanks
 * @param point the byte before the decimals
 * @param wrapped true where a row runs over several lines
 */
record Layout(byte delimiter, byte point, boolean wrapped) {

  private static final int LOOK_AHEAD = 3;

  /** Returns the layout that the data have. */
  static Layout of(LasText text, Block block, Layout stated, Quirks quirks) {
    List<int[]> lines = firstLines(text, block.from(), block.to(), LOOK_AHEAD);
    for (int[] line : lines) {
      String words = text.text(line[0], line[1]);
      for (byte delimiter : new byte[] {stated.delimiter, 0, ',', '\t', ';'}) {
        if (fits(words, delimiter, block.columns())) {
          Layout found = new Layout(delimiter, point(text, block, words, delimiter), false);
          return settled(stated, found, text.lineOf(line[0]), block.columns(), quirks);
        }
      }
    }
    if (!stated.wrapped && isWrapped(text, block)) {
      Layout found = new Layout((byte) 0, (byte) '.', true);
      return settled(stated, found, text.lineOf(lines.get(0)[0]), block.columns(), quirks);
    }
    return stated;
  }

  private static Layout settled(Layout stated, Layout found, int line, int columns, Quirks quirks) {
    boolean wrapped = columns == 1 ? stated.wrapped : found.wrapped;
    if (wrapped != stated.wrapped) {
      quirks.caution(
          "L48",
          line,
          "WRAP says "
              + (stated.wrapped ? "YES" : "NO")
              + ", but a row stands on "
              + (found.wrapped ? "several lines" : "one line")
              + ": read so");
    }
    if (found.delimiter != stated.delimiter) {
      quirks.caution(
          "L48",
          line,
          "values are split by "
              + named(found.delimiter)
              + " where the header says "
              + named(stated.delimiter)
              + ": read so");
    }
    if (found.point == ',') {
      quirks.caution("L47", line, "decimals stand behind a comma: read as decimal numbers");
    }
    return new Layout(found.delimiter, found.point, wrapped);
  }

  private static String named(byte delimiter) {
    return switch (delimiter) {
      case ',' -> "commas";
      case '\t' -> "tabs";
      case ';' -> "semicolons";
      default -> "blanks";
    };
  }

  private static boolean fits(String words, byte delimiter, int columns) {
    List<String> items = Items.split(words, delimiter);
    if (items.size() != columns) {
      return false;
    }
    if (delimiter != 0 || columns == 1) {
      return true;
    }
    for (String item : items.subList(0, columns - 1)) {
      if (item.endsWith(",") || item.endsWith(";")) {
        return false;
      }
    }
    return true;
  }

  /** Returns a comma where every value of the data has its decimals behind a comma, clearly. */
  private static byte point(LasText text, Block block, String words, byte delimiter) {
    if (delimiter == ',' || words.indexOf(',') < 0 || !isCommaClear(words, delimiter)) {
      return '.';
    }
    for (int i = block.from(); i < block.to(); i++) {
      if (text.bytes[i] == '.') {
        return '.';
      }
    }
    return ',';
  }

  private static boolean isCommaClear(String words, byte delimiter) {
    return Items.split(words, delimiter).stream()
        .anyMatch(i -> i.matches("[+-]?\\d+,\\d+") && i.length() - i.indexOf(',') != 4);
  }

  private static boolean isWrapped(LasText text, Block block) {
    int items = 0;
    for (int[] line : firstLines(text, block.from(), block.to(), block.columns())) {
      int here = Items.split(text.text(line[0], line[1]), (byte) 0).size();
      if (items == 0 && here != 1) {
        return false;
      }
      items += here;
      if (items >= block.columns()) {
        return items == block.columns() && block.columns() > 1;
      }
    }
    return false;
  }

  /** Returns the first lines that are neither blank nor comments, as pairs of offsets. */
  static List<int[]> firstLines(LasText text, int from, int to, int most) {
    List<int[]> lines = new ArrayList<>();
    for (int at = from; at < to && lines.size() < most; at = text.afterLine(text.lineEnd(at))) {
      int end = text.lineEnd(at);
      int first = text.skipBlanks(at);
      if (first < end && text.bytes[first] != '#') {
        lines.add(new int[] {at, end});
      }
    }
    return lines;
  }
}
