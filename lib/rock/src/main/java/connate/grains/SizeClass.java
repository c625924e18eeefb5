package connate.grains;

import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A class of grain sizes, such as 63 to 75 µm. A low limit of 0 stands for an open end: the pan; an
 * infinite high limit for what the coarsest sieve held back.
 *
 * @param lowMm the fine limit in mm, 0 where open
 * @param highMm the coarse limit in mm, infinite where open
 */
public record SizeClass(double lowMm, double highMm) {

  private static final String NUMBER = "(\\d+(?:[._,]\\d+)?)";
  private static final String UNIT = "(?:[\\s_\\[(]*([µμ]m|um|micron|microns|micrometres?|mm|cm))?";
  private static final String END = UNIT + "[\\s\\])%]*";
  private static final Pattern BETWEEN =
      Pattern.compile(
          "(?:F|f|fraction)?[\\s_]*" + NUMBER + "\\s*(?:-|–|to|\\.\\.)\\s*" + NUMBER + END);
  private static final Pattern BELOW =
      Pattern.compile("(?:F|f|fraction)?[\\s_]*(?:<|below|under)\\s*" + NUMBER + END);
  private static final Pattern ABOVE =
      Pattern.compile("(?:F|f|fraction)?[\\s_]*(?:>|above|over)\\s*" + NUMBER + END);

  /** Checks the order of the limits. */
  public SizeClass {
    if (!(lowMm >= 0 && lowMm < highMm)) {
      throw new IllegalArgumentException(
          "a size class from " + lowMm + " to " + highMm + " mm: the fine limit comes first");
    }
  }

  /** Returns whether a header reads as a size class. */
  public static boolean isHeader(String header) {
    String text = header.strip();
    return BETWEEN.matcher(text).matches()
        || BELOW.matcher(text).matches()
        || ABOVE.matcher(text).matches();
  }

  /**
   * Reads a header: {@code 63-75 µm}, {@code F0_01-0_1}, {@code 0-2_micron}, {@code <63}, {@code
   * >2000}; a point, a comma or {@code _} may stand before decimals.
   *
   * @param unit the unit where the header names none; empty if it must
   * @throws IllegalArgumentException if it is no size class, or has no unit anywhere
   */
  public static SizeClass parse(String header, Optional<Unit<Length>> unit) {
    String text = header.strip();
    Matcher between = BETWEEN.matcher(text);
    if (between.matches()) {
      double scale = scale(header, between.group(3), unit);
      return new SizeClass(number(between.group(1)) * scale, number(between.group(2)) * scale);
    }
    Matcher below = BELOW.matcher(text);
    if (below.matches()) {
      return new SizeClass(0, number(below.group(1)) * scale(header, below.group(2), unit));
    }
    Matcher above = ABOVE.matcher(text);
    if (above.matches()) {
      double low = number(above.group(1)) * scale(header, above.group(2), unit);
      return new SizeClass(low, Double.POSITIVE_INFINITY);
    }
    throw new IllegalArgumentException(
        "«" + header + "» is no size class; expected a form such as «63-75 µm», «<63 µm»");
  }

  /** Reads a header that names its unit. */
  public static SizeClass parse(String header) {
    return parse(header, Optional.empty());
  }

  private static double number(String text) {
    return Double.parseDouble(text.replace('_', '.').replace(',', '.'));
  }

  private static double scale(String header, String named, Optional<Unit<Length>> unit) {
    if (named == null) {
      return unit.orElseThrow(
              () ->
                  new IllegalArgumentException(
                      "the size class «"
                          + header
                          + "» has no unit: name it in the header (63-75 µm) or in the call (um)"))
          .convert(1, Units.mm);
    }
    return switch (named) {
      case "mm" -> 1;
      case "cm" -> 10;
      default -> 1e-3;
    };
  }

  /** Returns the limits in words. */
  @Override
  public String toString() {
    if (lowMm == 0) {
      return "below " + Numbers.text(highMm) + " mm";
    }
    return Double.isInfinite(highMm)
        ? "above " + Numbers.text(lowMm) + " mm"
        : Numbers.text(lowMm) + " to " + Numbers.text(highMm) + " mm";
  }
}
