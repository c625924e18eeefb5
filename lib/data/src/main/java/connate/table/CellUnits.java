package connate.table;

import connate.quantity.Unit;
import connate.role.Roles;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** Finds the unit with which a cell such as {@code 12 mD} ends. */
final class CellUnits {

  private final Heading heading;
  private final boolean decimalComma;
  private final Map<String, Optional<Unit<?>>> known = new HashMap<>();

  CellUnits(Heading heading, boolean decimalComma) {
    this.heading = heading;
    this.decimalComma = decimalComma;
  }

  Optional<Unit<?>> of(String cell) {
    int end = Cells.numberEnd(cell, decimalComma);
    return end == 0 || end == cell.length()
        ? Optional.empty()
        : known.computeIfAbsent(cell.substring(end), this::find);
  }

  double number(String cell) {
    return Cells.number(cell.substring(0, Cells.numberEnd(cell, decimalComma)), decimalComma);
  }

  /**
   * A unit must look like one: {@code 12A} and {@code 7H} are names of plugs, no years and hours. A
   * unit that fits what the column stands for is taken in any case.
   */
  private Optional<Unit<?>> find(String rest) {
    String symbol = rest.strip();
    Optional<Unit<?>> byRole =
        Roles.find(heading.name(), heading.symbol()).flatMap(r -> r.unit(symbol));
    if (byRole.isPresent()) {
      return byRole;
    }
    boolean apart = Character.isWhitespace(rest.charAt(0));
    boolean letter = symbol.length() == 1 && Character.isLetter(symbol.charAt(0));
    return Heading.find(heading.name(), symbol)
        .filter(u -> symbol.equals(u.symbol()) ? apart || !letter : apart && !letter);
  }
}
