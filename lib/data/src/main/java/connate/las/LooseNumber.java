package connate.las;

import java.util.Locale;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * What one item of the data says when it is not a plain number.
 *
 * @param kind how it is to be taken
 * @param value its value, NaN where it has none
 */
record LooseNumber(Kind kind, double value) {

  /** How an item is to be taken. */
  enum Kind {
    /** A plain number. */
    PLAIN,
    /** A number with an exponent in Fortran's manner. */
    FORTRAN,
    /** Nothing at all, between two delimiters. */
    EMPTY,
    /** A word that says that there is no value. */
    NULL_WORD,
    /** An overflow or infinity as a program printed it. */
    OVERFLOW,
    /** A number with a comma in it, of which one cannot say what the comma means. */
    COMMA,
    /** Anything else. */
    TEXT
  }

  private static final Set<String> NULL_WORDS =
      Set.of(
          "null", "(null)", "nan", "+nan", "-nan", "-", "--", "na", "n/a", "none", "#n/a", "nil");
  private static final Set<String> OVERFLOWS =
      Set.of(
          "inf",
          "+inf",
          "-inf",
          "infinity",
          "+infinity",
          "-infinity",
          "1.#inf",
          "-1.#inf",
          "1.#ind",
          "-1.#ind",
          "1.#qnan",
          "-1.#qnan",
          "#num!",
          "#div/0!");

  /** Compiled only when an item is no plain number, which in most files is never. */
  private static final class Patterns {

    static final Pattern FORTRAN =
        Pattern.compile("([+-]?(?:\\d+\\.?\\d*|\\.\\d+))(?:[dD]([+-]?\\d{1,3})|([+-]\\d{2,3}))");
    static final Pattern EXPONENT = Pattern.compile("[+-]?(?:\\d+\\.?\\d*|\\.\\d+)[eE][+-]?\\d+");
    static final Pattern COMMA = Pattern.compile("[+-]?\\d*(?:,\\d+)+(?:\\.\\d*)?");

    private Patterns() {}
  }

  /** Takes an item without the blanks around it. */
  static LooseNumber of(String item) {
    double plain = NumberScan.plain(item);
    if (!Double.isNaN(plain)) {
      return new LooseNumber(Kind.PLAIN, plain);
    }
    if (item.isEmpty()) {
      return new LooseNumber(Kind.EMPTY, Double.NaN);
    }
    String lower = item.toLowerCase(Locale.ROOT);
    if (NULL_WORDS.contains(lower)) {
      return new LooseNumber(Kind.NULL_WORD, Double.NaN);
    }
    if (OVERFLOWS.contains(lower) || isAllStars(item)) {
      return new LooseNumber(Kind.OVERFLOW, Double.NaN);
    }
    var fortran = Patterns.FORTRAN.matcher(item);
    if (fortran.matches()) {
      String power = fortran.group(2) == null ? fortran.group(3) : fortran.group(2);
      return new LooseNumber(Kind.FORTRAN, Double.parseDouble(fortran.group(1) + "e" + power));
    }
    if (Patterns.EXPONENT.matcher(item).matches()) {
      return new LooseNumber(Kind.OVERFLOW, Double.NaN);
    }
    Kind kind = Patterns.COMMA.matcher(item).matches() ? Kind.COMMA : Kind.TEXT;
    return new LooseNumber(kind, Double.NaN);
  }

  private static boolean isAllStars(String item) {
    for (int i = 0; i < item.length(); i++) {
      if (item.charAt(i) != '*') {
        return false;
      }
    }
    return true;
  }

  /** Tells whether the item has a value or says clearly that it has none. */
  boolean isClear() {
    return kind != Kind.TEXT && kind != Kind.COMMA;
  }
}
