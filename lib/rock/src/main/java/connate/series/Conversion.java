package connate.series;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

/** The one place where a column's numbers change their unit. */
final class Conversion {

  private Conversion() {}

  static double[] convert(Series series, Unit<?> to) {
    double[] values = series.values();
    Unit<?> from = series.unit();
    if (from.isSame(to)) {
      return values;
    }
    if (from.equals(Unstated.UNIT)) {
      return unstated(series, to, values);
    }
    if (!isComparable(from, to)) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "«%s» is a %s in %s; a %s was expected, in %s or the like",
              series.name(),
              from.dimension(),
              from.symbol(),
              to.dimension(),
              to.symbol()));
    }
    for (int row = 0; row < values.length; row++) {
      values[row] = from.convert(values[row], to);
    }
    return values;
  }

  /** A fraction is also a pure number; nothing else crosses from one dimension to another. */
  private static boolean isComparable(Unit<?> from, Unit<?> to) {
    return from.dimension() == to.dimension()
        || from.dimension() == Fraction.DIMENSION && to.dimension() == Ratio.DIMENSION;
  }

  private static double[] unstated(Series series, Unit<?> to, double[] values) {
    if (to.dimension() == Ratio.DIMENSION) {
      return values;
    }
    if (to.dimension() == Fraction.DIMENSION) {
      return fractions(series, to, values);
    }
    throw new IllegalArgumentException(
        String.format(
            Locale.ROOT,
            "«%s» has no unit: a %s was expected. Name the unit in the header, such as %s [%s],"
                + " or say table.unit(\"%s\", \"%s\")",
            series.name(),
            to.dimension(),
            series.name(),
            to.symbol(),
            series.name(),
            to.symbol()));
  }

  private static double[] fractions(Series series, Unit<?> to, double[] values) {
    for (double value : values) {
      if (value > 1) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "«%s» has no unit and holds %s, which is no fraction: in percent? Name the unit in"
                    + " the header: %s [%%]",
                series.name(),
                connate.quantity.Numbers.text(value),
                series.name()));
      }
    }
    Listening.caution(
        Caution.of(
            "U01",
            series.name(),
            "«"
                + series.name()
                + "» has no unit; read as a fraction, because no value is above 1"));
    for (int row = 0; row < values.length; row++) {
      values[row] = to.fromSi(values[row]);
    }
    return values;
  }

  static Map<String, String> with(Map<String, String> traits, String trait, String value) {
    Map<String, String> more = new TreeMap<>(traits);
    more.put(trait, value);
    return Map.copyOf(more);
  }
}
