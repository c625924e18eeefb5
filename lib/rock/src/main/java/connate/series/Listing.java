package connate.series;

import connate.quantity.Numbers;
import connate.quantity.Quantity;
import connate.quantity.Unit;
import java.util.ArrayList;
import java.util.List;

/**
 * A small table of results, ready to be shown.
 *
 * @param caption one line above
 * @param heads the columns
 * @param rows the cells: a Double, a Quantity, an Integer or a text; {@code null} where empty
 * @param total the number of rows, which may be larger than those shown
 * @param notes lines beneath
 */
public record Listing(
    String caption, List<Head> heads, List<List<Object>> rows, int total, List<String> notes)
    implements Listed {

  /**
   * A column.
   *
   * @param name the name
   * @param unit the unit in which its quantities are written, {@code null} for none
   */
  public record Head(String name, Unit<?> unit) {}

  /** Starts a table. */
  public static Builder titled(String caption) {
    return new Builder(caption);
  }

  @Override
  public Listing listing() {
    return this;
  }

  /** Returns a cell as text: numbers with four digits, quantities in the column's unit. */
  public String text(int row, int column) {
    Object cell = rows.get(row).get(column);
    if (cell == null) {
      return "";
    }
    if (cell instanceof Double number) {
      return Double.isNaN(number) ? "" : Numbers.text(number);
    }
    if (cell instanceof Quantity<?> quantity) {
      return write(quantity, heads.get(column).unit());
    }
    return cell.toString();
  }

  /** Returns whether a column holds numbers. */
  public boolean isNumeric(int column) {
    return rows.stream()
        .map(r -> r.get(column))
        .allMatch(c -> c == null || c instanceof Number || c instanceof Quantity<?>);
  }

  private static String write(Quantity<?> quantity, Unit<?> unit) {
    return unit != null && unit.dimension() == quantity.unit().dimension()
        ? Numbers.text(quantity.unit().convert(quantity.number(), unit))
        : quantity.toString();
  }

  @Override
  public String toString() {
    return ListingText.of(this);
  }

  /** Collects columns and rows. */
  public static final class Builder {
    private final String caption;
    private final List<Head> heads = new ArrayList<>();
    private final List<List<Object>> rows = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();

    private Builder(String caption) {
      this.caption = caption;
    }

    /** Adds a column without a unit. */
    public Builder column(String name) {
      return column(name, null);
    }

    /** Adds a column of quantities, written in a unit. */
    public Builder column(String name, Unit<?> unit) {
      heads.add(new Head(name, unit));
      return this;
    }

    /** Adds a row with a cell for each column. */
    public Builder row(Object... cells) {
      if (cells.length != heads.size()) {
        throw new IllegalArgumentException(
            "a row of " + cells.length + " cells under " + heads.size() + " columns");
      }
      List<Object> row = new ArrayList<>();
      for (Object cell : cells) {
        row.add(cell);
      }
      rows.add(row);
      return this;
    }

    /** Adds a line beneath the table. */
    public Builder note(String line) {
      notes.add(line);
      return this;
    }

    /** Returns the table. */
    public Listing build() {
      return build(rows.size());
    }

    /** Returns the table, of which the rows are only the first of a total. */
    public Listing build(int total) {
      return new Listing(caption, List.copyOf(heads), List.copyOf(rows), total, List.copyOf(notes));
    }
  }
}
