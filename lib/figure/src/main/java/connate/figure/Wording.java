package connate.figure;

import connate.quantity.Dimension;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Ratio;
import connate.quantity.Time;
import connate.quantity.Unit;
import connate.series.Series;
import connate.series.Unstated;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;

/** The words of figures: titles of axes, ranges, lines that fit. */
final class Wording {

  private Wording() {}

  /** Returns quantity and unit, such as {@code k_air, permeability (mD)}. */
  static String quantity(Series series) {
    return quantity(series.name(), series.unit());
  }

  /** Returns quantity and unit of a name. */
  static String quantity(String name, Unit<?> unit) {
    String words = name.isBlank() ? unit.dimension().name() : name.strip();
    return isNamed(words, unit)
        ? words + unit(unit)
        : words + ", " + unit.dimension().name() + unit(unit);
  }

  /** Returns the unit in brackets after a blank. */
  static String unit(Unit<?> unit) {
    if (unit == Unstated.UNIT) {
      return " (unit not stated)";
    }
    return unit.isPure() && unit.dimension() == Ratio.DIMENSION
        ? " (no unit)"
        : " (" + unit.symbol() + ")";
  }

  /** Tells whether the name says already what is measured, or the dimension would not help. */
  private static boolean isNamed(String name, Unit<?> unit) {
    Dimension<?> dimension = unit.dimension();
    return dimension == Fraction.DIMENSION
        || dimension == Ratio.DIMENSION
        || dimension == Length.DIMENSION
        || dimension == Time.DIMENSION
        || name.toLowerCase(Locale.ROOT).contains(dimension.name().toLowerCase(Locale.ROOT));
  }

  /** Returns the title of an axis. */
  static String axis(String quantity, boolean log) {
    return log ? quantity + ", log scale" : quantity;
  }

  /** Returns {@code from 0.05 to 0.31 mD}, over the given values. */
  static String range(double[] values, Unit<?> unit) {
    double[] ends = Extent.of(Double.NEGATIVE_INFINITY, values);
    return "from " + Numbers.text(ends[0]) + " to " + Numbers.text(ends[1]) + unit.suffix();
  }

  /** Returns a text shortened to so many characters. */
  static String clip(String text, int most) {
    int count = text.codePointCount(0, text.length());
    return count <= most ? text : text.substring(0, text.offsetByCodePoints(0, most - 1)) + "…";
  }

  /** Returns a text shortened until it fits. */
  static String fit(String text, Predicate<String> fits) {
    String shorter = text;
    for (int most = text.codePointCount(0, text.length()); most > 2; most--) {
      if (fits.test(shorter)) {
        break;
      }
      shorter = clip(text, most - 1);
    }
    return shorter;
  }

  /** Breaks a text into lines that fit; a word that is too long is broken, too. */
  static List<String> wrap(String text, Predicate<String> fits) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : text.split(" ")) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (fits.test(longer)) {
        line = longer;
        continue;
      }
      if (!line.isEmpty()) {
        lines.add(line);
      }
      line = word;
      while (!fits.test(line) && line.length() > 8) {
        int cut = line.length() - 1;
        while (cut > 8 && !fits.test(line.substring(0, cut))) {
          cut--;
        }
        cut = Character.isLowSurrogate(line.charAt(cut)) ? cut - 1 : cut;
        lines.add(line.substring(0, cut));
        line = line.substring(cut);
      }
    }
    if (!line.isEmpty()) {
      lines.add(line);
    }
    return lines;
  }

  /** Returns {@code 1 row} or {@code 7 rows}. */
  static String count(int n, String one) {
    return n + " " + (n == 1 ? one : one + "s");
  }

  /** Returns names as a list in a sentence, the first few of many. */
  static String list(List<String> names) {
    int shown = Math.min(8, names.size());
    String some = String.join(", ", names.subList(0, shown));
    return shown < names.size() ? some + " and " + (names.size() - shown) + " more" : some;
  }
}
