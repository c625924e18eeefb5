package connate.table;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.time.LocalDateTime;
import java.util.Locale;
import java.util.Set;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.CellType;

/**
 * What a spreadsheet's cell says: a percentage with its sign, because 18.4 % is stored as 0.184; a
 * date as a date, because it is stored as a count of days; all else as it stands.
 */
final class XlsxCell {

  /** Numbers of the built-in formats that show a date or a time (ECMA-376 part 1, 18.8.30). */
  private static final Set<Integer> DATES =
      Set.of(
          14, 15, 16, 17, 18, 19, 20, 21, 22, 27, 28, 29, 30, 31, 32, 33, 34, 35, 36, 45, 46, 47);

  private static final Set<Integer> PERCENTS = Set.of(9, 10);
  private static final MathContext DIGITS = new MathContext(15, RoundingMode.HALF_EVEN);
  private static final LocalDateTime FROM_1900 = LocalDateTime.of(1899, 12, 30, 0, 0);
  private static final LocalDateTime FROM_1904 = LocalDateTime.of(1904, 1, 1, 0, 0);
  private static final double LAST_DAY = 2958466;

  private XlsxCell() {}

  static String text(Cell cell, boolean from1904) {
    if (cell == null || cell.getText() == null) {
      return "";
    }
    if (cell.getType() == CellType.EMPTY || !(cell.getValue() instanceof BigDecimal number)) {
      return cell.getText().strip();
    }
    int id = cell.getDataFormatId() == null ? 0 : cell.getDataFormatId();
    String format = bare(cell.getDataFormatString());
    if (PERCENTS.contains(id) || format.contains("%")) {
      return number.movePointRight(2).round(DIGITS).stripTrailingZeros().toPlainString() + " %";
    }
    boolean date = DATES.contains(id) || format.matches(".*[ydhms].*");
    double days = number.doubleValue();
    return date && days >= 0 && days < LAST_DAY ? date(days, from1904) : cell.getText().strip();
  }

  /** A format without what it shows as it stands: quoted, escaped, in brackets. */
  private static String bare(String format) {
    return format == null
        ? ""
        : format
            .toLowerCase(Locale.ROOT)
            .replaceAll("\"[^\"]*\"|\\\\.|\\[[^\\]]*\\]|general|_.", "");
  }

  private static String date(double days, boolean from1904) {
    long seconds = StrictMath.round(days * 86400);
    LocalDateTime time = (from1904 ? FROM_1904 : FROM_1900).plusSeconds(seconds);
    if (seconds % 86400 == 0) {
      return time.toLocalDate().toString();
    }
    return days < 1 ? time.toLocalTime().toString() : time.toString();
  }
}
