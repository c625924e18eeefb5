package connate.figure;

import java.util.List;

/** A figure: drawn as SVG for a page, or as a sketch in text for a terminal. */
public interface Figure {

  /** Returns what the figure shows, in one line. */
  String title();

  /** Returns what is to be seen, for those who do not see it: kind, axes, ranges, finding. */
  String description();

  /** Returns the lines beneath the figure: how many rows, and what was not drawn. */
  List<String> notes();

  /**
   * Returns the figure as one {@code <svg>} element.
   *
   * @param idPrefix the start of every id in it: a letter, then letters, digits, - and _; different
   *     for each figure of one page
   */
  String svg(String idPrefix);

  /**
   * Returns the figure as lines of text.
   *
   * @param columns the width in characters
   * @param rows the height in lines
   */
  String sketch(int columns, int rows);

  /** Returns the width in pixels. */
  int width();

  /** Returns the height in pixels. */
  int height();
}
