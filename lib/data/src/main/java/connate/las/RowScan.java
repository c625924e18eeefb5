package connate.las;

/**
 * Reads data with one row a line. Lines of plain numbers take a fast way along the bytes; a line
 * that does not fit goes to {@link OddLines}.
 */
final class RowScan {

  private final LasText text;
  private final Block block;
  private final Layout layout;
  private final NumberScan numbers;
  private final OddLines odd;
  private Columns columns;

  RowScan(LasText text, Block block, Layout layout, Quirks quirks, boolean settingAside) {
    this.text = text;
    this.block = block;
    this.layout = layout;
    this.numbers = new NumberScan(text.bytes, layout.point());
    this.odd = new OddLines(text, block, layout, quirks, settingAside);
    this.columns = new Columns(block.columns(), expectedRows());
  }

  private int expectedRows() {
    var first = Layout.firstLines(text, block.from(), block.to(), 1);
    if (first.isEmpty()) {
      return 0;
    }
    int line = first.get(0)[1] - first.get(0)[0] + 1;
    return (block.to() - block.from()) / line + 16;
  }

  /** Returns the numbers of the block. */
  Columns run() {
    int at = block.from();
    while (at < block.to()) {
      int row = columns.nextRow();
      int end = layout.delimiter() == 0 ? byBlanks(at, row) : byDelimiter(at, row);
      if (end < 0) {
        end = text.lineEnd(at);
        odd.take(at, end, columns);
      } else {
        columns.accept(at);
      }
      at = text.afterLine(end);
    }
    if (odd.hasTextColumns(columns.rows())) {
      readAgain();
    }
    odd.settle(columns);
    if (numbers.exponents) {
      odd.noteExponents();
    }
    return columns;
  }

  private void readAgain() {
    Columns again = new Columns(block.columns(), columns.rows() + 16);
    odd.startAgain(again, columns.rows());
    columns = again;
    for (int at = block.from(); at < block.to(); at = text.afterLine(text.lineEnd(at))) {
      odd.take(at, text.lineEnd(at), columns);
    }
  }

  /** Fills a row from a line of numbers between blanks; returns the line's end or -1. */
  private int byBlanks(int start, int row) {
    byte[] b = text.bytes;
    double[][] cells = columns.cells;
    double nullValue = block.nullValue();
    int at = start;
    for (int c = 0; c < cells.length; c++) {
      while (b[at] == ' ' || b[at] == '\t') {
        at++;
      }
      at = numbers.read(at);
      if (at < 0 || b[at] > ' ' || b[at] < 0) {
        return -1;
      }
      double v = numbers.value;
      cells[c][row] = v == nullValue ? Double.NaN : v;
    }
    at = text.skipBlanks(at);
    return b[at] == '\n' || b[at] == '\r' ? at : -1;
  }

  /** Fills a row from a line of numbers between delimiters; returns the line's end or -1. */
  private int byDelimiter(int start, int row) {
    byte[] b = text.bytes;
    byte delimiter = layout.delimiter();
    double[][] cells = columns.cells;
    double nullValue = block.nullValue();
    int at = start;
    for (int c = 0; c < cells.length; c++) {
      at = skipSpaces(at);
      if (b[at] == delimiter) {
        cells[c][row] = Double.NaN;
        odd.countEmpty();
      } else {
        at = numbers.read(at);
        if (at < 0) {
          return -1;
        }
        double v = numbers.value;
        cells[c][row] = v == nullValue ? Double.NaN : v;
        at = skipSpaces(at);
      }
      if (c < cells.length - 1 && b[at++] != delimiter) {
        return -1;
      }
    }
    return b[at] == '\n' || b[at] == '\r' ? Math.min(at, text.to) : -1;
  }

  private int skipSpaces(int at) {
    int i = at;
    while (text.bytes[i] == ' ') {
      i++;
    }
    return i;
  }
}
