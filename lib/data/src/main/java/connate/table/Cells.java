package connate.table;

import java.util.Locale;
import java.util.Set;

/** What a cell holds: nothing, a number, a number with its unit, or words. */
final class Cells {

  private static final Set<String> NOTHING =
      Set.of(
          "",
          "-",
          "--",
          "nan",
          "na",
          "n/a",
          "#n/a",
          "null",
          "(null)",
          "none",
          "missing",
          "-999.25",
          "-999",
          "-9999",
          "-9999.25",
          "-99999",
          "-999.0",
          "-9999.0");

  private Cells() {}

  static boolean isMissing(String cell) {
    if (cell.isEmpty()) {
      return true;
    }
    String low = cell.toLowerCase(Locale.ROOT);
    return NOTHING.contains(low) || low.startsWith("-999") && NOTHING.contains(trimmed(low));
  }

  /** -999.2500 and -9999.00 say the same as without their last zeros. */
  private static String trimmed(String number) {
    String out = number;
    while (out.contains(".") && out.endsWith("0")) {
      out = out.substring(0, out.length() - 1);
    }
    return out.endsWith(".") ? out.substring(0, out.length() - 1) : out;
  }

  /** Returns whether the cell is an identifier such as 00123, whose zeros would be lost. */
  static boolean isPadded(String cell) {
    return cell.length() > 1
        && cell.charAt(0) == '0'
        && cell.chars().allMatch(c -> c >= '0' && c <= '9');
  }

  /** Returns the number that the whole cell is, NaN where it is none. */
  static double number(String cell, boolean decimalComma) {
    String text = decimalComma ? cell.replace(',', '.') : cell;
    if (text.isEmpty() || connate.quantity.Numbers.end(text) != text.length()) {
      return Double.NaN;
    }
    return Double.parseDouble(text);
  }

  /** Returns where the number ends with which a cell such as {@code 12 mD} begins; 0 for none. */
  static int numberEnd(String cell, boolean decimalComma) {
    return connate.quantity.Numbers.end(decimalComma ? cell.replace(',', '.') : cell);
  }
}
