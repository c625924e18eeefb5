package connate.quantity;

import java.util.Objects;

/**
 * A finite number with its unit. It remembers the unit that it was made in and prints in it; two
 * quantities are equal where their SI values are.
 *
 * @param <Q> the quantity's own type
 */
public abstract class Quantity<Q extends Quantity<Q>> implements Operand, Comparable<Q> {

  private final double value;
  private final Unit<Q> unit;

  Quantity(double value, Unit<Q> unit) {
    this.unit = Objects.requireNonNull(unit, "unit");
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(
          unit.dimension().name() + " is no finite number: " + value + " " + unit.symbol());
    }
    this.value = value;
  }

  /** Returns the number in a unit of the same dimension. */
  public final double in(Unit<Q> other) {
    return other.equals(unit) ? value : unit.convert(value, other);
  }

  /** Returns the number in the SI unit. */
  public final double si() {
    return unit.toSi(value);
  }

  /** Returns the number in the unit that the quantity was made in. */
  public final double number() {
    return value;
  }

  @Override
  public final Unit<Q> unit() {
    return unit;
  }

  /** Returns the same quantity, printed in another unit. */
  public final Q to(Unit<Q> other) {
    return other.of(in(other));
  }

  /** Returns whether this is more than another. */
  public final boolean isAbove(Q other) {
    return compareTo(other) > 0;
  }

  /** Returns whether this is less than another. */
  public final boolean isBelow(Q other) {
    return compareTo(other) < 0;
  }

  @Override
  public final int compareTo(Q other) {
    return Double.compare(si(), other.si());
  }

  @Override
  public final boolean equals(Object other) {
    return other instanceof Quantity<?> that
        && that.unit.dimension().equals(unit.dimension())
        && (that.value == value && that.unit.equals(unit) || that.si() == si());
  }

  @Override
  public final int hashCode() {
    return Double.hashCode(si());
  }

  /** Returns the number with four significant digits and the unit, such as {@code 142 mD}. */
  @Override
  public final String toString() {
    return Numbers.text(value) + unit.suffix();
  }
}
