package connate.las;

import connate.fault.DataException;
import connate.fault.Fault;
import java.util.ArrayList;
import java.util.List;

/** Takes the lines of data that are no plain row of numbers, and judges them at the end. */
final class OddLines {

  /**
   * A line that does not fit.
   *
   * @param from the offset of its start
   * @param items the number of items it holds
   * @param isRow true where it has the right number of items and starts with a number
   * @param fault what is wrong with it, with its place
   */
  private record Misfit(int from, int items, boolean isRow, Fault fault) {}

  private static final int KEPT = 200;
  private static final int MOST_STRAY = 3;

  private final LasText text;
  private final Block block;
  private final Layout layout;
  private final Quirks quirks;
  private final boolean settingAside;
  private final Tally tally;
  private final int[] textItems;
  private final List<Misfit> misfits = new ArrayList<>();
  private Misfit last;
  private int misfitCount;
  private int lastContent = -1;

  OddLines(LasText text, Block block, Layout layout, Quirks quirks, boolean settingAside) {
    this.text = text;
    this.block = block;
    this.layout = layout;
    this.quirks = quirks;
    this.settingAside = settingAside;
    this.tally = new Tally(text, quirks);
    this.textItems = new int[block.columns()];
  }

  void countEmpty() {
    tally.countEmpty();
  }

  void noteExponents() {
    quirks.note("L77", 0, "numbers with exponents, which the version of 1992 forbids: read");
  }

  /** Takes a line: as a row where it can be one, as a comment, or as a misfit. */
  void take(int from, int end, Columns columns) {
    String line = text.text(from, end);
    String stripped = line.strip();
    if (stripped.isEmpty() || stripped.startsWith("#")) {
      tally.comment(from, stripped.isEmpty());
      return;
    }
    lastContent = from;
    List<int[]> places = Items.places(line, layout.delimiter());
    places = tally.withoutTrailingDelimiter(places, columns.count(), layout, from);
    if (places.size() < columns.count() && layout.delimiter() == 0) {
      List<int[]> split = RunTogether.split(line, places);
      if (split.size() == columns.count()) {
        tally.count(Tally.Kind.RUN_TOGETHER, from);
        places = split;
      }
    }
    if (places.size() == columns.count()) {
      row(from, line, places, columns);
    } else {
      misfit(from, line, places, columns.count());
    }
  }

  private void row(int from, String line, List<int[]> places, Columns columns) {
    int row = columns.nextRow();
    for (int c = 0; c < columns.count(); c++) {
      int[] place = places.get(c);
      String item = line.substring(place[0], place[1]);
      if (columns.isText(c)) {
        columns.setWord(c, tally.word(item, block.nullValue()));
        continue;
      }
      LooseNumber number = LooseNumber.of(decimalPoint(Items.bare(item)));
      if (!number.isClear()) {
        countText(line, places);
        notANumber(from, line, place, number, c, places.size());
        return;
      }
      tally.item(number.kind(), from);
      double v = number.value();
      columns.cells[c][row] = v == block.nullValue() ? Double.NaN : v;
    }
    columns.accept(from);
  }

  private String decimalPoint(String item) {
    return layout.point() == ',' ? item.replace(',', '.') : item;
  }

  private void countText(String line, List<int[]> places) {
    for (int c = 0; c < textItems.length; c++) {
      String item = Items.bare(line.substring(places.get(c)[0], places.get(c)[1]));
      if (LooseNumber.of(item).kind() == LooseNumber.Kind.TEXT) {
        textItems[c]++;
      }
    }
  }

  private void notANumber(
      int from, String line, int[] place, LooseNumber number, int column, int items) {
    String item = line.substring(place[0], place[1]);
    boolean isComma = number.kind() == LooseNumber.Kind.COMMA;
    String message =
        isComma
            ? "'{}' in curve {}: the comma may split thousands or decimals"
            : "'{}' in curve {} is not a number";
    String help =
        isComma
            ? "write a point before the decimals and nothing between thousands"
            : "correct the value, or set such rows aside with LasOptions.STRICT.settingRowsAside()";
    int at = text.offset(from, line, place[0]);
    add(
        new Misfit(
            from,
            items,
            column > 0,
            text.fault(
                at,
                text.offset(from, line, place[1]),
                isComma ? "L14" : "L08",
                Words.fill(message, item, column + 1),
                help)));
  }

  private void misfit(int from, String line, List<int[]> places, int columns) {
    int[] place = places.get(places.size() - 1);
    int at = text.offset(from, line, place[0]);
    add(
        new Misfit(
            from,
            places.size(),
            false,
            text.fault(
                at,
                text.offset(from, line, place[1]),
                "L07",
                Words.fill("row of {} values, where ~C lists {} curves", places.size(), columns),
                "correct the row, or set such rows aside with LasOptions.STRICT.settingRowsAside()")));
  }

  private void add(Misfit misfit) {
    misfitCount++;
    last = misfit;
    if (misfits.size() < KEPT) {
      misfits.add(misfit);
    }
  }

  /** Tells whether at least half of the rows hold text in some column. */
  boolean hasTextColumns(int goodRows) {
    for (int count : textItems) {
      if (isText(count, goodRows)) {
        return true;
      }
    }
    return false;
  }

  private boolean isText(int count, int goodRows) {
    return count > 0 && 2L * count >= goodRows + misfitCount;
  }

  /** Forgets what was found, and makes the columns of text hold words. */
  void startAgain(Columns again, int goodRows) {
    for (int c = 0; c < textItems.length; c++) {
      if (isText(textItems[c], goodRows)) {
        again.makeText(c);
        quirks.caution("L53", 0, "curve " + (c + 1) + " holds text, not numbers: kept as text");
      }
    }
    misfits.clear();
    misfitCount = 0;
    last = null;
    tally.clear();
  }

  /** Judges the lines that did not fit, and tells what was met. */
  void settle(Columns columns) {
    tally.tell();
    takeStrayLines(columns);
    takeFragment(columns);
    if (misfitCount == 0) {
      return;
    }
    if (!settingAside) {
      throw new DataException(misfits.stream().map(Misfit::fault).toList(), misfitCount);
    }
    for (Misfit misfit : misfits.subList(0, Math.min(DataException.SHOWN, misfits.size()))) {
      quirks.caution("L45", misfit.fault.line(), "row set aside: " + misfit.fault.message());
    }
    if (misfitCount > DataException.SHOWN) {
      quirks.caution("L45", 0, misfitCount + " rows set aside in all");
    }
  }

  private void takeStrayLines(Columns columns) {
    if (columns.rows() == 0) {
      return;
    }
    int stray = 0;
    while (stray < misfits.size()
        && misfits.get(stray).from < columns.offset(0)
        && !misfits.get(stray).isRow) {
      stray++;
    }
    if (stray > MOST_STRAY) {
      return;
    }
    for (Misfit misfit : misfits.subList(0, stray)) {
      quirks.caution("L44", misfit.fault.line(), "stray line before the first row: left out");
    }
    misfits.subList(0, stray).clear();
    misfitCount -= stray;
  }

  private void takeFragment(Columns columns) {
    boolean isFragment =
        misfitCount > 0
            && columns.rows() > 0
            && last.from == lastContent
            && last.from > columns.offset(columns.rows() - 1)
            && last.items < columns.count();
    if (!isFragment) {
      return;
    }
    quirks.caution(
        "L43",
        last.fault.line(),
        Words.fill(
            "the data end in a fragment of {} values, where {} were expected: left out",
            last.items,
            columns.count()));
    misfits.remove(last);
    misfitCount--;
  }
}
