package connate.las;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * A section of a file above its numbers.
 *
 * @param kind what the section holds
 * @param title the title line as it stands, with its tilde
 * @param line the line of the title, counted from 1
 * @param items the header lines, empty in a section of free text
 * @param lines all lines below the title as they stand, comments included; empty for data
 */
public record LasSection(
    Kind kind, String title, int line, List<HeaderLine> items, List<String> lines) {

  /** What a section holds. */
  public enum Kind {
    /** The version of the format. */
    VERSION,
    /** The well. */
    WELL,
    /** The curves: one line per data column. */
    CURVE,
    /** Parameters and constants. */
    PARAMETER,
    /** Free text. */
    OTHER,
    /** The log data. */
    DATA,
    /** Parameters of a further data set of version 3.0. */
    SET_PARAMETER,
    /** Columns of a further data set of version 3.0. */
    SET_DEFINITION,
    /** Rows of a further data set of version 3.0. */
    SET_DATA,
    /** A section that the standard does not know. */
    UNKNOWN
  }

  /** Copies the lists. */
  public LasSection {
    Objects.requireNonNull(kind, "kind");
    Objects.requireNonNull(title, "title");
    items = List.copyOf(items);
    lines = List.copyOf(lines);
  }

  /** Returns the first header line of this name, in capitals or not. */
  public Optional<HeaderLine> item(String mnemonic) {
    return items.stream().filter(i -> i.isNamed(mnemonic)).findFirst();
  }
}
