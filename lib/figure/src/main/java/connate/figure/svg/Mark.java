package connate.figure.svg;

/**
 * The shape of a point. Circles are strokes of no length with round ends; squares are not, since
 * printed pages leave out strokes of no length with square ends.
 */
public enum Mark {
  /** A filled circle: eight characters or so for each. */
  CIRCLE,
  /** A filled square. */
  SQUARE,
  /** A filled triangle, point up. */
  TRIANGLE,
  /** A filled diamond. */
  DIAMOND,
  /** An upright cross. */
  PLUS,
  /** A slanting cross. */
  CROSS;

  /** Returns the attributes with which its path is drawn. */
  String attributes(String colour, double size, double opacity) {
    String clear = opacity < 1 ? " opacity=\"" + Pen.decimal(opacity) + "\"" : "";
    return switch (this) {
      case CIRCLE -> stroke(colour, size) + " stroke-linecap=\"round\"" + clear;
      case PLUS, CROSS -> stroke(colour, 1.4) + clear;
      case SQUARE, TRIANGLE, DIAMOND -> "fill=\"" + colour + "\"" + clear;
    };
  }

  private static String stroke(String colour, double width) {
    return "fill=\"none\" stroke=\"" + colour + "\" stroke-width=\"" + Pen.decimal(width) + "\"";
  }

  /** Adds one point to a path. */
  void draw(PathData path, double x, double y, double size) {
    double r = size / 2;
    switch (this) {
      case CIRCLE -> {
        path.move(x, y);
        path.dot();
      }
      case SQUARE -> {
        path.move(x - r * 0.9, y - r * 0.9);
        path.by(r * 1.8, 0);
        path.by(0, r * 1.8);
        path.by(-r * 1.8, 0);
        path.close();
      }
      case TRIANGLE -> {
        path.move(x, y - r * 1.2);
        path.by(r * 1.2, r * 2.1);
        path.by(-r * 2.4, 0);
        path.close();
      }
      case DIAMOND -> {
        path.move(x, y - r * 1.3);
        path.by(r * 1.3, r * 1.3);
        path.by(-r * 1.3, r * 1.3);
        path.by(-r * 1.3, -r * 1.3);
        path.close();
      }
      case PLUS -> {
        path.move(x - r * 1.2, y);
        path.by(r * 2.4, 0);
        path.move(x, y - r * 1.2);
        path.by(0, r * 2.4);
      }
      default -> {
        path.move(x - r, y - r);
        path.by(size, size);
        path.move(x - r, y + r);
        path.by(size, -size);
      }
    }
  }
}
