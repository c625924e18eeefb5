package connate.role;

import connate.quantity.Unit;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The roles that columns and curves play, found by name and unit. The list is the resource {@code
 * roles.txt}; a workbook adds names with {@link #add}.
 */
public final class Roles {

  private static final Map<String, Role> KNOWN = read();

  private Roles() {}

  /** Returns all roles in the order of the list. */
  public static List<Role> all() {
    synchronized (KNOWN) {
      return List.copyOf(KNOWN.values());
    }
  }

  /** Returns the role of this name in plain words, in capitals or not. */
  public static Optional<Role> named(String role) {
    synchronized (KNOWN) {
      return Optional.ofNullable(KNOWN.get(Role.key(role)));
    }
  }

  /**
   * Adds a name to a role for this process, wanted before all others.
   *
   * @param role the role in plain words, such as {@code porosity}
   * @param name the name of a column or curve, a star at its end for any letters and digits
   * @throws IllegalArgumentException if there is no such role
   */
  public static void add(String role, String name) {
    Role known =
        named(role)
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        "no role «"
                            + role
                            + "», but "
                            + String.join(", ", all().stream().map(Role::name).toList())));
    synchronized (KNOWN) {
      KNOWN.put(Role.key(role), known.with(name));
    }
  }

  /** Forgets the names that were added. */
  public static void reset() {
    Map<String, Role> fresh = read();
    synchronized (KNOWN) {
      KNOWN.clear();
      KNOWN.putAll(fresh);
    }
  }

  /**
   * Returns the role that a name fits best, where the unit does not speak against it.
   *
   * @param name the name of a column or curve
   * @param unit its unit as written, empty where it has none
   */
  public static Optional<Role> find(String name, String unit) {
    Role best = null;
    int bestRank = Integer.MAX_VALUE;
    for (Role role : all()) {
      int rank = role.rank(name);
      boolean isStarred = rank >= 0 && role.names().get(rank).endsWith("*");
      // of two open names the longer says more: perm* before pe*
      int weight = isStarred ? 1000 - role.names().get(rank).length() : rank;
      if (weight >= 0 && weight < bestRank && isAllowed(role, unit)) {
        best = role;
        bestRank = weight;
      }
    }
    return Optional.ofNullable(best);
  }

  private static boolean isAllowed(Role role, String unit) {
    if (unit.isBlank() || role.unit() == null || role.unit(unit).isPresent()) {
      return true;
    }
    return Unit.candidates(unit).isEmpty();
  }

  private static Map<String, Role> read() {
    try (InputStream list = Roles.class.getResourceAsStream("roles.txt")) {
      if (list == null) {
        throw new IllegalStateException("the list of roles is missing from the library");
      }
      Map<String, Role> roles = new LinkedHashMap<>();
      for (String line : new String(list.readAllBytes(), StandardCharsets.UTF_8).split("\n")) {
        if (!line.isBlank() && !line.startsWith("#")) {
          Role role = parse(line);
          roles.put(Role.key(role.name()), role);
        }
      }
      return roles;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Role parse(String line) {
    String[] parts = line.split("\\|");
    if (parts.length != 4) {
      throw new IllegalStateException("a role has four parts: " + line);
    }
    String unit = parts[1].strip();
    double[] range = range(parts[2].strip());
    List<String> names = new ArrayList<>();
    for (String name : parts[3].split(",")) {
      names.add(name.strip());
    }
    return new Role(parts[0].strip(), unitOf(unit), range[0], range[1], names);
  }

  private static Unit<?> unitOf(String symbol) {
    if (symbol.equals("-")) {
      return null;
    }
    return Unit.find(symbol)
        .orElseThrow(() -> new IllegalStateException("no unit " + symbol + " for a role"));
  }

  private static double[] range(String words) {
    if (words.equals("-")) {
      return new double[] {Double.NaN, Double.NaN};
    }
    String[] ends = words.split(" to ");
    return new double[] {Double.parseDouble(ends[0]), Double.parseDouble(ends[1])};
  }
}
