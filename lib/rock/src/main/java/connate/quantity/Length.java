package connate.quantity;

/** A length: depth, thickness, grain or pore size, distance. */
public final class Length extends Scalable<Length> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Length> DIMENSION = new Dimension<>("length", Length::new);

  private Length(double value, Unit<Length> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Length of(double value, Unit<Length> unit) {
    return new Length(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Length ofMetres(double value) {
    return new Length(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Length parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double metres() {
    return si();
  }

  /** Returns the area of this length times another. */
  public Area times(Length other) {
    return Area.ofSquareMetres(si() * other.si());
  }

  /** Returns the velocity of covering this length in a time. */
  public Velocity dividedBy(Time time) {
    return Velocity.ofMetresPerSecond(si() / time.si());
  }
}
