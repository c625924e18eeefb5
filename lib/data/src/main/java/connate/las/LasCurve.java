package connate.las;

import java.util.Arrays;
import java.util.Optional;

/** A curve: its header line and one value per row, numbers or words. */
public final class LasCurve {

  private final String name;
  private final HeaderLine header;
  private final double[] numbers;
  private final String[] words;
  private final int size;
  private final int missing;

  LasCurve(String name, HeaderLine header, double[] numbers, String[] words, int size) {
    this.name = name;
    this.header = header;
    this.numbers = numbers;
    this.words = words;
    this.size = size;
    this.missing = words == null ? countMissing(numbers, size) : countEmpty(words, size);
  }

  private static int countMissing(double[] numbers, int size) {
    int count = 0;
    for (int i = 0; i < size; i++) {
      if (Double.isNaN(numbers[i])) {
        count++;
      }
    }
    return count;
  }

  private static int countEmpty(String[] words, int size) {
    int count = 0;
    for (int i = 0; i < size; i++) {
      if (words[i].isEmpty()) {
        count++;
      }
    }
    return count;
  }

  /** Returns the name, which no other curve of the file has. */
  public String name() {
    return name;
  }

  /** Returns the mnemonic as the file has it, which several curves may share. */
  public String mnemonic() {
    return header.mnemonic();
  }

  /** Returns the header line. */
  public HeaderLine header() {
    return header;
  }

  /**
   * Returns the unit as written; empty where there is none, also where the file says so in words.
   */
  public String unit() {
    return isNone(header.unit()) ? "" : header.unit();
  }

  /** Tells whether a unit is a word for none. */
  static boolean isNone(String unit) {
    return unit.equals("_")
        || unit.equals("-")
        || unit.equalsIgnoreCase("NONE")
        || unit.equalsIgnoreCase("UNITLESS");
  }

  /** Returns the number of rows. */
  public int size() {
    return size;
  }

  /** Returns the number of rows without a value. */
  public int missing() {
    return missing;
  }

  /** Tells whether the curve holds words instead of numbers. */
  public boolean isText() {
    return words != null;
  }

  /**
   * Returns the value of a row.
   *
   * @param row the row, counted from 0
   * @return the value, NaN where there is none or where the curve holds words
   */
  public double value(int row) {
    if (row < 0 || row >= size) {
      throw new IndexOutOfBoundsException("row " + row + " of " + size);
    }
    return numbers == null ? Double.NaN : numbers[row];
  }

  /** Returns the word of a row, where the curve holds words. */
  public Optional<String> word(int row) {
    return words == null || words[row].isEmpty() ? Optional.empty() : Optional.of(words[row]);
  }

  /** Returns a copy of the values, NaN where there is none. */
  public double[] values() {
    if (numbers == null) {
      double[] none = new double[size];
      Arrays.fill(none, Double.NaN);
      return none;
    }
    return Arrays.copyOf(numbers, size);
  }

  /** Returns the values themselves, for use inside the package. */
  double[] raw() {
    return numbers;
  }

  @Override
  public String toString() {
    return name + (unit().isEmpty() ? "" : " [" + unit() + "]") + ", " + size + " rows";
  }
}
