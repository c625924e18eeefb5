package connate.table;

import connate.quantity.Numbers;
import connate.series.Listing;
import connate.series.Series;
import connate.series.Unstated;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** How a table shows: its first rows, and beneath them ranges, gaps and what needs a look. */
final class TableListing {

  private static final int SHOWN = 8;

  private TableListing() {}

  static Listing of(Table table) {
    Listing.Builder out =
        Listing.titled(
            table.name() + ": " + table.rows() + " rows, " + table.columns().size() + " columns");
    for (Column column : table.columns()) {
      Series s = column.numbers();
      boolean unit = s != null && !s.unit().equals(Unstated.UNIT);
      out.column(column.name(), unit ? s.unit() : null);
    }
    for (int row = 0; row < Math.min(SHOWN, table.rows()); row++) {
      out.row(cells(table, row));
    }
    table.columns().stream().map(TableListing::range).forEach(out::note);
    repeats(table).forEach(out::note);
    return out.build(table.rows());
  }

  private static Object[] cells(Table table, int row) {
    List<Object> cells = new ArrayList<>();
    for (Column column : table.columns()) {
      if (column.isMissing(row)) {
        cells.add(null);
      } else if (column.isNumeric()) {
        cells.add(new BigDecimal(column.text(row)));
      } else {
        cells.add(column.words().label(row));
      }
    }
    return cells.toArray();
  }

  private static String range(Column column) {
    return column.isNumeric() ? numbers(column.numbers()) : words(column);
  }

  private static String numbers(Series series) {
    double[] present = series.present();
    String missing = missing(series.size() - present.length);
    boolean unstated = series.unit().equals(Unstated.UNIT);
    if (present.length == 0) {
      return series.name() + ": no value in any row";
    }
    double low = java.util.Arrays.stream(present).min().orElseThrow();
    double high = java.util.Arrays.stream(present).max().orElseThrow();
    long zeros = java.util.Arrays.stream(present).filter(v -> v == 0).count();
    return series.name()
        + ": "
        + Numbers.text(low)
        + " to "
        + Numbers.text(high)
        + (unstated ? ", no unit stated" : series.unit().suffix())
        + missing
        + (zeros > 0 && low == 0 && high > 0
            ? ", " + zeros + (zeros == 1 ? " zero" : " zeros")
            : "");
  }

  private static String words(Column column) {
    int missing = 0;
    for (int row = 0; row < column.words().size(); row++) {
      missing += column.isMissing(row) ? 1 : 0;
    }
    List<String> different = column.words().distinct();
    String some =
        different.size() <= 6
            ? ": " + String.join(", ", different)
            : ": " + different.size() + " different words";
    return column.name() + some + missing(missing);
  }

  private static String missing(int count) {
    return count == 0 ? "" : ", " + count + " missing";
  }

  /** Rows that are the same in every column. */
  private static List<String> repeats(Table table) {
    Set<List<String>> seen = new HashSet<>();
    int repeats = 0;
    int first = -1;
    for (int row = 0; row < table.rows(); row++) {
      int at = row;
      if (!seen.add(table.columns().stream().map(c -> c.text(at)).toList())) {
        first = repeats++ == 0 ? row : first;
      }
    }
    return repeats == 0
        ? List.of()
        : List.of(
            repeats
                + (repeats == 1 ? " row is" : " rows are")
                + " the same as an earlier one, the first in line "
                + table.line(first));
  }
}
