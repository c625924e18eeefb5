package connate.quantity;

/** An interfacial tension. */
public final class InterfacialTension extends Scalable<InterfacialTension> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<InterfacialTension> DIMENSION =
      new Dimension<>("interfacial tension", InterfacialTension::new);

  private InterfacialTension(double value, Unit<InterfacialTension> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static InterfacialTension of(double value, Unit<InterfacialTension> unit) {
    return new InterfacialTension(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static InterfacialTension ofNewtonsPerMetre(double value) {
    return new InterfacialTension(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static InterfacialTension parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double newtonsPerMetre() {
    return si();
  }
}
