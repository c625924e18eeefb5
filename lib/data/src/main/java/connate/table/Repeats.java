package connate.table;

import java.util.Arrays;

/**
 * Rows that are the same in every column as an earlier one, found without writing any of them out.
 *
 * @param count how many
 * @param first the first of them, -1 for none
 */
record Repeats(int count, int first) {

  static Repeats of(Table table) {
    int rows = table.rows();
    long[] marks = new long[rows];
    for (int row = 0; row < rows; row++) {
      marks[row] = ((long) hash(table, row) << 32) | row;
    }
    Arrays.sort(marks);
    int count = 0;
    int first = Integer.MAX_VALUE;
    int start = 0;
    for (int at = 1; at < rows; at++) {
      if (marks[at] >> 32 != marks[start] >> 32) {
        start = at;
      } else if (hasEqual(table, marks, start, at)) {
        count++;
        first = Math.min(first, (int) marks[at]);
      }
    }
    return new Repeats(count, count == 0 ? -1 : first);
  }

  /** Whether the row at a place is the same as one of those of its hash before it. */
  private static boolean hasEqual(Table table, long[] marks, int start, int at) {
    for (int before = start; before < at; before++) {
      if (isEqual(table, (int) marks[before], (int) marks[at])) {
        return true;
      }
    }
    return false;
  }

  private static boolean isEqual(Table table, int a, int b) {
    for (Column column : table.columns()) {
      boolean same =
          column.isNumeric()
              ? Double.compare(column.numbers().value(a), column.numbers().value(b)) == 0
              : java.util.Objects.equals(column.words().label(a), column.words().label(b));
      if (!same) {
        return false;
      }
    }
    return true;
  }

  private static int hash(Table table, int row) {
    int hash = 1;
    for (Column column : table.columns()) {
      hash =
          31 * hash
              + (column.isNumeric()
                  ? Double.hashCode(column.numbers().value(row))
                  : java.util.Objects.hashCode(column.words().label(row)));
    }
    // the last step spreads what differs in the high bits alone, as neighbouring depths do
    return hash * 0x9E3779B9 ^ hash >>> 15;
  }
}
