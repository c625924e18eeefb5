package connate.table;

import java.util.Arrays;
import java.util.List;

/** Looks at each cell of a column once: which are numbers, which are missing, which are neither. */
final class ColumnScan {

  private final List<Sheet.Row> rows;
  private final int column;
  private final boolean decimalComma;
  private final double[] values;
  private int[] odd = new int[8];
  private int odds;
  private int numbers;
  private int marked;
  private int firstMarked = -1;
  private boolean isBroken;
  private boolean isDigitsName;

  ColumnScan(Sheet sheet, List<Sheet.Row> rows, int column) {
    this.rows = rows;
    this.column = column;
    this.decimalComma = decimalComma(sheet.decimalComma());
    this.values = new double[rows.size()];
    for (int row = 0; row < values.length; row++) {
      values[row] = look(row);
    }
  }

  /** The column's own numbers decide; only where they are silent, the file's. */
  private boolean decimalComma(boolean file) {
    if (!file && !hasComma()) {
      return false;
    }
    int commas = 0;
    int points = 0;
    for (Sheet.Row row : rows) {
      int says = Cells.decimalSign(row.cell(column));
      commas += says > 0 ? 1 : 0;
      points += says < 0 ? 1 : 0;
    }
    return commas == points ? file : commas > points;
  }

  private boolean hasComma() {
    for (Sheet.Row row : rows) {
      if (row.cell(column).indexOf(',') >= 0) {
        return true;
      }
    }
    return false;
  }

  private double look(int row) {
    String cell = cell(row);
    if (Missing.isWord(cell)) {
      return Double.NaN;
    }
    double value = Cells.number(cell, decimalComma);
    if (Double.isNaN(value)) {
      odd = odds == odd.length ? Arrays.copyOf(odd, 2 * odds) : odd;
      odd[odds++] = row;
      return Double.NaN;
    }
    if (Missing.isNumber(value)) {
      firstMarked = marked++ == 0 ? row : firstMarked;
      return Double.NaN;
    }
    numbers++;
    isDigitsName |= Cells.isDigitsName(cell);
    isBroken |= value != StrictMath.rint(value);
    return value;
  }

  String cell(int row) {
    return rows.get(row).cell(column);
  }

  boolean decimalComma() {
    return decimalComma;
  }

  /** The numbers, missing where a cell is empty or odd. */
  double[] values() {
    return values;
  }

  /** The rows whose cells are there, but no numbers. */
  int[] odd() {
    return Arrays.copyOf(odd, odds);
  }

  int numbers() {
    return numbers;
  }

  int filled() {
    return numbers + odds;
  }

  /** How many cells hold a number that stands for a missing one. */
  int marked() {
    return marked;
  }

  int firstMarked() {
    return firstMarked;
  }

  /** Whether a number is not whole. */
  boolean isBroken() {
    return isBroken;
  }

  /** Whether whole numbers are names, such as 00123. */
  boolean isDigitsName() {
    return isDigitsName && !isBroken;
  }
}
