package connate.table;

import connate.fault.Fault;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Labels;
import connate.series.Series;
import connate.series.Unstated;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Decides whether a column holds numbers or words. It holds numbers where four of five cells that
 * are not empty are numbers; the others are then faults, told with their places.
 */
final class ColumnReader {

  private static final double GREAT_MAJORITY = 0.8;
  private static final Set<String> WORDS = Set.of("well", "zone", "facies");

  private final Sheet sheet;
  private final Heading heading;
  private final List<Sheet.Row> rows;
  private final int column;
  private final List<Fault> faults = new ArrayList<>();

  ColumnReader(Sheet sheet, Heading heading, List<Sheet.Row> rows, int column) {
    this.sheet = sheet;
    this.heading = heading;
    this.rows = rows;
    this.column = column;
  }

  List<Fault> faults() {
    return faults;
  }

  Column read() {
    int filled = 0;
    int numbers = 0;
    int withUnit = 0;
    boolean padded = false;
    for (Sheet.Row row : rows) {
      String cell = row.cell(column);
      if (!Cells.isMissing(cell)) {
        filled++;
        padded |= Cells.isPadded(cell);
        if (!Double.isNaN(number(cell))) {
          numbers++;
        } else if (unitOf(cell).isPresent()) {
          withUnit++;
        }
      }
    }
    boolean named = role().map(r -> WORDS.contains(r.name())).orElse(false);
    boolean words = padded || named && heading.symbol().isEmpty();
    if (words
        || numbers + withUnit < GREAT_MAJORITY * filled
        || filled == 0 && heading.symbol().isEmpty()) {
      return Column.of(words(numbers, filled, words));
    }
    return Column.of(numbers(withUnit));
  }

  private Optional<Role> role() {
    return Roles.find(heading.name(), heading.symbol());
  }

  private double number(String cell) {
    return Cells.number(cell, sheet.decimalComma());
  }

  private Labels words(int numbers, int filled, boolean meant) {
    if (!meant && numbers > 0 && numbers > filled / 5) {
      Listening.caution(
          Caution.of(
              "T23",
              sheet.file(),
              sheet.file()
                  + ": «"
                  + heading.name()
                  + "» was read as words, though "
                  + numbers
                  + " of its "
                  + filled
                  + " cells are numbers"));
    }
    String[] words = new String[rows.size()];
    for (int row = 0; row < words.length; row++) {
      String cell = rows.get(row).cell(column);
      words[row] = cell.isEmpty() ? null : cell;
    }
    return Labels.of(heading.name(), words);
  }

  private Series numbers(int withUnit) {
    Unit<?> unit = withUnit > 0 && heading.symbol().isEmpty() ? firstUnit() : heading.unit();
    double[] values = new double[rows.size()];
    for (int row = 0; row < values.length; row++) {
      String cell = rows.get(row).cell(column);
      values[row] = Cells.isMissing(cell) ? Double.NaN : value(rows.get(row), cell, unit);
    }
    checkFractions(values, unit);
    return Series.over(heading.name(), unit, values, null);
  }

  private double value(Sheet.Row row, String cell, Unit<?> unit) {
    double number = number(cell);
    if (!Double.isNaN(number)) {
      return number;
    }
    Optional<Unit<?>> own = unitOf(cell);
    if (own.isPresent()) {
      return converted(row, cell, own.get(), unit);
    }
    fault(
        row,
        "T04",
        "«" + cell + "» stands in «" + heading.name() + "», where a number was expected",
        "write a number, or leave the cell empty where none was measured");
    return Double.NaN;
  }

  private double converted(Sheet.Row row, String cell, Unit<?> own, Unit<?> unit) {
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
      Listening.caution(
          Caution.of(
              "T24",
              sheet.file() + "/" + heading.name() + "/" + own.symbol(),
              sheet.file()
                  + ": «"
                  + heading.name()
                  + "» mixes units; cells in "
                  + own.symbol()
                  + " were converted to "
                  + unit.symbol()));
    }
    double number = number(cell.substring(0, Cells.numberEnd(cell, sheet.decimalComma())));
    return own.convert(number, unit);
  }

  private Unit<?> firstUnit() {
    return rows.stream()
        .map(r -> unitOf(r.cell(column)))
        .flatMap(Optional::stream)
        .findFirst()
        .orElse(Unstated.UNIT);
  }

  /** Returns the unit behind the number with which a cell begins. */
  private Optional<Unit<?>> unitOf(String cell) {
    int end = Cells.numberEnd(cell, sheet.decimalComma());
    return end == 0 || end == cell.length()
        ? Optional.empty()
        : Heading.find(heading.name(), cell.substring(end).strip());
  }

  /** A stated fraction above 1 is a fault; a stated percentage that never passes 1 a caution. */
  private void checkFractions(double[] values, Unit<?> unit) {
    if (unit.dimension() != Fraction.DIMENSION) {
      return;
    }
    double most = Double.NEGATIVE_INFINITY;
    for (int row = 0; row < values.length; row++) {
      double value = values[row];
      most = Double.isNaN(value) ? most : Math.max(most, value);
      if (unit.equals(Units.fraction) && value > 1 && faults.size() < 20) {
        fault(
            rows.get(row),
            "T03",
            heading.name() + " " + Numbers.text(value) + " is outside 0..1",
            "in percent? name the unit in the header: " + heading.name() + " [%]");
      }
    }
    if (unit.equals(Units.percent) && most <= 1 && most > 0) {
      Listening.caution(
          Caution.of(
              "T25",
              sheet.file(),
              sheet.file()
                  + ": «"
                  + heading.name()
                  + "» is named in % but no value is above 1: are"
                  + " they fractions?"));
    }
  }

  private void fault(Sheet.Row row, String code, String message, String help) {
    faults.add(sheet.fault(row, column, code, message, help));
  }
}
