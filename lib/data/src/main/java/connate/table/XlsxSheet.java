package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.fault.Nearest;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.stream.Stream;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.ReadingOptions;
import org.dhatim.fastexcel.reader.Row;

/** Reads the cells of an XLSX file, after a look at what it inflates to. */
final class XlsxSheet {

  private static final long CELLS = 50_000_000;
  private static final ReadingOptions WITH_FORMATS = new ReadingOptions(true, true);

  private final String file;
  private final boolean from1904;
  private long cells;

  private XlsxSheet(String file, boolean from1904) {
    this.file = file;
    this.from1904 = from1904;
  }

  static boolean isXlsx(byte[] bytes) {
    return bytes.length > 4 && bytes[0] == 'P' && bytes[1] == 'K' && bytes[2] == 3 && bytes[3] == 4;
  }

  /**
   * Reads a sheet.
   *
   * @param sheet the sheet's name, empty for the first
   */
  static Sheet read(String file, byte[] bytes, String sheet) {
    try {
      XlsxBounds.check(file, bytes);
      try (ReadableWorkbook book =
          new ReadableWorkbook(new ByteArrayInputStream(bytes), WITH_FORMATS)) {
        org.dhatim.fastexcel.reader.Sheet found = find(file, book, sheet);
        try (Stream<Row> rows = found.openStream()) {
          return new XlsxSheet(file, book.isDate1904()).read(rows.iterator());
        }
      }
    } catch (DataException known) {
      throw known;
    } catch (IOException | RuntimeException e) {
      throw refused(
          file,
          "T11",
          "this is no XLSX file that can be read: " + e.getMessage(),
          "save it once more as .xlsx, or as CSV");
    }
  }

  private Sheet read(Iterator<Row> found) {
    List<Sheet.Row> rows = new ArrayList<>();
    while (found.hasNext()) {
      Sheet.Row row = row(found.next());
      if (!row.isBlank()) {
        rows.add(row);
      }
    }
    return new Sheet(file, rows, null, false, ',');
  }

  private Sheet.Row row(Row row) {
    cells += row.getCellCount();
    if (row.getCellCount() > CsvSheet.COLUMNS || cells > CELLS) {
      throw refused(
          file,
          "T16",
          "row "
              + row.getRowNum()
              + " passes the bounds of "
              + CsvSheet.COLUMNS
              + " columns and "
              + CELLS
              + " cells",
          "save the part that matters as CSV");
    }
    List<String> texts = new ArrayList<>(row.getCellCount());
    for (Cell cell : row) {
      texts.add(XlsxCell.text(cell, from1904));
    }
    return new Sheet.Row(row.getRowNum(), texts);
  }

  private static org.dhatim.fastexcel.reader.Sheet find(
      String file, ReadableWorkbook book, String sheet) {
    if (sheet.isEmpty()) {
      return book.getFirstSheet();
    }
    return book.findSheet(sheet).orElseThrow(() -> noSheet(file, book, sheet));
  }

  private static DataException noSheet(String file, ReadableWorkbook book, String sheet) {
    List<String> names = book.getSheets().map(org.dhatim.fastexcel.reader.Sheet::getName).toList();
    return refused(
        file,
        "T12",
        "there is no sheet " + Nearest.miss(sheet, names),
        "name one of them, or none for the first");
  }

  private static DataException refused(String file, String code, String message, String help) {
    return new DataException(Fault.ofFile(file, code, message, help));
  }
}
