package connate.figure;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.Styler;
import org.knowm.xchart.style.XYStyler;
import org.knowm.xchart.style.markers.Marker;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** Makes an XChart chart of a panel: each layer a series, each scale an axis. */
final class PngPanel {

  private static final Color HAIRLINE = new Color(0xD9D9D9);

  private final XYChart chart;
  private final Axis x;
  private final Axis y;
  private int count;

  private PngPanel(XYChart chart, Panel panel) {
    this.chart = chart;
    this.x = panel.x();
    this.y = panel.y();
  }

  static XYChart chart(Panel panel, String title, int width, int height) {
    XYChart chart =
        new XYChartBuilder()
            .width(width)
            .height(height)
            .title(title)
            .xAxisTitle(panel.x().title())
            .yAxisTitle(panel.y().title())
            .build();
    style(chart.getStyler(), panel);
    PngPanel drawn = new PngPanel(chart, panel);
    panel.layers().forEach(drawn::add);
    if (drawn.count == 0) {
      drawn.line("", new double[] {0, 1}, new double[] {0, 1}, HAIRLINE, 0.1f, "");
    }
    return chart;
  }

  private static void style(XYStyler styler, Panel panel) {
    styler.setChartBackgroundColor(Color.WHITE);
    styler.setPlotBackgroundColor(Color.WHITE);
    styler.setPlotBorderVisible(false);
    styler.setPlotGridLinesColor(HAIRLINE);
    styler.setPlotGridVerticalLinesVisible(false);
    styler.setLegendPosition(Styler.LegendPosition.OutsideS);
    styler.setLegendLayout(Styler.LegendLayout.Horizontal);
    styler.setLegendBorderColor(Color.WHITE);
    styler.setLegendVisible(panel.layers().stream().anyMatch(l -> !l.label().isEmpty()));
    styler.setAxisTicksLineVisible(false);
    styler.setXAxisLogarithmic(isLog(panel.x()));
    styler.setYAxisLogarithmic(isLog(panel.y()));
    ends(panel.x(), styler::setXAxisMin, styler::setXAxisMax);
    ends(panel.y(), styler::setYAxisMin, styler::setYAxisMax);
    if (!isPlain(panel.x())) {
      chartLabels(panel.x(), styler::setXAxisTickLabelsFormattingFunction);
    }
    if (!isPlain(panel.y())) {
      chartLabels(panel.y(), styler::setYAxisTickLabelsFormattingFunction);
    }
  }

  /** A scale that XChart has as well: linear or logarithmic, rising. */
  private static boolean isPlain(Axis axis) {
    return isLog(axis) || axis.scale() instanceof LinearScale && !axis.reversed();
  }

  private static boolean isLog(Axis axis) {
    return axis.scale().isLog() && !axis.reversed();
  }

  /** Returns where a value goes on XChart's axis: itself, or its place from 0 to 1. */
  private static double place(Axis axis, double value) {
    if (!axis.scale().holds(value)) {
      return Double.NaN;
    }
    return isPlain(axis) ? value : axis.at(value);
  }

  private static void ends(
      Axis axis,
      java.util.function.Consumer<Double> low,
      java.util.function.Consumer<Double> high) {
    low.accept(isPlain(axis) ? axis.value(0) : 0.0);
    high.accept(isPlain(axis) ? axis.value(1) : 1.0);
  }

  private static void chartLabels(
      Axis axis, java.util.function.Consumer<java.util.function.Function<Double, String>> to) {
    List<Tick> ticks = axis.scale().ticks(8).stream().filter(Tick::isMajor).toList();
    boolean linear = axis.scale() instanceof LinearScale;
    to.accept(
        at ->
            linear
                ? connate.quantity.Numbers.text(rounded(axis.value(at)))
                : ticks.stream()
                    .filter(t -> Math.abs(axis.at(t.value()) - at) < 0.06)
                    .min(Comparator.comparingDouble(t -> Math.abs(axis.at(t.value()) - at)))
                    .map(Tick::plain)
                    .orElse(""));
  }

  private static double rounded(double value) {
    return Double.parseDouble(String.format(Locale.ROOT, "%.4g", value));
  }

  private void add(Layer layer) {
    if (layer instanceof Layer.Dots dots) {
      points(dots);
    } else if (layer instanceof Layer.Stroke stroke) {
      line(
          stroke.label(),
          stroke.x(),
          stroke.y(),
          colour(stroke.look(), 255),
          (float) stroke.width(),
          stroke.look().dash());
    } else if (layer instanceof Layer.Ribbon ribbon) {
      line(ribbon.label(), ribbon.x(), ribbon.low(), colour(ribbon.look(), 120), 1f, "4 3");
      line("", ribbon.x(), ribbon.high(), colour(ribbon.look(), 120), 1f, "4 3");
    } else if (layer instanceof Layer.Boxes boxes) {
      boxes(boxes);
    } else if (layer instanceof Layer.Rule rule) {
      rule(rule);
    }
  }

