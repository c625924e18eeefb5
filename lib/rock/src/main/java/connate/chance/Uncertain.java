package connate.chance;

import connate.quantity.Quantity;
import connate.quantity.Unit;
import java.util.Objects;

/**
 * A quantity that is not known exactly: a law of chance for its number in a unit.
 *
 * @param law the law of the number
 * @param unit the unit of the number
 * @param <Q> the quantity
 */
public record Uncertain<Q extends Quantity<Q>>(Distribution law, Unit<Q> unit) {

  /** Checks that nothing is missing. */
  public Uncertain {
    Objects.requireNonNull(law, "law");
    Objects.requireNonNull(unit, "unit");
  }

  /** Returns the quantity below which the given part lies. */
  public Q quantile(double probability) {
    return unit.of(law.quantile(probability));
  }

  /** Returns the mean. */
  public Q mean() {
    return unit.of(law.mean());
  }

  @Override
  public String toString() {
    return law.words() + unit.suffix();
  }
}
