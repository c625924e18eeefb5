package connate.well;

import connate.quantity.Length;
import java.util.Objects;

/**
 * A stretch of a well between two tops.
 *
 * @param well the well's name
 * @param name the zone's name
 * @param top the depth of its top, which belongs to it
 * @param base the depth of its base, which belongs to the next
 */
public record Zone(String well, String name, Length top, Length base) {

  /** Checks that the base lies below the top. */
  public Zone {
    Objects.requireNonNull(well, "well");
    Objects.requireNonNull(name, "name");
    if (!top.isBelow(base)) {
      throw new IllegalArgumentException(
          well + ", " + name + ": the top at " + top + " is not above the base at " + base);
    }
  }

  /** Returns the thickness along the hole. */
  public Length thickness() {
    return base.less(top);
  }

  @Override
  public String toString() {
    return name + " in " + well + ", " + top + " to " + base;
  }
}
