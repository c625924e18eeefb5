package connate.table;

import connate.quantity.Numbers;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * What stands in a table where nothing was measured: an empty cell, a dash, {@code NaN}, {@code
 * NA}, {@code null} and the like, and numbers such as -999.25 that no rock has. A workbook adds its
 * own with {@link #add}, before it reads the table.
 */
public final class Missing {

  private static final List<String> USUAL =
      List.of(
          "-",
          "--",
          "---",
          "nan",
          "na",
          "n/a",
          "#n/a",
          "n.a.",
          "nd",
          "n.d.",
          "null",
          "(null)",
          "none",
          "missing",
          "?",
          "-999.25",
          "-999",
          "-9999",
          "-9999.25",
          "-99999",
          "1e30");

  /** Words that may also be a name, and so count as missing in a column of numbers only. */
  private static final Set<String> ALSO_NAMES = Set.of("na", "nd", "n.d.", "none", "missing", "?");

  private static volatile Marks marks = Marks.of(USUAL);

  private Missing() {}

  /**
   * Adds a mark for this process.
   *
   * @param mark a word, in capitals or not, or a number such as {@code -1}
   */
  public static synchronized void add(String mark) {
    List<String> more = new ArrayList<>(marks.all());
    more.add(mark.strip());
    marks = Marks.of(more);
  }

  /** Returns the marks. */
  public static List<String> marks() {
    return marks.all();
  }

  /** Forgets the marks that were added. */
  public static synchronized void reset() {
    marks = Marks.of(USUAL);
  }

  /** Returns whether a cell of a column of numbers says that there is none. */
  static boolean isWord(String cell) {
    return cell.isEmpty()
        || marks.isStart(cell.charAt(0)) && marks.words().contains(cell.toLowerCase(Locale.ROOT));
  }

  /** Returns whether a number says that there is none. */
  static boolean isNumber(double value) {
    for (double mark : marks.numbers()) {
      if (value == mark) {
        return true;
      }
    }
    return false;
  }

  /** Returns whether a cell of a column of words says that there is none; R writes {@code NA}. */
  static boolean isNoWord(String cell) {
    if (cell.isEmpty() || cell.equals("NA")) {
      return true;
    }
    boolean marked = isWord(cell) && !ALSO_NAMES.contains(cell.toLowerCase(Locale.ROOT));
    return marked || isNumber(Cells.number(cell, false));
  }

  /** The marks, apart by kind: a word is looked up only where one begins like it. */
  private record Marks(List<String> all, Set<String> words, double[] numbers, boolean[] starts) {

    static Marks of(List<String> all) {
      Set<String> words = new HashSet<>();
      List<Double> numbers = new ArrayList<>();
      boolean[] starts = new boolean[128];
      for (String mark : all) {
        boolean number = Numbers.end(mark) == mark.length() && !mark.isEmpty();
        if (number) {
          numbers.add(Double.parseDouble(mark));
        } else if (!mark.isEmpty()) {
          words.add(mark.toLowerCase(Locale.ROOT));
          note(starts, mark.toLowerCase(Locale.ROOT).charAt(0));
          note(starts, mark.toUpperCase(Locale.ROOT).charAt(0));
        }
      }
      double[] values = numbers.stream().mapToDouble(Double::doubleValue).toArray();
      return new Marks(List.copyOf(all), words, values, starts);
    }

    private static void note(boolean[] starts, char first) {
      if (first < starts.length) {
        starts[first] = true;
      }
    }

    boolean isStart(char first) {
      return first >= starts.length || starts[first];
    }
  }
}
