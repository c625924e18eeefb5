package connate.figure;

import connate.quantity.Numbers;
import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The rows of each group, in the order in which the groups first stand.
 *
 * @param by what the rows are grouped by
 * @param rows the rows of each group
 */
record Groups(String by, Map<String, int[]> rows) {

  private static final int MOST = 10;

  /** Groups some rows by words; rows without a word are a group of their own. */
  static Groups of(Labels labels, int... rows) {
    Map<String, List<Integer>> found = new LinkedHashMap<>();
    for (int row : rows) {
      String word = labels.label(row);
      String name = word == null || word.isBlank() ? "no " + labels.name() : word;
      found.computeIfAbsent(name, n -> new ArrayList<>()).add(row);
    }
    return new Groups(labels.name(), arrays(fewer(found)));
  }

  /** Returns the words of a column of numbers, which must be few. */
  static Labels words(Series series) {
    double[] values = series.values();
    double[] different = java.util.Arrays.stream(series.present()).distinct().sorted().toArray();
    if (different.length > MOST) {
      throw new IllegalArgumentException(
          "«"
              + series.name()
              + "» has "
              + different.length
              + " different values, too many for groups; make classes of it first");
    }
    String[] words = new String[values.length];
    for (int i = 0; i < words.length; i++) {
      words[i] =
          Double.isNaN(values[i])
              ? null
              : series.name() + " " + Numbers.text(values[i]) + series.unit().suffix();
    }
    return Labels.of(series.name(), words);
  }

  /** Puts the smallest groups together where there are too many to tell apart. */
  private static Map<String, List<Integer>> fewer(Map<String, List<Integer>> all) {
    if (all.size() <= MOST) {
      return all;
    }
    List<String> large =
        all.keySet().stream()
            .sorted(Comparator.comparingInt(name -> -all.get(name).size()))
            .limit(MOST - 1L)
            .toList();
    Map<String, List<Integer>> out = new LinkedHashMap<>();
    List<Integer> rest = new ArrayList<>();
    all.forEach(
        (name, rows) -> {
          if (large.contains(name)) {
            out.put(name, rows);
          } else {
            rest.addAll(rows);
          }
        });
    out.put((all.size() - large.size()) + " other groups", rest);
    return out;
  }

  private static Map<String, int[]> arrays(Map<String, List<Integer>> lists) {
    Map<String, int[]> out = new LinkedHashMap<>();
    lists.forEach(
        (name, rows) -> out.put(name, rows.stream().mapToInt(Integer::intValue).toArray()));
    return out;
  }

  /** Returns the sizes in words. */
  String sizes() {
    return "By "
        + by
        + ": "
        + Wording.list(
            rows.entrySet().stream().map(e -> e.getKey() + " " + e.getValue().length).toList());
  }
}
