package connate.series;

import java.util.Arrays;
import java.util.List;
import java.util.Objects;

/** A column of words: wells, facies, rock types. A missing word is {@code null}. */
public interface Labels {

  /** Returns the labels of the given words, which are copied. */
  static Labels of(String name, String... words) {
    return new WordLabels(name, words.clone());
  }

  /** Returns the name. */
  String name();

  /** Returns the number of rows. */
  int size();

  /** Returns the word of a row, {@code null} where it is missing. */
  String label(int row);

  /** Returns the different words, in the order in which they first stand. */
  default List<String> distinct() {
    return java.util.stream.IntStream.range(0, size())
        .mapToObj(this::label)
        .filter(Objects::nonNull)
        .distinct()
        .toList();
  }

  /** Returns the rows that bear a word. */
  default int[] rows(String word) {
    return java.util.stream.IntStream.range(0, size())
        .filter(row -> word.equals(label(row)))
        .toArray();
  }
}

/** Labels over an array of their own. */
record WordLabels(String name, String[] words) implements Labels {

  @Override
  public int size() {
    return words.length;
  }

  @Override
  public String label(int row) {
    return words[row];
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof WordLabels that
        && that.name.equals(name)
        && Arrays.equals(that.words, words);
  }

  @Override
  public int hashCode() {
    return 31 * name.hashCode() + Arrays.hashCode(words);
  }

  @Override
  public String toString() {
    return name + ": " + words.length + " rows, " + distinct().size() + " different";
  }
}
