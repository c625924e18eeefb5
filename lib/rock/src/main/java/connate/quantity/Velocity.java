package connate.quantity;

/** A velocity. */
public final class Velocity extends Scalable<Velocity> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Velocity> DIMENSION = new Dimension<>("velocity", Velocity::new);

  private Velocity(double value, Unit<Velocity> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Velocity of(double value, Unit<Velocity> unit) {
    return new Velocity(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Velocity ofMetresPerSecond(double value) {
    return new Velocity(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Velocity parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double metresPerSecond() {
    return si();
  }
}
