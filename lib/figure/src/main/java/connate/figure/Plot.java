package connate.figure;

import java.util.Comparator;
import java.util.List;

/**
 * What is drawn: panels side by side with words around them.
 *
 * @param title what it shows
 * @param description what is to be seen
 * @param panels from left to right; all after the first share its upright axis
 * @param notes lines beneath
 * @param width in pixels
 * @param height in pixels
 */
record Plot(
    String title,
    String description,
    List<Panel> panels,
    List<String> notes,
    int width,
    int height) {

  /** The usual size. */
  static final int WIDTH = 640;

  static final int HEIGHT = 430;

  Plot {
    panels = List.copyOf(panels);
    notes = List.copyOf(notes);
  }

  static Plot of(String title, String description, Panel panel, List<String> notes) {
    return new Plot(title, description, List.of(panel), notes, WIDTH, HEIGHT);
  }

  /** Returns the layers that the key names: points, then lines, then areas. */
  List<Layer> inKey() {
    return panels.stream()
        .flatMap(panel -> panel.layers().stream())
        .filter(layer -> !layer.label().isEmpty())
        .sorted(Comparator.comparingInt(Plot::rank))
        .toList();
  }

  private static int rank(Layer layer) {
    return layer instanceof Layer.Dots ? 0 : layer instanceof Layer.Ribbon ? 2 : 1;
  }
}
