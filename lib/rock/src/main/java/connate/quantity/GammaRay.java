package connate.quantity;

/** A natural gamma ray reading in API units. */
public final class GammaRay extends Scalable<GammaRay> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<GammaRay> DIMENSION = new Dimension<>("gamma ray", GammaRay::new);

  private GammaRay(double value, Unit<GammaRay> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static GammaRay of(double value, Unit<GammaRay> unit) {
    return new GammaRay(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static GammaRay ofApi(double value) {
    return new GammaRay(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static GammaRay parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double api() {
    return si();
  }
}
