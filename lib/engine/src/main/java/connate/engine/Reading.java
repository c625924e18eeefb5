package connate.engine;

import connate.las.LasFile;
import connate.series.Series;
import connate.series.Unstated;
import connate.table.Table;
import connate.well.Well;
import java.util.ArrayList;
import java.util.List;

/** Makes of an input what the workbook calls for, and tells what was found in it. */
final class Reading {

  private Reading() {}

  static Table table(Inputs.Input input, String sheet, Teller teller) {
    Table table = Table.read(input.name(), input.content(), sheet);
    List<String> mapping = new ArrayList<>();
    for (String name : table.names()) {
      mapping.add(table.describe(name));
    }
    input.told(teller, table.rows(), mapping);
    return table;
  }

  static Well well(Inputs.Input input, Teller teller) {
    Well well = Well.of(LasFile.parse(input.name(), input.content()));
    List<String> mapping = new ArrayList<>();
    mapping.add("well " + well.name() + ", depth" + in(well.depth()));
    for (Series curve : well.curves().values()) {
      mapping.add(curve.name() + in(curve));
    }
    input.told(teller, well.rows(), mapping);
    return well;
  }

  private static String in(Series series) {
    return series.unit() == Unstated.UNIT ? ", no unit" : " in " + series.unit().symbol();
  }
}
