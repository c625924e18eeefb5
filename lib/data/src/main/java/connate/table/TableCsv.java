package connate.table;

import connate.series.Unstated;
import java.util.List;
import java.util.stream.Collectors;

/** Writes a table as CSV. */
final class TableCsv {

  private static final String FORMULA_STARTS = "=+-@\t\r\u0000";

  private TableCsv() {}

  static String of(Table table) {
    StringBuilder out = new StringBuilder();
    List<Column> columns = table.columns();
    out.append(columns.stream().map(TableCsv::head).collect(Collectors.joining(",")));
    for (int row = 0; row < table.rows(); row++) {
      out.append('\n');
      if (isBlank(columns, row)) {
        // an empty line would be passed over when the file is read
        out.append("NaN").append(",".repeat(columns.size() - 1));
        continue;
      }
      for (int column = 0; column < columns.size(); column++) {
        out.append(column == 0 ? "" : ",").append(cell(columns.get(column), row));
      }
    }
    return out.append('\n').toString();
  }

  private static boolean isBlank(List<Column> columns, int row) {
    return columns.stream().allMatch(c -> c.isMissing(row));
  }

  private static String head(Column column) {
    boolean unit =
        column.isNumeric()
            && !column.numbers().unit().equals(Unstated.UNIT)
            && !column.numbers().unit().symbol().equals("1");
    return quoted(
        harmless(column.name()) + (unit ? " [" + column.numbers().unit().symbol() + "]" : ""));
  }

  private static String cell(Column column, int row) {
    String text = column.text(row);
    return column.isNumeric() ? text : quoted(harmless(text));
  }

  /** A text that a spreadsheet would take for a formula gets an apostrophe before it. */
  private static String harmless(String text) {
    return isFormula(text) ? "'" + text : text;
  }

  /** Takes away the apostrophe that stands before what a spreadsheet would take for a formula. */
  static String plain(String cell) {
    return cell.length() > 1 && cell.charAt(0) == '\'' && isFormula(cell)
        ? cell.substring(1)
        : cell;
  }

  /** Apostrophes before it do not count, so that each of them survives writing and reading. */
  private static boolean isFormula(String text) {
    int at = 0;
    while (at < text.length() && text.charAt(at) == '\'') {
      at++;
    }
    return at < text.length() && FORMULA_STARTS.indexOf(text.charAt(at)) >= 0;
  }

  private static String quoted(String text) {
    boolean plain = text.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return plain ? text : "\"" + text.replace("\"", "\"\"") + "\"";
  }
}
