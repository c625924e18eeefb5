package connate.las;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/** Counts what was met among the data that is worth one line, however often it came. */
final class Tally {

  /** What is counted. */
  enum Kind {
    RUN_TOGETHER("L46", true, "rows hold numbers that touch each other: split at the minus signs"),
    NULL_WORD("L42", true, "values are words for no value: read as missing"),
    OVERFLOW("L42", true, "values are overflows or infinite: read as missing"),
    EMPTY("L42", false, "values are empty: read as missing"),
    FORTRAN("L77", false, "numbers have exponents in Fortran's manner: read"),
    COMMENT("L75", false, "comment lines among the data: left out"),
    BLANK("L75", false, "blank lines among the data: left out"),
    TRAILING("L75", false, "rows end in one more delimiter: left out");

    private final String code;
    private final boolean caution;
    private final String words;

    Kind(String code, boolean caution, String words) {
      this.code = code;
      this.caution = caution;
      this.words = words;
    }
  }

  private final LasText text;
  private final Quirks quirks;
  private final Map<Kind, int[]> counts = new EnumMap<>(Kind.class);

  Tally(LasText text, Quirks quirks) {
    this.text = text;
    this.quirks = quirks;
  }

  /** Counts one, first seen at an offset. */
  void count(Kind kind, int offset) {
    int[] count = counts.computeIfAbsent(kind, k -> new int[] {0, offset});
    count[0]++;
  }

  void countEmpty() {
    count(Kind.EMPTY, -1);
  }

  void comment(int offset, boolean blank) {
    count(blank ? Kind.BLANK : Kind.COMMENT, offset);
  }

  /** Counts an item by its kind. */
  void item(LooseNumber.Kind kind, int offset) {
    switch (kind) {
      case NULL_WORD -> count(Kind.NULL_WORD, offset);
      case OVERFLOW -> count(Kind.OVERFLOW, offset);
      case EMPTY -> count(Kind.EMPTY, offset);
      case FORTRAN -> count(Kind.FORTRAN, offset);
      default -> {}
    }
  }

  /** Returns a word of a column of text, empty where it stands for no value. */
  String word(String item, double nullValue) {
    String bare = Items.bare(item).strip();
    return NumberScan.plain(bare) == nullValue ? "" : bare;
  }

  /** Returns the places without an empty one that a delimiter at the line's end leaves. */
  List<int[]> withoutTrailingDelimiter(List<int[]> places, int columns, Layout layout, int offset) {
    if (layout.delimiter() == 0 || places.size() != columns + 1) {
      return places;
    }
    int[] lastPlace = places.get(columns);
    if (lastPlace[0] < lastPlace[1]) {
      return places;
    }
    count(Kind.TRAILING, offset);
    return places.subList(0, columns);
  }

  void clear() {
    counts.clear();
  }

  /** Tells each kind once. */
  void tell() {
    counts.forEach(
        (kind, count) -> {
          int line = count[1] < 0 ? 0 : text.lineOf(count[1]);
          String message = count[0] + " " + kind.words;
          if (kind.caution) {
            quirks.caution(kind.code, line, message);
          } else {
            quirks.note(kind.code, line, message);
          }
        });
  }
}
