package connate.las;

import connate.las.LasSection.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/** Reads the sections above the numbers. */
final class HeaderReader {

  private static final Set<Kind> WITH_ITEMS =
      Set.of(
          Kind.VERSION,
          Kind.WELL,
          Kind.CURVE,
          Kind.PARAMETER,
          Kind.SET_PARAMETER,
          Kind.SET_DEFINITION);

  private final LasText text;
  private final Quirks quirks;
  private int firstForeign;
  private int foreign;
  private int firstBlank;
  private int blanks;

  HeaderReader(LasText text, Quirks quirks) {
    this.text = text;
    this.quirks = quirks;
  }

  /** Checks what stands above the first section: comments may, numbers may not. */
  void readPreface(int to) {
    int comments = 0;
    for (int at = text.from; at < to; at = text.afterLine(text.lineEnd(at))) {
      int end = text.lineEnd(at);
      String line = text.text(at, end).strip();
      if (line.isEmpty()) {
        continue;
      }
      if (line.startsWith("#")) {
        comments++;
      } else if (line.codePoints().noneMatch(Character::isLetter)) {
        throw text.refusal(
            at,
            end,
            "L03",
            "data stand before the first section",
            "a LAS file starts with ~V; put the header above the numbers");
      } else {
        quirks.caution("L52", text.lineOf(at), "text above the first section: left out");
      }
    }
    if (comments > 0) {
      quirks.note(
          "L75", text.lineOf(text.from), comments + " comment lines above the first section");
    }
  }

  /** Reads one section. */
  LasSection read(Sections.Raw raw, Kind kind, LasVersion version) {
    List<HeaderLine> items = new ArrayList<>();
    List<String> lines = new ArrayList<>();
    int number = text.lineOf(raw.titleFrom());
    boolean withItems = WITH_ITEMS.contains(kind);
    int line = number;
    for (int at = raw.bodyFrom(); at < raw.bodyTo(); at = text.afterLine(text.lineEnd(at))) {
      int end = text.lineEnd(at);
      String words = text.text(at, end);
      line++;
      lines.add(words);
      watch(words, line, end - at, withItems);
      if (withItems && !isSkipped(words)) {
        item(line, words, kind, version, items);
      }
    }
    return new LasSection(kind, raw.title(), number, items, lines);
  }

  private static boolean isSkipped(String words) {
    String stripped = words.strip();
    return stripped.isEmpty() || stripped.startsWith("#");
  }

  private void watch(String words, int line, int bytes, boolean withItems) {
    boolean isForeign = words.length() != bytes;
    for (int i = 0; i < words.length() && !isForeign; i++) {
      char c = words.charAt(i);
      isForeign = c > 126 || c < 32 && c != '\t';
    }
    if (isForeign && foreign++ == 0) {
      firstForeign = line;
    }
    if (withItems && words.isBlank() && blanks++ == 0) {
      firstBlank = line;
    }
  }

  private void item(int line, String words, Kind kind, LasVersion version, List<HeaderLine> items) {
    HeaderLine item =
        version == LasVersion.V3_0
            ? HeaderParse.version3(line, words)
            : HeaderParse.plain(line, words);
    boolean noColon = HeaderParse.colon(words) < 0;
    boolean noDot = words.indexOf('.') < 0 || item.mnemonic().isEmpty();
    if (kind == Kind.CURVE && noColon && noDot) {
      quirks.caution("L52", line, "neither dot nor colon: not taken as a curve");
      return;
    }
    if (noColon || noDot) {
      String lacks = noDot ? noColon ? "no dot and no colon" : "no dot" : "no colon";
      quirks.note("L52", line, "header line with " + lacks + ": read " + described(item));
    }
    if (kind == Kind.CURVE) {
      item = HeaderParse.withBlankUnit(item);
    } else if (kind == Kind.WELL) {
      item = WellLabels.settled(item, version, quirks);
    }
    items.add(item);
  }

  private static String described(HeaderLine item) {
    return Words.fill("'{}' as the name, '{}' as the value", item.mnemonic(), item.value());
  }

  /** Tells of blank lines and foreign characters, once for the file. */
  void summarise() {
    if (foreign > 0) {
      quirks.note(
          "L71",
          firstForeign,
          foreign + " header lines hold characters outside ASCII: read as UTF-8 or Windows-1252");
    }
    if (blanks > 0) {
      quirks.note("L75", firstBlank, blanks + " blank lines in the header");
    }
  }

  /** Returns the version that the file states, 2.0 where it states none. */
  LasVersion version(List<Sections.Raw> sections) {
    HeaderReader unheard = new HeaderReader(text, new Quirks());
    for (Sections.Raw raw : sections) {
      if (raw.letter() == 'V') {
        for (HeaderLine item : unheard.read(raw, Kind.VERSION, LasVersion.V2_0).items()) {
          if (item.isNamed("VERS")) {
            return versionOf(item);
          }
        }
      }
    }
    boolean isThird = sections.stream().anyMatch(s -> s.word().startsWith("LOG_DATA"));
    quirks.caution("L51", 0, "no VERS: read as version " + (isThird ? "3.0" : "2.0"));
    return isThird ? LasVersion.V3_0 : LasVersion.V2_0;
  }

  private LasVersion versionOf(HeaderLine item) {
    double number = HeaderNumber.of(item);
    if (number >= 1 && number < 2) {
      return LasVersion.V1_2;
    }
    if (number >= 2 && number < 3) {
      return LasVersion.V2_0;
    }
    if (number >= 3 && number < 4) {
      return LasVersion.V3_0;
    }
    String stated = item.value().isEmpty() ? item.unit() : item.value();
    throw text.refusal(
        item,
        "L06",
        Words.fill("VERS is '{}', where 1.2, 2.0 or 3.0 was expected", stated),
        "correct the VERS line");
  }

  /** Returns the mnemonic in capitals, for comparisons. */
  static String key(String mnemonic) {
    return mnemonic.toUpperCase(Locale.ROOT);
  }
}
