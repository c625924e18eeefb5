package connate.las;

import java.util.Locale;

/** The units of a depth index, as files spell them. */
final class DepthUnit {

  private DepthUnit() {}

  /** Returns the metres in one unit, NaN where it is no length that the trade uses for depth. */
  static double metres(String unit) {
    return switch (unit.toUpperCase(Locale.ROOT)) {
      case "M", "METER", "METERS", "METRE", "METRES" -> 1;
      case "F", "FT", "FEET", "FOOT" -> 0.3048;
      case "CM" -> 0.01;
      case "MM" -> 0.001;
      case "IN", "INCH", "INCHES" -> 0.0254;
      case ".1IN", "0.1IN", "0.1 IN" -> 0.00254;
      case "KM" -> 1000;
      default -> Double.NaN;
    };
  }
}
