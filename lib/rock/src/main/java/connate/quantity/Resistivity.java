package connate.quantity;

/** An electrical resistivity. */
public final class Resistivity extends Scalable<Resistivity> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Resistivity> DIMENSION =
      new Dimension<>("resistivity", Resistivity::new);

  private Resistivity(double value, Unit<Resistivity> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Resistivity of(double value, Unit<Resistivity> unit) {
    return new Resistivity(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Resistivity ofOhmMetres(double value) {
    return new Resistivity(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Resistivity parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double ohmMetres() {
    return si();
  }
}
