/**
 * How a method's arithmetic reaches single values and whole columns: {@link
 * connate.formula.Formula} is the one adapter. It converts units, refuses the impossible, raises a
 * caution outside the published range and notes the card as used.
 */
package connate.formula;
