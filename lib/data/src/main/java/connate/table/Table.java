package connate.table;

import connate.fault.DataException;
import connate.file.AtomicFile;
import connate.quantity.Unit;
import connate.series.Labels;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import connate.series.Unstated;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * A table: columns of numbers with units and columns of words, row by row, each row with the line
 * of the file that it came from. A table does not change; {@link #with} and {@link #where} give
 * another.
 *
 * <p>A column is asked for by its name or by its role ({@code get("porosity")}); if the table has a
 * column of depth, its other columns know the depth of their rows.
 *
 * <p>The numbers stand in plain arrays; a Tablesaw table of them is made when {@link #tablesaw()}
 * is asked, because the first touch of that library costs more than a small replay.
 */
public final class Table implements Listed {

  private final String name;
  private final List<Column> columns;
  private final int[] lines;
  private final Finding finding;

  private Table(String name, List<Column> columns, int[] lines) {
    this.name = name;
    this.columns = List.copyOf(columns);
    this.lines = lines;
    this.finding = new Finding(name, this.columns);
  }

  static Table of(String name, List<Column> columns, int[] lines) {
    return new Table(name, columns, lines);
  }

  /**
   * Reads a table from a file's bytes: CSV, or XLSX by its first sheet.
   *
   * @param file the file's name, for messages
   * @param content its bytes
   * @throws DataException if it is no table, with the places of what is wrong
   */
  public static Table read(String file, byte[] content) {
    return read(file, content, "");
  }

  /** Reads a table from a sheet of an XLSX file. */
  public static Table read(String file, byte[] content, String sheet) {
    return TableReader.read(
        XlsxSheet.isXlsx(content)
            ? XlsxSheet.read(file, content, sheet)
            : CsvSheet.read(file, content));
  }

  /** Returns a table of columns that were made elsewhere. */
  public static Table of(String name, Series... series) {
    List<Column> columns = new ArrayList<>();
    for (Series one : series) {
      if (one.size() != series[0].size()) {
        throw new IllegalArgumentException(
            "«"
                + one.name()
                + "» has "
                + one.size()
                + " rows, «"
                + series[0].name()
                + "» "
                + series[0].size());
      }
      columns.add(Column.of(one));
    }
    return new Table(name, columns, new int[series.length == 0 ? 0 : series[0].size()]);
  }

  /** Returns the name, which is the file's. */
  public String name() {
    return name;
  }

  /** Returns the number of rows. */
  public int rows() {
    return lines.length;
  }

  /** Returns the names of the columns. */
  public List<String> names() {
    return columns.stream().map(Column::name).toList();
  }

  /**
   * Returns the line of the file from which a row came, counted from 1; 0 where it came from none.
   */
  public int line(int row) {
    return lines[row];
  }

  /** Returns whether there is a column of this name or role. */
  public boolean has(String nameOrRole) {
    return finding.find(nameOrRole).isPresent();
  }

  /**
   * Returns whether a column holds numbers.
   *
   * @throws IllegalArgumentException if there is none
   */
  public boolean isNumeric(String nameOrRole) {
    return finding.wanted(nameOrRole).isNumeric();
  }

  /**
   * Returns a column of numbers.
   *
   * @param nameOrRole the name, in capitals or not, or the role in plain words
   * @throws IllegalArgumentException if there is none, or it holds words
   */
  public Series get(String nameOrRole) {
    Column column = finding.wanted(nameOrRole);
    Series series =
        column
            .series()
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        name
                            + ": «"
                            + column.name()
                            + "» holds words: ask with labels(\""
                            + column.name()
                            + "\")"));
    return finding.depth().filter(d -> d != series).map(series::atDepth).orElse(series);
  }

  /** Returns all columns of numbers, in their order. */
  public List<Series> series() {
    return columns.stream().filter(Column::isNumeric).map(column -> get(column.name())).toList();
  }

  /**
   * Returns a column of words.
   *
   * @throws IllegalArgumentException if there is none, or it holds numbers
   */
  public Labels labels(String nameOrRole) {
    Column column = finding.wanted(nameOrRole);
    if (column.isNumeric() && rows() > 0 && column.numbers().count() == 0) {
      return Labels.of(column.name(), new String[rows()]);
    }
    if (column.isNumeric()) {
      throw new IllegalArgumentException(
          name
              + ": «"
              + column.name()
              + "» holds numbers: ask with get(\""
              + column.name()
              + "\")");
    }
    return column.words();
  }

  /** Returns the table with one more column, or with another in the place of the one so named. */
  public Table with(String column, Series values) {
    return with(Column.of(checked(column, values)));
  }

  /** Returns the table with one more column of words. */
  public Table with(String column, Labels words) {
    if (words.size() != rows()) {
      throw new IllegalArgumentException(sizes(column, words.size()));
    }
    return with(Column.of(words).named(column));
  }

  private Series checked(String column, Series values) {
    if (values.size() != rows()) {
      throw new IllegalArgumentException(sizes(column, values.size()));
    }
    return values.named(column);
  }

  private String sizes(String column, int size) {
    return name + " has " + rows() + " rows, «" + column + "» " + size;
  }

  private Table with(Column column) {
    List<Column> next = new ArrayList<>(columns);
    int at = finding.indexOf(column.name());
    if (at < 0) {
      next.add(column);
    } else {
      next.set(at, column);
    }
    return new Table(name, next, lines);
  }

  /** States the unit of a column that came without one. */
  public Table unit(String column, Unit<?> unit) {
    Series series = get(column);
    if (!series.unit().equals(Unstated.UNIT) && !series.unit().isSame(unit)) {
      throw new IllegalArgumentException(
          name
              + ": «"
              + series.name()
              + "» is in "
              + series.unit()
              + " by its header, not in "
              + unit
              + "; to convert it say get(\""
              + series.name()
              + "\").to(…)");
    }
    return with(Column.of(series.as(unit)));
  }

  /** States the unit of a column by its symbol; the column's role decides where two share one. */
  public Table unit(String column, String symbol) {
    String found = get(column).name();
    return unit(
        column,
        Heading.find(found, symbol)
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        "«" + symbol + "» is no unit that is known for «" + found + "»")));
  }

  /** Returns the table with a column under another name. */
  public Table rename(String column, String other) {
    List<Column> next = new ArrayList<>(columns);
    next.set(finding.indexOf(finding.wanted(column).name()), finding.wanted(column).named(other));
    return new Table(name, next, lines);
  }

  /** Returns the rows that bear a word. */
  public Table where(String column, String word) {
    int[] chosen = labels(column).rows(word);
    if (chosen.length == 0) {
      throw new IllegalArgumentException(
          name
              + ": no row has «"
              + word
              + "» in «"
              + column
              + "»; there are "
              + String.join(", ", labels(column).distinct()));
    }
    return rows(chosen);
  }

  /** Returns the rows in which a column's number is present and passes a test, in its own unit. */
  public Table where(String column, java.util.function.DoublePredicate test) {
    Series series = get(column);
    return rows(
        IntStream.range(0, rows())
            .filter(r -> !Double.isNaN(series.value(r)) && test.test(series.value(r)))
            .toArray());
  }

  /** Returns the rows in which a column has a value. */
  public Table present(String column) {
    Column wanted = finding.wanted(column);
    return rows(IntStream.range(0, rows()).filter(r -> !wanted.isMissing(r)).toArray());
  }

  /** Returns the chosen rows, counted from 0, in the given order. */
  public Table rows(int... chosen) {
    return new Table(
        name,
        columns.stream().map(c -> c.rows(chosen)).toList(),
        IntStream.of(chosen).map(r -> lines[r]).toArray());
  }

  /** Returns the rows by rising value of a column, missing ones last. */
  public Table sortedBy(String column) {
    Column wanted = finding.wanted(column);
    Comparator<Integer> order =
        wanted.isNumeric()
            ? Comparator.comparingDouble(r -> wanted.numbers().value(r))
            : Comparator.comparing(
                r -> wanted.words().label(r), Comparator.nullsLast(Comparator.naturalOrder()));
    return rows(
        IntStream.range(0, rows()).boxed().sorted(order).mapToInt(Integer::intValue).toArray());
  }

  /**
   * Returns the table with the columns of another beside its own, where a key is the same. Rows
   * without a partner stay, with missing values.
   *
   * @param other the other table, in which a key stands once
   * @param key a column's name or role that both have, such as {@code well}
   * @throws IllegalArgumentException if a key stands twice in the other table
   */
  public Table join(Table other, String key) {
    return new Joining(this, other, key).table(key);
  }

  /** Returns the table as CSV: units in the header, missing values empty, numbers in full. */
  public String csv() {
    return TableCsv.of(this);
  }

  /**
   * Writes the table as CSV, UTF-8, in one step: who reads sees the old file or the new one. A word
   * that a spreadsheet would take for a formula gets an apostrophe before it, which {@link #read}
   * takes away again.
   */
  public void writeCsv(Path path) {
    AtomicFile.write(path, csv().getBytes(StandardCharsets.UTF_8));
  }

  /** Returns the same columns as a Tablesaw table; units and lines stay here. */
  public tech.tablesaw.api.Table tablesaw() {
    return TablesawView.of(this);
  }

  /** Returns what a column was read as, in a few words: its unit and what it stands for. */
  public String describe(String column) {
    Column found = finding.wanted(column);
    String role = finding.role(found);
    String stands =
        role.isEmpty() || role.equals(Finding.key(found.name())) ? "" : " (" + role + ")";
    if (!found.isNumeric()) {
      return found.name() + ": words" + stands;
    }
    Unit<?> unit = found.numbers().unit();
    boolean none = unit.equals(Unstated.UNIT);
    return found.name() + (none ? ": numbers, no unit" : " in " + unit) + stands;
  }

  List<Column> columns() {
    return columns;
  }

  Column column(String nameOrRole) {
    return finding.wanted(nameOrRole);
  }

  @Override
  public Listing listing() {
    return TableListing.of(this);
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
