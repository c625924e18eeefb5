package connate.figure;

import connate.figure.svg.Pen;
import connate.figure.svg.SvgCanvas;

/** Draws what stands before the words of a key: a point, a piece of line, a patch. */
final class KeySample {

  private KeySample() {}

  static void draw(SvgCanvas canvas, Layer layer, double x, double y, double width) {
    double middle = x + width / 2;
    if (layer instanceof Layer.Dots dots) {
      double size = Math.max(dots.size(), 6);
      Look look = dots.look();
      canvas.points(new double[] {middle}, new double[] {y}, look.mark(), size, look.colour(), 1);
    } else if (layer instanceof Layer.Stroke stroke) {
      canvas.line(x, y, x + width, y, stroke.look().pen(Math.max(stroke.width(), 1.4)));
    } else if (layer instanceof Layer.Rule rule) {
      canvas.line(x, y, x + width, y, rule.look().pen(1.4));
    } else if (layer instanceof Layer.Ribbon ribbon) {
      Pen pen = Pen.area(ribbon.look().colour(), Theme.BAND_OPACITY);
      canvas.rectangle(x + 2, y - 5, x + width - 2, y + 5, pen);
    } else if (layer instanceof Layer.Boxes boxes) {
      Pen pen = Pen.area(boxes.look().colour(), boxes.opacity());
      canvas.rectangle(x + 4, y - 5, x + width - 4, y + 5, pen);
    }
  }
}
