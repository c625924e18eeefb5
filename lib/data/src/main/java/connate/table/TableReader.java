package connate.table;

import connate.method.Caution;
import connate.method.Listening;
import java.util.ArrayList;
import java.util.List;

/** Makes a table of a sheet: finds the header, then each column's kind, and checks every cell. */
final class TableReader {

  private final Sheet sheet;
  private final Header header;
  private final List<Sheet.Row> rows;
  private final Faults faults = new Faults();

  private TableReader(Sheet sheet) {
    this.sheet = sheet;
    this.header = Header.of(sheet);
    this.rows = sheet.rows().subList(header.firstRow(), sheet.rows().size());
  }

  static Table read(Sheet sheet) {
    return new TableReader(sheet).table();
  }

  private Table table() {
    checkWidths();
    List<Column> columns = new ArrayList<>();
    for (int column = 0; column < header.headings().size(); column++) {
      Heading heading = header.headings().get(column);
      columns.add(new ColumnReader(sheet, heading, rows, column, faults).read());
    }
    faults.throwAny();
    int[] lines = rows.stream().mapToInt(Sheet.Row::line).toArray();
    return Table.of(sheet.file(), columns, lines);
  }

  /**
   * A row that is too long has a cell too many somewhere: nobody can say which column it shifts. A
   * row that ends early may have been cut; its last cells count as missing, and the reader is told.
   */
  private void checkWidths() {
    int width = header.headings().size();
    int cut = 0;
    int firstCut = 0;
    for (Sheet.Row row : rows) {
      int filled = row.width();
      if (filled > width) {
        faults.add(
            () ->
                sheet.fault(
                    row,
                    width,
                    "T05",
                    "a cell too many: " + filled + " cells under " + width + " columns",
                    "is a decimal comma meant, or a comma in words? quote the cell or part cells"
                        + " by ;"));
      }
      if (sheet.lines() != null && row.cells().size() < width) {
        firstCut = cut++ == 0 ? row.line() : firstCut;
      }
    }
    faults.throwAny();
    if (cut > 0) {
      tellCut(cut, firstCut);
    }
  }

  private void tellCut(int count, int line) {
    Listening.caution(
        Caution.of(
            "T29",
            sheet.file(),
            sheet.file()
                + ": "
                + count
                + (count == 1 ? " row ends" : " rows end")
                + " before the last column, the first in line "
                + line
                + "; what is not there counts as missing"));
  }
}
