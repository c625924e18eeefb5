package connate.chance;

import connate.quantity.Quantity;
import connate.quantity.Units;
import java.util.LinkedHashMap;
import java.util.Map;

/** What one run of a calculation gives: quantities by name. */
public final class Outcome {

  private final Map<String, Quantity<?>> values;

  private Outcome(Map<String, Quantity<?>> values) {
    this.values = values;
  }

  /** Returns an outcome of one quantity. */
  public static Outcome of(String name, Quantity<?> value) {
    return new Outcome(Map.of()).and(name, value);
  }

  /** Returns an outcome of one pure number. */
  public static Outcome of(String name, double value) {
    return of(name, Units.number(value));
  }

  /** Returns the outcome with one more quantity. */
  public Outcome and(String name, Quantity<?> value) {
    Map<String, Quantity<?>> more = new LinkedHashMap<>(values);
    if (more.put(name, value) != null) {
      throw new IllegalArgumentException("the outcome has «" + name + "» already");
    }
    return new Outcome(more);
  }

  /** Returns the outcome with one more pure number. */
  public Outcome and(String name, double value) {
    return and(name, Units.number(value));
  }

  Map<String, Quantity<?>> values() {
    return values;
  }

  @Override
  public String toString() {
    return values.toString();
  }
}
