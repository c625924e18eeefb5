package connate.quantity;

/** A pressure or a stress. */
public final class Pressure extends Scalable<Pressure> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Pressure> DIMENSION = new Dimension<>("pressure", Pressure::new);

  private Pressure(double value, Unit<Pressure> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Pressure of(double value, Unit<Pressure> unit) {
    return new Pressure(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Pressure ofPascals(double value) {
    return new Pressure(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Pressure parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double pascals() {
    return si();
  }
}
