package connate.las;

/** Units in plain ASCII, as the standard wants them. */
final class LasUnits {

  private LasUnits() {}

  /** Returns a unit's symbol in ASCII: {@code g/cm3} for g/cm³, {@code us/ft} for µs/ft. */
  static String ascii(String unit) {
    String plain =
        unit.replace("²", "2")
            .replace("³", "3")
            .replace("µ", "u")
            .replace("μ", "u")
            .replace("·", ".")
            .replace("Ω", "ohm");
    if (plain.startsWith("°")) {
      plain = "deg" + plain.substring(1);
    }
    return LasWriter.ascii(plain).strip();
  }
}
