package connate.table;

import connate.fault.Fault;
import java.util.List;

/**
 * The cells of a file as text, with the lines on which they stand.
 *
 * @param file the file's name
 * @param rows the rows
 * @param lines the file's lines, empty where it has none to show
 * @param decimalComma whether numbers are written with a comma
 * @param separator the character between cells
 */
record Sheet(
    String file, List<Row> rows, List<String> lines, boolean decimalComma, char separator) {

  /**
   * A row.
   *
   * @param line the line of the file on which it begins, counted from 1
   * @param cells its cells, without blanks around them
   */
  record Row(int line, List<String> cells) {

    String cell(int column) {
      return column < cells.size() ? cells.get(column) : "";
    }

    boolean isBlank() {
      return cells.stream().allMatch(String::isEmpty);
    }

    long filled() {
      return cells.stream().filter(c -> !c.isEmpty()).count();
    }
  }

  /** Returns a fault of one cell, marked in its line. */
  Fault fault(Row row, int column, String code, String message, String help) {
    String text = row.line() <= lines.size() ? lines.get(row.line() - 1) : "";
    String cell = row.cell(column);
    int start = text.isEmpty() ? column : Places.startOf(text, column, separator);
    return new Fault(
        file, row.line(), start + 1, Math.max(1, cell.length()), code, message, text, help);
  }
}
