package connate.quantity;

/**
 * A quantity on a scale with a true zero, so that sums and multiples have a meaning. Results keep
 * the unit of the left side.
 *
 * @param <Q> the quantity's own type
 */
public abstract class Scalable<Q extends Scalable<Q>> extends Quantity<Q> {

  Scalable(double value, Unit<Q> unit) {
    super(value, unit);
  }

  /** Returns the sum. */
  public final Q plus(Q other) {
    return unit().of(number() + other.in(unit()));
  }

  /** Returns the difference. */
  public final Q less(Q other) {
    return unit().of(number() - other.in(unit()));
  }

  /** Returns the multiple. */
  public final Q times(double factor) {
    return unit().of(number() * factor);
  }

  /** Returns the part of this that a fraction says. */
  public final Q times(Fraction part) {
    return unit().of(number() * part.fraction());
  }

  /** Returns the quotient. */
  public final Q dividedBy(double divisor) {
    return unit().of(number() / divisor);
  }

  /** Returns how many times the other goes into this. */
  public final double ratioTo(Q other) {
    return si() / other.si();
  }
}
