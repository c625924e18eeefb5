package connate.quantity;

/** A permeability, a property of the rock alone. */
public final class Permeability extends Scalable<Permeability> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Permeability> DIMENSION =
      new Dimension<>("permeability", Permeability::new);

  private Permeability(double value, Unit<Permeability> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Permeability of(double value, Unit<Permeability> unit) {
    return new Permeability(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Permeability ofSquareMetres(double value) {
    return new Permeability(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Permeability parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double squareMetres() {
    return si();
  }

  /** Returns this permeability times a thickness, in mD·m. */
  public PermeabilityThickness times(Length thickness) {
    return PermeabilityThickness.of(in(Units.mD) * thickness.in(Units.m), Units.mDm);
  }
}
