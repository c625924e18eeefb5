package connate.figure;

/**
 * A mark on an axis.
 *
 * @param value where it stands
 * @param label its words, empty for a small mark; the exponent where it is a power
 * @param power whether the label is a power of ten
 */
record Tick(double value, String label, boolean power) {

  static Tick of(double value, String label) {
    return new Tick(value, label, false);
  }

  boolean isMajor() {
    return !label.isEmpty();
  }

  /** Returns the label as plain text. */
  String plain() {
    return power ? "1e" + label : label;
  }
}
