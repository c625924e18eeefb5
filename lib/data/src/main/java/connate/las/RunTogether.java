package connate.las;

import java.util.ArrayList;
import java.util.List;

/** Splits numbers of fixed width that touch each other, such as {@code -999.250-999.250}. */
final class RunTogether {

  private RunTogether() {}

  /** Returns the places of a line's items, with each number that touches a minus sign split off. */
  static List<int[]> split(String line, List<int[]> places) {
    List<int[]> out = new ArrayList<>();
    for (int[] place : places) {
      int from = place[0];
      for (int i = from + 1; i < place[1]; i++) {
        if (line.charAt(i) == '-' && isDigitOrPoint(line.charAt(i - 1))) {
          out.add(new int[] {from, i});
          from = i;
        }
      }
      out.add(new int[] {from, place[1]});
    }
    return isAllPlain(line, out) ? out : places;
  }

  private static boolean isDigitOrPoint(char c) {
    return c >= '0' && c <= '9' || c == '.';
  }

  private static boolean isAllPlain(String line, List<int[]> places) {
    return places.stream()
        .noneMatch(p -> Double.isNaN(NumberScan.plain(line.substring(p[0], p[1]))));
  }
}
