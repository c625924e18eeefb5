package connate.las;

import java.util.ArrayList;
import java.util.List;

/** Splits a line of data into its items. */
final class Items {

  private Items() {}

  /**
   * Returns the items of a line.
   *
   * @param line the line
   * @param delimiter the byte between items; 0 for a run of blanks, which leaves no empty items
   */
  static List<String> split(String line, byte delimiter) {
    List<String> items = new ArrayList<>();
    for (int[] place : places(line, delimiter)) {
      items.add(bare(line.substring(place[0], place[1])));
    }
    return items;
  }

  /** Returns start and end of each item, without blanks around it, with its quotes. */
  static List<int[]> places(String line, byte delimiter) {
    return delimiter == 0 ? byBlanks(line) : byDelimiter(line, (char) delimiter);
  }

  /** Returns an item without its quotes. */
  static String bare(String item) {
    boolean quoted = item.length() >= 2 && item.startsWith("\"") && item.endsWith("\"");
    return quoted ? item.substring(1, item.length() - 1) : item;
  }

  private static List<int[]> byBlanks(String line) {
    List<int[]> places = new ArrayList<>();
    int i = 0;
    while (i < line.length()) {
      while (i < line.length() && isBlank(line.charAt(i))) {
        i++;
      }
      int from = i;
      boolean quoted = i < line.length() && line.charAt(i) == '"' && line.indexOf('"', i + 1) > 0;
      if (quoted) {
        i = line.indexOf('"', i + 1) + 1;
      }
      while (i < line.length() && !isBlank(line.charAt(i))) {
        i++;
      }
      if (i > from) {
        places.add(new int[] {from, i});
      }
    }
    return places;
  }

  private static List<int[]> byDelimiter(String line, char delimiter) {
    List<int[]> places = new ArrayList<>();
    int from = 0;
    while (from <= line.length()) {
      int end = itemEnd(line, from, delimiter);
      places.add(stripped(line, from, end));
      from = end + 1;
    }
    return places;
  }

  /** Returns the end of an item; a quote opens only at its start and closes only at its end. */
  private static int itemEnd(String line, int from, char delimiter) {
    int first = from;
    while (first < line.length()
        && isBlank(line.charAt(first))
        && line.charAt(first) != delimiter) {
      first++;
    }
    if (first < line.length() && line.charAt(first) == '"') {
      int close = line.indexOf('"', first + 1);
      while (close >= 0) {
        int next = close + 1;
        while (next < line.length() && line.charAt(next) == ' ') {
          next++;
        }
        if (next == line.length() || line.charAt(next) == delimiter) {
          return next;
        }
        close = line.indexOf('"', close + 1);
      }
    }
    int end = line.indexOf(delimiter, from);
    return end < 0 ? line.length() : end;
  }

  private static int[] stripped(String line, int from, int to) {
    int start = from;
    int end = to;
    while (start < end && isBlank(line.charAt(start))) {
      start++;
    }
    while (end > start && isBlank(line.charAt(end - 1))) {
      end--;
    }
    return new int[] {start, end};
  }

  private static boolean isBlank(char c) {
    return c == ' ' || c == '\t';
  }
}
