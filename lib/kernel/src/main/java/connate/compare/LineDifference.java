package connate.compare;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** The lines to take out and to put in between two texts: the least number of them. */
final class LineDifference {

  private static final int LARGEST = 4000;

  private LineDifference() {}

  /**
   * A line put in or taken out.
   *
   * @param line its number, in the new text where it was put in, else in the old
   * @param text the line
   * @param isAdded whether it was put in
   */
  record Edit(int line, String text, boolean isAdded) {}

  static List<Edit> of(List<String> old, List<String> now) {
    int start = 0;
    while (start < Math.min(old.size(), now.size()) && old.get(start).equals(now.get(start))) {
      start++;
    }
    int end = 0;
    while (end < Math.min(old.size(), now.size()) - start
        && old.get(old.size() - 1 - end).equals(now.get(now.size() - 1 - end))) {
      end++;
    }
    List<String> a = old.subList(start, old.size() - end);
    List<String> b = now.subList(start, now.size() - end);
    return a.size() > LARGEST || b.size() > LARGEST ? whole(a, b, start) : edits(a, b, start);
  }

  private static List<Edit> whole(List<String> a, List<String> b, int start) {
    List<Edit> out = new ArrayList<>();
    for (int i = 0; i < a.size(); i++) {
      out.add(new Edit(start + i + 1, a.get(i), false));
    }
    for (int i = 0; i < b.size(); i++) {
      out.add(new Edit(start + i + 1, b.get(i), true));
    }
    return out;
  }

  /** By the longest common subsequence. */
  private static List<Edit> edits(List<String> a, List<String> b, int start) {
    int[][] common = new int[a.size() + 1][b.size() + 1];
    for (int i = 1; i <= a.size(); i++) {
      for (int j = 1; j <= b.size(); j++) {
        common[i][j] =
            a.get(i - 1).equals(b.get(j - 1))
                ? common[i - 1][j - 1] + 1
                : Math.max(common[i - 1][j], common[i][j - 1]);
      }
    }
    List<Edit> out = new ArrayList<>();
    int i = a.size();
    int j = b.size();
    while (i > 0 || j > 0) {
      if (i > 0 && j > 0 && a.get(i - 1).equals(b.get(j - 1))) {
        i--;
        j--;
      } else if (j > 0 && (i == 0 || common[i][j - 1] >= common[i - 1][j])) {
        out.add(new Edit(start + j, b.get(--j), true));
      } else {
        out.add(new Edit(start + i, a.get(--i), false));
      }
    }
    Collections.reverse(out);
    return out;
  }
}
