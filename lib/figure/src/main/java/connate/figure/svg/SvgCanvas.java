package connate.figure.svg;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A drawing that ends as one {@code <svg>} element for a page.
 *
 * <p>Runs of things drawn alike share one group; lines of one run share one path. Equal points
 * become few paths of dots. Nothing but the elements and attributes of this package is written, and
 * no text is written unescaped.
 */
public final class SvgCanvas {

  private static final String FONTS = "Liberation Sans,Arial,Helvetica,sans-serif";

  /** So many times may translucent points of one kind darken each other. */
  private static final int LAYERS = 8;

  private final double width;
  private final double height;
  private final String prefix;
  private final StringBuilder body = new StringBuilder();
  private final StringBuilder defs = new StringBuilder();
  private String open = "";
  private PathData path = new PathData();
  private int clips;

  /**
   * Starts a drawing.
   *
   * @param width the width in pixels
   * @param height the height in pixels
   * @param prefix the start of every id in it, a letter first, different for each figure of a page
   */
  public SvgCanvas(double width, double height, String prefix) {
    if (!prefix.matches("[A-Za-z][A-Za-z0-9_-]*")) {
      throw new IllegalArgumentException(
          "«" + prefix + "» cannot start an id: a letter first, then letters, digits, - and _");
    }
    this.width = width;
    this.height = height;
    this.prefix = prefix;
  }

  /** Draws a straight line. */
  public void line(double x1, double y1, double x2, double y2, Pen pen) {
    style(pen.attributes());
    path.move(x1, y1);
    path.line(x2, y2);
  }

  /**
   * Draws a line through points; a NaN breaks it, a point between two gaps becomes a short stroke.
   */
  public void lines(double[] x, double[] y, Pen pen) {
    style(pen.attributes());
    for (int i = 0; i < x.length; i++) {
      boolean starts = i == 0 || isGap(x, y, i - 1);
      boolean ends = i == x.length - 1 || isGap(x, y, i + 1);
      if (isGap(x, y, i)) {
        continue;
      }
      if (!starts) {
        path.line(x[i], y[i]);
      } else {
        path.move(x[i], y[i]);
        path.by(0, ends ? 1 : 0);
      }
    }
  }

  private static boolean isGap(double[] x, double[] y, int i) {
    return Double.isNaN(x[i]) || Double.isNaN(y[i]);
  }

  /** Draws a closed shape. */
  public void shape(double[] x, double[] y, Pen pen) {
    style(pen.attributes());
    path.move(x[0], y[0]);
    for (int i = 1; i < x.length; i++) {
      path.line(x[i], y[i]);
    }
    path.close();
  }

  /** Draws an upright rectangle between two corners. */
  public void rectangle(double x1, double y1, double x2, double y2, Pen pen) {
    shape(new double[] {x1, x2, x2, x1}, new double[] {y1, y1, y2, y2}, pen);
  }

  /** Draws equal points. */
  public void points(
      double[] x, double[] y, Mark mark, double size, String colour, double opacity) {
    int layers = opacity < 1 ? Math.min(LAYERS, x.length) : 1;
    Integer[] order = byPlace(x, y);
    for (int layer = 0; layer < layers; layer++) {
      flush();
      style(mark.attributes(Pen.line(colour, 1).stroke(), size, opacity));
      for (int i = layer; i < order.length; i += layers) {
        mark.draw(path, x[order[i]], y[order[i]], size);
      }
    }
    flush();
  }

  /**
   * Returns the points from left to right: near ones fall into different layers, moves are short.
   */
  private static Integer[] byPlace(double[] x, double[] y) {
    Integer[] order = new Integer[x.length];
    Arrays.setAll(order, i -> i);
    Arrays.sort(
        order,
        (a, b) -> {
          int byX = Long.compare(PathData.tenths(x[a]), PathData.tenths(x[b]));
          return byX != 0 ? byX : Long.compare(PathData.tenths(y[a]), PathData.tenths(y[b]));
        });
    return order;
  }

  /** Sets a text at a position on its base line. */
  public void text(double x, double y, String text, Lettering lettering) {
    style(lettering.attributes());
    body.append("<text x=\"").append(PathData.text(x)).append("\" y=\"");
    body.append(PathData.text(y)).append("\">").append(Markup.text(text)).append("</text>");
  }

  /** Sets ten to a power. */
  public void powerOfTen(double x, double y, int exponent, Lettering lettering) {
    style(lettering.attributes());
    body.append("<text x=\"").append(PathData.text(x)).append("\" y=\"");
    body.append(PathData.text(y)).append("\">10<tspan dy=\"-4\" font-size=\"");
    body.append(Pen.decimal(lettering.size() * 0.75)).append("\">");
    body.append(exponent < 0 ? "−" : "").append(Math.abs(exponent)).append("</tspan></text>");
  }

  /** Sets a text that reads upwards. */
  public void textUpwards(double x, double y, String text, Lettering lettering) {
    style(lettering.attributes());
    body.append("<text transform=\"translate(").append(PathData.text(x)).append(' ');
    body.append(PathData.text(y)).append(") rotate(-90)\">").append(Markup.text(text));
    body.append("</text>");
  }

  /** Draws what follows inside an upright rectangle only, until {@link #unclip}. */
  public void clip(double x1, double y1, double x2, double y2) {
    endGroup();
    String id = prefix + "-c" + clips++;
    defs.append("<clipPath id=\"").append(id).append("\"><rect x=\"").append(PathData.text(x1));
    defs.append("\" y=\"").append(PathData.text(y1)).append("\" width=\"");
    defs.append(PathData.text(x2 - x1)).append("\" height=\"").append(PathData.text(y2 - y1));
    defs.append("\"/></clipPath>");
    body.append("<g clip-path=\"url(#").append(id).append(")\">");
  }

  /** Ends a clip. */
  public void unclip() {
    endGroup();
    body.append("</g>\n");
  }

  /** Returns the element. */
  public String finish(String title, String description) {
    endGroup();
    List<String> out = new ArrayList<>();
    String w = PathData.text(width);
    String h = PathData.text(height);
    String t = prefix + "-t";
    String d = prefix + "-d";
    out.add("<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\"");
    out.add(" aria-labelledby=\"" + t + " " + d + "\" width=\"" + w + "\" height=\"" + h + "\"");
    out.add(" viewBox=\"0 0 " + w + " " + h + "\" font-family=\"" + FONTS + "\">\n");
    out.add("<title id=\"" + t + "\">" + Markup.text(title) + "</title>\n");
    out.add("<desc id=\"" + d + "\">" + Markup.text(description) + "</desc>\n");
    out.add(defs.isEmpty() ? "" : "<defs>" + defs + "</defs>\n");
    out.add("<rect width=\"" + w + "\" height=\"" + h + "\" fill=\"#fff\"/>\n");
    return String.join("", out) + body + "</svg>\n";
  }

  private void style(String attributes) {
    if (!attributes.equals(open)) {
      endGroup();
      body.append("<g ").append(attributes).append('>');
      open = attributes;
    }
  }

  private void flush() {
    if (!path.isEmpty()) {
      body.append("<path d=\"").append(path).append("\"/>");
      path = new PathData();
    }
  }

  private void endGroup() {
    flush();
    if (!open.isEmpty()) {
      body.append("</g>\n");
      open = "";
    }
  }
}
