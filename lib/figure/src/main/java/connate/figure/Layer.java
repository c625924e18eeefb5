package connate.figure;

/** One thing in a panel, in the values of its axes. A label that is not empty stands in the key. */
sealed interface Layer {

  /** Returns the words for the key, empty for none. */
  String label();

  /** Points. */
  record Dots(double[] x, double[] y, Look look, double size, String label) implements Layer {}

  /** A line; NaN breaks it. */
  record Stroke(double[] x, double[] y, Look look, double width, String label) implements Layer {}

  /** The room between two lines over one x. */
  record Ribbon(double[] x, double[] low, double[] high, Look look, String label)
      implements Layer {}

  /** Upright rectangles. */
  record Boxes(
      double[] x1, double[] x2, double[] y1, double[] y2, Look look, double opacity, String label)
      implements Layer {}

  /** A level band over the whole width, with its name where there is room. */
  record Zone(double from, double to, String name, boolean shaded, boolean named) implements Layer {
    @Override
    public String label() {
      return "";
    }
  }

  /** A line through the whole panel. */
  record Rule(double at, boolean upright, Look look, String label) implements Layer {}

  /** Words at a place. */
  record Words(double x, double y, String text, boolean before) implements Layer {
    @Override
    public String label() {
      return "";
    }
  }
}
