package connate.figure;

import connate.figure.svg.Lettering.Side;
import connate.figure.svg.Pen;
import connate.figure.svg.SvgCanvas;
import java.util.List;

/** Draws one panel: hairlines, layers, axes. */
final class PanelSvg {

  private static final double TICK_ROOM = 62;
  private static final double ROW_ROOM = 42;
  private static final int LONGEST_NAME = 26;

  private final SvgCanvas canvas;
  private final Panel panel;
  private final double x1;
  private final double y1;
  private final double x2;
  private final double y2;
  private final List<Tick> across;
  private final List<Tick> upright;

  PanelSvg(SvgCanvas canvas, Panel panel, double x1, double y1, double x2, double y2) {
    this.canvas = canvas;
    this.panel = panel;
    this.x1 = x1;
    this.y1 = y1;
    this.x2 = x2;
    this.y2 = y2;
    this.across = roomy(panel.x().scale());
    this.upright = panel.y().scale().ticks((int) Math.max(2, (y2 - y1) / ROW_ROOM));
  }

  /** Returns the marks of the level axis, so few that their labels do not touch. */
  private List<Tick> roomy(Scale scale) {
    for (int wanted = (int) Math.max(4, (x2 - x1) / TICK_ROOM); wanted > 1; wanted--) {
      List<Tick> ticks = scale.ticks(wanted);
      if (fits(ticks)) {
        return ticks;
      }
    }
    return scale.ticks(1);
  }

  private boolean fits(List<Tick> ticks) {
    double end = Double.NEGATIVE_INFINITY;
    double step = panel.x().reversed() ? -1 : 1;
    for (Tick tick : ticks) {
      if (tick.isMajor()) {
        double half = Theme.TICK.width(tick.power() ? "10−7" : shorten(tick.label())) * 0.54;
        double at = step * atX(tick.value());
        if (at - half < end + 4) {
          return false;
        }
        end = at + half;
      }
    }
    return true;
  }

  /** Draws everything; the upright axis only where this is the first panel. */
  void draw(boolean first) {
    boolean empty = panel.x().scale() instanceof NameScale && panel.head();
    canvas.clip(x1, y1, x2, y2);
    panel.layers().stream().filter(Layer.Zone.class::isInstance).forEach(this::layer);
    canvas.unclip();
    hairlines(empty);
    canvas.clip(x1 - 1, y1 - 1, x2 + 1, y2 + 1);
    panel.layers().stream().filter(l -> !(l instanceof Layer.Zone)).forEach(this::layer);
    canvas.unclip();
    if (!empty) {
      levelAxis();
    }
    if (first) {
      uprightAxis();
    }
  }

  private void hairlines(boolean empty) {
    if (empty) {
      return;
    }
    if (!(panel.y().scale() instanceof NameScale)) {
      for (Tick tick : upright) {
        if (tick.isMajor()) {
          canvas.line(x1, atY(tick.value()), x2, atY(tick.value()), Theme.HAIRLINE);
        }
      }
    }
    if (panel.head() || panel.y().scale() instanceof NameScale) {
      for (Tick tick : across) {
        if (tick.isMajor()) {
          canvas.line(atX(tick.value()), y1, atX(tick.value()), y2, Theme.HAIRLINE);
        }
      }
    }
  }

  private void levelAxis() {
    double base = panel.head() ? y1 : y2;
    double out = panel.head() ? -1 : 1;
    for (Tick tick : across) {
      Pen pen = tick.isMajor() ? Theme.BASE : Theme.SMALL;
      double length = out * (tick.isMajor() ? 4 : 2.5);
      canvas.line(atX(tick.value()), base, atX(tick.value()), base + length, pen);
    }
    canvas.line(x1, base, x2, base, Theme.BASE);
    double row = panel.head() ? base - 8 : base + 17;
    for (Tick tick : across) {
      label(tick, atX(tick.value()), row, Side.MIDDLE);
    }
    if (!panel.x().title().isEmpty()) {
      head(panel.head() ? base - 27 : base + 36);
    }
  }

  /** Sets the title of the level axis, smaller where a track is narrow. */
  private void head(double row) {
    String title = panel.x().title();
    if (!panel.head()) {
      double most = x2 - x1 + 20;
      String fitted = Wording.fit(title, t -> Theme.AXIS.width(t) * 1.08 <= most);
      canvas.text((x1 + x2) / 2, row, fitted, Theme.AXIS);
      return;
    }
    List<String> lines =
        Wording.wrap(title, line -> Theme.INSIDE.width(line) * 1.08 <= x2 - x1 + 8);
    for (int i = 0; i < Math.min(2, lines.size()); i++) {
      double y = row - (Math.min(2, lines.size()) - 1 - i) * 12;
      canvas.text((x1 + x2) / 2, y, lines.get(i), Theme.INSIDE);
    }
  }

  private void uprightAxis() {
    boolean names = panel.y().scale() instanceof NameScale;
    if (!names) {
      for (Tick tick : upright) {
        if (!tick.isMajor()) {
          canvas.line(x1 - 3, atY(tick.value()), x1, atY(tick.value()), Theme.SMALL);
        }
      }
    }
    for (Tick tick : upright) {
      label(tick, x1 - 7, atY(tick.value()) + 4, Side.END);
    }
  }

