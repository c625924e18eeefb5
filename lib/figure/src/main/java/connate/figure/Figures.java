package connate.figure;

import connate.chance.Runs;
import connate.chance.Tornado;
import connate.heterogeneity.Lorenz;
import connate.series.Labels;
import connate.series.Series;
import connate.well.Well;

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

  /**
   * Returns the logs of a well: those that are asked for with {@link DepthPlot#track(String,
   * Series...)}, or else those that a well is usually looked at by.
   */
  public static DepthPlot depthPlot(Well well) {
    return DepthPlot.of(well);
  }

  /**
   * Returns columns as lines over another.
   *
   * @param x the common column
   * @param columns columns of one dimension, drawn in the unit of the first
   */
  public static CurvePlot curves(Series x, Series... columns) {
    return CurvePlot.of(x, columns);
  }

  /** Returns the values of a column on the scale of a normal law. */
  public static ProbabilityPlot probabilityPlot(Series values) {
    return ProbabilityPlot.of(values);
  }

  /** Returns how far each input moves a result. */
  public static TornadoChart tornado(Tornado tornado) {
    return TornadoChart.of(tornado);
  }

  /** Returns how far each input of a simulation moves one of its results. */
  public static TornadoChart tornado(Runs runs, String result) {
    return TornadoChart.of(Tornado.of(runs, result));
  }

  /** Returns flow capacity over storage capacity. */
  public static LorenzPlot lorenzPlot(Lorenz lorenz) {
    return LorenzPlot.of(lorenz);
  }

  /** Returns named values side by side, the first on top. */
  public static BarChart bars(Labels names, Series values) {
    return BarChart.of(names, values);
  }

  /** Returns the spread of a column in each group. */
  public static BoxPlot boxes(Series values, Labels groups) {
    return BoxPlot.of(values, groups);
  }
}
