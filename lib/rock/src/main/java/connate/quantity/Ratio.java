package connate.quantity;

/** A pure number that is no fraction: a sorting, an exponent, an index. */
public final class Ratio extends Scalable<Ratio> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Ratio> DIMENSION = new Dimension<>("number", Ratio::new);

  private static final Unit<Ratio> UNSTATED = new Unit<>(DIMENSION, "?", 1, 0, java.util.List.of());

  private Ratio(double value, Unit<Ratio> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Ratio of(double value, Unit<Ratio> unit) {
    return new Ratio(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Ratio ofValue(double value) {
    return new Ratio(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit, or a bare number.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Ratio parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double value() {
    return si();
  }

  /**
   * Returns the unit that stands where none is known. It belongs to no registry, so no symbol finds
   * it.
   */
  public static Unit<Ratio> unstated() {
    return UNSTATED;
  }
}
