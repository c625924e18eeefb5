package connate.figure;

import java.util.List;

/** What all figures share: they describe themselves as a plot, which is drawn. */
abstract class PlottedFigure implements Figure {

  /** Returns the description of what is drawn. */
  abstract Plot plot();

  @Override
  public final String title() {
    return plot().title();
  }

  @Override
  public final String description() {
    return plot().description();
  }

  @Override
  public final List<String> notes() {
    return plot().notes();
  }

  @Override
  public final String svg(String idPrefix) {
    return new PlotSvg(plot(), idPrefix).draw();
  }

  @Override
  public final String sketch(int columns, int rows) {
    return PlotSketch.of(plot(), columns, rows);
  }

  @Override
  public final int width() {
    return plot().width();
  }

  @Override
  public final int height() {
    return plot().height();
  }

  /** Returns the title and what to do to see the rest. */
  @Override
  public String toString() {
    return "figure: " + title();
  }
}
