package connate.figure;

import connate.series.Series;

/** Where figures start. */
public final class Figures {

  private Figures() {}

  /** Returns y against x, row by row. */
  public static Crossplot crossplot(Series x, Series y) {
    return Crossplot.of(x, y);
  }

  /** Returns how often the values of a column fall into bins. */
  public static Histogram histogram(Series values) {
    return Histogram.of(values);
  }

  /**
   * Returns logs side by side, each in a track; with none the tracks are added one by one.
   *
   * @param logs columns that know the depth of their rows
   */
  public static DepthPlot depthPlot(Series... logs) {
    return DepthPlot.of(logs);
  }
}
