package connate.quantity;

/** A permeability times a thickness, the kh of a well test. */
public final class PermeabilityThickness extends Scalable<PermeabilityThickness> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<PermeabilityThickness> DIMENSION =
      new Dimension<>("permeability-thickness", PermeabilityThickness::new);

  private PermeabilityThickness(double value, Unit<PermeabilityThickness> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static PermeabilityThickness of(double value, Unit<PermeabilityThickness> unit) {
    return new PermeabilityThickness(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static PermeabilityThickness ofCubicMetres(double value) {
    return new PermeabilityThickness(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static PermeabilityThickness parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double cubicMetres() {
    return si();
  }

  /** Returns the permeability that this is over a thickness, in mD. */
  public Permeability dividedBy(Length thickness) {
    return Permeability.of(in(Units.mDm) / thickness.in(Units.m), Units.mD);
  }
}
