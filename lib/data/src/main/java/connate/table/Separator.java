package connate.table;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Finds the character that stands between the cells of a CSV file. */
final class Separator {

  private static final char[] KNOWN = {';', '\t', '|', ','};
  private static final int LOOKED_AT = 200;

  private Separator() {}

  /** Returns what the file says in a first line such as {@code sep=;}, 0 where it says nothing. */
  static char stated(String text) {
    boolean states =
        text.length() > 5
            && text.substring(0, 4).toLowerCase(Locale.ROOT).equals("sep=")
            && Lines.isBreak(text.charAt(5));
    return states ? text.charAt(4) : 0;
  }

  /** Returns the one by which most lines have the same number of cells, more than one. */
  static char of(String text) {
    List<String> lines = first(text);
    char best = ',';
    int most = 0;
    for (char candidate : KNOWN) {
      int alike = alike(lines, candidate);
      if (alike > most) {
        most = alike;
        best = candidate;
      }
    }
    return best;
  }

  private static List<String> first(String text) {
    List<String> lines = new ArrayList<>();
    int at = 0;
    while (at < text.length() && lines.size() < LOOKED_AT) {
      int end = at;
      while (end < text.length() && !Lines.isBreak(text.charAt(end))) {
        end++;
      }
      String line = text.substring(at, end);
      if (!line.isBlank() && line.charAt(0) != '#') {
        lines.add(line);
      }
      at = end + 1;
    }
    return lines;
  }

  private static int alike(List<String> lines, char separator) {
    Map<Integer, Integer> counts = new HashMap<>();
    for (String line : lines) {
      int found = count(line, separator);
      if (found > 0) {
        counts.merge(found, 1, Integer::sum);
      }
    }
    int most = 0;
    for (int count : counts.values()) {
      most = Math.max(most, count);
    }
    return most;
  }

  /** Returns how often the separator stands in a line outside of quotes; inches quote nothing. */
  static int count(String line, char separator) {
    int found = 0;
    boolean quoted = false;
    boolean fresh = true;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      quoted ^= c == '"' && (quoted || fresh);
      boolean parts = c == separator && !quoted;
      found += parts ? 1 : 0;
      fresh = parts || fresh && c == ' ';
    }
    return found;
  }
}
