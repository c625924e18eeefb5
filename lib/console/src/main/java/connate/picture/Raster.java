package connate.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Draws a figure's SVG as dots. It knows what our own figures hold, and leaves out the rest. */
public final class Raster {

  private static final Pattern PART =
      Pattern.compile(
          "<(?<end>/?)(?<name>\\w+)(?<attributes>(?:\\s+[\\w:-]+=\"[^\"]*\")*)\\s*(?<empty>/?)>"
              + "|(?<text>[^<]+)");
  private static final Pattern ATTRIBUTE = Pattern.compile("([\\w:-]+)=\"([^\"]*)\"");
  private static final Pattern ENTITY = Pattern.compile("&(amp|lt|gt|quot|apos|#x?\\w+);");
  private static final Pattern CALL = Pattern.compile("(translate|rotate|scale)\\(([^)]*)\\)");

  private final Graphics2D graphics;
  private final Map<String, Shape> clips = new HashMap<>();
  private final Deque<State> states = new ArrayDeque<>();
  private SvgStyle style = SvgStyle.plain();
  private String clipName = "";
  private double textX;
  private double textY;

  private record State(SvgStyle style, AffineTransform place, Shape clip) {}

  private Raster(Graphics2D graphics) {
    this.graphics = graphics;
  }

  /**
   * Draws a figure.
   *
   * @param svg the figure, checked before
   * @param scale how many dots a unit of the figure takes
   * @throws IllegalArgumentException if it is no figure that can be drawn
   */
  public static BufferedImage of(String svg, double scale) {
    try {
      Matcher root = PART.matcher(svg.strip());
      if (!root.lookingAt() || !"svg".equals(root.group("name"))) {
        throw new IllegalArgumentException("it does not begin with <svg");
      }
      Map<String, String> own = attributes(root.group("attributes"));
      BufferedImage image =
          new BufferedImage(
              (int) Math.ceil(scale * Double.parseDouble(own.get("width"))),
              (int) Math.ceil(scale * Double.parseDouble(own.get("height"))),
              BufferedImage.TYPE_INT_RGB);
      Graphics2D graphics = paper(image);
      graphics.scale(scale, scale);
      new Raster(graphics).draw(svg.strip());
      graphics.dispose();
      return image;
    } catch (RuntimeException e) {
      throw new IllegalArgumentException("the figure cannot be drawn: " + e.getMessage(), e);
    }
  }

  private static Graphics2D paper(BufferedImage image) {
    Graphics2D graphics = image.createGraphics();
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    graphics.setColor(Color.WHITE);
    graphics.fillRect(0, 0, image.getWidth(), image.getHeight());
    return graphics;
  }

  private void draw(String svg) {
    Matcher part = PART.matcher(svg);
    int done = 0;
    while (done < svg.length()) {
      if (!part.find(done) || part.start() != done) {
        throw new IllegalArgumentException("stray text at " + done);
      }
      done = part.end();
      if (part.group("text") != null) {
        letters(plain(part.group("text")));
      } else if (part.group("end").isEmpty()) {
        start(part.group("name"), attributes(part.group("attributes")));
        if (!part.group("empty").isEmpty()) {
          end(part.group("name"));
        }
      } else {
        end(part.group("name"));
      }
    }
  }

  private static Map<String, String> attributes(String text) {
    Map<String, String> all = new HashMap<>();
    Matcher attribute = ATTRIBUTE.matcher(text);
    while (attribute.find()) {
      all.put(attribute.group(1), plain(attribute.group(2)));
    }
    return all;
  }

  /** Returns text without the five entities and the numbered ones. */
  private static String plain(String text) {
    return text.indexOf('&') < 0
        ? text
        : ENTITY.matcher(text).replaceAll(m -> Matcher.quoteReplacement(letter(m.group(1))));
  }

  private static String letter(String name) {
    return switch (name) {
      case "amp" -> "&";
      case "lt" -> "<";
      case "gt" -> ">";
      case "quot" -> "\"";
      case "apos" -> "'";
      default ->
          Character.toString(
              name.startsWith("#x")
                  ? Integer.parseInt(name.substring(2), 16)
                  : Integer.parseInt(name.substring(1)));
    };
  }

  private void start(String name, Map<String, String> own) {
    states.push(new State(style, graphics.getTransform(), graphics.getClip()));
    style = style.with(own).with(Map.of("element", name));
    transform(own.getOrDefault("transform", ""));
    String clip = own.getOrDefault("clip-path", "").replaceAll("url\\(#(.*)\\)", "$1");
    if (clips.containsKey(clip)) {
      graphics.clip(clips.get(clip));
    }
    if (name.equals("clipPath")) {
      clipName = own.getOrDefault("id", "");
    } else if (name.equals("text")) {
      textX = number(own, "x");
      textY = number(own, "y");
    } else if (name.equals("tspan")) {
      textY += number(own, "dy");
    } else {
      shape(shape(name, own));
    }
  }

  private static double number(Map<String, String> own, String name) {
    return Double.parseDouble(own.getOrDefault(name, "0"));
  }

  private static Shape shape(String name, Map<String, String> own) {
    return switch (name) {
      case "path" -> SvgPath.parse(own.getOrDefault("d", ""));
      case "polygon" -> SvgPath.parse("M" + own.getOrDefault("points", "") + "z");
      case "polyline" -> SvgPath.parse("M" + own.getOrDefault("points", ""));
      case "line" ->
          new Line2D.Double(
              number(own, "x1"), number(own, "y1"), number(own, "x2"), number(own, "y2"));
      case "rect" ->
          new Rectangle2D.Double(
              number(own, "x"), number(own, "y"), number(own, "width"), number(own, "height"));
      case "circle" -> {
        double r = number(own, "r");
        yield new Ellipse2D.Double(number(own, "cx") - r, number(own, "cy") - r, 2 * r, 2 * r);
      }
      default -> null;
    };
  }

  private void shape(Shape shape) {
    if (shape == null) {
      return;
    }
    if (!clipName.isEmpty()) {
      clips.put(clipName, shape);
      return;
    }
    if (style.fill() != null) {
      graphics.setColor(style.fill());
      graphics.fill(shape);
    }
    if (style.stroke() != null) {
      graphics.setColor(style.stroke());
      graphics.setStroke(style.pen());
      graphics.draw(shape);
    }
  }

  private void transform(String text) {
    Matcher call = CALL.matcher(text);
    while (call.find()) {
      String[] numbers = call.group(2).strip().split("[\\s,]+");
      double first = Double.parseDouble(numbers[0]);
      double second = numbers.length > 1 ? Double.parseDouble(numbers[1]) : 0;
      switch (call.group(1)) {
        case "translate" -> graphics.translate(first, second);
        case "rotate" -> graphics.rotate(Math.toRadians(first));
        default -> graphics.scale(first, numbers.length > 1 ? second : first);
      }
    }
  }

  private void letters(String text) {
    String element = style.text("element");
    if (!element.equals("text") && !element.equals("tspan") || style.fill() == null) {
      return;
    }
    graphics.setFont(style.font());
    graphics.setColor(style.fill());
    double width = graphics.getFontMetrics().getStringBounds(text, graphics).getWidth();
    String anchor = style.text("text-anchor");
    double left = anchor.equals("middle") ? width / 2 : anchor.equals("end") ? width : 0;
    graphics.drawString(text, (float) (textX - left), (float) textY);
    textX += width - left;
  }

  private void end(String name) {
    State before = states.pop();
    style = before.style();
    graphics.setTransform(before.place());
    graphics.setClip(before.clip());
    if (name.equals("clipPath")) {
      clipName = "";
    }
  }
}
