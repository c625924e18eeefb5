package connate.las;

import connate.quantity.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * Finds the index and the order of the columns. The test is that the index starts, or in a log run
 * the other way ends, at STRT; where header, labels and numbers leave two readings open the file is
 * refused.
 */
final class IndexFinder {

  /**
   * What was found.
   *
   * @param curve the number of the index among the curves
   * @param order the column of each curve
   */
  record Found(int curve, int[] order) {}

  private static final Set<String> NAMES =
      Set.of("DEPT", "DEPTH", "DEP", "MD", "TIME", "INDEX", "TDEP", "ETIM");

  private final LasText text;
  private final IndexWords well;
  private final List<HeaderLine> curves;
  private final Columns columns;
  private final Quirks quirks;
  private final int[] labelled;

  IndexFinder(
      LasText text,
      IndexWords well,
      List<HeaderLine> curves,
      Columns columns,
      int[] labelled,
      Quirks quirks) {
    this.text = text;
    this.well = well;
    this.curves = curves;
    this.columns = columns;
    this.labelled = labelled;
    this.quirks = quirks;
  }

  /** Returns the index and the order. */
  Found find(String asked) {
    int[] order = labelled == null ? ColumnLabels.identity(curves.size()) : labelled;
    if (!asked.isEmpty()) {
      return new Found(asked(asked), order);
    }
    if (columns.rows() == 0) {
      return new Found(0, order);
    }
    if (labelled != null && !ColumnLabels.isIdentity(labelled)) {
      return byLabels();
    }
    int named = named();
    if (Double.isNaN(well.start())) {
      return withoutStart(named, order);
    }
    if (named > 0) {
      return misplaced(named, order);
    }
    if (!matches(0, 0)) {
      throw noStart(0);
    }
    return new Found(0, order);
  }

  private int asked(String asked) {
    for (int i = 0; i < curves.size(); i++) {
      if (curves.get(i).isNamed(asked)) {
        return i;
      }
    }
    throw text.refusal("L09", "no curve is named '" + asked + "'", "curves: " + names());
  }

  /** Returns the first curve that bears the name of an index; 0 where none or the first does. */
  private int named() {
    for (int i = 0; i < curves.size(); i++) {
      if (NAMES.contains(HeaderReader.key(curves.get(i).mnemonic()))) {
        return i;
      }
    }
    return 0;
  }

  private Found byLabels() {
    int curve = named();
    if (Double.isNaN(well.start()) || !matches(labelled[curve], curve)) {
      throw contradiction(
          curve, "the labels of the data section name column " + (labelled[curve] + 1));
    }
    quirks.caution(
        "L30",
        curves.get(curve).line(),
        "the curve section lists the columns in another order than the labels of the data: "
            + Words.fill(
                "ordered by the labels, where {} is column {} and starts at STRT",
                curves.get(curve).mnemonic(),
                labelled[curve] + 1));
    return new Found(curve, labelled);
  }

  private Found withoutStart(int named, int[] order) {
    boolean isNamed = NAMES.contains(HeaderReader.key(curves.get(0).mnemonic()));
    if (named != 0 || !isNamed || columns.isText(0)) {
      throw text.refusal(
          "L09",
          "no STRT, and the first curve is no " + "depth or time by its name",
          "name the index: LasOptions.STRICT.withIndex(\"" + curves.get(named).mnemonic() + "\")");
    }
    return new Found(0, order);
  }

  private Found misplaced(int named, int[] order) {
    boolean first = matches(0, 0);
    boolean other = matches(named, named);
    if (other && !first) {
      quirks.caution(
          "L30",
          curves.get(named).line(),
          Words.fill(
              "the index {} is not the first curve: found in column {}, which starts at STRT",
              curves.get(named).mnemonic(),
              named + 1));
      return new Found(named, order);
    }
    if (first && labelled != null) {
      return new Found(0, order);
    }
    if (first) {
      throw contradiction(named, Words.fill("column 1, listed as {},", curves.get(0).mnemonic()));
    }
    throw noStart(named);
  }

  private RuntimeException contradiction(int curve, String other) {
    HeaderLine line = curves.get(curve);
    return text.refusal(
        line,
        "L10",
        Words.fill(
            "{} is listed as curve {}, but {}: STRT is {}, and that column starts at {}",
            line.mnemonic(),
            curve + 1,
            other,
            plain(well.start()),
            plain(first(other.startsWith("column 1,") ? 0 : labelled[curve]))),
        "put the curve lines into the order of the columns, or name the index: "
            + "LasOptions.STRICT.withIndex(\""
            + line.mnemonic()
            + "\")");
  }

  private RuntimeException noStart(int curve) {
    List<String> others = new ArrayList<>();
    for (int c = 0; c < columns.count(); c++) {
      if (matches(c, c)) {
        others.add("column " + (c + 1));
      }
    }
    String where = others.isEmpty() ? "no column starts there" : others + " would";
    String name = curves.get(curve).mnemonic();
    String message =
        Words.fill(
            "STRT is {}, but {} starts at {}; {}",
            plain(well.start()),
            name,
            plain(first(curve)),
            where);
    String help = "correct STRT, or name the index: LasOptions.STRICT.withIndex(\"" + name + "\")";
    int at = text.from;
    while (text.lineOf(at) < well.line(0) && at < text.to) {
      at = text.afterLine(text.lineEnd(at));
    }
    return text.refusal(at, text.lineEnd(at), "L09", message, help);
  }

  private String names() {
    return String.join(", ", curves.stream().map(HeaderLine::mnemonic).toList());
  }

  private double first(int column) {
    double v = columns.isText(column) ? Double.NaN : columns.cells[column][0];
    return Double.isNaN(v) && !columns.isText(column) ? well.nullValue() : v;
  }

  private double last(int column) {
    return columns.isText(column) ? Double.NaN : columns.cells[column][columns.rows() - 1];
  }

  private boolean matches(int column, int curve) {
    return isStart(first(column), curve) || isStart(last(column), curve);
  }

  private boolean isStart(double value, int curve) {
    if (near(value, well.start())) {
      return true;
    }
    double from = DepthUnit.metres(well.startUnit());
    double to = DepthUnit.metres(curves.get(curve).unit());
    return from != to && near(value, well.start() * from / to);
  }

  private boolean near(double a, double b) {
    double step = Double.isNaN(well.step()) ? 0 : Math.abs(well.step());
    return Math.abs(a - b) <= Math.max(1e-6 * Math.abs(b), 0.01 * step);
  }

  /** Writes a number at ten digits, so that last bits do not show. */
  static String plain(double value) {
    return Double.isFinite(value) ? Numbers.record(value) : "missing";
  }
}
