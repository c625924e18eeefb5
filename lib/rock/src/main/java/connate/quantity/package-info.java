/**
 * What a number means: one type per dimension that the trade uses, and the units it is read in.
 *
 * <p>Read {@link connate.quantity.Quantity} for what every quantity can do, then {@link
 * connate.quantity.Units} for the names: {@code mD(250)}, {@code ft(8200)}, {@code percent(21)}.
 */
package connate.quantity;
