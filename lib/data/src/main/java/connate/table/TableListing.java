package connate.table;

import connate.quantity.Numbers;
import connate.role.Roles;
import connate.series.Listing;
import connate.series.Series;
import connate.series.Unstated;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/** How a table shows: its first rows, and beneath them ranges, gaps and what needs a look. */
final class TableListing {

  private static final int SHOWN = 8;
  private static final MathContext DIGITS = new MathContext(9, RoundingMode.HALF_EVEN);

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
    looks(table).forEach(out::note);
    return out.build(table.rows());
  }

  private static Object[] cells(Table table, int row) {
    List<Object> cells = new ArrayList<>();
    for (Column column : table.columns()) {
      if (column.isMissing(row)) {
        cells.add(null);
      } else if (column.isNumeric()) {
        cells.add(shown(column.numbers().value(row)));
      } else {
        cells.add(column.words().label(row));
      }
    }
    return cells.toArray();
  }

  /** A number as the file has it, but for digits that no measurement has. */
  private static BigDecimal shown(double value) {
    BigDecimal exact = new BigDecimal(Numbers.full(value));
    return exact.precision() > DIGITS.getPrecision() ? exact.round(DIGITS) : exact;
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
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    int zeros = 0;
    for (double value : present) {
      low = Math.min(low, value);
      high = Math.max(high, value);
      zeros += value == 0 ? 1 : 0;
    }
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

  /** What needs a look: values outside of the usual range, rows that stand twice. */
  private static List<String> looks(Table table) {
    List<String> notes = new ArrayList<>();
    for (Column column : table.columns()) {
      if (column.isNumeric()) {
        Series series = column.numbers();
        Outliers out = Outliers.of(series, Roles.find(series.name(), symbol(series)));
        if (out.count() > 0) {
          notes.add(series.name() + ": " + out.words() + at(table, out.first()));
        }
      }
    }
    Repeats repeats = Repeats.of(table);
    if (repeats.count() > 0) {
      notes.add(
          repeats.count()
              + (repeats.count() == 1 ? " row is" : " rows are")
              + " the same as an earlier one, the first"
              + at(table, repeats.first()).replace(",", ""));
    }
    return notes;
  }

  private static String symbol(Series series) {
    return series.unit().equals(Unstated.UNIT) ? "" : series.unit().symbol();
  }

  private static String at(Table table, int row) {
    return table.line(row) == 0 ? ", row " + (row + 1) : ", in line " + table.line(row);
  }
}
