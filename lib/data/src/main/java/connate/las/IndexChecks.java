package connate.las;

/** Compares the index with what the well section says of it, and looks along it. */
final class IndexChecks {

  private static final double NOISE = 1e-3;

  private final LasText text;
  private final IndexWords well;
  private final HeaderLine header;
  private final Columns columns;
  private final int column;
  private final Quirks quirks;

  IndexChecks(
      LasText text,
      IndexWords well,
      HeaderLine header,
      Columns columns,
      int column,
      Quirks quirks) {
    this.text = text;
    this.well = well;
    this.header = header;
    this.columns = columns;
    this.column = column;
    this.quirks = quirks;
  }

  /** Puts index values back that equal the null, leaves rows out that have none, and looks. */
  void run() {
    restoreNulls();
    if (columns.rows() == 0) {
      quirks.caution("L54", 0, "the data section has no rows");
      return;
    }
    units();
    bounds();
    steps();
  }

  private double at(int row) {
    return columns.cells[column][row];
  }

  private void restoreNulls() {
    double[] index = columns.cells[column];
    for (int row = columns.rows() - 1; row >= 0; row--) {
      if (!Double.isNaN(index[row])) {
        continue;
      }
      if (fits(row)) {
        index[row] = well.nullValue();
        quirks.caution(
            "L40",
            text.lineOf(columns.offset(row)),
            "the index equals the null value here, and fits between its neighbours: kept");
      } else {
        quirks.caution(
            "L40",
            text.lineOf(columns.offset(row)),
            "row without an index: left out, since it has no place");
        columns.remove(row);
      }
    }
  }

  private boolean fits(int row) {
    double value = well.nullValue();
    boolean hasBefore = row > 0 && !Double.isNaN(at(row - 1));
    boolean hasBehind = row + 1 < columns.rows() && !Double.isNaN(at(row + 1));
    if (hasBefore && hasBehind) {
      return (at(row - 1) - value) * (value - at(row + 1)) > 0;
    }
    return value == (row == 0 ? well.start() : well.stop());
  }

  private void units() {
    double stated = DepthUnit.metres(well.startUnit());
    double used = DepthUnit.metres(header.unit());
    boolean differ = stated != used && !Double.isNaN(stated) && !Double.isNaN(used);
    if (differ) {
      quirks.caution(
          "L49",
          header.line(),
          Words.fill(
              "STRT is in {}, the curve {} in {}: the curve's unit is taken",
              well.startUnit(),
              header.mnemonic(),
              header.unit()));
    }
  }

  private void bounds() {
    double first = at(0);
    double last = at(columns.rows() - 1);
    double scale = scale();
    double start = well.start() * scale;
    double stop = well.stop() * scale;
    boolean isReversed = !near(first, start) && near(last, start);
    if (isReversed) {
      quirks.caution(
          "L31",
          well.line(0),
          Words.fill(
              "STRT is {}, but the data run the other way, from {} to {}: kept as they stand",
              plain(well.start()),
              plain(first),
              plain(last)));
    }
    double end = isReversed ? first : last;
    if (end != stop && !Double.isNaN(stop)) {
      boolean isNoise = Math.abs(end - stop) <= NOISE * Math.max(Math.abs(well.step()), 1e-3);
      String message =
          Words.fill("STOP is {}, but the data end at {}", plain(well.stop()), plain(end));
      if (isNoise) {
        quirks.note("L33", well.line(1), message);
      } else {
        quirks.caution("L33", well.line(1), message);
      }
    }
  }

  private double scale() {
    double factor = DepthUnit.metres(well.startUnit()) / DepthUnit.metres(header.unit());
    return Double.isNaN(factor) || near(at(0), well.start()) ? 1 : factor;
  }

  private boolean near(double a, double b) {
    double step = Double.isNaN(well.step()) ? 0 : Math.abs(well.step());
    return Math.abs(a - b) <= Math.max(1e-6 * Math.abs(b), 0.01 * step);
  }

  private void steps() {
    int rows = columns.rows();
    if (rows < 2) {
      return;
    }
    double total = at(rows - 1) - at(0);
    double sign = Math.signum(total);
    double common = total / (rows - 1);
    int repeated = -1;
    int turned = -1;
    int uneven = -1;
    double widest = 0;
    for (int i = 1; i < rows; i++) {
      double step = at(i) - at(i - 1);
      if (step == 0 && repeated < 0) {
        repeated = i;
      } else if (step * sign < 0 && turned < 0) {
        turned = i;
      }
      if (uneven < 0
          && step != 0
          && Math.abs(step - at(1) + at(0)) > 0.05 * Math.abs(at(1) - at(0))) {
        uneven = i;
      }
      widest = Math.max(widest, Math.abs(step));
    }
    tellOrder(repeated, turned);
    double first = at(1) - at(0);
    tellStep(uneven, first == 0 ? common : first, widest);
    if (sign < 0) {
      quirks.note("L80", 0, "the index decreases: logged upwards");
    }
  }

  private void tellOrder(int repeated, int turned) {
    if (repeated > 0) {
      quirks.caution(
          "L34",
          text.lineOf(columns.offset(repeated)),
          Words.fill("the index {} comes twice", plain(at(repeated))));
    }
    if (turned > 0) {
      quirks.caution(
          "L35",
          text.lineOf(columns.offset(turned)),
          Words.fill(
              "the index turns back, from {} to {}", plain(at(turned - 1)), plain(at(turned))));
    }
  }

  private void tellStep(int uneven, double step, double widest) {
    double stated = well.step() * scale();
    boolean isStatedIrregular = stated == 0 || Double.isNaN(stated);
    if (isStatedIrregular && uneven > 0) {
      quirks.note(
          "L32",
          text.lineOf(columns.offset(uneven)),
          "STEP is 0: the index is irregular, widest step " + plain(widest));
      return;
    }
    if (uneven > 0) {
      quirks.caution(
          "L32",
          text.lineOf(columns.offset(uneven)),
          Words.fill(
              "the step is uneven here: from {} to {}, where STEP is {}; widest step {}",
              plain(at(uneven - 1)),
              plain(at(uneven)),
              plain(well.step()),
              plain(widest)));
    }
    if (isStatedIrregular) {
      return;
    }
    if (stated * step < 0) {
      quirks.caution(
          "L31",
          well.line(2),
          Words.fill(
              "STEP is {}, but the index runs the other way: by {}",
              plain(well.step()),
              plain(step)));
    }
    if (Math.abs(Math.abs(stated) - Math.abs(step)) > 0.01 * Math.abs(stated)) {
      quirks.caution(
          "L32",
          well.line(2),
          Words.fill("STEP is {}, but the data step by {}", plain(well.step()), plain(step)));
    }
  }

  private static String plain(double value) {
    return IndexFinder.plain(value);
  }
}
