package connate.figure;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Draws a plot in characters. */
final class PlotSketch {

  private static final int LEAST_COLUMNS = 30;
  private static final int LEAST_ROWS = 8;
  private static final int WIDEST_LABEL = 14;
  private static final double MOST_CELLS = 10_000;

  private final Plot plot;
  private final char[][] grid;
  private final int left;
  private final int top;
  private final int bottom;

  private PlotSketch(Plot plot, int columns, int rows) {
    this.plot = plot;
    this.grid = new char[rows][columns];
    for (char[] line : grid) {
      Arrays.fill(line, ' ');
    }
    this.left = labelWidth() + 1;
    this.top = 0;
    this.bottom = rows - 3;
  }

  static String of(Plot plot, int columns, int rows) {
    List<String> words = new ArrayList<>();
    int width = Math.max(LEAST_COLUMNS, columns);
    words.add(Wording.clip(plot.title(), width));
    keys(plot, width, words);
    List<String> notes =
        plot.notes().stream()
            .flatMap(n -> Wording.wrap(n, line -> line.length() <= width).stream())
            .toList();
    String upright = plot.panels().get(0).y().title();
    if (!upright.isEmpty()) {
      words.add(Wording.clip(upright, width));
    }
    int room = Math.max(LEAST_ROWS, rows - words.size() - notes.size());
    PlotSketch sketch = new PlotSketch(plot, width, room);
    sketch.draw();
    words.addAll(sketch.lines());
    words.addAll(notes);
    return words.stream().map(PlotSketch::printable).reduce((a, b) -> a + "\n" + b).orElse("");
  }

  private static String printable(String line) {
    return line.replaceAll("[\\p{Cntrl}\\u202A-\\u202E\\u2066-\\u2069]", "?").stripTrailing();
  }

  private static void keys(Plot plot, int width, List<String> words) {
    StringBuilder key = new StringBuilder();
    for (Layer layer : plot.inKey()) {
      if (!(layer instanceof Layer.Ribbon)) {
        key.append(key.isEmpty() ? "" : "   ").append(letter(layer)).append(' ');
        key.append(layer.label());
      }
    }
    words.addAll(Wording.wrap(key.toString(), line -> line.length() <= width));
  }

  private static char letter(Layer layer) {
    if (layer instanceof Layer.Dots dots) {
      return dots.look().letter();
    }
    if (layer instanceof Layer.Stroke stroke) {
      return stroke.look().letter();
    }
    return layer instanceof Layer.Boxes boxes ? boxes.look().letter() : '|';
  }

  private int labelWidth() {
    int widest = 1;
    for (Tick tick : plot.panels().get(0).y().scale().ticks(5)) {
      widest = Math.max(widest, Math.min(WIDEST_LABEL, tick.plain().length()));
    }
    return widest;
  }

  private void draw() {
    int panels = plot.panels().size();
    double weights = plot.panels().stream().mapToDouble(Panel::weight).sum();
    double from = left + 1.0;
    double room = grid[0].length - from - (panels - 1);
    for (int i = 0; i < panels; i++) {
      Panel panel = plot.panels().get(i);
      double width = room * panel.weight() / weights;
      panel(panel, (int) from, (int) (from + width) - 1, i == 0);
      from += width + 1;
    }
  }

  private void panel(Panel panel, int first, int last, boolean withLabels) {
    for (int row = top; row <= bottom; row++) {
      put(row, first - 1, '│');
    }
    for (int column = first; column <= last; column++) {
      put(bottom, column, '─');
    }
    put(bottom, first - 1, '└');
    panel.layers().forEach(layer -> layer(panel, layer, first, last));
    if (withLabels) {
      labels(panel.y());
    }
    ticks(panel.x(), first, last);
    String title = Wording.clip(panel.x().title(), Math.max(4, last - first + 1));
    write(bottom + 2, first + Math.max(0, (last - first + 1 - title.length()) / 2), title);
  }

  private void labels(Axis y) {
    for (Tick tick : y.scale().ticks(Math.max(2, (bottom - top) / 3))) {
      double at = y.at(tick.value());
      if (tick.isMajor() && at >= 0 && at <= 1) {
        String words = Wording.clip(tick.plain(), WIDEST_LABEL);
        write(row(at), left - 1 - words.length(), words);
        put(row(at), left, '┤');
      }
    }
  }

