package connate.table;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Unit;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Unstated;
import java.util.List;
import java.util.Optional;

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
    return counts && !one || !square && likely(name, symbol).isEmpty()
        ? new Heading(text, "", Unstated.UNIT)
        : with(file, name, symbol);
  }

  /** A unit behind a comma, a stroke or, for a percentage, a blank; else all is the name. */
  private static Heading trailing(String text) {
    int sign = Math.max(text.lastIndexOf(','), text.lastIndexOf(" / ") + 1);
    int end = text.endsWith(" %") ? text.length() - 2 : sign;
    String symbol = end > 0 ? text.substring(end + 1).strip() : "";
    if (!symbol.isEmpty() && symbol.indexOf(' ') < 0) {
      String name = text.substring(0, end).strip();
      Optional<Unit<?>> unit = likely(name, symbol);
      if (unit.isPresent()) {
        return new Heading(name, symbol, unit.get());
      }
    }
    return new Heading(text, "", Unstated.UNIT);
  }

  /** Without square brackets a letter is a unit only if it is written as one: no sample (S). */
  private static Optional<Unit<?>> likely(String name, String symbol) {
    Optional<Role> role = Roles.find(name, symbol);
    if (role.isPresent() && role.get().unit() != null && role.get().unit(symbol).isPresent()) {
      return role.get().unit(symbol);
    }
    boolean letter = symbol.length() == 1 && Character.isLetter(symbol.charAt(0));
    return find(name, symbol)
        .filter(u -> (!letter || symbol.equals(u.symbol())) && !isOfWords(role));
  }

  private static boolean isOfWords(Optional<Role> role) {
    return role.filter(r -> ColumnReader.WORDS.contains(r.name())).isPresent();
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
