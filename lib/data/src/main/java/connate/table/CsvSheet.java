package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.CsvRecordHandler;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the cells of a CSV file. */
final class CsvSheet {

  /** The most characters of a cell. */
  static final int CELL = 1 << 20;

  /** The most characters of a row. */
  static final int ROW = 16 << 20;

  /** The most columns. */
  static final int COLUMNS = 10_000;

  private static final int LOOKED_AT = 200;
  private static final Pattern PLACE = Pattern.compile("starting at line (\\d+)");

  private CsvSheet() {}

  static Sheet read(String file, byte[] bytes) {
    String text = CsvText.of(file, bytes);
    char stated = Separator.stated(text);
    String table = stated == 0 ? text : " ".repeat(5) + text.substring(5);
    char separator = stated == 0 ? Separator.of(text) : stated;
    Lines lines = new Lines(text);
    List<Sheet.Row> rows =
        rows(file, CommentLines.blanked(file, table, separator), separator, lines);
    return new Sheet(file, rows, lines, hasDecimalComma(rows), separator);
  }

  private static List<Sheet.Row> rows(String file, String text, char separator, Lines lines) {
    List<Sheet.Row> rows = new ArrayList<>();
    int line = 1;
    try (CsvReader<CsvRecord> reader = reader(text, separator)) {
      for (CsvRecord cells : reader) {
        line = (int) cells.getStartingLineNumber();
        Sheet.Row row = row(cells, line);
        if (!row.isBlank()) {
          rows.add(row);
        }
      }
    } catch (CsvParseException e) {
      throw unreadable(file, line, lines, e);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return rows;
  }

  private static CsvReader<CsvRecord> reader(String text, char separator) {
    return CsvReader.builder()
        .fieldSeparator(separator)
        .commentStrategy(CommentStrategy.NONE)
        .skipEmptyLines(true)
        .trimWhitespacesAroundQuotes(true)
        .allowUnclosedQuote(false)
        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
        .maxBufferSize(ROW)
        .build(
            CsvRecordHandler.of(h -> h.maxFields(COLUMNS).maxFieldSize(CELL).maxRecordSize(ROW)),
            text);
  }

  private static Sheet.Row row(CsvRecord record, int line) {
    String[] cells = new String[record.getFieldCount()];
    for (int i = 0; i < cells.length; i++) {
      cells[i] = TableCsv.plain(record.getField(i).strip());
    }
    return new Sheet.Row(line, Arrays.asList(cells));
  }

  private static DataException unreadable(
      String file, int lastRead, Lines lines, CsvParseException cause) {
    String why = String.valueOf(cause.getMessage());
    Matcher place = PLACE.matcher(why);
    int line = place.find() ? Integer.parseInt(place.group(1)) : lastRead + 1;
    boolean large = why.contains("exceed") || why.contains("limit");
    return new DataException(
        new Fault(
            file,
            line,
            0,
            1,
            large ? "T16" : "T10",
            large
                ? "from here on a row passes the bounds of "
                    + COLUMNS
                    + " columns, 1 MiB a cell and 16 MiB a row"
                : "the cells cannot be told apart from here on",
            lines.line(line),
            "look for a quote that is opened and not closed"));
  }

  /** Most of the first numbers that show a decimal sign show a comma. */
  private static boolean hasDecimalComma(List<Sheet.Row> rows) {
    int commas = 0;
    int points = 0;
    for (Sheet.Row row : rows.subList(0, Math.min(rows.size(), LOOKED_AT))) {
      for (String cell : row.cells()) {
        int says = Cells.decimalSign(cell);
        commas += says > 0 ? 1 : 0;
        points += says < 0 ? 1 : 0;
      }
    }
    return commas > points;
  }
}
