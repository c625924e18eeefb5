package connate.las;

import connate.file.AtomicFile;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * Writes LAS 2.0: one row a line, no exponents, plain ASCII, every number in as many digits as it
 * takes to read the same number back.
 *
 * <p>Header lines of a file that was read are written as they stood where the standard allows it.
 * STRT, STOP, STEP and NULL are made anew from the columns. Data sets beside the log, which version
 * 2.0 cannot hold, are left out, and the section ~Other says so.
 */
public final class LasWriter {

  private static final double[] NULLS = {-999.25, -9999, -99999, -999999};
  private static final List<String> REQUIRED =
      List.of("COMP", "WELL", "FLD", "LOC", "PROV", "SRVC", "DATE", "UWI");
  private static final Set<String> OWN = Set.of("STRT", "STOP", "STEP", "NULL");

  private final List<HeaderLine> well;
  private final List<HeaderLine> parameters;
  private final List<String> other;
  private final List<LasColumn> columns;
  private final double nullValue;
  private final StringBuilder out = new StringBuilder();

  private LasWriter(
      List<HeaderLine> well,
      List<HeaderLine> parameters,
      List<String> other,
      List<LasColumn> columns,
      double nullValue) {
    this.well = well;
    this.parameters = parameters;
    this.other = other;
    this.columns = columns;
    this.nullValue = nullValue;
  }

  /**
   * Writes a file.
   *
   * @param path where it goes
   * @param head header lines to keep, of a file that was read
   * @param columns the columns, the index first
   */
  public static void write(Path path, LasFile head, List<LasColumn> columns) {
    AtomicFile.write(path, text(head, columns).getBytes(StandardCharsets.US_ASCII));
  }

  /**
   * Writes a file.
   *
   * @param path where it goes
   * @param well header lines for the well
   * @param columns the columns, the index first
   */
  public static void write(Path path, List<HeaderLine> well, List<LasColumn> columns) {
    AtomicFile.write(path, text(well, columns).getBytes(StandardCharsets.US_ASCII));
  }

  /** Returns a file as it was read, in version 2.0. */
  public static String text(LasFile file) {
    List<LasColumn> columns = new ArrayList<>();
    columns.add(LasColumn.of(file.index()));
    for (LasCurve curve : file.curves()) {
      if (curve != file.index()) {
        columns.add(LasColumn.of(curve));
      }
    }
    return text(file, columns);
  }

  /** Returns columns with the header lines of a file that was read. */
  public static String text(LasFile head, List<LasColumn> columns) {
    List<String> other = new ArrayList<>();
    for (LasSection section : head.sections()) {
      if (section.kind() == LasSection.Kind.OTHER) {
        other.addAll(section.lines());
      }
    }
    head.sets().forEach(s -> other.add("Left out: the data set " + s.name() + " of version 3.0"));
    return new LasWriter(
            head.items(LasSection.Kind.WELL),
            head.items(LasSection.Kind.PARAMETER),
            other,
            columns,
            freeNull(head.nullValue(), columns))
        .run();
  }

  /** Returns columns with new header lines for the well. */
  public static String text(List<HeaderLine> well, List<LasColumn> columns) {
    return new LasWriter(well, List.of(), List.of(), columns, freeNull(Double.NaN, columns)).run();
  }

  private static double freeNull(double wanted, List<LasColumn> columns) {
    if (!Double.isNaN(wanted) && !isUsed(wanted, columns)) {
      return wanted;
    }
    for (double candidate : NULLS) {
      if (!isUsed(candidate, columns)) {
        return candidate;
      }
    }
    throw new IllegalArgumentException("every usual null value stands among the values");
  }

  private static boolean isUsed(double value, List<LasColumn> columns) {
    for (LasColumn column : columns) {
      for (int row = 0; !column.isText() && row < column.size(); row++) {
        if (column.number(row) == value) {
          return true;
        }
      }
    }
    return false;
  }

  private String run() {
    check();
    out.append("~Version Information\n");
    line("VERS", "", "2.0", "CWLS LOG ASCII STANDARD -VERSION 2.0");
    line("WRAP", "", "NO", "ONE LINE PER DEPTH STEP");
    wellSection();
    out.append("~Curve Information\n");
    List<String> names = names();
    for (int c = 0; c < columns.size(); c++) {
      LasColumn column = columns.get(c);
      line(names.get(c), column.unit(), column.code(), column.description());
    }
    if (!parameters.isEmpty()) {
      out.append("~Parameter Information\n");
      parameters.forEach(this::keep);
    }
    if (!other.isEmpty()) {
      out.append("~Other Information\n");
      other.forEach(l -> out.append(l.startsWith("~") ? " " : "").append(ascii(l)).append('\n'));
    }
    rows(names);
    return out.toString();
  }

