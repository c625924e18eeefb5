package connate.table;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.role.Role;
import connate.series.Series;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** What a reader of a column must know, though it is no fault. */
final class ColumnLooks {

  private final String file;
  private final String name;
  private final List<Sheet.Row> rows;
  private final Set<String> told = new HashSet<>();

  ColumnLooks(String file, String name, List<Sheet.Row> rows) {
    this.file = file;
    this.name = name;
    this.rows = rows;
  }

  void words(int numbers, int filled) {
    tell(
        "T23",
        " was read as words: "
            + numbers
            + " of the "
            + filled
            + " cells that are filled are numbers");
  }

  void mixed(Unit<?> own, Unit<?> unit) {
    tell("T24", " mixes units; cells in " + own + " were converted to " + unit);
  }

  void percent(double[] values) {
    double most = Double.NEGATIVE_INFINITY;
    for (double value : values) {
      most = Double.isNaN(value) ? most : Math.max(most, value);
    }
    if (most <= 1 && most > 0) {
      tell("T25", " is named in % but no value is above 1: are they fractions?");
    }
  }

  /** A mark such as -999 is in doubt where other values of the column are near it. */
  void mark(double[] values, ColumnScan scan) {
    if (scan.marked() == 0) {
      return;
    }
    double mark = Cells.number(scan.cell(scan.firstMarked()), scan.decimalComma());
    double far = mark / 2;
    for (double value : values) {
      if (mark < 0 ? value < far : value > far) {
        tell(
            "T26",
            ": "
                + scan.cell(scan.firstMarked())
                + " counts as missing, first in line "
                + rows.get(scan.firstMarked()).line()
                + ", though another value is "
                + Numbers.text(value));
        return;
      }
    }
  }

  /** Values outside of what the role is met with. */
  void range(Series series, Optional<Role> role) {
    Outliers found = Outliers.of(series, role);
    if (found.count() > 0) {
      tell("T27", " has " + found.words() + ", first in line " + rows.get(found.first()).line());
    }
  }

  private void tell(String code, String text) {
    if (told.add(code + text)) {
      Listening.caution(Caution.of(code, file + "/" + name, file + ": «" + name + "»" + text));
    }
  }
}
