package connate.quantity;

/** A change of pressure with depth or distance. */
public final class PressureGradient extends Scalable<PressureGradient> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<PressureGradient> DIMENSION =
      new Dimension<>("pressure gradient", PressureGradient::new);

  private PressureGradient(double value, Unit<PressureGradient> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static PressureGradient of(double value, Unit<PressureGradient> unit) {
    return new PressureGradient(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static PressureGradient ofPascalsPerMetre(double value) {
    return new PressureGradient(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static PressureGradient parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double pascalsPerMetre() {
    return si();
  }
}
