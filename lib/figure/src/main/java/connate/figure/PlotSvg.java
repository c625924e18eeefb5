package connate.figure;

import connate.figure.svg.Lettering;
import connate.figure.svg.Lettering.Side;
import connate.figure.svg.SvgCanvas;
import java.util.ArrayList;
import java.util.List;

/** Lays a plot out on a page and draws its words; {@link PanelSvg} draws what stands inside. */
final class PlotSvg {

  private static final double EDGE = 12;
  private static final double TITLE_ROW = 19;
  private static final double KEY_ROW = 18;
  private static final double NOTE_ROW = 16;
  private static final double SAMPLE = 22;
  private static final double GAP = 14;

  /** Room for a sans-serif that is wider than the one measured with. */
  private static final double SPARE = 1.08;

  private final Plot plot;
  private final SvgCanvas canvas;
  private final List<Key> keys = new ArrayList<>();
  private final List<String> titleLines;
  private final List<String> noteLines;

  PlotSvg(Plot plot, String prefix) {
    this.plot = plot;
    this.titleLines = wrap(plot.title(), Theme.TITLE);
    this.noteLines = plot.notes().stream().flatMap(n -> wrap(n, Theme.NOTE).stream()).toList();
    double keyRows = placeKeys();
    double left = left();
    double top = EDGE + titleLines.size() * TITLE_ROW + keyRows * KEY_ROW + 6;
    double bottom = plot.height() - EDGE - noteLines.size() * NOTE_ROW;
    this.canvas = new SvgCanvas(plot.width(), plot.height(), prefix);
    drawPanels(left, top, bottom);
    drawWords(bottom);
  }

  private record Key(Layer layer, double x, int row) {}

  String draw() {
    return canvas.finish(plot.title(), plot.description());
  }

  private void drawPanels(double left, double top, double bottom) {
    boolean head = plot.panels().stream().anyMatch(Panel::head);
    double y1 = top + (head ? 42 : 0);
    double y2 = bottom - (head ? 8 : 42);
    double weights = plot.panels().stream().mapToDouble(Panel::weight).sum();
    double gaps = (plot.panels().size() - 1) * GAP;
    double room = plot.width() - left - right() - gaps;
    double x = left;
    for (Panel panel : plot.panels()) {
      double width = room * panel.weight() / weights;
      PanelSvg drawn = new PanelSvg(canvas, panel, x, y1, x + width, y2);
      drawn.draw(x == left);
      x += width + GAP;
    }
    Axis y = plot.panels().get(0).y();
    if (!y.title().isEmpty()) {
      double most = plot.height() - 2 * EDGE - 8;
      String title = Wording.fit(y.title(), t -> Theme.AXIS.width(t) * SPARE <= most);
      double half = Theme.AXIS.width(title) * SPARE / 2;
      double middle = Math.min(Math.max((y1 + y2) / 2, EDGE + half), plot.height() - EDGE - half);
      canvas.textUpwards(EDGE + 8, middle, title, Theme.AXIS);
    }
  }

  private double left() {
    Axis y = plot.panels().get(0).y();
    double widest = 0;
    for (Tick tick : y.scale().ticks(8)) {
      String words = tick.power() ? "10−77" : tick.label();
      widest = Math.max(widest, Theme.TICK.width(PanelSvg.shorten(words)));
    }
    return EDGE + (y.title().isEmpty() ? 0 : 22) + widest * SPARE + 8;
  }

  private double right() {
    Panel last = plot.panels().get(plot.panels().size() - 1);
    return last.head() ? 20 : 24;
  }

  /** Places the key's entries in rows under the title and returns how many rows they need. */
  private double placeKeys() {
    double x = EDGE;
    int row = 0;
    for (Layer layer : plot.inKey()) {
      double width = SAMPLE + 6 + Theme.LEGEND.width(keyWords(layer)) * SPARE + 16;
      if (x > EDGE && x + width > plot.width() - EDGE) {
        x = EDGE;
        row++;
      }
      keys.add(new Key(layer, x, row));
      x += width;
    }
    return keys.isEmpty() ? 0 : row + 1.3;
  }

  private static String keyWords(Layer layer) {
    return Wording.clip(layer.label(), 80);
  }

  private void drawWords(double bottom) {
    double y = EDGE + 4;
    for (String line : titleLines) {
      canvas.text(EDGE, y + 8, line, Theme.TITLE);
      y += TITLE_ROW;
    }
    for (Key key : keys) {
      double base = y + 10 + key.row() * KEY_ROW;
      KeySample.draw(canvas, key.layer(), key.x(), base - 4, SAMPLE);
      canvas.text(key.x() + SAMPLE + 6, base, keyWords(key.layer()), Theme.LEGEND);
    }
    double note = bottom + 12;
    for (String line : noteLines) {
      canvas.text(EDGE, note, line, Theme.NOTE.at(Side.START));
      note += NOTE_ROW;
    }
  }

  private List<String> wrap(String text, Lettering lettering) {
    return Wording.wrap(text, line -> lettering.width(line) * SPARE <= plot.width() - 2 * EDGE);
  }
}
