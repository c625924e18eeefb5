package connate.quantity;

/** A temperature on the absolute scale. */
public final class Temperature extends Quantity<Temperature> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Temperature> DIMENSION =
      new Dimension<>("temperature", Temperature::new);

  private Temperature(double value, Unit<Temperature> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Temperature of(double value, Unit<Temperature> unit) {
    return new Temperature(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Temperature ofKelvins(double value) {
    return new Temperature(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Temperature parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double kelvins() {
    return si();
  }
}
