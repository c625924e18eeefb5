package connate.quantity;

/** A rate of volume. */
public final class Rate extends Scalable<Rate> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Rate> DIMENSION = new Dimension<>("rate", Rate::new);

  private Rate(double value, Unit<Rate> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Rate of(double value, Unit<Rate> unit) {
    return new Rate(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Rate ofCubicMetresPerSecond(double value) {
    return new Rate(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Rate parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double cubicMetresPerSecond() {
    return si();
  }

  /** Returns the flux, the rate through each unit of an area. */
  public Velocity dividedBy(Area area) {
    return Velocity.ofMetresPerSecond(si() / area.si());
  }
}
