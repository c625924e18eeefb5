package connate.quantity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * A unit of one dimension: SI value = (number + offset) × factor.
 *
 * @param <Q> the quantity that it measures
 */
public final class Unit<Q extends Quantity<Q>> {

  private static final Map<String, List<Unit<?>>> BY_SYMBOL = new HashMap<>();
  private static final Map<String, List<Unit<?>>> BY_ALIAS = new HashMap<>();

  private final Dimension<Q> dimension;
  private final String symbol;
  private final double factor;
  private final double offset;
  private final List<String> aliases;

  Unit(Dimension<Q> dimension, String symbol, double factor, double offset, List<String> aliases) {
    this.dimension = dimension;
    this.symbol = symbol;
    this.factor = factor;
    this.offset = offset;
    this.aliases = aliases;
  }

  static synchronized void register(Unit<?> unit) {
    BY_SYMBOL.computeIfAbsent(unit.symbol, s -> new ArrayList<>()).add(unit);
    BY_ALIAS.computeIfAbsent(fold(unit.symbol), s -> new ArrayList<>()).add(unit);
    for (String alias : unit.aliases) {
      List<Unit<?>> named = BY_ALIAS.computeIfAbsent(fold(alias), s -> new ArrayList<>());
      if (!named.contains(unit)) {
        named.add(unit);
      }
    }
  }

  /**
   * Returns the one unit that a symbol or alias names, whatever its dimension: the exact case
   * first, then any case. Empty where it names none, or several of different dimensions ({@code F}
   * is feet or degrees); {@link Dimension#find} decides those.
   */
  public static Optional<Unit<?>> find(String symbol) {
    List<Unit<?>> all = candidates(symbol);
    return all.size() == 1 ? Optional.of(all.get(0)) : Optional.empty();
  }

  /** Returns every unit that a symbol or alias may name, the exact case before any case. */
  public static List<Unit<?>> candidates(String symbol) {
    Units.load();
    String wanted = symbol.strip();
    List<Unit<?>> exact = BY_SYMBOL.getOrDefault(wanted, List.of());
    return List.copyOf(exact.isEmpty() ? BY_ALIAS.getOrDefault(fold(wanted), List.of()) : exact);
  }

  private static String fold(String symbol) {
    return symbol.toLowerCase(Locale.ROOT);
  }

  /** Returns the dimension. */
  public Dimension<Q> dimension() {
    return dimension;
  }

  /** Returns the symbol, such as {@code mD}. */
  public String symbol() {
    return symbol;
  }

  /** Returns the quantity of so many of this unit. */
  public Q of(double value) {
    return dimension.make(value, this);
  }

  /** Returns the SI value of a number in this unit. */
  public double toSi(double value) {
    return (value + offset) * factor;
  }

  /** Returns the number in this unit of an SI value. */
  public double fromSi(double si) {
    return si / factor - offset;
  }

  /** Returns a number of this unit in another of the same dimension, in one step. */
  public double convert(double value, Unit<?> other) {
    if (offset == 0 && other.offset == 0) {
      return value * (factor / other.factor);
    }
    return other.fromSi(toSi(value));
  }

  /** Returns whether a number in one unit is the same number in the other. */
  public boolean isSame(Unit<?> other) {
    return dimension == other.dimension && factor == other.factor && offset == other.offset;
  }

  /** Returns whether this is the SI unit of its dimension. */
  public boolean isSi() {
    return factor == 1 && offset == 0;
  }

  /** Returns whether numbers in this unit are printed bare: fractions and pure numbers. */
  public boolean isPure() {
    return isSi() && (symbol.equals("1") || symbol.equals("fraction"));
  }

  /** Returns what follows a number: a blank and the symbol, or nothing for a pure number. */
  public String suffix() {
    return isPure() ? "" : " " + symbol;
  }

  boolean isCalled(String name) {
    return symbol.equalsIgnoreCase(name) || aliases.stream().anyMatch(name::equalsIgnoreCase);
  }

  @Override
  public String toString() {
    return symbol;
  }
}
