package connate.quantity;

/** A surface per volume. */
public final class SpecificSurface extends Scalable<SpecificSurface> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<SpecificSurface> DIMENSION =
      new Dimension<>("specific surface", SpecificSurface::new);

  private SpecificSurface(double value, Unit<SpecificSurface> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static SpecificSurface of(double value, Unit<SpecificSurface> unit) {
    return new SpecificSurface(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static SpecificSurface ofPerMetre(double value) {
    return new SpecificSurface(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static SpecificSurface parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double perMetre() {
    return si();
  }
}
