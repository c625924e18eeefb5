package connate.quantity;

/** An area. */
public final class Area extends Scalable<Area> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Area> DIMENSION = new Dimension<>("area", Area::new);

  private Area(double value, Unit<Area> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Area of(double value, Unit<Area> unit) {
    return new Area(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Area ofSquareMetres(double value) {
    return new Area(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Area parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double squareMetres() {
    return si();
  }

  /** Returns the volume of this area times a length. */
  public Volume times(Length other) {
    return Volume.ofCubicMetres(si() * other.si());
  }
}
