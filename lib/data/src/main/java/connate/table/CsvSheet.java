package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.method.Caution;
import connate.method.Listening;
import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/** Reads the cells of a CSV file: finds its character set, separator and decimal sign. */
final class CsvSheet {

  private static final char[] SEPARATORS = {';', '\t', '|', ','};
  private static final int LOOKED_AT = 200;
  private static final int CELL = 1 << 20;
  private static final Pattern COMMA_NUMBER = Pattern.compile("-?\\d+,\\d+");
  private static final Pattern POINT_NUMBER = Pattern.compile("-?\\d+\\.\\d+");

  private CsvSheet() {}

  static Sheet read(String file, byte[] bytes) {
    String text = text(file, bytes);
    List<String> lines = text.lines().toList();
    String body = withoutComments(text);
    char separator = separator(lines);
    List<Sheet.Row> rows = rows(file, body, separator);
    return new Sheet(file, rows, lines, hasDecimalComma(rows, separator), separator);
  }

  private static String text(String file, byte[] bytes) {
    boolean mark =
        bytes.length > 2
            && bytes[0] == (byte) 0xEF
            && bytes[1] == (byte) 0xBB
            && bytes[2] == (byte) 0xBF;
    int start = mark ? 3 : 0;
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .decode(ByteBuffer.wrap(bytes, start, bytes.length - start))
          .toString();
    } catch (CharacterCodingException e) {
      Listening.caution(
          Caution.of("T20", file, file + " is no UTF-8; it was read as Windows-1252"));
      return new String(bytes, start, bytes.length - start, Charset.forName("windows-1252"));
    }
  }

  /** Blanks out the lines that start with # or % above the table; their places stay. */
  private static String withoutComments(String text) {
    StringBuilder out = new StringBuilder(text);
    int at = 0;
    while (at < out.length() && isComment(out, at)) {
      int end = out.indexOf("\n", at);
      end = end < 0 ? out.length() : end;
      for (int i = at; i < end; i++) {
        out.setCharAt(i, ' ');
      }
      at = end + 1;
    }
    return out.toString();
  }

  private static boolean isComment(CharSequence text, int at) {
    char c = text.charAt(at);
    return c == '#' || c == '%' || c == '\n' || c == '\r';
  }

  /** The separator by which most lines have the same number of cells, more than one. */
  private static char separator(List<String> lines) {
    List<String> some =
        lines.stream().filter(l -> !l.isBlank() && l.charAt(0) != '#').limit(LOOKED_AT).toList();
    char best = ',';
    long most = 0;
    for (char candidate : SEPARATORS) {
      long alike = alike(some, candidate);
      if (alike > most) {
        most = alike;
        best = candidate;
      }
    }
    return best;
  }

  private static long alike(List<String> lines, char separator) {
    java.util.Map<Long, Long> counts = new java.util.HashMap<>();
    for (String line : lines) {
      long found = separators(line, separator);
      if (found > 0) {
        counts.merge(found, 1L, Long::sum);
      }
    }
    return counts.values().stream().mapToLong(Long::longValue).max().orElse(0);
  }

  private static long separators(String line, char separator) {
    long found = 0;
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      quoted ^= c == '"';
      found += c == separator && !quoted ? 1 : 0;
    }
    return found;
  }

  private static List<Sheet.Row> rows(String file, String text, char separator) {
    List<Sheet.Row> rows = new ArrayList<>();
    long line = 1;
    try (CsvReader<CsvRecord> reader =
        CsvReader.builder()
            .fieldSeparator(separator)
            .commentStrategy(CommentStrategy.NONE)
            .skipEmptyLines(true)
            .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
            .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
            .maxBufferSize(16 * CELL)
            .ofCsvRecord(text)) {
      for (CsvRecord cells : reader) {
        line = cells.getStartingLineNumber();
        Sheet.Row row =
            new Sheet.Row((int) line, cells.getFields().stream().map(String::strip).toList());
        if (!row.isBlank()) {
          rows.add(row);
        }
      }
    } catch (CsvParseException e) {
      throw new DataException(
          new Fault(
              file,
              (int) line,
              0,
              1,
              "T10",
              "the cells cannot be told apart from here on",
              "",
              "look for a quote that is opened and not closed"));
    } catch (java.io.IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
    return rows;
  }

  /** A comma is a decimal sign where it does not part cells and no number has a point. */
  private static boolean hasDecimalComma(List<Sheet.Row> rows, char separator) {
    if (separator == ',') {
      return false;
    }
    long commas = 0;
    long points = 0;
    for (Sheet.Row row : rows.subList(0, Math.min(rows.size(), LOOKED_AT))) {
      for (String cell : row.cells()) {
        commas += COMMA_NUMBER.matcher(cell).matches() ? 1 : 0;
        points += POINT_NUMBER.matcher(cell).matches() ? 1 : 0;
      }
    }
    return commas > 0 && points == 0;
  }
}
