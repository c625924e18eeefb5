package connate.conductivity;

import connate.method.MethodCard;
import connate.method.MethodInput;
import connate.quantity.Numbers;

/** Says what of a sand is outside the range of a formula. */
final class Outside {

  /** Per cent finer than 2 µm; common practice, no source. */
  private static final double MOST_CLAY = 10;

  private Outside() {}

  static String uniformity(Sand sand, double low, double high) {
    return text("Cu", sand.uniformity(), low, high, "");
  }

  static String median(Sand sand, double low, double high) {
    return text("d50", sand.d50(), low, high, " mm");
  }

  static String clay(Sand sand) {
    return text("clay", sand.clay(), 0, MOST_CLAY, " %");
  }

  private static String text(String name, double value, double low, double high, String unit) {
    if (Double.isNaN(value) || value >= low && value <= high) {
      return "";
    }
    boolean small = value < low;
    return name
        + " "
        + Numbers.text(value)
        + (small ? " below " : " above ")
        + Numbers.text(small ? low : high)
        + unit;
  }

  static String inputs(MethodCard card, Sand sand) {
    String all = "";
    for (MethodInput input : card.inputs()) {
      double value = sand.of(input.symbol());
      if (!Double.isNaN(value) && input.possible().contains(value)) {
        String unit = input.unit().suffix();
        String one = text(input.symbol(), value, input.valid().low(), input.valid().high(), unit);
        all = both(all, one);
      }
    }
    return all;
  }

  static boolean isPossible(MethodCard card, Sand sand) {
    return card.inputs().stream()
        .allMatch(
            input -> {
              double value = sand.of(input.symbol());
              return Double.isNaN(value) || input.possible().contains(value);
            });
  }

  static String both(String a, String b) {
    if (a.isEmpty() || a.equals(b)) {
      return b;
    }
    return b.isEmpty() ? a : a + ", " + b;
  }
}
