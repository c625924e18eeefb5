package connate.series;

import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Quantity;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import connate.quantity.Units;
import java.util.Arrays;
import java.util.Locale;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;

/** Sums and products of columns, row by row. */
final class Arithmetic {

  private Arithmetic() {}

  static Series combine(
      Series left, String sign, Operand right, Unit<?> unit, DoubleBinaryOperator function) {
    double[] a = left.in(unit);
    double[] b = numbers(right, unit, left);
    for (int row = 0; row < a.length; row++) {
      a[row] = function.applyAsDouble(a[row], b[row]);
    }
    return Series.over(left.name() + sign + nameOf(right), unit, a, left);
  }

  static Series times(Series left, Operand right) {
    if (isPure(right)) {
      double[] a = left.values();
      double[] b = numbers(right, pureUnit(right), left);
      for (int row = 0; row < a.length; row++) {
        a[row] *= b[row];
      }
      return Series.over(left.name() + " × " + nameOf(right), left.unit(), a, left);
    }
    if (left.isPure() && right instanceof Series other) {
      return times(other, left).named(left.name() + " × " + other.name());
    }
    throw new IllegalArgumentException(
        "«"
            + left.name()
            + "» times a "
            + right.unit().dimension()
            + ": one side must be a fraction or a pure number");
  }

  static Series ratio(Series left, Operand right) {
    return combine(left, " / ", right, left.unit(), (a, b) -> a / b).as(Units.number);
  }

  static Series map(Series series, Unit<?> unit, DoubleUnaryOperator function) {
    double[] values = series.values();
    for (int row = 0; row < values.length; row++) {
      values[row] = function.applyAsDouble(values[row]);
    }
    return Series.over(series.name(), unit, values, series);
  }

  static Series rows(Series series, int... chosen) {
    double[] values = new double[chosen.length];
    for (int i = 0; i < chosen.length; i++) {
      values[i] = series.value(chosen[i]);
    }
    Series picked = new ArraySeries(series.name(), series.unit(), values, series.traits(), null);
    return series.depth().map(d -> picked.atDepth(rows(d, chosen))).orElse(picked);
  }

  /** Returns an operand's numbers in a unit, one for each row; a quantity stands in every row. */
  static double[] numbers(Operand operand, Unit<?> unit, Series like) {
    if (operand instanceof Series series) {
      if (series.size() != like.size()) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "«%s» has %d rows, «%s» %d: they do not stand side by side",
                like.name(),
                like.size(),
                series.name(),
                series.size()));
      }
      return series.in(unit);
    }
    double[] same = new double[like.size()];
    Arrays.fill(same, Series.of("value", operand.unit(), number(operand)).in(unit)[0]);
    return same;
  }

  private static double number(Operand operand) {
    if (operand instanceof Quantity<?> quantity) {
      return quantity.number();
    }
    throw new IllegalArgumentException("expected a quantity or a series, found " + operand);
  }

  private static boolean isPure(Operand operand) {
    return operand.unit().dimension() == Fraction.DIMENSION
        || operand.unit().dimension() == Ratio.DIMENSION;
  }

  private static Unit<?> pureUnit(Operand operand) {
    return operand.unit().dimension() == Fraction.DIMENSION ? Units.fraction : Units.number;
  }

  private static String nameOf(Operand operand) {
    return operand instanceof Series series ? series.name() : operand.toString();
  }
}
