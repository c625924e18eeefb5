package connate.las;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Reads the data sets beside the log of a version 3.0 file. */
final class SetReader {

  private final Quirks quirks;
  private final byte delimiter;
  private final double nullValue;

  SetReader(Quirks quirks, byte delimiter, double nullValue) {
    this.quirks = quirks;
    this.delimiter = delimiter;
    this.nullValue = nullValue;
  }

  /** Returns the sets of all data sections that have a definition. */
  List<LasSet> read(List<LasSection> sections) {
    List<LasSet> sets = new ArrayList<>();
    for (LasSection data : sections) {
      if (data.kind() == LasSection.Kind.SET_DATA) {
        set(data, sections, sets);
      }
    }
    return sets;
  }

  private void set(LasSection data, List<LasSection> sections, List<LasSet> sets) {
    String word = word(data.title());
    String base = word.replaceFirst("(?i)_DATA", "");
    String definition = definitionName(data.title(), word);
    LasSection columns = named(sections, definition);
    if (columns == null) {
      columns = named(sections, SectionKinds.bare(definition));
    }
    if (columns == null) {
      quirks.caution(
          "L55",
          data.line(),
          Words.fill("{} has no definition {}: left out", data.title().strip(), definition));
      return;
    }
    LasSection parameters = named(sections, word.replaceFirst("(?i)_DATA", "_PARAMETER"));
    List<HeaderLine> values = parameters == null ? List.of() : parameters.items();
    sets.add(new LasSet(base, values, columns.items(), rows(data, columns.items().size())));
  }

  private static String definitionName(String title, String word) {
    int bar = title.indexOf('|');
    if (bar >= 0) {
      return title.substring(bar + 1).strip().toUpperCase(Locale.ROOT);
    }
    return word.replaceFirst("(?i)_DATA", "_DEFINITION").toUpperCase(Locale.ROOT);
  }

  private static LasSection named(List<LasSection> sections, String word) {
    for (LasSection section : sections) {
      if (word(section.title()).equalsIgnoreCase(word)) {
        return section;
      }
    }
    return null;
  }

  private static String word(String title) {
    return title.substring(1).strip().split("[ \t|]", 2)[0];
  }

  private List<List<String>> rows(LasSection data, int columns) {
    List<List<String>> rows = new ArrayList<>();
    int line = data.line();
    for (String words : data.lines()) {
      line++;
      if (words.isBlank() || words.strip().startsWith("#")) {
        continue;
      }
      List<String> items = new ArrayList<>(Items.split(words, delimiter));
      if (items.size() == columns + 1 && items.get(columns).isEmpty()) {
        items.remove(columns);
      }
      if (items.size() != columns) {
        quirks.caution(
            "L55",
            line,
            Words.fill("row of {} items, where {} are defined: left out", items.size(), columns));
        continue;
      }
      items.replaceAll(i -> NumberScan.plain(i) == nullValue ? "" : i.strip());
      rows.add(items);
    }
    return rows;
  }
}
