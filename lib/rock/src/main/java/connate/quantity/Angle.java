package connate.quantity;

/** An angle. */
public final class Angle extends Scalable<Angle> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Angle> DIMENSION = new Dimension<>("angle", Angle::new);

  private Angle(double value, Unit<Angle> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Angle of(double value, Unit<Angle> unit) {
    return new Angle(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Angle ofRadians(double value) {
    return new Angle(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Angle parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double radians() {
    return si();
  }
}
