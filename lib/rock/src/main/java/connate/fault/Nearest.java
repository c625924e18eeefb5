package connate.fault;

import java.util.Collection;
import java.util.Locale;

/** Finds the name that is meant by a misspelt one. */
public final class Nearest {

  private Nearest() {}

  /** Returns {@code «NAME»; nearest: …; it has …} for a name that is not among the known. */
  public static String miss(String wanted, Collection<String> known) {
    String nearest = "";
    int least = Integer.MAX_VALUE;
    for (String name : known) {
      int distance = distance(wanted.toUpperCase(Locale.ROOT), name.toUpperCase(Locale.ROOT));
      if (distance < least) {
        least = distance;
        nearest = name;
      }
    }
    boolean isNear = least <= Math.max(1, wanted.length() / 2);
    return "«"
        + wanted
        + "»"
        + (isNear ? "; nearest is " + nearest : "")
        + "; there are "
        + (known.isEmpty() ? "none" : String.join(", ", known));
  }

  /** Counts the letters to insert, remove or change (Levenshtein 1966), a swap counting as one. */
  public static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : cheapest(a, b, d, i, j);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int cheapest(String a, String b, int[][] d, int i, int j) {
    int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
    int best = Math.min(Math.min(d[i - 1][j], d[i][j - 1]) + 1, d[i - 1][j - 1] + change);
    boolean isSwap =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return isSwap ? Math.min(best, d[i - 2][j - 2] + 1) : best;
  }
}
