package connate.table;

import connate.fault.Fault;
import java.util.List;

/**
 * The cells of a file as text, with the lines on which they stand.
 *
 * @param file the file's name, for a spreadsheet with the sheet's
 * @param rows the rows
 * @param lines the file's lines, {@code null} where it has none to show
 * @param decimalComma whether most numbers are written with a comma
 * @param separator the character between cells
 */
record Sheet(String file, List<Row> rows, Lines lines, boolean decimalComma, char separator) {

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
      for (String cell : cells) {
        if (!cell.isEmpty()) {
          return false;
        }
      }
      return true;
    }

    int filled() {
      int filled = 0;
      for (String cell : cells) {
        filled += cell.isEmpty() ? 0 : 1;
      }
      return filled;
    }

    /** The number of cells up to the last that is not empty. */
    int width() {
      int width = cells.size();
      while (width > 0 && cells.get(width - 1).isEmpty()) {
        width--;
      }
      return width;
    }
  }

  /** Returns a fault of one cell, marked in its line; a spreadsheet's cell is named instead. */
  Fault fault(Row row, int column, String code, String message, String help) {
    int length = Math.max(1, row.cell(column).length());
    if (lines == null) {
      String cell = "in cell " + name(column) + row.line() + " ";
      return new Fault(file, row.line(), column + 1, length, code, cell + message, "", help);
    }
    Lines.Place place = lines.place(row.line(), column, separator);
    return new Fault(file, place.line(), place.column(), length, code, message, place.text(), help);
  }

  /** Returns a column's letters: A to Z, AA and so on. */
  static String name(int column) {
    String letter = String.valueOf((char) ('A' + column % 26));
    return column < 26 ? letter : name(column / 26 - 1) + letter;
  }
}
