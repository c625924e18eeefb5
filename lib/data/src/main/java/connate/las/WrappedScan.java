package connate.las;

import connate.fault.DataException;
import connate.fault.Fault;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads wrapped data: the index alone on a line, then the other values over several lines. A row
 * ends when all columns have a value; that must be at the end of a line.
 */
final class WrappedScan {

  private final LasText text;
  private final Block block;
  private final Quirks quirks;
  private final boolean settingAside;
  private final NumberScan numbers;
  private final Columns columns;
  private final Tally tally;
  private final List<Fault> faults = new ArrayList<>();
  private final List<Integer> firstShape = new ArrayList<>();
  private int faultCount;
  private int filled;
  private int rowFrom;

  WrappedScan(LasText text, Block block, Quirks quirks, boolean settingAside) {
    this.text = text;
    this.block = block;
    this.quirks = quirks;
    this.settingAside = settingAside;
    this.numbers = new NumberScan(text.bytes, (byte) '.');
    this.tally = new Tally(text, quirks);
    this.columns =
        new Columns(block.columns(), (block.to() - block.from()) / (8 * block.columns()));
  }

  /** Returns the numbers of the block. */
  Columns run() {
    int at = block.from();
    while (at < block.to()) {
      int first = text.skipBlanks(at);
      byte b = text.bytes[first];
      boolean isBlank = b == '\n' || b == '\r';
      if (isBlank || b == '#') {
        tally.comment(at, isBlank);
      } else {
        line(at, first);
      }
      at = text.afterLine(text.lineEnd(first));
    }
    finish();
    return columns;
  }

  private void line(int lineFrom, int first) {
    int before = filled;
    if (filled == 0) {
      rowFrom = lineFrom;
      columns.nextRow();
    }
    int at = first;
    byte b = text.bytes[at];
    while (b != '\n' && b != '\r') {
      if (filled == columns.count()) {
        misfit(
            lineFrom,
            at,
            "L12",
            Words.fill(
                "the row that starts at line {} runs over: more than {} values",
                text.lineOf(rowFrom),
                columns.count()));
        return;
      }
      int end = item(at);
      if (end < 0) {
        return;
      }
      filled++;
      at = text.skipBlanks(end);
      b = text.bytes[at];
    }
    endOfLine(lineFrom, filled - before);
  }

  private void endOfLine(int lineFrom, int items) {
    boolean isFirstRow = columns.rows() == 0;
    if (isFirstRow) {
      firstShape.add(items);
    }
    boolean isIndexLine = filled == items;
    if (!isFirstRow && isIndexLine && items != firstShape.get(0)) {
      misfit(
          lineFrom,
          lineFrom,
          "L12",
          Words.fill(
                  "a row starts with {} values on its first line, where the first row starts with {}: ",
                  items,
                  firstShape.get(0))
              + "a value of the row above is missing");
      return;
    }
    if (filled == columns.count()) {
      columns.accept(rowFrom);
      filled = 0;
    }
  }

  private int item(int at) {
    int end = numbers.read(at);
    double value = numbers.value;
    if (end < 0 || text.bytes[end] > ' ') {
      end = at;
      while (text.bytes[end] > ' ' || text.bytes[end] < 0) {
        end++;
      }
      LooseNumber loose = LooseNumber.of(text.text(at, end));
      if (!loose.isClear()) {
        misfit(
            rowFrom,
            at,
            "L08",
            Words.fill("'{}' in curve {} is not a number", text.text(at, end), filled + 1));
        return -1;
      }
      tally.item(loose.kind(), at);
      value = loose.value();
    }
    columns.cells[filled][columns.rows()] = value == block.nullValue() ? Double.NaN : value;
    return end;
  }

  private void misfit(int lineFrom, int at, String code, String message) {
    faultCount++;
    filled = 0;
    int end = text.lineEnd(at);
    if (faults.size() < DataException.SHOWN) {
      faults.add(
          text.fault(
              at,
              end,
              code,
              message,
              "correct the rows, or set them aside with LasOptions.STRICT.settingRowsAside()"));
    }
    if (!settingAside) {
      throw new DataException(faults, faultCount);
    }
    quirks.caution(
        code.equals("L08") ? "L45" : code, text.lineOf(lineFrom), "row set aside: " + message);
  }

  private void finish() {
    if (filled > 0) {
      quirks.caution(
          "L43",
          text.lineOf(rowFrom),
          Words.fill(
              "the data end in a fragment of {} values, where {} were expected: left out",
              filled,
              columns.count()));
    }
    tally.tell();
    if (numbers.exponents) {
      quirks.note("L77", 0, "numbers with exponents, which the version of 1992 forbids: read");
    }
    quirks.note("L82", 0, "wrapped: a row stands on lines of " + shape() + " values");
  }

  private String shape() {
    StringBuilder out = new StringBuilder();
    firstShape.forEach(n -> out.append(out.length() == 0 ? "" : ", ").append(n));
    return out.toString();
  }
}
