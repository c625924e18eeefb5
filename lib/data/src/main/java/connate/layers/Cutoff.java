package connate.layers;

import connate.quantity.Quantity;
import java.util.Objects;

/**
 * A limit by which samples of a log count as net.
 *
 * @param limit the limit
 * @param isAbove whether samples above it count, else those below
 */
public record Cutoff(Quantity<?> limit, boolean isAbove) {

  /** Checks that there is a limit. */
  public Cutoff {
    Objects.requireNonNull(limit, "limit");
  }

  /** Counts the samples above a limit. */
  public static Cutoff above(Quantity<?> limit) {
    return new Cutoff(limit, true);
  }

  /** Counts the samples below a limit. */
  public static Cutoff below(Quantity<?> limit) {
    return new Cutoff(limit, false);
  }

  boolean admits(double value, double limitInUnit) {
    return isAbove ? value > limitInUnit : value < limitInUnit;
  }

  @Override
  public String toString() {
    return (isAbove ? "above " : "below ") + limit;
  }
}
