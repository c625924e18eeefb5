package connate.las;

import java.util.Objects;

/**
 * A column to be written.
 *
 * @param mnemonic the name; blanks, dots and colons become underscores
 * @param unit the unit, empty for none
 * @param code the API code or empty
 * @param description the words after the colon
 * @param numbers the values, NaN where there is none; {@code null} for a column of words
 * @param words the words, {@code null} for a column of numbers
 */
public record LasColumn(
    String mnemonic,
    String unit,
    String code,
    String description,
    double[] numbers,
    String[] words) {

  /** Checks that there are numbers or words, and copies them. */
  public LasColumn {
    Objects.requireNonNull(mnemonic, "mnemonic");
    Objects.requireNonNull(unit, "unit");
    Objects.requireNonNull(code, "code");
    Objects.requireNonNull(description, "description");
    if ((numbers == null) == (words == null)) {
      throw new IllegalArgumentException(mnemonic + " needs either numbers or words");
    }
    numbers = numbers == null ? null : numbers.clone();
    words = words == null ? null : words.clone();
  }

  /** Returns a column of numbers. */
  public static LasColumn of(String mnemonic, String unit, String description, double... numbers) {
    return new LasColumn(mnemonic, unit, "", description, numbers, null);
  }

  /** Returns a curve of a file as a column. */
  static LasColumn of(LasCurve curve) {
    HeaderLine header = curve.header();
    String[] words = null;
    if (curve.isText()) {
      words = new String[curve.size()];
      for (int row = 0; row < words.length; row++) {
        words[row] = curve.word(row).orElse("");
      }
    }
    double[] numbers = words == null ? curve.values() : null;
    return new LasColumn(
        curve.name(), curve.unit(), header.value(), header.description(), numbers, words);
  }

  @Override
  public double[] numbers() {
    return numbers == null ? null : numbers.clone();
  }

  @Override
  public String[] words() {
    return words == null ? null : words.clone();
  }

  /** Returns the number of rows. */
  public int size() {
    return numbers == null ? words.length : numbers.length;
  }

  double number(int row) {
    return numbers[row];
  }

  String word(int row) {
    return words[row];
  }

  boolean isText() {
    return words != null;
  }
}
