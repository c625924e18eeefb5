package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.Row;

/** Reads the cells of an XLSX file, after a look at what it inflates to. */
final class XlsxSheet {

  private static final long LARGEST = 512L << 20;
  private static final int COLUMNS = 10_000;

  private XlsxSheet() {}

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
      inspect(file, bytes);
      try (ReadableWorkbook book = new ReadableWorkbook(new ByteArrayInputStream(bytes))) {
        org.dhatim.fastexcel.reader.Sheet found = find(file, book, sheet);
        try (Stream<Row> rows = found.openStream()) {
          return new Sheet(file, rows.map(XlsxSheet::row).toList(), List.of(), false, ',');
        }
      }
    } catch (IOException | RuntimeException e) {
      if (e instanceof DataException known) {
        throw known;
      }
      throw refused(
          file,
          "T11",
          "this is no XLSX file that can be read: " + e.getMessage(),
          "save it once more as .xlsx, or as CSV");
    }
  }

  private static Sheet.Row row(Row row) {
    List<String> cells = new ArrayList<>();
    for (Cell cell : row) {
      cells.add(cell == null || cell.getText() == null ? "" : cell.getText().strip());
      if (cells.size() > COLUMNS) {
        throw new IllegalArgumentException("more than " + COLUMNS + " columns");
      }
    }
    return new Sheet.Row(row.getRowNum(), cells);
  }

  private static org.dhatim.fastexcel.reader.Sheet find(
      String file, ReadableWorkbook book, String sheet) {
    if (sheet.isEmpty()) {
      return book.getFirstSheet();
    }
    return book.findSheet(sheet)
        .orElseThrow(
            () ->
                refused(
                    file,
                    "T12",
                    "there is no sheet «" + sheet + "»",
                    "there are "
                        + String.join(
                            ", ",
                            book.getSheets()
                                .map(org.dhatim.fastexcel.reader.Sheet::getName)
                                .toList())));
  }

  /** Inflates each part once, counting, and looks for document types, before anything parses it. */
  private static void inspect(String file, byte[] bytes) throws IOException {
    long total = 0;
    byte[] chunk = new byte[1 << 16];
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(bytes))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        boolean head = true;
        for (int n = zip.read(chunk); n > 0; n = zip.read(chunk)) {
          total += n;
          if (total > LARGEST) {
            throw refused(
                file,
                "T13",
                "it inflates to more than " + (LARGEST >> 20) + " MB",
                "save the sheet that matters as CSV");
          }
          if (head && hasDocumentType(chunk, n)) {
            throw refused(
                file,
                "T14",
                "it declares entities, which no spreadsheet needs",
                "open it in a spreadsheet program and save it anew");
          }
          head = false;
        }
      }
    }
  }

  private static boolean hasDocumentType(byte[] chunk, int n) {
    String start = new String(chunk, 0, n, StandardCharsets.ISO_8859_1);
    return start.contains("<!DOCTYPE") || start.contains("<!ENTITY");
  }

  private static DataException refused(String file, String code, String message, String help) {
    return new DataException(Fault.ofFile(file, code, message, help));
  }
}
