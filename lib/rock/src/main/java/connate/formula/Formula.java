package connate.formula;

import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.MethodInput;
import connate.quantity.Operand;
import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.List;

/**
 * The one way from a method's arithmetic to values and columns. It converts each input to the unit
 * of the equation, throws where an input is impossible, raises a caution where one is outside the
 * published range, and notes the card as used.
 *
 * <p>In a column, rows that are missing stay missing; rows that are impossible become missing and
 * are counted in a caution; where no row is possible, the call throws.
 *
 * @param <R> the result's type
 */
public final class Formula<R extends Quantity<R>> {

  /** Arithmetic of one number. */
  @FunctionalInterface
  public interface Of1 {
    /** Returns the result. */
    double at(double a);
  }

  /** Arithmetic of two numbers. */
  @FunctionalInterface
  public interface Of2 {
    /** Returns the result. */
    double at(double a, double b);
  }

  /** Arithmetic of three numbers. */
  @FunctionalInterface
  public interface Of3 {
    /** Returns the result. */
    double at(double a, double b, double c);
  }

  /** Arithmetic of four numbers. */
  @FunctionalInterface
  public interface Of4 {
    /** Returns the result. */
    double at(double a, double b, double c, double d);
  }

  /** Arithmetic of as many numbers as the card has inputs; the array is not to be kept. */
  @FunctionalInterface
  public interface OfAny {
    /** Returns the result. */
    double at(double... inputs);
  }

  private final MethodCard card;
  private final Unit<R> unit;
  private final Loop loop;
  private final List<MethodInput> inputs;
  private volatile int noted = -1;

  private Formula(MethodCard card, Unit<R> unit, int arity, Loop loop) {
    if (arity >= 0 && card.inputs().size() != arity || !unit.equals(card.resultUnit())) {
      throw new IllegalStateException(card.id() + ": card and arithmetic do not fit");
    }
    this.card = card;
    this.unit = unit;
    this.loop = loop;
    this.inputs = card.inputs();
  }

  /** Binds arithmetic of one input to its card. */
  public static <R extends Quantity<R>> Formula<R> of(MethodCard card, Unit<R> unit, Of1 f) {
    return new Formula<>(card, unit, 1, Loop.of(f));
  }

  /** Binds arithmetic of two inputs to its card. */
  public static <R extends Quantity<R>> Formula<R> of(MethodCard card, Unit<R> unit, Of2 f) {
    return new Formula<>(card, unit, 2, Loop.of(f));
  }

  /** Binds arithmetic of three inputs to its card. */
  public static <R extends Quantity<R>> Formula<R> of(MethodCard card, Unit<R> unit, Of3 f) {
    return new Formula<>(card, unit, 3, Loop.of(f));
  }

  /** Binds arithmetic of four inputs to its card. */
  public static <R extends Quantity<R>> Formula<R> of(MethodCard card, Unit<R> unit, Of4 f) {
    return new Formula<>(card, unit, 4, Loop.of(f));
  }

  /** Binds arithmetic of any number of inputs to its card. */
  public static <R extends Quantity<R>> Formula<R> ofAny(MethodCard card, Unit<R> unit, OfAny f) {
    return new Formula<>(card, unit, -1, Loop.ofAny(f));
  }

  /** Returns the card. */
  public MethodCard card() {
    return card;
  }

  /**
   * Returns the result for one value of each input.
   *
   * @throws IllegalArgumentException if an input is impossible, or the result is no number
   */
  public R value(Operand... operands) {
    double[] numbers = new double[inputs.size()];
    checkCount(operands.length);
    for (int i = 0; i < numbers.length; i++) {
      numbers[i] = Inputs.number(card, inputs.get(i), operands[i]);
    }
    return unit.of(number(numbers));
  }

  /**
   * Returns the result for numbers that stand in the card's units already, with the same checks.
   *
   * @throws IllegalArgumentException if an input is impossible
   */
  public double number(double... numbers) {
    checkCount(numbers.length);
    note();
    for (int i = 0; i < numbers.length; i++) {
      Inputs.check(card, inputs.get(i), numbers[i]);
    }
    double result = loop.one(numbers);
    if (Double.isNaN(result)) {
      throw new IllegalArgumentException(Inputs.describe(card, numbers) + " gives no number");
    }
    return result;
  }

  /**
   * Returns the column of results; a quantity among the operands stands in every row.
   *
   * @throws IllegalArgumentException if no operand is a column, two differ in length, an input is
   *     of another dimension, or no row is possible
   */
  public Series series(Operand... operands) {
    checkCount(operands.length);
    Series like = Inputs.firstSeries(card, operands);
    double[][] columns = new double[operands.length][];
    boolean[] same = new boolean[operands.length];
    for (int i = 0; i < operands.length; i++) {
      same[i] = !(operands[i] instanceof Series);
      columns[i] =
          same[i]
              ? new double[] {Inputs.number(card, inputs.get(i), operands[i])}
              : Inputs.column(card, inputs.get(i), (Series) operands[i], like.size());
    }
    note();
    Inputs.sift(card, inputs, columns, same, like);
    double[] out = new double[like.size()];
    loop.all(columns, same, out);
    return Series.over(card.resultName(), unit, out, like);
  }

  private void checkCount(int found) {
    if (found != inputs.size()) {
      throw new IllegalArgumentException(
          card.title() + " takes " + inputs.size() + " inputs, found " + found);
    }
  }

  private void note() {
    int now = Listening.epoch();
    if (noted != now && !Listening.isMuted()) {
      noted = now;
      Listening.used(card);
    }
  }
}
