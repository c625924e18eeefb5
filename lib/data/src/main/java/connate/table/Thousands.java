package connate.table;

import java.util.regex.Pattern;

/** Numbers with a sign between thousands; a class of its own, because most files have none. */
final class Thousands {

  /** Groups of thousands that leave no doubt: two of them, or a decimal sign of another kind. */
  private static final Pattern BLANK_GROUPS =
      Pattern.compile("[-+]?[1-9]\\d{0,2}([ \u00a0\u202f'’])\\d{3}(?:\\1\\d{3})*(?:[.,]\\d+)?");

  private static final Pattern COMMA_GROUPS =
      Pattern.compile("[-+]?[1-9]\\d{0,2}(?:(?:,\\d{3})+\\.\\d+|(?:,\\d{3}){2,})");
  private static final Pattern POINT_GROUPS =
      Pattern.compile("[-+]?[1-9]\\d{0,2}(?:(?:\\.\\d{3})+,\\d+|(?:\\.\\d{3}){2,})");
  private static final Pattern ONE_COMMA_GROUP = Pattern.compile("[-+]?[1-9]\\d{0,2},\\d{3}");
  private static final Pattern ONE_POINT_GROUP = Pattern.compile("[-+]?[1-9]\\d{0,2}\\.\\d{3}");

  private Thousands() {}

  static double number(String text, boolean decimalComma) {
    boolean fits =
        BLANK_GROUPS.matcher(text).matches()
            ? text.indexOf(decimalComma ? '.' : ',') < 0
            : (decimalComma ? POINT_GROUPS : COMMA_GROUPS).matcher(text).matches();
    if (!fits) {
      return Double.NaN;
    }
    String bare = text.replaceAll(decimalComma ? "[ \u00a0\u202f'’.]" : "[ \u00a0\u202f'’,]", "");
    return Double.parseDouble(bare.replace(',', '.'));
  }

  /** Returns whether a sign stands where it may part thousands or decimals. */
  static boolean isOneGroup(String cell, boolean decimalComma) {
    return (decimalComma ? ONE_POINT_GROUP : ONE_COMMA_GROUP).matcher(cell).matches();
  }
}
