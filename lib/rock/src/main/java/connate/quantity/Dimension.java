package connate.quantity;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * A dimension of the trade, such as permeability, with its units. Permeability and area are two
 * dimensions here, though both are square metres: nobody may add them.
 *
 * @param <Q> the quantity's type
 */
public final class Dimension<Q extends Quantity<Q>> {

  /** Makes a quantity from a number and its unit. */
  @FunctionalInterface
  interface Maker<Q extends Quantity<Q>> {
    Q make(double value, Unit<Q> unit);
  }

  private final String name;
  private final Maker<Q> maker;
  private final List<Unit<Q>> units = new ArrayList<>();

  Dimension(String name, Maker<Q> maker) {
    this.name = name;
    this.maker = maker;
  }

  /** Returns the name, such as {@code permeability}. */
  public String name() {
    return name;
  }

  /** Returns the units, in the order in which they were registered. */
  public List<Unit<Q>> units() {
    Units.load();
    return List.copyOf(units);
  }

  /** Returns the SI unit. */
  public Unit<Q> siUnit() {
    return units().stream().filter(Unit::isSi).findFirst().orElseThrow();
  }

  /** Returns the unit of this dimension that a symbol or an alias names, the exact case first. */
  public Optional<Unit<Q>> find(String symbol) {
    String wanted = symbol.strip();
    return units().stream()
        .filter(u -> u.symbol().equals(wanted))
        .findFirst()
        .or(() -> units().stream().filter(u -> u.isCalled(wanted)).findFirst());
  }

  /**
   * Reads a number and its unit, such as {@code 250 mD}.
   *
   * @throws IllegalArgumentException if the text is not a number followed by a unit of this
   *     dimension
   */
  public Q parse(String text) {
    String trimmed = text.strip();
    int split = Numbers.end(trimmed);
    if (split == 0) {
      throw new IllegalArgumentException(
          "expected a " + name + " such as " + example() + ", found «" + text + "»");
    }
    double value = Double.parseDouble(trimmed.substring(0, split));
    String symbol = trimmed.substring(split).strip();
    return unitOf(symbol, text).of(value);
  }

  Unit<Q> unit(String symbol, double factor, double offset, String... aliases) {
    Unit<Q> unit = new Unit<>(this, symbol, factor, offset, List.of(aliases));
    units.add(unit);
    Unit.register(unit);
    return unit;
  }

  Q make(double value, Unit<Q> unit) {
    return maker.make(value, unit);
  }

  private Unit<Q> unitOf(String symbol, String text) {
    if (symbol.isEmpty()) {
      Unit<Q> si = siUnit();
      if (si.isPure()) {
        return si;
      }
      throw new IllegalArgumentException(
          "«" + text + "» has no unit: write it as a " + name + ", such as " + example());
    }
    return find(symbol)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "«" + symbol + "» is no unit of " + name + "; known: " + symbols()));
  }

  private String symbols() {
    return String.join(", ", units().stream().map(Unit::symbol).toList());
  }

  private String example() {
    return String.format(Locale.ROOT, "250%s", units().get(units().size() / 2).suffix());
  }

  @Override
  public String toString() {
    return name;
  }
}
