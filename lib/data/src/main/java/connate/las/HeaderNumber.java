package connate.las;

import java.util.List;

/** Reads the numbers of the header: STRT, STOP, STEP, NULL, VERS. */
final class HeaderNumber {

  private HeaderNumber() {}

  /**
   * Returns the number that a line holds, NaN where it holds none. Words behind the number are left
   * out; a number that touches the dot, where the unit should stand, is taken too.
   */
  static double of(HeaderLine item) {
    String words = item.value().isEmpty() ? item.unit() : item.value();
    for (String part : List.of(words, firstPart(words))) {
      LooseNumber number = LooseNumber.of(part);
      if (!Double.isNaN(number.value())) {
        return number.value();
      }
      if (number.kind() == LooseNumber.Kind.COMMA && part.matches("[+-]?\\d+,\\d+")) {
        return Double.parseDouble(part.replace(',', '.'));
      }
    }
    return Double.NaN;
  }

  private static String firstPart(String words) {
    for (int i = 0; i < words.length(); i++) {
      char c = words.charAt(i);
      if (c == ' ' || c == '\t' || c == ':') {
        return words.substring(0, i);
      }
    }
    return words;
  }
}
