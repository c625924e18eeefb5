package connate.table;

import connate.series.Unstated;
import java.util.stream.Collectors;

/** Writes a table as CSV. */
final class TableCsv {

  private static final String FORMULA_STARTS = "=+-@\t\r\u0000";

  private TableCsv() {}

  static String of(Table table) {
    StringBuilder out = new StringBuilder();
    out.append(table.columns().stream().map(TableCsv::head).collect(Collectors.joining(",")));
    out.append('\n');
    for (int row = 0; row < table.rows(); row++) {
      int at = row;
      out.append(table.columns().stream().map(c -> cell(c, at)).collect(Collectors.joining(",")));
      out.append('\n');
    }
    return out.toString();
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
    return !text.isEmpty() && FORMULA_STARTS.indexOf(text.charAt(0)) >= 0 ? "'" + text : text;
  }

  private static String quoted(String text) {
    boolean plain = text.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return plain ? text : "\"" + text.replace("\"", "\"\"") + "\"";
  }
}
