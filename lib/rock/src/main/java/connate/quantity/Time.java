package connate.quantity;

/** A span of time, from seconds to millions of years. */
public final class Time extends Scalable<Time> {

  /** The dimension, under which the units are registered. */
  public static final Dimension<Time> DIMENSION = new Dimension<>("time", Time::new);

  private Time(double value, Unit<Time> unit) {
    super(value, unit);
  }

  /** Returns the quantity of a number and its unit. */
  public static Time of(double value, Unit<Time> unit) {
    return new Time(value, unit);
  }

  /** Returns the quantity of a number in the SI unit. */
  public static Time ofSeconds(double value) {
    return new Time(value, DIMENSION.siUnit());
  }

  /**
   * Reads a number and its unit.
   *
   * @throws IllegalArgumentException if the text is not such a quantity
   */
  public static Time parse(String text) {
    return DIMENSION.parse(text);
  }

  /** Returns the number in the SI unit. */
  public double seconds() {
    return si();
  }
}
