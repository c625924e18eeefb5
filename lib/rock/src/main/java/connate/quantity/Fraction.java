package connate.quantity;

/** A part of a whole: porosity, saturation, shale volume, coverage. */
public final class Fraction extends Scalable<Fraction> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Fraction> DIMENSION = new Dimension<>("fraction", Fraction::new);

  private Fraction(double value, Unit<Fraction> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Fraction of(double value, Unit<Fraction> unit) {
    return new Fraction(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Fraction ofFraction(double value) {
    return new Fraction(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit, or a bare number.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Fraction parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double fraction() {
    return si();
  }

  /** Returns what is left of the whole. */
  public Fraction rest() {
    return Fraction.of(1 - si(), Units.fraction).to(unit());
  }
}
