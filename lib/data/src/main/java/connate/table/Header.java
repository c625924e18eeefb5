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

  private static final int LOOKED_AT = 20;

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
    boolean units = at + 1 < rows.size() && isUnits(sheet, at + 1);
    List<Heading> headings = new ArrayList<>();
    for (int column = 0; column < row.cells().size(); column++) {
      headings.add(heading(sheet, row, units ? rows.get(at + 1) : null, column));
    }
    return new Header(unlike(sheet, trimmed(headings, rows)), at + (units ? 2 : 1));
  }

  private static Heading heading(Sheet sheet, Sheet.Row row, Sheet.Row units, int column) {
    String name = row.cell(column).isEmpty() ? "column " + (column + 1) : row.cell(column);
    String symbol = units == null ? "" : bare(units.cell(column));
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

  /**
   * A title fills fewer cells than the table has columns, and the row beneath it fills more. Where
   * it fills half of them, the rows beneath must be one of names and one of numbers.
   */
  private static boolean isTitle(List<Sheet.Row> rows, int at, int width) {
    int filled = rows.get(at).filled();
    Sheet.Row next = rows.get(at + 1);
    if (width < 2 || next.filled() <= filled) {
      return false;
    }
    return filled < Math.max(2, width / 2.0)
        || 2 * filled <= width
            && 4 * next.filled() >= 3 * width
            && !hasNumber(next)
            && at + 2 < rows.size()
            && hasNumber(rows.get(at + 2));
  }

  private static boolean hasNumber(Sheet.Row row) {
    return row.cells().stream()
        .anyMatch(
            c -> !Double.isNaN(Cells.number(c, false)) || !Double.isNaN(Cells.number(c, true)));
  }

  /** A row of units: half of its cells are units over columns of numbers, none is a number. */
  private static boolean isUnits(Sheet sheet, int at) {
    Sheet.Row row = sheet.rows().get(at);
    Sheet.Row names = sheet.rows().get(at - 1);
    int known = 0;
    int filled = 0;
    for (int column = 0; column < row.cells().size(); column++) {
      String symbol = bare(row.cell(column));
      if (!Double.isNaN(Cells.number(symbol, sheet.decimalComma()))) {
        return false;
      }
      if (!symbol.isEmpty() && !symbol.equals("-")) {
        filled++;
        boolean unit = Heading.find(names.cell(column), symbol).isPresent();
        known += unit && isNumbers(sheet, at + 1, column) ? 1 : 0;
      }
    }
    return known > 0 && 2 * known >= filled;
  }

  private static boolean isNumbers(Sheet sheet, int from, int column) {
    int words = 0;
    int numbers = 0;
    int to = Math.min(sheet.rows().size(), from + LOOKED_AT);
    for (Sheet.Row row : sheet.rows().subList(from, to)) {
      String cell = row.cell(column);
      boolean number = !Double.isNaN(Cells.number(cell, sheet.decimalComma()));
      numbers += number ? 1 : 0;
      words += number || Missing.isWord(cell) ? 0 : 1;
    }
    return numbers >= words;
  }

  private static String bare(String cell) {
    int start = cell.startsWith("[") || cell.startsWith("(") ? 1 : 0;
    int end = cell.endsWith("]") || cell.endsWith(")") ? cell.length() - 1 : cell.length();
    return start < end ? cell.substring(start, end).strip() : "";
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
    int filled = 0;
    for (Sheet.Row row : rows) {
      filled = Math.max(filled, row.width());
    }
    while (last > Math.max(1, filled) && headings.get(last - 1).name().equals("column " + last)) {
      last--;
    }
    return headings.subList(0, last);
  }

  private static List<Heading> unlike(Sheet sheet, List<Heading> headings) {
    Map<String, Integer> seen = new HashMap<>();
    List<Heading> out = new ArrayList<>();
    for (Heading heading : headings) {
      int count = seen.merge(Finding.key(heading.name()), 1, Integer::sum);
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
