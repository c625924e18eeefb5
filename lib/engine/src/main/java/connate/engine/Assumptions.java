package connate.engine;

import connate.protocol.Event;
import connate.protocol.Item;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;

/** The assumptions of a calculation, some of which the replay sets to another value. */
final class Assumptions {

  private final Map<String, String> overrides;
  private final Teller teller;

  Assumptions(Map<String, String> overrides, Teller teller) {
    this.overrides = overrides;
    this.teller = teller;
  }

  <T> T settle(
      String name, T stated, Function<String, T> parse, Function<T, Item.Measure> measure) {
    String other = overrides.get(name);
    T value = other == null ? stated : parsed(name, other, parse);
    teller.tell(
        new Event.Assumed(name, measure.apply(value), measure.apply(stated), other != null));
    return value;
  }

  private static <T> T parsed(String name, String text, Function<String, T> parse) {
    try {
      return parse.apply(text.strip());
    } catch (NumberFormatException e) {
      throw new IllegalArgumentException(
          "the assumption «" + name + "» is to be «" + text + "», which is no number of its kind",
          e);
    } catch (IllegalArgumentException e) {
      throw new IllegalArgumentException(
          "the assumption «" + name + "» is to be «" + text + "»: " + e.getMessage(), e);
    }
  }

  static Boolean yesOrNo(String text) {
    switch (text.toLowerCase(Locale.ROOT)) {
      case "true", "yes":
        return true;
      case "false", "no":
        return false;
      default:
        throw new IllegalArgumentException("expected yes or no");
    }
  }
}
