package connate.quantity;

/** A density. */
public final class Density extends Scalable<Density> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Density> DIMENSION = new Dimension<>("density", Density::new);

  private Density(double value, Unit<Density> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Density of(double value, Unit<Density> unit) {
    return new Density(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Density ofKilogramsPerCubicMetre(double value) {
    return new Density(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Density parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double kilogramsPerCubicMetre() {
    return si();
  }
}
