package connate.las;

import java.nio.charset.StandardCharsets;

/**
 * Reads decimal numbers from bytes, correctly rounded.
 *
 * <p>Up to 18 digits are gathered in a long. Where that long is below 2⁵³ and the power of ten is
 * at most 10²², both are exact as doubles and one division or multiplication rounds correctly
 * (Clinger 1990, How to read floating point numbers accurately); all else goes to {@link
 * Double#parseDouble}.
 */
final class NumberScan {

  private static final double[] POWERS = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };
  private static final long EXACT = 1L << 53;
  private static final int MOST_DIGITS = 18;

  private final byte[] bytes;
  private final byte point;

  /** The value of the last number read. */
  double value;

  /** True once a number with an exponent was read. */
  boolean exponents;

  NumberScan(byte[] bytes, byte point) {
    this.bytes = bytes;
    this.point = point;
  }

  /**
   * Reads a number.
   *
   * @param start the offset of its first byte
   * @return the offset behind it, or -1 where no number stands; what follows is not looked at
   */
  int read(int start) {
    byte[] b = bytes;
    int i = start;
    byte first = b[i];
    if (first == '-' || first == '+') {
      i++;
    }
    int digitsFrom = i;
    long m = 0;
    int d = b[i] - '0';
    while (d >= 0 && d <= 9) {
      m = m * 10 + d;
      d = b[++i] - '0';
    }
    int digits = i - digitsFrom;
    int decimals = 0;
    if (b[i] == point) {
      int decimalsFrom = ++i;
      d = b[i] - '0';
      while (d >= 0 && d <= 9) {
        m = m * 10 + d;
        d = b[++i] - '0';
      }
      decimals = i - decimalsFrom;
      digits += decimals;
    }
    if (digits == 0) {
      return -1;
    }
    if ((b[i] | 0x20) == 'e') {
      return readExponent(start, i);
    }
    if (digits > MOST_DIGITS || m >= EXACT) {
      value = slow(start, i);
      return i;
    }
    double v = decimals == 0 ? m : m / POWERS[decimals];
    value = first == '-' ? -v : v;
    return i;
  }

  private int readExponent(int start, int at) {
    int i = at + 1;
    if (bytes[i] == '-' || bytes[i] == '+') {
      i++;
    }
    int from = i;
    while (bytes[i] >= '0' && bytes[i] <= '9') {
      i++;
    }
    if (i == from) {
      return -1;
    }
    exponents = true;
    value = slow(start, i);
    return Double.isInfinite(value) ? -1 : i;
  }

  private double slow(int start, int end) {
    String text = new String(bytes, start, end - start, StandardCharsets.ISO_8859_1);
    return Double.parseDouble(point == '.' ? text : text.replace((char) point, '.'));
  }

  /** Returns the value of a text, or NaN where it is not a plain number as a whole. */
  static double plain(String text) {
    byte[] b = (text + "\n").getBytes(StandardCharsets.UTF_8);
    NumberScan scan = new NumberScan(b, (byte) '.');
    return scan.read(0) == b.length - 1 ? scan.value : Double.NaN;
  }
}
