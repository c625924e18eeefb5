package connate.las;

/**
 * Splits a header line: at the first dot, the first blank behind that dot, the last colon (LAS 2.0,
 * update of 2014). A colon inside a time ({@code 12:31}), behind a drive letter ({@code C:\}) or
 * inside braces at the end of the line does not end the value.
 */
final class HeaderParse {

  private HeaderParse() {}

  /** Returns the line split in the manner of versions 1.2 and 2.0. */
  static HeaderLine plain(int line, String text) {
    return split(line, text, text.length(), "", "");
  }

  /**
   * Returns a curve's line with a unit such as {@code 1000 lbf}, which holds a blank, put right.
   */
  static HeaderLine withBlankUnit(HeaderLine curve) {
    boolean isNumber = !curve.unit().isEmpty() && Character.isDigit(curve.unit().charAt(0));
    String both = curve.unit() + " " + curve.value();
    if (!isNumber || !both.matches("\\d+ [A-Za-z][^ ]*")) {
      return curve;
    }
    return curve.withUnit(both, "");
  }

  /** Returns the line split in the manner of version 3.0, with format and association. */
  static HeaderLine version3(int line, String text) {
    String association = "";
    String rest = text;
    int bar = text.lastIndexOf('|');
    if (bar > text.indexOf(':') && text.indexOf(':') >= 0) {
      association = text.substring(bar + 1).strip();
      rest = text.substring(0, bar);
    }
    int brace = rest.lastIndexOf('{');
    int close = rest.lastIndexOf('}');
    String format = "";
    int end = rest.length();
    if (brace > rest.indexOf(':') && close > brace && rest.indexOf(':') >= 0) {
      format = rest.substring(brace + 1, close).strip();
      end = brace;
    }
    return split(line, text, end, format, association);
  }

  private static HeaderLine split(
      int line, String full, int end, String format, String association) {
    String text = full.substring(0, end);
    int colon = colon(text);
    String left = colon < 0 ? text : text.substring(0, colon);
    String description = colon < 0 ? "" : text.substring(colon + 1).strip();
    int dot = left.indexOf('.');
    if (dot < 0) {
      String[] parts = left.strip().split("[ \t]+", 2);
      String value = parts.length < 2 ? "" : parts[1].strip();
      return new HeaderLine(line, full, parts[0], "", value, description, format, association);
    }
    String mnemonic = left.substring(0, dot).strip();
    String tail = left.substring(dot + 1);
    int blank = unitEnd(tail);
    String unit = tail.substring(0, blank).strip();
    String value = tail.substring(blank).strip();
    return new HeaderLine(line, full, mnemonic, unit, value, description, format, association);
  }

  private static int unitEnd(String tail) {
    int i = 0;
    while (i < tail.length() && tail.charAt(i) != ' ' && tail.charAt(i) != '\t') {
      i++;
    }
    return i;
  }

  /** Returns the place of the colon that ends the value, or -1. */
  static int colon(String text) {
    boolean hasBraces = text.stripTrailing().endsWith("}");
    int brace = hasBraces ? text.lastIndexOf('{') : -1;
    int from = (brace >= 0 ? brace : text.length()) - 1;
    for (int i = text.lastIndexOf(':', from); i >= 0; i = text.lastIndexOf(':', i - 1)) {
      if (!isPartOfValue(text, i)) {
        return i;
      }
    }
    return -1;
  }

  private static boolean isPartOfValue(String text, int colon) {
    char before = colon == 0 ? ' ' : text.charAt(colon - 1);
    char after = colon + 1 >= text.length() ? ' ' : text.charAt(colon + 1);
    if (Character.isDigit(before) && Character.isDigit(after)) {
      return text.indexOf('.') < colon && text.lastIndexOf(' ', colon) > text.indexOf('.');
    }
    boolean isSlash = after == '\\' || after == '/';
    char beforeDrive = colon < 2 ? ' ' : text.charAt(colon - 2);
    return isSlash && Character.isLetter(before) && !Character.isLetterOrDigit(beforeDrive);
  }
}
