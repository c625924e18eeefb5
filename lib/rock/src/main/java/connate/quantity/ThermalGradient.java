package connate.quantity;

/** A change of temperature with depth. */
public final class ThermalGradient extends Scalable<ThermalGradient> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<ThermalGradient> DIMENSION =
      new Dimension<>("thermal gradient", ThermalGradient::new);

  private ThermalGradient(double value, Unit<ThermalGradient> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static ThermalGradient of(double value, Unit<ThermalGradient> unit) {
    return new ThermalGradient(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static ThermalGradient ofKelvinsPerMetre(double value) {
    return new ThermalGradient(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static ThermalGradient parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double kelvinsPerMetre() {
    return si();
  }
}
