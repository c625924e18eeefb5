package connate.las;

import java.util.Objects;

/**
 * One line of a header section: {@code MNEM.UNIT VALUE : DESCRIPTION {FORMAT} | ASSOCIATION}.
 *
 * @param line the line in the file, counted from 1
 * @param text the line as it stands
 * @param mnemonic the name
 * @param unit the unit as written, empty where there is none
 * @param value the value, empty where there is none
 * @param description the words after the colon
 * @param format what stands in braces at the end of the description, without the braces
 * @param association what a version 3.0 line names after the bar
 */
public record HeaderLine(
    int line,
    String text,
    String mnemonic,
    String unit,
    String value,
    String description,
    String format,
    String association) {

  /** Checks that nothing is missing. */
  public HeaderLine {
    Objects.requireNonNull(text, "text");
    Objects.requireNonNull(mnemonic, "mnemonic");
    Objects.requireNonNull(unit, "unit");
    Objects.requireNonNull(value, "value");
    Objects.requireNonNull(description, "description");
    Objects.requireNonNull(format, "format");
    Objects.requireNonNull(association, "association");
  }

  /** Returns a line that stands in no file yet. */
  public static HeaderLine of(String mnemonic, String unit, String value, String description) {
    return new HeaderLine(0, "", mnemonic, unit, value, description, "", "");
  }

  /** Tells whether the mnemonic is this one, in capitals or not. */
  public boolean isNamed(String name) {
    return mnemonic.equalsIgnoreCase(name);
  }

  /** Returns the same line with another value. */
  HeaderLine withValue(String newValue, String newDescription) {
    return new HeaderLine(
        line, text, mnemonic, unit, newValue, newDescription, format, association);
  }

  /** Returns the same line with another unit and value. */
  HeaderLine withUnit(String newUnit, String newValue) {
    return new HeaderLine(
        line, text, mnemonic, newUnit, newValue, description, format, association);
  }
}
