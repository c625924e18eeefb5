package connate.series;

import connate.quantity.Ratio;
import connate.quantity.Unit;

/** The unit of a column that came without one. */
public final class Unstated {

  /**
   * Stands where a unit is not known; it converts to nothing but fractions that are plain to see.
   */
  public static final Unit<Ratio> UNIT = Ratio.unstated();

  private Unstated() {}
}
