package connate.engine;

import connate.chance.Exceedance;
import connate.protocol.Item;
import connate.quantity.Numbers;
import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.series.Estimate;
import java.util.Optional;

/** Makes of a value the number, unit and range that a record can hold. */
final class Measures {

  private Measures() {}

  /** Returns the value as a measure, where it is one. */
  static Optional<Item.Measure> find(Object value) {
    if (value instanceof Quantity<?> quantity) {
      return Optional.of(of(quantity));
    }
    if (value instanceof Estimate<?> e) {
      return Optional.of(ranged(e.value(), e.low(), e.high(), e.range(), 0, e.toString()));
    }
    if (value instanceof Exceedance e) {
      return Optional.of(ranged(e.middle(), e.low(), e.high(), e.words(), e.runs(), e.toString()));
    }
    if (value instanceof Number number) {
      return Optional.of(number(number));
    }
    return Optional.empty();
  }

  /** Returns a value that is no number, such as a name or a yes or no, as a measure. */
  static Item.Measure word(Object value) {
    String kind = value instanceof Boolean ? "yes or no" : "text";
    return new Item.Measure(
        kind, Double.NaN, "", Double.NaN, Double.NaN, "", 0, String.valueOf(value));
  }

  static Item.Measure of(Quantity<?> quantity) {
    return new Item.Measure(
        quantity.unit().dimension().name(),
        quantity.number(),
        symbol(quantity.unit()),
        Double.NaN,
        Double.NaN,
        "",
        0,
        quantity.toString());
  }

  private static Item.Measure number(Number number) {
    double value =
        number instanceof Float ? Double.parseDouble(number.toString()) : number.doubleValue();
    boolean whole = !(number instanceof Double || number instanceof Float);
    String text = whole || !Double.isFinite(value) ? whole(number) : Numbers.text(value);
    return new Item.Measure("number", value, "", Double.NaN, Double.NaN, "", 0, text);
  }

  private static String whole(Number number) {
    return number instanceof Double d ? Numbers.text(d) : number.toString();
  }

  private static Item.Measure ranged(
      Quantity<?> value, Quantity<?> low, Quantity<?> high, String range, int count, String text) {
    Unit<?> unit = value.unit();
    return new Item.Measure(
        unit.dimension().name(),
        value.number(),
        symbol(unit),
        low.unit().convert(low.number(), unit),
        high.unit().convert(high.number(), unit),
        range,
        count,
        text);
  }

  private static String symbol(Unit<?> unit) {
    return unit.isPure() ? "" : unit.symbol();
  }
}
