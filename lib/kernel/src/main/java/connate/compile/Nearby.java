package connate.compile;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Finds the name that somebody may have meant. */
final class Nearby {

  private Nearby() {}

  /** Returns the nearest of some names, where one is near. */
  static Optional<String> name(String wanted, List<String> names) {
    String low = wanted.toLowerCase(Locale.ROOT);
    int most = Math.max(1, wanted.length() / 3);
    return names.stream()
        .filter(n -> distance(low, n.toLowerCase(Locale.ROOT)) <= most)
        .min(Comparator.comparingInt(n -> distance(low, n.toLowerCase(Locale.ROOT))));
  }

  private static int distance(String a, String b) {
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(change, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()];
  }
}
