package connate.las;

import java.util.Objects;

/**
 * Something in a file that the standard does not foresee, or that a reader of the numbers must
 * know.
 *
 * @param code a short stable code such as {@code L36}, explained by {@code help("L36")}
 * @param weight whether it can touch what the numbers mean
 * @param line the line where it is first seen, counted from 1; 0 where the whole file is meant
 * @param message what was found and what was done about it
 */
public record Quirk(String code, Weight weight, int line, String message) {

  /** How much a quirk matters. */
  public enum Weight {
    /** A matter of form: the numbers mean what they would mean without it. */
    NOTE,
    /** A matter of meaning: look before you use the numbers. */
    CAUTION
  }

  /** Checks the place. */
  public Quirk {
    Objects.requireNonNull(code, "code");
    Objects.requireNonNull(weight, "weight");
    Objects.requireNonNull(message, "message");
    if (line < 0) {
      throw new IllegalArgumentException("a line is counted from 1: " + line);
    }
  }

  /** Tells whether the quirk can touch what the numbers mean. */
  public boolean isCaution() {
    return weight == Weight.CAUTION;
  }

  /** Returns the quirk in one line. */
  @Override
  public String toString() {
    return (line == 0 ? "" : "line " + line + ": ") + message + " [" + code + "]";
  }
}
