package connate.quantity;

/** A compressibility. */
public final class Compressibility extends Scalable<Compressibility> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Compressibility> DIMENSION =
      new Dimension<>("compressibility", Compressibility::new);

  private Compressibility(double value, Unit<Compressibility> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Compressibility of(double value, Unit<Compressibility> unit) {
    return new Compressibility(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Compressibility ofPerPascal(double value) {
    return new Compressibility(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Compressibility parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double perPascal() {
    return si();
  }
}
