package connate.table;

import connate.fault.Fault;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Labels;
import connate.series.Series;
import connate.series.Unstated;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Decides whether a column holds numbers or words. It holds numbers where its heading names a unit
 * and any cell is one, or where four of five cells that are not empty are numbers; the others are
 * then faults, told with their places.
 */
final class ColumnReader {

  private static final double GREAT_MAJORITY = 0.8;

  /** Roles whose columns hold words, also where they are written in digits. */
  static final Set<String> WORDS = Set.of("well", "zone", "facies");

  private final Sheet sheet;
  private final Heading heading;
  private final List<Sheet.Row> rows;
  private final int column;
  private final Faults faults;
  private final ColumnScan scan;
  private final CellUnits units;
  private final ColumnLooks looks;

  ColumnReader(Sheet sheet, Heading heading, List<Sheet.Row> rows, int column, Faults faults) {
    this.sheet = sheet;
    this.heading = heading;
    this.rows = rows;
    this.column = column;
    this.faults = faults;
    this.scan = new ColumnScan(sheet, rows, column);
    this.units = new CellUnits(heading, scan.decimalComma());
    this.looks = new ColumnLooks(sheet.file(), heading.name(), rows);
  }

  Column read() {
    int[] odd = scan.odd();
    int measured = 0;
    int doubtful = 0;
    for (int row : odd) {
      measured += units.of(scan.cell(row)).isPresent() ? 1 : 0;
      doubtful += isNearNumber(scan.cell(row)) ? 1 : 0;
    }
    boolean meant = isNamedWords();
    int near = scan.numbers() + measured + doubtful;
    boolean empty = scan.filled() == 0;
    boolean majority = empty || near >= GREAT_MAJORITY * scan.filled();
    boolean numeric = hasUnit() ? empty || near > 0 : !meant && majority;
    return numeric ? Column.of(numbers(odd, measured)) : Column.of(words(meant));
  }

  private boolean isNearNumber(String cell) {
    return Cells.isDoubtful(cell, scan.decimalComma()) || Cells.isBound(cell, scan.decimalComma());
  }

  private boolean hasUnit() {
    return !heading.unit().equals(Unstated.UNIT);
  }

  /** Names of wells, zones and facies are words, also where they are written in digits. */
  private boolean isNamedWords() {
    boolean role = role().map(r -> WORDS.contains(r.name())).orElse(false);
    return scan.isDigitsName() || role && !scan.isBroken();
  }

  private Optional<Role> role() {
    return Roles.find(heading.name(), heading.symbol());
  }

  private Labels words(boolean meant) {
    boolean wanted = role().map(r -> r.unit() != null).orElse(false);
    if (hasUnit() || !meant && (wanted || scan.numbers() > scan.filled() / 5)) {
      looks.words(scan.numbers(), scan.filled());
    }
    String[] words = new String[rows.size()];
    for (int row = 0; row < words.length; row++) {
      String cell = scan.cell(row);
      words[row] = Missing.isNoWord(cell) ? null : cell;
    }
    return Labels.of(heading.name(), words);
  }

  private Series numbers(int[] odd, int measured) {
    boolean own = measured > 0 && !hasUnit();
    Unit<?> unit = own ? firstUnit(odd) : heading.unit();
    if (own && scan.numbers() > 0) {
      refuseBare();
    }
    double[] values = scan.values();
    for (int row : odd) {
      values[row] = value(row, unit);
    }
    looks.mark(values, scan);
    checkFractions(values, unit);
    Series series = Series.over(heading.name(), unit, values, null);
    looks.range(series, role());
    return NameTraits.of(series, role());
  }

  private double value(int row, Unit<?> unit) {
    String cell = scan.cell(row);
    Optional<Unit<?>> own = units.of(cell);
    if (own.isPresent()) {
      return converted(row, own.get(), unit);
    }
    if (Cells.isDoubtful(cell, scan.decimalComma())) {
      fault(
          row,
          "T07",
          "«" + cell + "» may be a thousand or a decimal in «" + heading.name() + "»",
          "write it without a sign between thousands, and decimals with a point");
    } else if (Cells.isBound(cell, scan.decimalComma())) {
      fault(
          row,
          "T08",
          "«" + cell + "» is a bound of «" + heading.name() + "», where a number was expected",
          "leave the cell empty, or write the number to reckon with and say so in the prose");
    } else {
      fault(
          row,
          "T04",
          "«" + cell + "» stands in «" + heading.name() + "», where a number was expected",
          "write a number, or leave the cell empty where none was measured");
    }
    return Double.NaN;
  }

  private double converted(int row, Unit<?> own, Unit<?> unit) {
    String cell = scan.cell(row);
    if (own.dimension() != unit.dimension()) {
      fault(
          row,
          "T06",
          "«"
              + cell
              + "» is a "
              + own.dimension()
              + ", where «"
              + heading.name()
              + "» holds a "
              + unit.dimension()
              + " in "
              + unit.symbol(),
          "write all cells of a column in one dimension");
      return Double.NaN;
    }
    if (!own.isSame(unit)) {
      looks.mixed(own, unit);
    }
    return own.convert(units.number(cell), unit);
  }

  private Unit<?> firstUnit(int... odd) {
    for (int row : odd) {
      Optional<Unit<?>> unit = units.of(scan.cell(row));
      if (unit.isPresent()) {
        return unit.get();
      }
    }
    return Unstated.UNIT;
  }

  /** Where cells name units and the heading none, a bare number may be in any of them. */
  private void refuseBare() {
    for (int row = 0; row < rows.size(); row++) {
      if (!Double.isNaN(scan.values()[row])) {
        fault(
            row,
            "T09",
            "«"
                + scan.cell(row)
                + "» has no unit, where other cells of «"
                + heading.name()
                + "» do",
            "name the unit in the header, such as " + heading.name() + " [mD], or in each cell");
      }
    }
  }

  /** A stated fraction above 1 is a fault; a stated percentage that never passes 1 a caution. */
  private void checkFractions(double[] values, Unit<?> unit) {
    if (unit.equals(Units.percent)) {
      looks.percent(values);
    }
    for (int row = 0; unit.equals(Units.fraction) && row < values.length; row++) {
      if (values[row] > 1) {
        fault(
            row,
            "T03",
            heading.name() + " " + scan.cell(row) + " is outside 0..1",
            "in percent? name the unit in the header: " + heading.name() + " [%]");
      }
    }
  }

  private void fault(int row, String code, String message, String help) {
    faults.add(() -> fault(rows.get(row), code, message, help));
  }

  private Fault fault(Sheet.Row row, String code, String message, String help) {
    return sheet.fault(row, column, code, message, help);
  }
}
