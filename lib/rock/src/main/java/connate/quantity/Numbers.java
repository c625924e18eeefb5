package connate.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * How numbers are written: for people with four significant digits, for records with ten, for files
 * with all that they need.
 */
public final class Numbers {

  private static final MathContext PEOPLE = new MathContext(4, RoundingMode.HALF_EVEN);
  private static final MathContext RECORD = new MathContext(10, RoundingMode.HALF_EVEN);
  private static final double WHOLE = 1e7;
  private static final double SMALL = 1e-3;
  private static final double LARGE = 1e6;
  private static final double EXACT = 1e15;
  private static final int SAFE_DIGITS = 15;
  private static final int MOST_DIGITS = 17;

  /** Beneath a power of two the doubles lie closer, so that the nearest decimal may miss it. */
  private static final RoundingMode[] NEAREST_FIRST = {
    RoundingMode.HALF_EVEN, RoundingMode.UP, RoundingMode.DOWN
  };

  private Numbers() {}

  /** Returns a number as a person reads it: whole numbers in full, else four digits. */
  public static String text(double value) {
    if (!Double.isFinite(value)) {
      return Double.isNaN(value) ? "missing" : value > 0 ? "∞" : "-∞";
    }
    if (value == StrictMath.rint(value) && StrictMath.abs(value) < WHOLE) {
      return Long.toString((long) value);
    }
    return write(new BigDecimal(value).round(PEOPLE), value);
  }

  /** Returns a number at ten significant digits, so that last bits do not show. */
  public static String record(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("no number to write: " + value);
    }
    if (value == 0) {
      return "0";
    }
    return write(new BigDecimal(value).round(RECORD), value);
  }

  /**
   * Returns a number with the fewest digits that read back as the same double, 15 to 17 of them at
   * most. {@link Double#toString(double)} writes some numbers longer before JDK 19 than after, so
   * that a file would differ between machines.
   */
  public static String full(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("no number to write: " + value);
    }
    if (value == StrictMath.rint(value) && StrictMath.abs(value) < EXACT) {
      return Long.toString((long) value);
    }
    BigDecimal exact = new BigDecimal(value);
    for (int digits = SAFE_DIGITS; digits < MOST_DIGITS; digits++) {
      for (RoundingMode mode : NEAREST_FIRST) {
        BigDecimal rounded = exact.round(new MathContext(digits, mode));
        if (rounded.doubleValue() == value) {
          return write(rounded, value, EXACT);
        }
      }
    }
    return write(exact.round(new MathContext(MOST_DIGITS, RoundingMode.HALF_EVEN)), value, EXACT);
  }

  /** Returns where the number at the start of a text ends; 0 where it starts with none. */
  public static int end(String text) {
    int at = sign(text, 0);
    int digits = at;
    at = digits(text, at);
    int count = at - digits;
    if (at < text.length() && text.charAt(at) == '.') {
      int after = digits(text, at + 1);
      count += after - at - 1;
      at = after;
    }
    return count == 0 ? 0 : exponent(text, at);
  }

  private static int exponent(String text, int at) {
    if (at < text.length() && (text.charAt(at) == 'e' || text.charAt(at) == 'E')) {
      int start = sign(text, at + 1);
      int end = digits(text, start);
      return end > start ? end : at;
    }
    return at;
  }

  private static int sign(String text, int at) {
    return at < text.length() && (text.charAt(at) == '-' || text.charAt(at) == '+') ? at + 1 : at;
  }

  private static int digits(String text, int from) {
    int at = from;
    while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
      at++;
    }
    return at;
  }

  private static String write(BigDecimal rounded, double value) {
    return write(rounded, value, LARGE);
  }

  private static String write(BigDecimal rounded, double value, double large) {
    double size = StrictMath.abs(value);
    BigDecimal short_ = rounded.stripTrailingZeros();
    if (size >= SMALL && size < large) {
      return short_.toPlainString();
    }
    int exponent = short_.precision() - short_.scale() - 1;
    return short_.movePointLeft(exponent).toPlainString() + "e" + exponent;
  }
}
