package connate.table;

import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.StringColumn;

/** Makes a Tablesaw table of a table. Everything that touches Tablesaw stands here. */
final class TablesawView {

  private TablesawView() {}

  static tech.tablesaw.api.Table of(Table table) {
    tech.tablesaw.api.Table out = tech.tablesaw.api.Table.create(table.name());
    for (Column column : table.columns()) {
      if (column.isNumeric()) {
        out.addColumns(DoubleColumn.create(column.name(), column.numbers().values()));
      } else {
        StringColumn words = StringColumn.create(column.name());
        for (int row = 0; row < table.rows(); row++) {
          words.append(column.words().label(row));
        }
        out.addColumns(words);
      }
    }
    return out;
  }
}
