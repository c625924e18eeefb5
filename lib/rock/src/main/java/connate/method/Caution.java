package connate.method;

import java.util.Objects;

/**
 * Something that the library noticed and the reader must know.
 *
 * @param code a short stable code, explained by {@code help}
 * @param about what it concerns: a method's id, a column, a file
 * @param text one or two sentences
 */
public record Caution(String code, String about, String text) {

  /** Checks that nothing is missing. */
  public Caution {
    Objects.requireNonNull(code, "code");
    Objects.requireNonNull(about, "about");
    Objects.requireNonNull(text, "text");
  }

  /** Returns a caution. */
  public static Caution of(String code, String about, String text) {
    return new Caution(code, about, text);
  }

  @Override
  public String toString() {
    return "caution[" + code + "] " + text;
  }
}
