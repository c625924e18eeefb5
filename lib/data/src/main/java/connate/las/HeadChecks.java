package connate.las;

import connate.las.LasSection.Kind;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** Looks over the header: what is missing, doubled or oddly written. */
final class HeadChecks {

  private static final int LONG_LINE = 256;
  private static final int LOOKED_AT = 1 << 18;
  private static final List<String> REQUIRED = List.of("STRT", "STOP", "STEP");

  private final LasText text;
  private final LasHead head;
  private final Quirks quirks;

  HeadChecks(LasText text, LasHead head, Quirks quirks) {
    this.text = text;
    this.head = head;
    this.quirks = quirks;
  }

  /** Returns the declared null value, NaN where there is none. */
  double nullValue() {
    for (HeaderLine item : head.items(Kind.WELL)) {
      if (item.isNamed("NULL")) {
        return HeaderNumber.of(item);
      }
    }
    return Double.NaN;
  }

  /** Looks over all sections. */
  void run(boolean settingAside) {
    wellNumbers(settingAside);
    nulls();
    order();
    doubles();
    descriptions();
    curveNames();
    lineLengths();
    oldTexts();
  }

  private void wellNumbers(boolean settingAside) {
    for (String mnemonic : REQUIRED) {
      HeaderLine item = wellItem(mnemonic);
      if (item == null) {
        quirks.caution("L51", 0, mnemonic + " is missing from the well section");
      } else if (Double.isNaN(HeaderNumber.of(item))) {
        boolean isClear = LooseNumber.of(item.value()).isClear();
        if (!isClear && !settingAside) {
          throw text.refusal(
              item,
              "L15",
              Words.fill("{} is '{}', where a number was expected", mnemonic, item.value()),
              "correct the line, or leave the value blank");
        }
        quirks.caution("L51", item.line(), mnemonic + " has no value");
      } else if (item.value().isEmpty()) {
        quirks.caution(
            "L51",
            item.line(),
            mnemonic + " touches the dot, where the unit belongs: read as its value");
      }
    }
    HeaderLine well = wellItem("WELL");
    if (well == null || well.value().isEmpty()) {
      quirks.caution("L51", well == null ? 0 : well.line(), "the well has no name");
    }
  }

  private void nulls() {
    HeaderLine item = wellItem("NULL");
    if (item == null || Double.isNaN(HeaderNumber.of(item))) {
      quirks.caution(
          "L41",
          item == null ? 0 : item.line(),
          "no null value is declared: every number is taken as a value");
    } else if (Math.abs(HeaderNumber.of(item)) < 100) {
      quirks.caution(
          "L40",
          item.line(),
          Words.fill(
              "the null value {} is a value that a log can have",
              IndexFinder.plain(HeaderNumber.of(item))));
    }
  }

  private void order() {
    List<Kind> kinds = new ArrayList<>();
    for (LasSection section : head.sections()) {
      kinds.add(section.kind());
    }
    if (!kinds.contains(Kind.PARAMETER)) {
      quirks.note("L76", 0, "no parameter section");
    } else if (kinds.indexOf(Kind.PARAMETER) < kinds.indexOf(Kind.CURVE)) {
      quirks.note(
          "L76",
          head.sections().get(kinds.indexOf(Kind.PARAMETER)).line(),
          "the parameters stand before the curves");
    }
    if (kinds.indexOf(Kind.DATA) < kinds.size() - 1) {
      quirks.note(
          "L55",
          head.sections().get(kinds.indexOf(Kind.DATA)).line(),
          "the log data are not the last section");
    }
    for (LasSection section : head.sections()) {
      switch (section.kind()) {
        case UNKNOWN ->
            quirks.note(
                "L55",
                section.line(),
                Words.fill(
                    "{} is a section that the standard does not know: kept as text",
                    section.title().strip()));
        case SET_DATA ->
            quirks.note(
                "L55",
                section.line(),
                Words.fill("{} is a data set beside the log", section.title().strip()));
        default -> {}
      }
    }
  }