  private void label(Tick tick, double x, double y, Side side) {
    if (!tick.isMajor()) {
      return;
    }
    if (tick.power()) {
      canvas.powerOfTen(x, y, Integer.parseInt(tick.label()), Theme.TICK.at(side));
    } else {
      canvas.text(x, y, shorten(tick.label()), Theme.TICK.at(side));
    }
  }

  /** Returns a name that leaves room for the panel. */
  static String shorten(String name) {
    return Wording.clip(name, LONGEST_NAME);
  }

  private double atX(double value) {
    return x1 + (x2 - x1) * panel.x().at(value);
  }

  private double atY(double value) {
    return y2 + (y1 - y2) * panel.y().at(value);
  }

  private double[] atX(double... values) {
    return panel.x().at(values, x1, x2);
  }

  private double[] atY(double... values) {
    return panel.y().at(values, y2, y1);
  }

  private void layer(Layer layer) {
    if (layer instanceof Layer.Dots dots) {
      dots(dots);
    } else if (layer instanceof Layer.Stroke stroke) {
      double[][] thin = Thinning.of(atX(stroke.x()), atY(stroke.y()));
      canvas.lines(thin[0], thin[1], stroke.look().pen(stroke.width()));
    } else if (layer instanceof Layer.Ribbon ribbon) {
      ribbon(ribbon);
    } else if (layer instanceof Layer.Boxes boxes) {
      boxes(boxes);
    } else if (layer instanceof Layer.Zone zone) {
      zone(zone);
    } else if (layer instanceof Layer.Rule rule) {
      rule(rule);
    } else if (layer instanceof Layer.Words words) {
      canvas.text(
          atX(words.x()),
          atY(words.y()),
          words.text(),
          Theme.INSIDE.at(words.before() ? Side.END : Side.START));
    }
  }

  private void dots(Layer.Dots dots) {
    double[] x = atX(dots.x());
    double[] y = atY(dots.y());
    int count = 0;
    for (int i = 0; i < x.length; i++) {
      if (!Double.isNaN(x[i]) && !Double.isNaN(y[i])) {
        x[count] = x[i];
        y[count++] = y[i];
      }
    }
    canvas.points(
        java.util.Arrays.copyOf(x, count),
        java.util.Arrays.copyOf(y, count),
        dots.look().mark(),
        dots.size(),
        dots.look().colour(),
        panel.head() ? Theme.OVER_OPACITY : Theme.POINT_OPACITY);
  }

  private void ribbon(Layer.Ribbon ribbon) {
    double[] x = atX(ribbon.x());
    double[] low = atY(ribbon.low());
    double[] high = atY(ribbon.high());
    int n = 0;
    for (int i = 0; i < x.length; i++) {
      if (!Double.isNaN(x[i]) && !Double.isNaN(low[i]) && !Double.isNaN(high[i])) {
        x[n] = x[i];
        low[n] = low[i];
        high[n++] = high[i];
      }
    }
    if (n < 2) {
      return;
    }
    double[] round = new double[2 * n];
    double[] sides = new double[2 * n];
    for (int i = 0; i < n; i++) {
      round[i] = x[i];
      sides[i] = low[i];
      round[2 * n - 1 - i] = x[i];
      sides[2 * n - 1 - i] = high[i];
    }
    canvas.shape(round, sides, Pen.area(ribbon.look().colour(), Theme.BAND_OPACITY));
  }

  private void boxes(Layer.Boxes boxes) {
    Pen pen = Pen.area(boxes.look().colour(), boxes.opacity());
    for (int i = 0; i < boxes.x1().length; i++) {
      double a = panel.x().scale().holds(boxes.x1()[i]) ? atX(boxes.x1()[i]) : x1;
      double b = atX(boxes.x2()[i]);
      canvas.rectangle(a, atY(boxes.y1()[i]), b, atY(boxes.y2()[i]), pen);
    }
  }

  private void zone(Layer.Zone zone) {
    double from = atY(zone.from());
    double to = atY(zone.to());
    if (zone.shaded()) {
      canvas.rectangle(x1, from, x2, to, Pen.area(Theme.SKY, 0.14));
    }
    canvas.line(x1, from, x2, from, Theme.SMALL);
    canvas.line(x1, to, x2, to, Theme.SMALL);
    if (zone.named() && Math.abs(to - from) >= 11) {
      List<String> lines =
          Wording.wrap(zone.name(), line -> Theme.INSIDE.width(line) * 1.08 <= x2 - x1 - 4);
      int shown = (int) Math.min(lines.size(), Math.abs(to - from) / 12);
      double y = (Math.max(from, y1) + Math.min(to, y2)) / 2 + 4 - (shown - 1) * 6;
      for (int i = 0; i < shown; i++) {
        canvas.text(x1 + 3, y + i * 12, lines.get(i), Theme.INSIDE.at(Side.START));
      }
    }
  }

  private void rule(Layer.Rule rule) {
    Pen pen = rule.look().pen(1.4);
    if (rule.upright()) {
      canvas.line(atX(rule.at()), y1, atX(rule.at()), y2, pen);
    } else {
      canvas.line(x1, atY(rule.at()), x2, atY(rule.at()), pen);
    }
  }
}
