package connate.series;

import connate.quantity.Numbers;
import connate.quantity.Quantity;
import java.util.Objects;

/**
 * A value with the range that it may well have.
 *
 * @param value the value
 * @param low the low end
 * @param high the high end
 * @param range what the range means, such as {@code 80 %}
 * @param <Q> the quantity
 */
public record Estimate<Q extends Quantity<Q>>(Q value, Q low, Q high, String range) {

  /** Checks that low is not above high. */
  public Estimate {
    Objects.requireNonNull(value, "value");
    if (low.compareTo(high) > 0) {
      throw new IllegalArgumentException("the low end " + low + " is above the high end " + high);
    }
  }

  /** Returns value and range in the value's unit: {@code 142 mD (80 %: 96 to 211)}. */
  @Override
  public String toString() {
    return value
        + " ("
        + range
        + ": "
        + Numbers.text(low.in(value.unit()))
        + " to "
        + Numbers.text(high.in(value.unit()))
        + ")";
  }
}