  private void rule(Layer.Rule rule) {
    double[] at = {rule.at(), rule.at()};
    double[] xs = rule.upright() ? at : new double[] {x.value(0), x.value(1)};
    double[] ys = rule.upright() ? new double[] {y.value(0), y.value(1)} : at;
    line(rule.label(), xs, ys, colour(rule.look(), 255), 1f, rule.look().dash());
  }

  /** The outlines of upright rectangles, one after another. */
  private void boxes(Layer.Boxes boxes) {
    List<double[]> path = new ArrayList<>();
    for (int i = 0; i < boxes.x1().length; i++) {
      path.add(new double[] {boxes.x1()[i], boxes.y1()[i]});
      path.add(new double[] {boxes.x1()[i], boxes.y2()[i]});
      path.add(new double[] {boxes.x2()[i], boxes.y2()[i]});
      path.add(new double[] {boxes.x2()[i], boxes.y1()[i]});
    }
    line(
        boxes.label(),
        path.stream().mapToDouble(p -> p[0]).toArray(),
        path.stream().mapToDouble(p -> p[1]).toArray(),
        colour(boxes.look(), 255),
        1.4f,
        "");
  }

  private void points(Layer.Dots dots) {
    XYSeries series = series(dots.label(), dots.x(), dots.y());
    if (series != null) {
      series.setXYSeriesRenderStyle(XYSeries.XYSeriesRenderStyle.Scatter);
      series.setMarker(marker(dots.look()));
      series.setMarkerColor(colour(dots.look(), 150));
      chart.getStyler().setMarkerSize(Math.max(3, (int) Math.round(dots.size())));
    }
  }

  private void line(
      String label, double[] xs, double[] ys, Color colour, float width, String dash) {
    XYSeries series = series(label, xs, ys);
    if (series != null) {
      series.setXYSeriesRenderStyle(XYSeries.XYSeriesRenderStyle.Line);
      series.setMarker(SeriesMarkers.NONE);
      series.setLineColor(colour);
      series.setLineStyle(stroke(width, dash));
    }
  }

  private static BasicStroke stroke(float width, String dash) {
    float w = Math.max(0.1f, width);
    if (dash.isEmpty()) {
      return new BasicStroke(w);
    }
    String[] parts = dash.split(" ");
    float[] lengths = new float[parts.length];
    for (int i = 0; i < lengths.length; i++) {
      lengths[i] = Float.parseFloat(parts[i]);
    }
    return new BasicStroke(w, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10f, lengths, 0f);
  }

  /** Adds a series of the places that exist; one outside the axes would stretch them. */
  private XYSeries series(String label, double[] xs, double[] ys) {
    double[] px = new double[xs.length];
    double[] py = new double[xs.length];
    int n = 0;
    for (int i = 0; i < xs.length; i++) {
      double a = place(x, xs[i]);
      double b = place(y, ys[i]);
      if (!Double.isNaN(a) && !Double.isNaN(b) && isInside(x, xs[i]) && isInside(y, ys[i])) {
        px[n] = a;
        py[n++] = b;
      }
    }
    if (n == 0) {
      return null;
    }
    String name = label.isEmpty() ? "layer " + count : label + " ".repeat(count);
    count++;
    XYSeries series =
        chart.addSeries(name, java.util.Arrays.copyOf(px, n), java.util.Arrays.copyOf(py, n));
    series.setShowInLegend(!label.isEmpty());
    return series;
  }

  private static boolean isInside(Axis axis, double value) {
    double at = axis.at(value);
    return at >= -0.001 && at <= 1.001;
  }

  private static Color colour(Look look, int alpha) {
    Color c = Color.decode(look.colour());
    return new Color(c.getRed(), c.getGreen(), c.getBlue(), alpha);
  }

  private static Marker marker(Look look) {
    return switch (look.mark()) {
      case CIRCLE -> SeriesMarkers.CIRCLE;
      case TRIANGLE -> SeriesMarkers.TRIANGLE_UP;
      case SQUARE -> SeriesMarkers.SQUARE;
      case DIAMOND -> SeriesMarkers.DIAMOND;
      case CROSS -> SeriesMarkers.CROSS;
      case PLUS -> SeriesMarkers.PLUS;
    };
  }
}