  private void check() {
    if (columns.isEmpty() || columns.get(0).isText()) {
      throw new IllegalArgumentException("the first column is the index and holds numbers");
    }
    for (LasColumn column : columns) {
      if (column.size() != columns.get(0).size()) {
        throw new IllegalArgumentException(
            column.mnemonic()
                + " has "
                + column.size()
                + " rows, the index "
                + columns.get(0).size());
      }
    }
  }

  private void wellSection() {
    LasColumn index = columns.get(0);
    int last = index.size() - 1;
    out.append("~Well Information\n");
    line("STRT", index.unit(), last < 0 ? "" : plain(index.number(0)), "START");
    line("STOP", index.unit(), last < 0 ? "" : plain(index.number(last)), "STOP");
    line("STEP", index.unit(), plain(step(index)), "STEP, 0 WHERE IRREGULAR");
    line("NULL", "", plain(nullValue), "NULL VALUE");
    Set<String> present = new HashSet<>();
    for (HeaderLine item : well) {
      String key = HeaderReader.key(item.mnemonic());
      if (!OWN.contains(key)) {
        present.add(key);
        keep(item);
      }
    }
    for (String required : REQUIRED) {
      if (!present.contains(required)) {
        line(required, "", "", "");
      }
    }
  }

  /** Returns the step where all steps are the same but for rounding in the last digit, else 0. */
  private static double step(LasColumn index) {
    if (index.size() < 2) {
      return 0;
    }
    double total = index.number(index.size() - 1) - index.number(0);
    double step = Math.rint(total / (index.size() - 1) * 1e6) / 1e6;
    for (int row = 1; row < index.size(); row++) {
      double expected = index.number(0) + row * step;
      if (Math.abs(index.number(row) - expected) > 1e-6 * Math.max(1, Math.abs(expected))) {
        return 0;
      }
    }
    return step;
  }

  private List<String> names() {
    Set<String> taken = new HashSet<>();
    List<String> names = new ArrayList<>();
    for (LasColumn column : columns) {
      String base = ascii(column.mnemonic()).strip().replaceAll("[\\s.:~#\"]", "_");
      base = base.isEmpty() ? "CURVE" : base;
      String name = base;
      for (int n = 2; !taken.add(name.toUpperCase(Locale.ROOT)); n++) {
        name = base + "_" + n;
      }
      names.add(name);
    }
    return names;
  }

  /** Writes a header line as it stood, where it reads the same in version 2.0. */
  private void keep(HeaderLine item) {
    HeaderLine again = HeaderParse.plain(item.line(), item.text());
    boolean isSame =
        !item.text().isEmpty()
            && again.mnemonic().equals(item.mnemonic())
            && again.unit().equals(item.unit())
            && again.value().equals(item.value())
            && item.text().indexOf('.') >= 0
            && HeaderParse.colon(item.text()) >= 0
            && !item.text().stripLeading().startsWith("~");
    if (isSame) {
      out.append(ascii(item.text()).stripTrailing()).append('\n');
    } else {
      line(item.mnemonic(), item.unit(), item.value(), item.description());
    }
  }

  private void line(String mnemonic, String unit, String value, String description) {
    String name = ascii(mnemonic).strip().replaceAll("[.:~#]", "_");
    String left = name + "." + LasUnits.ascii(unit).replaceAll("[\\s:]", "_");
    out.append(left).append(" ".repeat(Math.max(1, 16 - left.length())));
    out.append(ascii(value)).append(" ".repeat(Math.max(1, 24 - value.length())));
    out.append(": ").append(ascii(description).replace(':', ';')).append('\n');
  }

  private void rows(List<String> names) {
    out.append("~A ").append(String.join(" ", names)).append('\n');
    String none = plain(nullValue);
    for (int row = 0; row < columns.get(0).size(); row++) {
      for (int c = 0; c < columns.size(); c++) {
        LasColumn column = columns.get(c);
        out.append(c == 0 ? "" : " ");
        if (column.isText()) {
          String word = ascii(column.word(row)).strip().replaceAll("[\\s\"]", "_");
          out.append(word.isEmpty() ? none : word);
        } else {
          out.append(Double.isFinite(column.number(row)) ? plain(column.number(row)) : none);
        }
      }
      out.append('\n');
    }
  }

  /** Returns the shortest digits that read back as the same number, without an exponent. */
  static String plain(double value) {
    String text = Double.toString(value);
    if (text.indexOf('E') < 0) {
      return text;
    }
    return new BigDecimal(text).toPlainString();
  }

  /** Returns the text with a blank for each character that the standard does not allow. */
  static String ascii(String text) {
    StringBuilder plain = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      plain.append(c >= ' ' && c <= '~' ? c : ' ');
    }
    return plain.toString();
  }
}
