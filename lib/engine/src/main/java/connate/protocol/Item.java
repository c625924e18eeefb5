package connate.protocol;

import java.util.List;

/**
 * A value as data: what the engine makes of a result and the kernel writes into the log or the
 * console. No markup crosses, except a figure's SVG, which the kernel checks before it uses it.
 */
public sealed interface Item {

  /** Plain text, possibly of several lines. */
  record Text(String text) implements Item {}

  /**
   * One number with its unit and, where known, its range.
   *
   * @param kind the quantity's name, such as {@code permeability}, or {@code number}
   * @param value the number in {@code unit}; NaN where missing
   * @param unit the unit's symbol, empty for a pure number
   * @param low the low end of the range, NaN where none is stated
   * @param high the high end of the range, NaN where none is stated
   * @param range what the range means, such as {@code 80 %}, empty where none is stated
   * @param count the number of samples behind the value, 0 where it does not apply
   * @param text the value as a person reads it, range included
   */
  record Measure(
      String kind,
      double value,
      String unit,
      double low,
      double high,
      String range,
      int count,
      String text)
      implements Item {}

  /**
   * A table, cut where it is long.
   *
   * @param caption one line above the table
   * @param heads the columns
   * @param rows the cells as text, at most as many as are shown
   * @param total the number of rows before the cut
   * @param notes lines beneath: ranges, nulls, duplicates, what needs a look
   */
  record Grid(
      String caption, List<Head> heads, List<List<String>> rows, int total, List<String> notes)
      implements Item {}

  /**
   * A column of a {@link Grid}.
   *
   * @param name the column's name
   * @param unit the unit's symbol, empty where none
   * @param numeric whether the cells are numbers, set flush right
   */
  record Head(String name, String unit, boolean numeric) {}

  /**
   * A figure.
   *
   * @param svg the drawing, untrusted until the kernel has checked it
   * @param title what the figure shows
   * @param description finding and range, for readers who cannot see it
   * @param notes lines beneath: n, what was dropped
   * @param sketch the figure as text for terminals without pictures
   */
  record Picture(String svg, String title, String description, List<String> notes, String sketch)
      implements Item {}

  /** Several items shown together, in order. */
  record Group(List<Item> items) implements Item {}
}
