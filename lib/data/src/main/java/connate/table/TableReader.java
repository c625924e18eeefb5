package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import java.util.ArrayList;
import java.util.List;

/** Makes a table of a sheet: finds the header, then each column's kind, and checks every cell. */
final class TableReader {

  private final Sheet sheet;
  private final Header header;
  private final List<Sheet.Row> rows;
  private final List<Fault> faults = new ArrayList<>();

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
      columns.add(column(column));
    }
    if (!faults.isEmpty()) {
      throw new DataException(faults, faults.size());
    }
    int[] lines = rows.stream().mapToInt(Sheet.Row::line).toArray();
    return Table.of(sheet.file(), columns, lines);
  }

  /**
   * A row that is too long has a cell too many somewhere: nobody can say which column it shifts.
   */
  private void checkWidths() {
    int width = header.headings().size();
    for (Sheet.Row row : rows) {
      for (int column = width; column < row.cells().size(); column++) {
        if (!row.cell(column).isEmpty()) {
          faults.add(
              sheet.fault(
                  row,
                  column,
                  "T05",
                  "a cell too many: " + row.cells().size() + " cells under " + width + " columns",
                  "is a decimal comma meant, or a comma in words? quote the cell or part cells by ;"));
          break;
        }
      }
    }
    if (!faults.isEmpty()) {
      throw new DataException(faults, faults.size());
    }
  }

  private Column column(int column) {
    Heading heading = header.headings().get(column);
    ColumnReader reader = new ColumnReader(sheet, heading, rows, column);
    Column out = reader.read();
    faults.addAll(reader.faults());
    return out;
  }
}
