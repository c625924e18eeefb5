package connate.quantity;

/** A volume. */
public final class Volume extends Scalable<Volume> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Volume> DIMENSION = new Dimension<>("volume", Volume::new);

  private Volume(double value, Unit<Volume> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Volume of(double value, Unit<Volume> unit) {
    return new Volume(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Volume ofCubicMetres(double value) {
    return new Volume(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Volume parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double cubicMetres() {
    return si();
  }

  /** Returns the rate of moving this volume in a time. */
  public Rate dividedBy(Time time) {
    return Rate.ofCubicMetresPerSecond(si() / time.si());
  }
}