  private void doubles() {
    for (LasSection section : head.sections()) {
      if (section.kind() != Kind.WELL && section.kind() != Kind.PARAMETER) {
        continue;
      }
      Map<String, HeaderLine> first = new HashMap<>();
      for (HeaderLine item : section.items()) {
        HeaderLine other = first.putIfAbsent(HeaderReader.key(item.mnemonic()), item);
        if (other != null && !isZone(item)) {
          boolean isSame = other.value().equals(item.value());
          quirks.caution(
              "L37",
              item.line(),
              Words.fill(
                      "{} stands twice, first on line {}, with {}: the ",
                      item.mnemonic(),
                      other.line(),
                      isSame ? "the same value" : "another value")
                  + "first is taken");
        }
      }
    }
  }

  private static boolean isZone(HeaderLine item) {
    return item.mnemonic().isEmpty() || !item.association().isEmpty();
  }

  private void descriptions() {
    List<String> bare = new ArrayList<>();
    int line = 0;
    for (HeaderLine item : head.items(Kind.VERSION)) {
      if (Set.of("VERS", "WRAP").contains(HeaderReader.key(item.mnemonic()))
          && item.description().isEmpty()) {
        bare.add(item.mnemonic());
        line = line == 0 ? item.line() : line;
      }
    }
    for (HeaderLine item : head.items(Kind.WELL)) {
      if (Set.of("STRT", "STOP", "STEP", "NULL").contains(HeaderReader.key(item.mnemonic()))
          && item.description().isEmpty()) {
        bare.add(item.mnemonic());
        line = line == 0 ? item.line() : line;
      }
    }
    if (!bare.isEmpty()) {
      quirks.note("L79", line, "no description: " + String.join(", ", bare));
    }
  }

  private void curveNames() {
    Shown names = new Shown("L73", "curve names with characters beyond letters, digits and _: ");
    Shown units = new Shown("L74", "units with dots, blanks or words for none: ");
    Shown bare = new Shown("L81", "curves without a unit: ");
    for (HeaderLine curve : head.items(Kind.CURVE)) {
      String unit = curve.unit();
      if (!isPlainName(curve.mnemonic())) {
        names.add(curve, curve.mnemonic());
      }
      if (isOddUnit(unit)) {
        units.add(curve, curve.mnemonic() + " '" + unit + "'");
      } else if (unit.isEmpty()) {
        bare.add(curve, curve.mnemonic());
      }
    }
    names.tell();
    units.tell();
    bare.tell();
  }

  private static boolean isPlainName(String name) {
    for (int i = 0; i < name.length(); i++) {
      char c = name.charAt(i);
      boolean isLetter = c >= 'A' && c <= 'Z' || c >= 'a' && c <= 'z';
      if (!isLetter && !(c >= '0' && c <= '9') && c != '_') {
        return false;
      }
    }
    return !name.isEmpty();
  }

  private static boolean isOddUnit(String unit) {
    boolean isSplit = unit.indexOf('.') >= 0 || unit.indexOf(' ') >= 0;
    return isSplit || LasCurve.isNone(unit);
  }

  private void lineLengths() {
    int most = 0;
    int at = 0;
    int until = Math.min(text.to, text.from + LOOKED_AT);
    for (int i = text.from, end; i < until; i = text.afterLine(end)) {
      end = text.lineEnd(i);
      if (end - i > most) {
        most = end - i;
        at = i;
      }
    }
    if (most > LONG_LINE - 2) {
      quirks.note(
          "L72",
          text.lineOf(at),
          "lines of up to " + most + " characters, where version 2.0 of 1992 allows 256");
    }
  }

  private void oldTexts() {
    if (head.version() == LasVersion.V1_2) {
      quirks.note("L78", 0, "version 1.2: texts of the well section stand after the colon");
    }
  }

  private HeaderLine wellItem(String mnemonic) {
    for (HeaderLine item : head.items(Kind.WELL)) {
      if (item.mnemonic().toUpperCase(Locale.ROOT).equals(mnemonic)) {
        return item;
      }
    }
    return null;
  }

  /** Gathers curves for one note. */
  private final class Shown {

    private static final int MOST = 6;
    private final String code;
    private final StringBuilder words;
    private int count;
    private int line;

    Shown(String code, String words) {
      this.code = code;
      this.words = new StringBuilder(words);
    }

    void add(HeaderLine curve, String word) {
      if (count == 0) {
        line = curve.line();
      }
      if (count < MOST) {
        words.append(count == 0 ? "" : ", ").append(word);
      }
      count++;
    }

    void tell() {
      if (count > 0) {
        quirks.note(code, line, words + (count > MOST ? " and " + (count - MOST) + " more" : ""));
      }
    }
  }
}
