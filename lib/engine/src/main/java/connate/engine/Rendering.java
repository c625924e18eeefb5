package connate.engine;

import connate.figure.Figure;
import connate.protocol.Item;
import connate.quantity.Numbers;
import connate.quantity.Operand;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.lang.reflect.Array;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.StringJoiner;

/** Makes of any value what a log or a console can show. */
public final class Rendering {

  private static final int LONGEST = 20_000;
  private static final int MOST_ELEMENTS = 100;
  private static final int DEEPEST = 4;
  private static final int SKETCH_COLUMNS = 72;
  private static final int SKETCH_ROWS = 20;

  private Rendering() {}

  /**
   * Returns a value as an item.
   *
   * @param id a name that no other figure of the log has: letters, digits, - and _
   */
  public static Item of(String id, Object value) {
    if (value instanceof Figure figure) {
      return new Item.Picture(
          figure.svg(id),
          figure.title(),
          figure.description(),
          figure.notes(),
          figure.sketch(SKETCH_COLUMNS, SKETCH_ROWS));
    }
    return of(value);
  }

  private static Item of(Object value) {
    Optional<Item.Measure> measure =
        value instanceof Operand || value instanceof Number
            ? Measures.find(value)
            : Optional.empty();
    if (measure.isPresent()) {
      return measure.get();
    }
    if (value instanceof Item item) {
      return item;
    }
    if (value instanceof Listed listed) {
      return grid(listed.listing());
    }
    return Measures.find(value)
        .map(Item.class::cast)
        .orElseGet(() -> new Item.Text(cut(text(value, 0))));
  }

  /** Returns several values as one item. */
  public static Item together(String id, Object... values) {
    if (values.length == 1) {
      return of(id, values[0]);
    }
    List<Item> items = new ArrayList<>();
    for (Object value : values) {
      items.add(of(id + (char) ('a' + items.size() % 26) + items.size() / 26, value));
    }
    return new Item.Group(items);
  }

  private static Item.Grid grid(Listing listing) {
    List<Item.Head> heads = new ArrayList<>();
    for (int column = 0; column < listing.heads().size(); column++) {
      Listing.Head head = listing.heads().get(column);
      String unit = head.unit() == null || head.unit().isPure() ? "" : head.unit().symbol();
      heads.add(new Item.Head(head.name(), unit, listing.isNumeric(column)));
    }
    List<List<String>> rows = new ArrayList<>();
    for (int row = 0; row < listing.rows().size(); row++) {
      List<String> cells = new ArrayList<>();
      for (int column = 0; column < heads.size(); column++) {
        cells.add(listing.text(row, column));
      }
      rows.add(cells);
    }
    return new Item.Grid(listing.caption(), heads, rows, listing.total(), listing.notes());
  }

  private static String text(Object value, int depth) {
    if (value instanceof Double number) {
      return Double.isFinite(number) ? Numbers.record(number) : Numbers.text(number);
    }
    if (value instanceof Series series) {
      return series(series);
    }
    if (depth < DEEPEST && value instanceof Collection<?> values) {
      return elements(values, values.size(), depth);
    }
    if (depth < DEEPEST && value instanceof Map<?, ?> map) {
      return map(map, depth);
    }
    if (depth < DEEPEST && value != null && value.getClass().isArray()) {
      return array(value, depth);
    }
    return value == null || hasText(value) ? own(value) : kind(value);
  }

  /** Returns a value's own text without its place in memory, which no two runs share. */
  private static String own(Object value) {
    String place = "@" + Integer.toHexString(System.identityHashCode(value));
    return String.valueOf(value).replace(place, "");
  }

  /** Returns whether a value says more of itself than its place in memory. */
  private static boolean hasText(Object value) {
    try {
      return value.getClass().getMethod("toString").getDeclaringClass() != Object.class;
    } catch (NoSuchMethodException e) {
      return true;
    }
  }

  private static String kind(Object value) {
    Class<?> type = value.getClass();
    return type.isHidden() || type.isSynthetic() ? "(function)" : "(" + plain(type) + ")";
  }

  private static String plain(Class<?> type) {
    return type.getSimpleName().isEmpty() ? "object" : type.getSimpleName();
  }

  private static String series(Series series) {
    String unit = series.unit().isPure() ? "" : " [" + series.unit().symbol() + "]";
    StringJoiner numbers = new StringJoiner(" ", ": ", series.size() > 10 ? " …" : "");
    for (int row = 0; row < series.size() && row < 10; row++) {
      numbers.add(Double.isNaN(series.value(row)) ? "-" : Numbers.text(series.value(row)));
    }
    int missing = series.size() - series.count();
    String range = series.count() == 0 ? "" : ", " + series.min() + " to " + series.max();
    return series.name()
        + unit
        + numbers
        + "\n"
        + series.size()
        + " values"
        + (missing == 0 ? "" : ", " + missing + " missing")
        + range;
  }

  private static String elements(Collection<?> values, int size, int depth) {
    StringJoiner out =
        new StringJoiner(", ", "[", size > MOST_ELEMENTS ? ", … " + size + "]" : "]");
    int told = 0;
    for (Object value : values) {
      if (told < MOST_ELEMENTS) {
        out.add(text(value, depth + 1));
      }
      told++;
    }
    return out.toString();
  }

  private static String map(Map<?, ?> map, int depth) {
    String end = map.size() > MOST_ELEMENTS ? ", … " + map.size() + "}" : "}";
    StringJoiner out = new StringJoiner(", ", "{", end);
    map.entrySet().stream()
        .limit(MOST_ELEMENTS)
        .forEach(e -> out.add(text(e.getKey(), depth + 1) + "=" + text(e.getValue(), depth + 1)));
    return out.toString();
  }

  private static String array(Object array, int depth) {
    int size = Array.getLength(array);
    List<Object> first = new ArrayList<>();
    for (int i = 0; i < size && i < MOST_ELEMENTS + 1; i++) {
      first.add(Array.get(array, i));
    }
    return elements(first, size, depth);
  }

  private static String cut(String text) {
    return text.length() <= LONGEST
        ? text
        : text.substring(0, LONGEST) + "… (" + text.length() + " characters)";
  }
}
