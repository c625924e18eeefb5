package connate.role;

import connate.quantity.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;

/**
 * What a column or curve stands for, and the names under which it is met.
 *
 * @param name the role in plain words, such as {@code bulk density}
 * @param unit the unit in which the range is meant, {@code null} for words and bare numbers
 * @param low the value below which a value deserves a look, NaN for none
 * @param high the value above which a value deserves a look, NaN for none
 * @param names the names, the most wanted first, without what does not matter; a star at the end
 *     stands for letters and digits
 */
public record Role(String name, Unit<?> unit, double low, double high, List<String> names) {

  /** Takes from the names what does not matter. */
  public Role {
    Objects.requireNonNull(name, "name");
    names = names.stream().map(Role::plain).toList();
  }

  /** Returns the same role with one more name, wanted before all others. */
  public Role with(String alias) {
    List<String> more = new ArrayList<>();
    more.add(alias);
    more.addAll(names);
    return new Role(name, unit, low, high, more);
  }

  /**
   * Returns how well a name fits: 0 for the most wanted, rising; -1 where it does not.
   *
   * @param mnemonic the name of a column or curve
   */
  public int rank(String mnemonic) {
    String key = key(mnemonic);
    if (key.isEmpty()) {
      return -1;
    }
    for (int i = 0; i < names.size(); i++) {
      if (fits(key, names.get(i))) {
        return i;
      }
    }
    return -1;
  }

  private static boolean fits(String key, String alias) {
    int last = alias.length() - 1;
    return alias.charAt(last) == '*' ? key.regionMatches(0, alias, 0, last) : key.equals(alias);
  }

  private static String plain(String name) {
    if (key(name).isEmpty()) {
      throw new IllegalArgumentException("«" + name + "» is no name of a column");
    }
    return key(name) + (name.strip().endsWith("*") ? "*" : "");
  }

  /** Returns the unit that a symbol means for this role, empty where it means none. */
  public Optional<Unit<?>> unit(String symbol) {
    return unit == null ? Optional.empty() : unit.dimension().find(symbol).map(u -> u);
  }

  /** Tells whether a unit is of this role's dimension. */
  public boolean isMeasuredIn(Unit<?> other) {
    return unit != null && unit.dimension() == other.dimension();
  }

  /** Returns a name without what does not matter: capitals, blanks, dots, dashes, underscores. */
  static String key(String name) {
    StringBuilder key = new StringBuilder(name.length());
    String lower = name.toLowerCase(Locale.ROOT);
    for (int i = 0; i < lower.length(); i++) {
      char c = lower.charAt(i);
      if (Character.isLetterOrDigit(c)) {
        key.append(c);
      }
    }
    return key.toString();
  }
}
