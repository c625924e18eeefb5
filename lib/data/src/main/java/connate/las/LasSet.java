package connate.las;

import java.util.List;
import java.util.Objects;

/**
 * A data set of a version 3.0 file beside the log: tops, cores, a survey, or one of the vendor's.
 *
 * @param name the name, such as {@code Tops}
 * @param parameters its parameters
 * @param columns its columns
 * @param rows its rows; an item that is empty or equals the null value is empty
 */
public record LasSet(
    String name, List<HeaderLine> parameters, List<HeaderLine> columns, List<List<String>> rows) {

  /** Copies the lists. */
  public LasSet {
    Objects.requireNonNull(name, "name");
    parameters = List.copyOf(parameters);
    columns = List.copyOf(columns);
    rows = rows.stream().map(List::copyOf).toList();
  }

  /**
   * Returns a column's items.
   *
   * @param mnemonic the column's name, in capitals or not
   * @throws IllegalArgumentException if there is no such column
   */
  public List<String> column(String mnemonic) {
    for (int i = 0; i < columns.size(); i++) {
      if (columns.get(i).isNamed(mnemonic)) {
        int at = i;
        return rows.stream().map(r -> r.get(at)).toList();
      }
    }
    throw new IllegalArgumentException(
        name
            + " has no column "
            + mnemonic
            + "; it has "
            + String.join(", ", columns.stream().map(HeaderLine::mnemonic).toList()));
  }
}
