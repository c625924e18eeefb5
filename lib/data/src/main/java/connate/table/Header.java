package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.method.Caution;
import connate.method.Listening;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The header of a sheet: title rows above it are passed over, a row of units beneath it is taken.
 *
 * @param headings the columns
 * @param firstRow the index of the first row of data
 */
record Header(List<Heading> headings, int firstRow) {

  /** Caution: two columns of one name. */
  static final String TWICE = "T22";

  static Header of(Sheet sheet) {
    List<Sheet.Row> rows = sheet.rows();
    if (rows.isEmpty()) {
      throw new DataException(
          Fault.ofFile(sheet.file(), "T01", "the file holds no table", "is it the right file?"));
    }
    int width = width(rows);
    int at = 0;
    while (at < rows.size() - 1 && isTitle(rows, at, width)) {
      at++;
    }
    Sheet.Row row = rows.get(at);
    refuseNumbers(sheet, row);
    boolean units = at + 1 < rows.size() && isUnits(rows.get(at + 1), row);
    List<Heading> headings = new ArrayList<>();
    for (int column = 0; column < row.cells().size(); column++) {
      headings.add(heading(sheet, row, units ? rows.get(at + 1) : null, column));
    }
    return new Header(unlike(sheet, trimmed(headings, rows)), at + (units ? 2 : 1));
  }

  private static Heading heading(Sheet sheet, Sheet.Row row, Sheet.Row units, int column) {
    String name = row.cell(column).isEmpty() ? "column " + (column + 1) : row.cell(column);
    String symbol = units == null ? "" : units.cell(column).replaceAll("^[\\[(]|[\\])]$", "");
    return symbol.isEmpty()
        ? Heading.of(sheet.file(), name)
        : Heading.with(sheet.file(), name, symbol);
  }

  /** The number of cells that most rows have. */
  private static int width(List<Sheet.Row> rows) {
    Map<Integer, Integer> counts = new HashMap<>();
    rows.stream().limit(500).forEach(r -> counts.merge(r.cells().size(), 1, Integer::sum));
    return counts.entrySet().stream()
        .max(Map.Entry.comparingByValue())
        .map(Map.Entry::getKey)
        .orElse(1);
  }

  /** A title fills fewer cells than the table has columns, and the row beneath it fills more. */
  private static boolean isTitle(List<Sheet.Row> rows, int at, int width) {
    long filled = rows.get(at).filled();
    return width > 1 && filled < Math.max(2, width / 2.0) && rows.get(at + 1).filled() > filled;
  }

  private static boolean isUnits(Sheet.Row row, Sheet.Row names) {
    int known = 0;
    int filled = 0;
    for (int column = 0; column < row.cells().size(); column++) {
      String cell = row.cell(column);
      String symbol = cell.replaceAll("^[\\[(]|[\\])]$", "");
      if (!cell.isEmpty() && !cell.equals("-")) {
        filled++;
        known += Heading.find(names.cell(column), symbol).isPresent() ? 1 : 0;
      }
      if (!Double.isNaN(Cells.number(cell, false))) {
        return false;
      }
    }
    return known > 0 && known >= filled - 1;
  }

  private static void refuseNumbers(Sheet sheet, Sheet.Row row) {
    long numbers =
        row.cells().stream()
            .filter(c -> !Double.isNaN(Cells.number(c, sheet.decimalComma())))
            .count();
    if (numbers > 0 && numbers == row.filled()) {
      throw new DataException(
          sheet.fault(
              row,
              0,
              "T02",
              "a row of column names was expected, found numbers",
              "write the names above the numbers, such as depth [m],porosity [%]"));
    }
  }

  /** Empty columns at the right end, as spreadsheets leave them, do not count. */
  private static List<Heading> trimmed(List<Heading> headings, List<Sheet.Row> rows) {
    int last = headings.size();
    while (last > 1 && headings.get(last - 1).name().equals("column " + last)) {
      int column = last - 1;
      if (rows.stream().anyMatch(r -> !r.cell(column).isEmpty())) {
        break;
      }
      last--;
    }
    return headings.subList(0, last);
  }

  private static List<Heading> unlike(Sheet sheet, List<Heading> headings) {
    Map<String, Integer> seen = new HashMap<>();
    List<Heading> out = new ArrayList<>();
    for (Heading heading : headings) {
      int count = seen.merge(Table.key(heading.name()), 1, Integer::sum);
      if (count > 1) {
        Listening.caution(
            Caution.of(
                TWICE,
                sheet.file(),
                sheet.file()
                    + ": the column «"
                    + heading.name()
                    + "» stands "
                    + count
                    + " times; this one is «"
                    + heading.name()
                    + " ("
                    + count
                    + ")»"));
      }
      String name = count > 1 ? heading.name() + " (" + count + ")" : heading.name();
      out.add(new Heading(name, heading.symbol(), heading.unit()));
    }
    return out;
  }
}
