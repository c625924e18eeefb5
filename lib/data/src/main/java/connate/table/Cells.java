package connate.table;

import connate.quantity.Numbers;

/** What a cell holds: a number, a number with its unit, or words. */
final class Cells {

  private static final char MINUS = '\u2212';

  /** The digits that a double holds for certain; a longer name of digits would change. */
  private static final int EXACT_DIGITS = 15;

  private Cells() {}

  /** Returns the number that the whole cell is, NaN where it is none. */
  static double number(String cell, boolean decimalComma) {
    if (cell.isEmpty() || !isStart(cell.charAt(0))) {
      return Double.NaN;
    }
    String text = cell.charAt(0) == MINUS ? '-' + cell.substring(1) : cell;
    String plain = decimalComma ? swapped(text) : text;
    if (Numbers.end(plain) != plain.length()) {
      return Thousands.number(text, decimalComma);
    }
    double value = Double.parseDouble(plain);
    return Double.isInfinite(value) ? Double.NaN : value;
  }

  private static boolean isStart(char c) {
    return c >= '0' && c <= '9' || c == '-' || c == '+' || c == '.' || c == ',' || c == MINUS;
  }

  /** Turns a decimal comma into a point; a point then stands for no decimal sign. */
  private static String swapped(String text) {
    return text.indexOf('.') >= 0 ? text.replace('.', '\'') : text.replace(',', '.');
  }

  /** Returns whether a cell such as {@code 1,234} may be a thousand or a decimal. */
  static boolean isDoubtful(String cell, boolean decimalComma) {
    return cell.indexOf(decimalComma ? '.' : ',') > 0 && Thousands.isOneGroup(cell, decimalComma);
  }

  /** Returns whether the cell is a name of digits, such as 00123, that a number would not keep. */
  static boolean isDigitsName(String cell) {
    boolean padded = cell.length() > 1 && cell.charAt(0) == '0';
    if (!padded && cell.length() <= EXACT_DIGITS) {
      return false;
    }
    return cell.chars().allMatch(c -> c >= '0' && c <= '9');
  }

  /** Returns whether a cell names a bound of detection, such as {@code <0.01}. */
  static boolean isBound(String cell, boolean decimalComma) {
    return cell.length() > 1
        && (cell.charAt(0) == '<' || cell.charAt(0) == '>')
        && numberEnd(cell.substring(1).strip(), decimalComma) > 0;
  }

  /** Returns where the number ends with which a cell such as {@code 12 mD} begins; 0 for none. */
  static int numberEnd(String cell, boolean decimalComma) {
    return Numbers.end(decimalComma ? cell.replace(',', '.') : cell);
  }

  /**
   * Returns what a cell says about the decimal sign: 1 for a comma, -1 for a point, 0 for nothing.
   */
  static int decimalSign(String cell) {
    int comma = cell.indexOf(',');
    int point = cell.indexOf('.');
    if (comma < 0) {
      return point >= 0 && !Double.isNaN(number(cell, false)) ? -1 : 0;
    }
    if (point >= 0) {
      boolean known = !Double.isNaN(number(cell, comma > point));
      return !known ? 0 : comma > point ? 1 : -1;
    }
    return isDoubtful(cell, false) || Double.isNaN(number(cell, true)) ? 0 : 1;
  }
}
