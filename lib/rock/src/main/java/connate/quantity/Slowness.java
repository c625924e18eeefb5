package connate.quantity;

/** A sonic slowness, the inverse of a velocity. */
public final class Slowness extends Scalable<Slowness> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Slowness> DIMENSION = new Dimension<>("slowness", Slowness::new);

  private Slowness(double value, Unit<Slowness> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Slowness of(double value, Unit<Slowness> unit) {
    return new Slowness(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Slowness ofSecondsPerMetre(double value) {
    return new Slowness(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Slowness parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double secondsPerMetre() {
    return si();
  }
}
