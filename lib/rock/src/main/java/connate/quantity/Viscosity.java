package connate.quantity;

/** A dynamic viscosity. */
public final class Viscosity extends Scalable<Viscosity> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Viscosity> DIMENSION = new Dimension<>("viscosity", Viscosity::new);

  private Viscosity(double value, Unit<Viscosity> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Viscosity of(double value, Unit<Viscosity> unit) {
    return new Viscosity(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Viscosity ofPascalSeconds(double value) {
    return new Viscosity(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Viscosity parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double pascalSeconds() {
    return si();
  }
}
