package connate.formula;

import connate.method.Caution;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.MethodInput;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Numbers;
import connate.quantity.Operand;
import connate.quantity.Quantity;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.List;
import java.util.Locale;
import java.util.StringJoiner;

/** Checks and conversions of a method's inputs. */
final class Inputs {

  /** Caution: an input is outside the method's range. */
  static final String OUTSIDE = "M01";

  /** Caution: rows of a column are impossible and were set missing. */
  static final String IMPOSSIBLE = "M02";

  private Inputs() {}

  static double number(MethodCard card, MethodInput input, Operand operand) {
    if (!(operand instanceof Quantity<?> quantity)) {
      throw new IllegalArgumentException(
          card.title() + ": " + input.name() + " must be one value here, found a column");
    }
    Unit<?> from = quantity.unit();
    if (from.isSame(input.unit())) {
      return quantity.number();
    }
    boolean pure =
        from.dimension() == Fraction.DIMENSION && input.unit().dimension() == Ratio.DIMENSION;
    if (from.dimension() != input.unit().dimension() && !pure) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "%s: %s must be a %s, found the %s %s",
              card.title(),
              input.name(),
              input.unit().dimension(),
              from.dimension(),
              quantity));
    }
    return from.convert(quantity.number(), input.unit());
  }

  static double[] column(MethodCard card, MethodInput input, Series series, int size) {
    if (series.size() != size) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "%s: «%s» has %d rows, the first column %d",
              card.title(),
              series.name(),
              series.size(),
              size));
    }
    try {
      return series.in(input.unit());
    } catch (IllegalArgumentException e) {
      throw new IllegalArgumentException(
          card.title() + ": " + input.name() + ": " + e.getMessage(), e);
    }
  }

  static Series firstSeries(MethodCard card, Operand... operands) {
    for (Operand operand : operands) {
      if (operand instanceof Series series) {
        return series;
      }
    }
    StringJoiner found = new StringJoiner(", ");
    for (Operand operand : operands) {
      found.add(operand.unit().dimension() + " " + operand);
    }
    StringJoiner wanted = new StringJoiner(", ");
    card.inputs().forEach(i -> wanted.add(i.name() + " (" + i.unit().dimension() + ")"));
    throw new IllegalArgumentException(card.title() + " takes " + wanted + "; found " + found);
  }

  static void check(MethodCard card, MethodInput input, double value) {
    if (!input.possible().contains(value)) {
      throw new IllegalArgumentException(impossible(card, input, value));
    }
    if (!input.valid().contains(value)) {
      Listening.caution(
          Caution.of(OUTSIDE, card.id() + "/" + input.name(), outside(card, input, value)));
    }
  }

  /** Sets impossible rows missing and tells of them and of rows outside the method's range. */
  static void sift(
      MethodCard card, List<MethodInput> inputs, double[][] columns, boolean[] same, Series like) {
    for (int i = 0; i < columns.length; i++) {
      if (same[i]) {
        check(card, inputs.get(i), columns[i][0]);
      } else {
        sift(card, inputs.get(i), columns[i]);
      }
    }
  }

  private static void sift(MethodCard card, MethodInput input, double[] column) {
    Range possible = input.possible();
    Range valid = input.valid();
    int refused = 0;
    int flagged = 0;
    int firstRefused = -1;
    double firstValue = Double.NaN;
    int kept = 0;
    for (int row = 0; row < column.length; row++) {
      double value = column[row];
      if (Double.isNaN(value)) {
        continue;
      }
      if (!possible.contains(value)) {
        if (refused++ == 0) {
          firstRefused = row;
          firstValue = value;
        }
        column[row] = Double.NaN;
      } else {
        kept++;
        flagged += valid.contains(value) ? 0 : 1;
      }
    }
    if (refused > 0) {
      tellRefused(card, input, refused, kept, firstRefused, firstValue);
    }
    if (flagged > 0) {
      Listening.caution(
          Caution.of(
              OUTSIDE,
              card.id() + "/" + input.name(),
              String.format(
                  Locale.ROOT,
                  "%s: %d of %d rows have a %s outside the method's range %s%s",
                  card.title(),
                  flagged,
                  kept,
                  input.name(),
                  valid,
                  input.unit().suffix())));
    }
  }

  private static void tellRefused(
      MethodCard card, MethodInput input, int refused, int kept, int row, double value) {
    if (kept < refused) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "%s; so are %d of %d rows, the first in row %d",
              impossible(card, input, value),
              refused,
              refused + kept,
              row + 1));
    }
    Listening.caution(
        Caution.of(
            IMPOSSIBLE,
            card.id() + "/" + input.name(),
            String.format(
                Locale.ROOT,
                "%s: %d of %d rows have an impossible %s and give no value; the first is %s in row"
                    + " %d",
                card.title(),
                refused,
                refused + kept,
                input.name(),
                Numbers.text(value) + input.unit().suffix(),
                row + 1)));
  }

  private static String impossible(MethodCard card, MethodInput input, double value) {
    String hint =
        input.unit().dimension() == Fraction.DIMENSION && value > 1 && input.unit().isPure()
            ? ": in percent? write percent(" + Numbers.text(value) + ")"
            : "";
    return String.format(
        Locale.ROOT,
        "%s: %s %s is impossible, expected %s%s%s",
        card.title(),
        input.name(),
        Numbers.text(value) + input.unit().suffix(),
        input.possible(),
        input.unit().suffix(),
        hint);
  }

  private static String outside(MethodCard card, MethodInput input, double value) {
    return String.format(
        Locale.ROOT,
        "%s: %s %s is outside the method's range %s%s",
        card.title(),
        input.name(),
        Numbers.text(value) + input.unit().suffix(),
        input.valid(),
        input.unit().suffix());
  }

  static String describe(MethodCard card, double... numbers) {
    StringJoiner out = new StringJoiner(", ", card.title() + " at ", "");
    for (int i = 0; i < numbers.length; i++) {
      MethodInput input = card.inputs().get(i);
      out.add(input.name() + " " + Numbers.text(numbers[i]) + input.unit().suffix());
    }
    return out.toString();
  }
}
