package connate.figure.svg;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * How lines and areas are drawn.
 *
 * @param stroke the colour of lines, {@code none} for none
 * @param width the width of lines in pixels
 * @param dash the lengths of dashes and gaps, empty for a whole line
 * @param fill the colour of areas, {@code none} for none
 * @param opacity 1 for opaque
 */
public record Pen(String stroke, double width, String dash, String fill, double opacity) {

  /** Checks that the colours are hexadecimal or none, so that no text reaches an attribute. */
  public Pen {
    check(stroke, "#[0-9A-Fa-f]{3}|#[0-9A-Fa-f]{6}|none", "a colour");
    check(fill, "#[0-9A-Fa-f]{3}|#[0-9A-Fa-f]{6}|none", "a colour");
    check(dash, "[0-9. ]*", "dashes");
  }

  private static void check(String value, String form, String what) {
    if (!value.matches(form)) {
      throw new IllegalArgumentException("«" + value + "» is not " + what);
    }
  }

  /** Returns a whole line. */
  public static Pen line(String colour, double width) {
    return new Pen(colour, width, "", "none", 1);
  }

  /** Returns an area without an edge. */
  public static Pen area(String colour, double opacity) {
    return new Pen("none", 0, "", colour, opacity);
  }

  /** Returns the same line in dashes. */
  public Pen dashed(String lengths) {
    return new Pen(stroke, width, lengths, fill, opacity);
  }

  /** Returns the presentation attributes. */
  String attributes() {
    StringBuilder out = new StringBuilder("fill=\"").append(fill).append('"');
    if (!stroke.equals("none")) {
      out.append(" stroke=\"").append(stroke).append('"');
      out.append(" stroke-width=\"").append(decimal(width)).append('"');
      out.append(" stroke-linejoin=\"round\"");
    }
    if (!dash.isEmpty()) {
      out.append(" stroke-dasharray=\"").append(dash).append('"');
    }
    if (opacity < 1) {
      out.append(" opacity=\"").append(decimal(opacity)).append('"');
    }
    return out.toString();
  }

  /** Returns a number with at most two decimals. */
  static String decimal(double value) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(2, RoundingMode.HALF_EVEN);
    return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
  }
}
