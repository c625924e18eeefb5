package connate.quantity;

/** A hydraulic conductivity times a thickness. */
public final class Transmissivity extends Scalable<Transmissivity> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Transmissivity> DIMENSION =
      new Dimension<>("transmissivity", Transmissivity::new);

  private Transmissivity(double value, Unit<Transmissivity> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Transmissivity of(double value, Unit<Transmissivity> unit) {
    return new Transmissivity(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Transmissivity ofSquareMetresPerSecond(double value) {
    return new Transmissivity(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Transmissivity parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double squareMetresPerSecond() {
    return si();
  }
}
