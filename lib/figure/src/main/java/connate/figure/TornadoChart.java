package connate.figure;

import connate.chance.Tornado;
import connate.quantity.Unit;
import java.util.ArrayList;
import java.util.List;

/** How far each input alone moves a result, longest bar on top. */
public final class TornadoChart extends PlottedFigure {

  private static final int ROW = 30;
  private static final int AROUND = 150;

  private final Tornado tornado;
  private final boolean log;

  private TornadoChart(Tornado tornado, boolean log) {
    this.tornado = tornado;
    this.log = log;
  }

  static TornadoChart of(Tornado tornado) {
    if (tornado.bars().isEmpty()) {
      throw new IllegalArgumentException(
          "a tornado chart of «" + tornado.result() + "» has nothing to draw: no input was varied");
    }
    return new TornadoChart(tornado, false);
  }

  /** Returns it on a log axis. */
  public TornadoChart logAxis() {
    return new TornadoChart(tornado, true);
  }

  /** Returns it on an even axis. */
  public TornadoChart linearAxis() {
    return new TornadoChart(tornado, false);
  }

  @Override
  Plot plot() {
    Unit<?> unit = tornado.base().unit();
    int n = tornado.bars().size();
    double base = tornado.base().number();
    double[] low = new double[n];
    double[] high = new double[n];
    List<String> names = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      Tornado.Bar bar = tornado.bars().get(n - 1 - i);
      names.add(bar.input());
      low[i] = bar.atLow().unit().convert(bar.atLow().number(), unit);
      high[i] = bar.atHigh().unit().convert(bar.atHigh().number(), unit);
    }
    checkLog(low, high, base);
    Scale scale = Scale.around(log, low, high, new double[] {base});
    List<Layer> layers = new ArrayList<>();
    layers.add(bars(base, low, Theme.SKY, "input at the value that 90 % exceed", '▒'));
    layers.add(bars(base, high, Theme.ORANGE, "input at the value that 10 % exceed", '█'));
    layers.add(new Layer.Rule(base, true, Look.of(0), ""));
    String quantity = Wording.axis(Wording.quantity(tornado.result(), unit), log);
    Panel panel = Panel.of(Axis.of(quantity, scale), Axis.of("", new NameScale(names)), layers);
    String note = tornado.base() + " with all inputs at their medians (upright line)";
    return new Plot(
        "What moves " + tornado.result(),
        describe(quantity, note),
        List.of(panel),
        List.of(note),
        Plot.WIDTH,
        AROUND + ROW * n);
  }

  private void checkLog(double[] low, double[] high, double base) {
    for (int i = 0; log && i < low.length; i++) {
      if (!(low[i] > 0 && high[i] > 0 && base > 0)) {
        throw new IllegalArgumentException(
            "«"
                + tornado.result()
                + "» has a bar that ends at or below 0, which no log axis holds:"
                + " draw it on an even axis");
      }
    }
  }

  private static Layer bars(double base, double[] ends, String colour, String label, char letter) {
    int n = ends.length;
    double[] from = new double[n];
    double[] bottom = new double[n];
    double[] top = new double[n];
    for (int i = 0; i < n; i++) {
      from[i] = base;
      bottom[i] = i - 0.32;
      top[i] = i + 0.32;
    }
    Look look = new Look(colour, Look.of(0).mark(), "", letter);
    return new Layer.Boxes(from, ends, bottom, top, look, 0.9, label);
  }

  private String describe(String quantity, String note) {
    StringBuilder out = new StringBuilder("Tornado chart of ").append(quantity).append(". ");
    out.append(tornado.bars().get(0).input()).append(" moves it most.");
    for (Tornado.Bar bar : tornado.bars()) {
      out.append(' ').append(bar.input()).append(": ").append(bar.atLow());
      out.append(" to ").append(bar.atHigh()).append('.');
    }
    return out.append(' ').append(note).append('.').toString();
  }
}
