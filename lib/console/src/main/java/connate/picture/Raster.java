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
import java.io.StringReader;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Draws a figure's SVG as dots. It knows what our own figures hold, and leaves out the rest. */
public final class Raster {

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
      XMLInputFactory factory = XMLInputFactory.newFactory();
      factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
      factory.setProperty(XMLInputFactory.IS_COALESCING, true);
      XMLStreamReader reader = factory.createXMLStreamReader(new StringReader(svg));
      reader.nextTag();
      BufferedImage image =
          new BufferedImage(
              (int) Math.ceil(scale * Double.parseDouble(reader.getAttributeValue(null, "width"))),
              (int) Math.ceil(scale * Double.parseDouble(reader.getAttributeValue(null, "height"))),
              BufferedImage.TYPE_INT_RGB);
      Graphics2D graphics = image.createGraphics();
      graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      graphics.setRenderingHint(
          RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
      graphics.setColor(Color.WHITE);
      graphics.fillRect(0, 0, image.getWidth(), image.getHeight());
      graphics.scale(scale, scale);
      new Raster(graphics).draw(reader);
      graphics.dispose();
      return image;
    } catch (XMLStreamException | RuntimeException e) {
      throw new IllegalArgumentException("the figure cannot be drawn: " + e.getMessage(), e);
    }
  }

  private void draw(XMLStreamReader reader) throws XMLStreamException {
    int event = reader.getEventType();
    while (event != XMLStreamConstants.END_DOCUMENT) {
      if (event == XMLStreamConstants.START_ELEMENT) {
        start(reader.getLocalName(), attributes(reader));
      } else if (event == XMLStreamConstants.END_ELEMENT) {
        end(reader.getLocalName());
      } else if (event == XMLStreamConstants.CHARACTERS && !states.isEmpty()) {
        letters(reader.getText());
      }
      event = reader.next();
    }
  }

  private static Map<String, String> attributes(XMLStreamReader reader) {
    Map<String, String> all = new HashMap<>();
    for (int i = 0; i < reader.getAttributeCount(); i++) {
      all.put(reader.getAttributeLocalName(i), reader.getAttributeValue(i));
    }
    return all;
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
