package connate.table;

import connate.fault.Nearest;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Length;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Series;
import connate.series.Unstated;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Finds a table's columns: by name, else by the role that name and unit fit. */
final class Finding {

  private final String table;
  private final List<Column> columns;

  Finding(String table, List<Column> columns) {
    this.table = table;
    this.columns = columns;
  }

  static String key(String name) {
    return name.toLowerCase(Locale.ROOT).strip();
  }

  Column wanted(String nameOrRole) {
    List<String> names = columns.stream().map(Column::name).toList();
    return find(nameOrRole)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    table + " has no column " + Nearest.miss(nameOrRole, names)));
  }

  Optional<Column> find(String nameOrRole) {
    int at = indexOf(nameOrRole);
    if (at >= 0) {
      return Optional.of(columns.get(at));
    }
    List<Column> fit = Roles.named(nameOrRole).map(this::fitting).orElse(List.of());
    if (fit.size() > 1) {
      tell(nameOrRole, fit);
    }
    return fit.stream().findFirst();
  }

  int indexOf(String wanted) {
    for (int i = 0; i < columns.size(); i++) {
      if (key(columns.get(i).name()).equals(key(wanted))) {
        return i;
      }
    }
    return -1;
  }

  /** The role that a column's name and unit fit best, empty where they fit none. */
  String role(Column column) {
    boolean unit = column.isNumeric() && !column.numbers().unit().equals(Unstated.UNIT);
    String symbol = unit ? column.numbers().unit().symbol() : "";
    return Roles.find(column.name(), symbol).map(Role::name).orElse("");
  }

  /** The column of depth in a unit of length, where there is one. */
  Optional<Series> depth() {
    return Roles.named("depth").stream()
        .flatMap(role -> fitting(role).stream())
        .map(Column::numbers)
        .filter(n -> n != null && n.unit().dimension() == Length.DIMENSION)
        .findFirst();
  }

  /** The columns of a role, the best first: numbers before words, then as the list ranks them. */
  private List<Column> fitting(Role role) {
    return columns.stream()
        .filter(c -> role.rank(c.name()) >= 0 && isFit(role, c))
        .sorted(
            Comparator.comparing((Column c) -> role.unit() != null && !c.isNumeric())
                .thenComparingInt(c -> role.rank(c.name())))
        .toList();
  }

  private static boolean isFit(Role role, Column column) {
    return role.unit() == null
        || !column.isNumeric()
        || column.numbers().unit().equals(Unstated.UNIT)
        || role.isMeasuredIn(column.numbers().unit());
  }

  private void tell(String role, List<Column> fit) {
    List<String> others = fit.stream().skip(1).map(c -> "«" + c.name() + "»").toList();
    Listening.caution(
        Caution.of(
            "T28",
            table + "/" + role,
            table
                + ": by «"
                + role
                + "» the column «"
                + fit.get(0).name()
                + "» was taken, though "
                + String.join(", ", others)
                + (others.size() == 1 ? " fits" : " fit")
                + " too"));
  }
}
