package connate.quantity;

/** A hydraulic conductivity, of rock and water together. */
public final class HydraulicConductivity extends Scalable<HydraulicConductivity> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<HydraulicConductivity> DIMENSION =
      new Dimension<>("hydraulic conductivity", HydraulicConductivity::new);

  private HydraulicConductivity(double value, Unit<HydraulicConductivity> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static HydraulicConductivity of(double value, Unit<HydraulicConductivity> unit) {
    return new HydraulicConductivity(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static HydraulicConductivity ofMetresPerSecond(double value) {
    return new HydraulicConductivity(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static HydraulicConductivity parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double metresPerSecond() {
    return si();
  }

  /** Returns the transmissivity of a bed of this conductivity, in m²/d. */
  public Transmissivity times(Length thickness) {
    return Transmissivity.of(in(Units.mPerDay) * thickness.in(Units.m), Units.m2PerDay);
  }
}