  private void ticks(Axis x, int first, int last) {
    int end = -1;
    List<Tick> ticks = new ArrayList<>(x.scale().ticks(Math.max(2, (last - first) / 10)));
    if (x.reversed()) {
      java.util.Collections.reverse(ticks);
    }
    for (Tick tick : ticks) {
      double at = x.at(tick.value());
      if (!tick.isMajor() || at < 0 || at > 1) {
        continue;
      }
      int column = column(at, first, last);
      put(bottom, column, '┴');
      int start = Math.max(first - 1, column - tick.plain().length() / 2);
      start = Math.min(start, last + 1 - tick.plain().length());
      if (start > end && start >= 0) {
        write(bottom + 1, start, tick.plain());
        end = start + tick.plain().length();
      }
    }
  }

  private void layer(Panel panel, Layer layer, int first, int last) {
    if (layer instanceof Layer.Dots dots) {
      for (int i = 0; i < dots.x().length; i++) {
        mark(panel, dots.x()[i], dots.y()[i], first, last, dots.look().letter());
      }
    } else if (layer instanceof Layer.Stroke stroke) {
      stroke(panel, stroke, first, last);
    } else if (layer instanceof Layer.Boxes boxes) {
      for (int i = 0; i < boxes.x1().length; i++) {
        box(panel, boxes, i, first, last);
      }
    } else if (layer instanceof Layer.Rule rule) {
      rule(panel, rule, first, last);
    } else if (layer instanceof Layer.Zone zone && zone.named()) {
      zone(panel, zone, first, last);
    }
  }

  private void mark(Panel panel, double x, double y, int first, int last, char c) {
    if (panel.x().scale().holds(x) && panel.y().scale().holds(y)) {
      double across = panel.x().at(x);
      double up = panel.y().at(y);
      if (across >= 0 && across <= 1 && up >= 0 && up <= 1) {
        put(row(up), column(across, first, last), c);
      }
    }
  }

  /** Draws a line cell by cell, so that it is straight where the axes make it so. */
  private void stroke(Panel panel, Layer.Stroke stroke, int first, int last) {
    double[] x = panel.x().at(stroke.x(), first, last);
    double[] y = panel.y().at(stroke.y(), bottom - 1.0, top);
    for (int i = 1; i < x.length; i++) {
      double longest = Math.max(Math.abs(x[i] - x[i - 1]), Math.abs(y[i] - y[i - 1]));
      if (!(longest < MOST_CELLS)) {
        continue;
      }
      int steps = (int) Math.max(1, Math.ceil(longest));
      for (int step = 0; step <= steps; step++) {
        double t = step / (double) steps;
        long column = Math.round(x[i - 1] + t * (x[i] - x[i - 1]));
        long row = Math.round(y[i - 1] + t * (y[i] - y[i - 1]));
        if (column >= first && column <= last && row >= top && row < bottom) {
          put((int) row, (int) column, stroke.look().letter());
        }
      }
    }
  }

  private void box(Panel panel, Layer.Boxes boxes, int i, int first, int last) {
    double from = panel.x().scale().holds(boxes.x1()[i]) ? panel.x().at(boxes.x1()[i]) : 0;
    double to = panel.x().at(boxes.x2()[i]);
    int low = row(Math.max(0, Math.min(1, panel.y().at(boxes.y1()[i]))));
    int high = row(Math.max(0, Math.min(1, panel.y().at(boxes.y2()[i]))));
    if (low == high && boxes.y1()[i] == boxes.y2()[i]) {
      return;
    }
    int a = column(Math.min(from, to), first, last);
    int b = Math.max(a, column(Math.max(from, to), first, last) - 1);
    for (int row = Math.min(low, high); row <= Math.max(low, high); row++) {
      for (int column = Math.max(first, a); column <= Math.min(last, b); column++) {
        put(row, column, boxes.look().letter());
      }
    }
  }

  private void rule(Panel panel, Layer.Rule rule, int first, int last) {
    if (rule.upright()) {
      for (int row = top; row < bottom; row++) {
        put(row, column(panel.x().at(rule.at()), first, last), '|');
      }
    }
  }

  private void zone(Panel panel, Layer.Zone zone, int first, int last) {
    double middle = (panel.y().at(zone.from()) + panel.y().at(zone.to())) / 2;
    if (middle >= 0 && middle <= 1) {
      write(row(middle), first, Wording.clip(zone.name(), Math.max(2, last - first + 1)));
    }
  }

  private int column(double at, int first, int last) {
    return first + (int) Math.round(at * (last - first));
  }

  private int row(double at) {
    return (int) Math.round(bottom - 1 - at * (bottom - 1 - top));
  }

  private void put(int row, int column, char c) {
    if (row >= 0 && row < grid.length && column >= 0 && column < grid[0].length) {
      grid[row][column] = c;
    }
  }

  private void write(int row, int column, String words) {
    for (int i = 0; i < words.length(); i++) {
      put(row, column + i, words.charAt(i));
    }
  }

  private List<String> lines() {
    return Arrays.stream(grid).map(String::new).toList();
  }
}
