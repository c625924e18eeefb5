package connate.las;

import java.util.Locale;
import java.util.Map;
import java.util.Set;

/**
 * Tells on which side of the colon a text of the well section stands. Version 1.2 has it behind the
 * colon, 2.0 before it; what a file says of its version is not to be trusted, but the labels of the
 * standard on the other side are.
 */
final class WellLabels {

  private static final Set<String> NUMBERS = Set.of("STRT", "STOP", "STEP", "NULL");
  private static final Map<String, Set<String>> LABELS =
      Map.ofEntries(
          Map.entry("COMP", Set.of("COMPANY", "COMPANY NAME", "OPERATOR")),
          Map.entry("WELL", Set.of("WELL", "WELL NAME")),
          Map.entry("FLD", Set.of("FIELD", "FIELD NAME")),
          Map.entry("LOC", Set.of("LOCATION", "WELL LOCATION")),
          Map.entry("PROV", Set.of("PROVINCE")),
          Map.entry("CNTY", Set.of("COUNTY")),
          Map.entry("STAT", Set.of("STATE")),
          Map.entry("CTRY", Set.of("COUNTRY")),
          Map.entry("SRVC", Set.of("SERVICE COMPANY", "SERVICE COMPANY NAME")),
          Map.entry("DATE", Set.of("DATE", "LOG DATE")),
          Map.entry("UWI", Set.of("UNIQUE WELL ID", "UNIQUE WELL IDENTIFIER", "UWI NUMBER")),
          Map.entry("API", Set.of("API NUMBER", "API#")),
          Map.entry("LIC", Set.of("LICENSE NUMBER", "LICENCE NUMBER")));

  private WellLabels() {}

  /** Returns the line with its value, whichever side it stands on. */
  static HeaderLine settled(HeaderLine item, LasVersion version, Quirks quirks) {
    String name = item.mnemonic().toUpperCase(Locale.ROOT);
    int colon = item.text().indexOf(':');
    if (version == LasVersion.V3_0 || NUMBERS.contains(name) || colon < 0) {
      return item;
    }
    String behind = item.text().substring(colon + 1).strip();
    String before = before(item, colon);
    boolean labelBefore = isLabel(name, before);
    boolean labelBehind = isLabel(name, behind);
    boolean isOld = version == LasVersion.V1_2;
    if (labelBefore && !labelBehind) {
      if (!isOld) {
        quirks.caution(
            "L50",
            item.line(),
            Words.fill("{} has its value after the colon, as in version 1.2: ", item.mnemonic())
                + "read '"
                + behind
                + "'");
      }
      return item.withValue(behind, before);
    }
    if (!isOld) {
      return item;
    }
    if (labelBehind) {
      if (!before.isEmpty()) {
        quirks.caution(
            "L50",
            item.line(),
            Words.fill("{} has its value before the colon, as in version 2.0: ", item.mnemonic())
                + "read '"
                + before
                + "'");
      }
      return item.withValue(before, behind);
    }
    return item.withValue(behind, before);
  }

  private static String before(HeaderLine item, int colon) {
    String left = item.text().substring(0, colon);
    int dot = left.indexOf('.');
    if (dot < 0) {
      return item.value();
    }
    String tail = left.substring(dot + 1);
    boolean hasUnit = !item.unit().isEmpty() && tail.startsWith(item.unit());
    return (hasUnit ? tail.substring(item.unit().length()) : tail).strip();
  }

  private static boolean isLabel(String name, String words) {
    return LABELS.getOrDefault(name, Set.of()).contains(words.toUpperCase(Locale.ROOT));
  }
}
