package connate.series;

import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Quantity;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/**
 * A column of numbers with a name and a unit; NaN stands for a missing value. Implementations do
 * not change once they are made, and none gives its array away.
 */
public interface Series extends Operand {

  /**
   * Trait: which fluid a permeability was measured with: {@code air}, {@code liquid}, {@code
   * brine}.
   */
  String FLUID = "fluid";

  /** Trait: under which stress a value stands: {@code ambient}, {@code in situ}. */
  String STRESS = "stress";

  /** Returns a series of the given numbers, which are copied. */
  static Series of(String name, Unit<?> unit, double... values) {
    return new ArraySeries(name, unit, values.clone(), Map.of(), null);
  }

  /**
   * Returns a series that takes over an array. The caller must not touch the array again.
   *
   * @param like the series whose depth and traits it shares, {@code null} for none
   */
  static Series over(String name, Unit<?> unit, double[] values, Series like) {
    return like == null
        ? new ArraySeries(name, unit, values, Map.of(), null)
        : new ArraySeries(name, unit, values, like.traits(), like.depth().orElse(null));
  }

  /** Returns the name. */
  String name();

  /** Returns the unit; {@link Unstated#UNIT} where none is known. */
  @Override
  Unit<?> unit();

  /** Returns the number of rows. */
  int size();

  /** Returns the number of a row in {@link #unit()}, NaN where it is missing. */
  double value(int row);

  /** Returns the depth that belongs to each row, where one is known. */
  default Optional<Series> depth() {
    return Optional.empty();
  }

  /** Returns what is known of how the values were obtained, such as fluid and stress. */
  default Map<String, String> traits() {
    return Map.of();
  }

  /** Returns a copy of the numbers in {@link #unit()}. */
  default double[] values() {
    double[] copy = new double[size()];
    for (int row = 0; row < copy.length; row++) {
      copy[row] = value(row);
    }
    return copy;
  }

  /**
   * Returns a copy of the numbers in another unit.
   *
   * @throws IllegalArgumentException if the unit is of another dimension, or this has no unit and
   *     its numbers do not tell
   */
  default double[] in(Unit<?> other) {
    return Conversion.convert(this, other);
  }

  /** Returns how many rows have a value. */
  default int count() {
    int count = 0;
    for (int row = 0; row < size(); row++) {
      count += Double.isNaN(value(row)) ? 0 : 1;
    }
    return count;
  }

  /** Returns the values of the rows that have one. */
  default double[] present() {
    return Summary.present(this);
  }

  /** Returns the smallest value. */
  default Quantity<?> min() {
    return Summary.of(this, Summary::min);
  }

  /** Returns the largest value. */
  default Quantity<?> max() {
    return Summary.of(this, Summary::max);
  }

  /** Returns the arithmetic mean of the rows that have a value. */
  default Quantity<?> mean() {
    return Summary.of(this, Summary::mean);
  }

  /** Returns the median of the rows that have a value. */
  default Quantity<?> median() {
    return Summary.of(this, Summary::median);
  }

  /** Returns the value of one row as a quantity. */
  default Quantity<?> at(int row) {
    return unit().of(value(row));
  }

  /** Returns the same numbers under another name. */
  default Series named(String name) {
    return new ArraySeries(name, unit(), values(), traits(), depth().orElse(null));
  }

  /** Returns the same numbers with one more trait. */
  default Series with(String trait, String value) {
    return new ArraySeries(
        name(), unit(), values(), Conversion.with(traits(), trait, value), depth().orElse(null));
  }

  /** Returns the same numbers with the depths of their rows. */
  default Series atDepth(Series depth) {
    return new ArraySeries(name(), unit(), values(), traits(), depth);
  }

  /** Returns the numbers converted to another unit. */
  default Series to(Unit<?> other) {
    return over(name(), other, in(other), this);
  }

  /** States the unit of numbers that came without one, or corrects a wrong one. */
  default Series as(Unit<?> stated) {
    return over(name(), stated, values(), this);
  }

  /** Returns the sum with a series or a quantity of the same dimension. */
  default Series plus(Operand other) {
    return Arithmetic.combine(this, " + ", other, unit(), (a, b) -> a + b);
  }

  /** Returns the difference with a series or a quantity of the same dimension. */
  default Series less(Operand other) {
    return Arithmetic.combine(this, " - ", other, unit(), (a, b) -> a - b);
  }

  /** Returns the product with a fraction or a pure number, or with a series of them. */
  default Series times(Operand other) {
    return Arithmetic.times(this, other);
  }

  /** Returns the multiple. */
  default Series times(double factor) {
    return map(v -> v * factor);
  }

  /** Returns the quotient. */
  default Series dividedBy(double divisor) {
    return map(v -> v / divisor);
  }

  /** Returns how many times the other goes into each value, as pure numbers. */
  default Series ratioTo(Operand other) {
    return Arithmetic.ratio(this, other);
  }

  /** Returns a function of each value, in the same unit. */
  default Series map(DoubleUnaryOperator function) {
    return Arithmetic.map(this, unit(), function);
  }

  /** Returns a function of each value, which yields another unit. */
  default Series map(Unit<?> result, DoubleUnaryOperator function) {
    return Arithmetic.map(this, result, function);
  }

  /**
   * Returns the decimal logarithm of each value as a pure number, missing where it is not above 0.
   */
  default Series log10() {
    return map(connate.quantity.Units.number, v -> v > 0 ? StrictMath.log10(v) : Double.NaN)
        .named("log10 " + name());
  }

  /** Returns the chosen rows, in the given order. */
  default Series rows(int... chosen) {
    return Arithmetic.rows(this, chosen);
  }

  /** Returns whether the numbers are parts of a whole or pure numbers. */
  default boolean isPure() {
    return unit().dimension() == Fraction.DIMENSION || unit().dimension() == Ratio.DIMENSION;
  }
}
