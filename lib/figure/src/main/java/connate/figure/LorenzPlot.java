package connate.figure;

import connate.heterogeneity.Lorenz;
import connate.quantity.Numbers;
import java.util.ArrayList;
import java.util.List;

/** Flow capacity over storage capacity, with the line of a uniform rock. */
public final class LorenzPlot extends PlottedFigure {

  private static final int MOST_POINTS = 60;

  private final Lorenz lorenz;

  private LorenzPlot(Lorenz lorenz) {
    this.lorenz = lorenz;
  }

  static LorenzPlot of(Lorenz lorenz) {
    return new LorenzPlot(lorenz);
  }

  @Override
  Plot plot() {
    double[] storage = lorenz.storage().values();
    double[] flow = lorenz.flow().values();
    double[] ends = {0, 1};
    List<Layer> layers = new ArrayList<>();
    layers.add(new Layer.Ribbon(storage, storage, flow, Look.of(1), ""));
    layers.add(
        new Layer.Stroke(
            ends,
            ends,
            new Look(Theme.LINES[0], Look.of(0).mark(), "7 3", '·'),
            1.2,
            "uniform rock"));
    String label = lorenz.isByDepth() ? "layers from the top down" : "layers, fastest first";
    layers.add(new Layer.Stroke(storage, flow, Look.of(1).whole(), Theme.LINE, label));
    if (storage.length <= MOST_POINTS) {
      layers.add(new Layer.Dots(storage, flow, Look.of(1).round(), Theme.POINT + 1, ""));
    }
    Scale whole = new LinearScale(0, 1);
    Panel panel =
        Panel.of(
            Axis.of("storage capacity, cumulative (fraction)", whole),
            Axis.of("flow capacity, cumulative (fraction)", whole),
            layers);
    int n = storage.length - 1;
    String note =
        "n = "
            + Wording.count(n, "layer")
            + "; Lorenz coefficient "
            + Numbers.text(StrictMath.rint(lorenz.coefficient().value() * 1000) / 1000);
    String words =
        "Lorenz plot: cumulative flow capacity over cumulative storage capacity, each from 0 to 1. "
            + "The first half of the storage carries "
            + Numbers.text(StrictMath.rint(1000 * half(storage, flow)) / 10)
            + " % of the flow. "
            + note
            + ".";
    return new Plot(
        "Flow capacity against storage capacity", words, List.of(panel), List.of(note), 500, 500);
  }

  /** Returns the flow capacity at half the storage capacity. */
  private static double half(double[] storage, double[] flow) {
    for (int i = 1; i < storage.length; i++) {
      if (storage[i] >= 0.5) {
        double part = (0.5 - storage[i - 1]) / (storage[i] - storage[i - 1]);
        return flow[i - 1] + part * (flow[i] - flow[i - 1]);
      }
    }
    return 1;
  }
}
