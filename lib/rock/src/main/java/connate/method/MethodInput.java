package connate.method;

import connate.quantity.Unit;

/**
 * One input of a method.
 *
 * @param symbol the symbol in the equation
 * @param name the quantity in words
 * @param unit the unit in which the equation takes it
 * @param possible outside it the input is impossible and is refused
 * @param valid outside it the method was not calibrated: it computes, and says so
 */
public record MethodInput(String symbol, String name, Unit<?> unit, Range possible, Range valid) {

  /** Returns the published range in words, empty where none is stated. */
  public String range() {
    return valid.equals(Range.ANY) ? "" : name + " " + valid + unit.suffix();
  }
}
