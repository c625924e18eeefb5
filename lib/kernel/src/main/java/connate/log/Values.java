package connate.log;

import connate.protocol.Item;
import connate.quantity.Numbers;

/** A measure in words: the value alone, and its range alone. */
public final class Values {

  private Values() {}

  /** Returns the value with its unit, without its range. */
  public static String plain(Item.Measure measure) {
    if (Double.isNaN(measure.value())) {
      return measure.text();
    }
    return Numbers.text(measure.value()) + (measure.unit().isEmpty() ? "" : " " + measure.unit());
  }

  /** Returns the range in words, empty where there is none. */
  public static String range(Item.Measure measure) {
    if (Double.isNaN(measure.low()) || Double.isNaN(measure.high())) {
      return "";
    }
    if (measure.low() == measure.high()) {
      return measure.range();
    }
    return measure.range()
        + ": "
        + Numbers.text(measure.low())
        + " to "
        + Numbers.text(measure.high());
  }
}
