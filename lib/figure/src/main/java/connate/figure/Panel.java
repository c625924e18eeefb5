package connate.figure;

import java.util.List;

/**
 * A field with two axes and what stands in it, the lowest layer first.
 *
 * @param x the level axis
 * @param y the upright axis
 * @param layers what stands in it
 * @param weight its part of the width, against the other panels
 * @param head whether the level axis stands above, as over a depth track
 */
record Panel(Axis x, Axis y, List<Layer> layers, double weight, boolean head) {

  Panel {
    layers = List.copyOf(layers);
  }

  static Panel of(Axis x, Axis y, List<Layer> layers) {
    return new Panel(x, y, layers, 1, false);
  }
}
