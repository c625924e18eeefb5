package connate.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.util.HashMap;
import java.util.Map;

/** The drawing attributes in force at an element: its own and those of the groups around it. */
final class SvgStyle {

  private final Map<String, String> all;

  private SvgStyle(Map<String, String> all) {
    this.all = all;
  }

  static SvgStyle plain() {
    return new SvgStyle(Map.of());
  }

  /** Returns this style with the attributes of an element further in; opacities multiply. */
  SvgStyle with(Map<String, String> own) {
    Map<String, String> merged = new HashMap<>(all);
    merged.putAll(own);
    merged.remove("clip-path");
    merged.remove("transform");
    double opacity = number("opacity", 1) * new SvgStyle(own).number("opacity", 1);
    merged.put("opacity", String.valueOf(opacity));
    return new SvgStyle(merged);
  }

  double number(String name, double other) {
    String text = all.get(name);
    return text == null ? other : Double.parseDouble(text.replace("px", ""));
  }

  String text(String name) {
    return all.getOrDefault(name, "");
  }

  /** Returns the fill, {@code null} for none. */
  Color fill() {
    return colour(all.getOrDefault("fill", "#000000"), number("fill-opacity", 1));
  }

  /** Returns the line's colour, {@code null} for none. */
  Color stroke() {
    return colour(all.getOrDefault("stroke", "none"), number("stroke-opacity", 1));
  }

  private Color colour(String text, double own) {
    if (!text.startsWith("#")) {
      return text.equals("none") ? null : text.equals("white") ? Color.WHITE : Color.BLACK;
    }
    String hex = text.substring(1);
    String six = hex.length() == 3 ? hex.replaceAll("(.)", "$1$1") : hex;
    int alpha = (int) Math.round(255 * own * number("opacity", 1));
    return new Color(Integer.parseInt(six, 16) | alpha << 24, true);
  }

  BasicStroke pen() {
    int cap = text("stroke-linecap").equals("round") ? BasicStroke.CAP_ROUND : BasicStroke.CAP_BUTT;
    int join =
        text("stroke-linejoin").equals("round") ? BasicStroke.JOIN_ROUND : BasicStroke.JOIN_MITER;
    float width = (float) number("stroke-width", 1);
    String dash = text("stroke-dasharray");
    return dash.isBlank() || dash.equals("none")
        ? new BasicStroke(width, cap, join)
        : new BasicStroke(width, cap, join, 4, lengths(dash), 0);
  }

  private static float[] lengths(String dash) {
    String[] parts = dash.strip().split("[\\s,]+");
    float[] lengths = new float[parts.length];
    for (int i = 0; i < lengths.length; i++) {
      lengths[i] = Float.parseFloat(parts[i]);
    }
    return lengths;
  }

  Font font() {
    int weight = text("font-weight").equals("bold") ? Font.BOLD : Font.PLAIN;
    return new Font(Font.SANS_SERIF, weight, 1).deriveFont((float) number("font-size", 12));
  }
}
