package connate.table;

import connate.quantity.Numbers;
import connate.role.Role;
import connate.series.Series;
import java.util.Optional;

/**
 * The values of a column outside of the range in which its role is met.
 *
 * @param count how many
 * @param first the row of the first, -1 for none
 * @param words what to say of them
 */
record Outliers(int count, int first, String words) {

  private static final Outliers NONE = new Outliers(0, -1, "");

  static Outliers of(Series series, Optional<Role> role) {
    if (role.isEmpty() || !role.get().isMeasuredIn(series.unit())) {
      return NONE;
    }
    Role known = role.get();
    double low = known.unit().convert(known.low(), series.unit());
    double high = known.unit().convert(known.high(), series.unit());
    int count = 0;
    int first = -1;
    for (int row = 0; row < series.size(); row++) {
      double value = series.value(row);
      if (value < low || value > high) {
        first = count++ == 0 ? row : first;
      }
    }
    return count == 0 ? NONE : new Outliers(count, first, words(series, first, count, low, high));
  }

  private static String words(Series series, int first, int count, double low, double high) {
    return count
        + (count == 1 ? " value" : " values")
        + " outside "
        + Numbers.text(low)
        + " to "
        + Numbers.text(high)
        + series.unit().suffix()
        + ", such as "
        + Numbers.text(series.value(first));
  }
}
