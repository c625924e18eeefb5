package connate.quantity;

/**
 * What may stand as an input of a published method: one {@link Quantity}, or a column of numbers
 * with a unit.
 */
public interface Operand {

  /** Returns the unit in which the numbers stand. */
  Unit<?> unit();
}
