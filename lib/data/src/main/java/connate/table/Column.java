package connate.table;

import connate.quantity.Numbers;
import connate.series.Labels;
import connate.series.Series;
import java.util.Optional;

/**
 * A column of a table: numbers or words.
 *
 * @param numbers the numbers, {@code null} for words
 * @param words the words, {@code null} for numbers
 */
record Column(Series numbers, Labels words) {

  static Column of(Series numbers) {
    return new Column(numbers, null);
  }

  static Column of(Labels words) {
    return new Column(null, words);
  }

  String name() {
    return numbers == null ? words.name() : numbers.name();
  }

  boolean isNumeric() {
    return numbers != null;
  }

  Optional<Series> series() {
    return Optional.ofNullable(numbers);
  }

  Column named(String name) {
    if (numbers != null) {
      return of(numbers.named(name));
    }
    String[] copy = new String[words.size()];
    for (int row = 0; row < copy.length; row++) {
      copy[row] = words.label(row);
    }
    return of(Labels.of(name, copy));
  }

  Column rows(int... chosen) {
    if (numbers != null) {
      return of(numbers.rows(chosen));
    }
    String[] some = new String[chosen.length];
    for (int i = 0; i < some.length; i++) {
      some[i] = words.label(chosen[i]);
    }
    return of(Labels.of(words.name(), some));
  }

  boolean isMissing(int row) {
    return numbers == null ? words.label(row) == null : Double.isNaN(numbers.value(row));
  }

  /** Returns the cell as it is written to a file: numbers in full. */
  String text(int row) {
    if (isMissing(row)) {
      return "";
    }
    if (numbers == null) {
      return words.label(row);
    }
    return Numbers.full(numbers.value(row));
  }
}
