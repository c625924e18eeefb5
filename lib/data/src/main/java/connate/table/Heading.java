package connate.table;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Unit;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Unstated;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A column's heading: its name, and the unit that stands with it.
 *
 * @param name the name without its unit
 * @param symbol the unit as written, empty where none is
 * @param unit the unit, {@link Unstated#UNIT} where none is known
 */
record Heading(String name, String symbol, Unit<?> unit) {

  /** Caution: a unit that is not known. */
  static final String UNKNOWN = "T21";

  private static final Pattern TRAILING = Pattern.compile("(.+?)(?:, ?| / | (?=%))([^ ,]+)");
  private static final List<String> NO_UNIT = List.of("", "-", "none", "_", "n/a");

  /** Reads a heading such as {@code porosity [%]}, {@code depth (m)} or {@code depth, m}. */
  static Heading of(String file, String text) {
    int open = text.endsWith("]") ? text.lastIndexOf('[') : -1;
    open = text.endsWith(")") ? text.lastIndexOf('(') : open;
    if (open <= 0) {
      return trailing(text);
    }
    String symbol = text.substring(open + 1, text.length() - 1).strip();
    String name = text.substring(0, open).strip();
    boolean square = text.charAt(open) == '[';
    boolean counts = !Double.isNaN(Cells.number(symbol, false)); // AMC[0], AMC[1], k (2)
    boolean one = square && symbol.equals("1") && text.charAt(open - 1) == ' ';
    return counts && !one || !square && find(name, symbol).isEmpty()
        ? new Heading(text, "", Unstated.UNIT)
        : with(file, name, symbol);
  }

  /** A unit behind a comma, a stroke or, for a percentage, a blank; else all is the name. */
  private static Heading trailing(String text) {
    Matcher parts = TRAILING.matcher(text);
    if (parts.matches()) {
      String symbol = parts.group(2).strip();
      Optional<Unit<?>> unit = find(parts.group(1), symbol);
      if (unit.isPresent()) {
        return new Heading(parts.group(1).strip(), symbol, unit.get());
      }
    }
    return new Heading(text, "", Unstated.UNIT);
  }

  /** Returns a heading with a unit from a row of units, or from the workbook. */
  static Heading with(String file, String name, String symbol) {
    if (NO_UNIT.contains(symbol.toLowerCase(java.util.Locale.ROOT))) {
      return new Heading(name, "", Unstated.UNIT);
    }
    Optional<Unit<?>> unit = find(name, symbol);
    if (unit.isEmpty()) {
      Listening.caution(
          Caution.of(
              UNKNOWN,
              file,
              file
                  + ": the unit «"
                  + symbol
                  + "» of «"
                  + name
                  + "» is not known; its numbers stand"
                  + " without a unit"));
    }
    return new Heading(name, symbol, unit.orElse(Unstated.UNIT));
  }

  /** Returns the unit that a symbol means for a column; the column's role decides between two. */
  static Optional<Unit<?>> find(String name, String symbol) {
    Optional<Role> role = Roles.find(name, symbol);
    Optional<Unit<?>> byRole = role.flatMap(r -> r.unit(symbol));
    Optional<Unit<?>> byName =
        byRole.isPresent() ? byRole : Roles.find(name, "").flatMap(r -> r.unit(symbol));
    return byName.isPresent() ? byName : Unit.find(symbol);
  }
}
