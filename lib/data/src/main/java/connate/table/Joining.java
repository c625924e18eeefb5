package connate.table;

import connate.series.Labels;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Sets the columns of one table beside those of another, where a key is the same. */
final class Joining {

  private final Table left;
  private final Table right;
  private final int[] partner;

  Joining(Table left, Table right, String key) {
    this.left = left;
    this.right = right;
    this.partner = partners(key);
  }

  Table table(String key) {
    List<Column> columns = new ArrayList<>(left.columns());
    Column used = right.column(key);
    for (Column column : right.columns()) {
      if (!column.name().equals(used.name())) {
        columns.add(beside(column));
      }
    }
    int[] lines = new int[left.rows()];
    Arrays.setAll(lines, left::line);
    return Table.of(left.name(), columns, lines);
  }

  /** The row of the right table for each of the left, -1 for none. */
  private int[] partners(String key) {
    Column mine = left.column(key);
    Column theirs = right.column(key);
    if (mine.isNumeric() != theirs.isNumeric()) {
      throw new IllegalArgumentException(
          "«" + key + "» holds numbers in one table and words in the other");
    }
    Series converted = mine.isNumeric() ? theirs.numbers().to(mine.numbers().unit()) : null;
    Map<Object, Integer> rows = new HashMap<>();
    for (int row = 0; row < right.rows(); row++) {
      Object value = value(theirs, converted, row);
      Integer first = value == null ? null : rows.putIfAbsent(value, row);
      if (first != null) {
        throw new IllegalArgumentException(
            right.name()
                + " has «"
                + value
                + "» in "
                + key
                + " twice, in lines "
                + right.line(first)
                + " and "
                + right.line(row)
                + ": which one belongs to a row of "
                + left.name()
                + " cannot be told");
      }
    }
    int[] found = new int[left.rows()];
    for (int row = 0; row < found.length; row++) {
      Object value = value(mine, mine.numbers(), row);
      found[row] = value == null ? -1 : rows.getOrDefault(value, -1);
    }
    return found;
  }

  private static Object value(Column column, Series numbers, int row) {
    if (column.isMissing(row)) {
      return null;
    }
    return numbers == null ? column.words().label(row) : (Object) (numbers.value(row) + 0.0);
  }

  private Column beside(Column column) {
    String name =
        left.has(column.name()) ? column.name() + " (" + right.name() + ")" : column.name();
    if (column.isNumeric()) {
      double[] values = new double[partner.length];
      Arrays.setAll(
          values, row -> partner[row] < 0 ? Double.NaN : column.numbers().value(partner[row]));
      return Column.of(Series.over(name, column.numbers().unit(), values, null));
    }
    String[] words = new String[partner.length];
    Arrays.setAll(words, row -> partner[row] < 0 ? null : column.words().label(partner[row]));
    return Column.of(Labels.of(name, words));
  }
}
