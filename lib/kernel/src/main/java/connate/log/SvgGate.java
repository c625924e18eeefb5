package connate.log;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Set;

/**
 * Lets a figure through that holds nothing but drawing. It reads the strict subset of XML that our
 * own drawing code writes (elements, quoted attributes, text with the five entities and character
 * references) and refuses everything else: comments, instructions, document types, CDATA, names
 * that are not on the list, references that leave the figure.
 */
public final class SvgGate {

  private static final Set<String> ELEMENTS =
      Set.of(
          "svg",
          "g",
          "path",
          "rect",
          "line",
          "polyline",
          "polygon",
          "circle",
          "ellipse",
          "text",
          "tspan",
          "title",
          "desc",
          "defs",
          "clipPath",
          "use");
  private static final Set<String> ATTRIBUTES =
      Set.of(
          "xmlns",
          "viewBox",
          "width",
          "height",
          "role",
          "id",
          "aria-labelledby",
          "aria-label",
          "x",
          "y",
          "x1",
          "x2",
          "y1",
          "y2",
          "cx",
          "cy",
          "r",
          "rx",
          "ry",
          "d",
          "points",
          "dx",
          "dy",
          "transform",
          "fill",
          "fill-opacity",
          "fill-rule",
          "stroke",
          "stroke-width",
          "stroke-opacity",
          "stroke-dasharray",
          "stroke-dashoffset",
          "stroke-linecap",
          "stroke-linejoin",
          "stroke-miterlimit",
          "opacity",
          "clip-path",
          "clip-rule",
          "href",
          "font-family",
          "font-size",
          "font-weight",
          "font-style",
          "text-anchor",
          "textLength",
          "lengthAdjust",
          "dominant-baseline",
          "preserveAspectRatio",
          "clipPathUnits",
          "shape-rendering",
          "vector-effect",
          "focusable");

  private final String svg;
  private final StringBuilder out;
  private final Deque<String> open = new ArrayDeque<>();
  private int at;

  private SvgGate(String svg) {
    this.svg = svg;
    this.out = new StringBuilder(svg.length() + 64);
  }

  /**
   * Returns the figure as it may stand in a log.
   *
   * @throws IllegalArgumentException if it holds anything that is not drawing
   */
  public static String pass(String svg) {
    SvgGate gate = new SvgGate(svg.strip());
    gate.run();
    return gate.out.toString();
  }

  private void run() {
    if (!svg.startsWith("<svg")) {
      throw refused("a figure starts with <svg");
    }
    while (at < svg.length()) {
      if (svg.charAt(at) != '<') {
        text();
      } else if (svg.startsWith("</", at)) {
        end();
      } else {
        start();
      }
    }
    if (!open.isEmpty()) {
      throw refused("element " + open.peek() + " is not closed");
    }
  }

  private void start() {
    if (open.isEmpty() && out.length() > 0) {
      throw refused("something follows the figure");
    }
    at++;
    String element = name();
    if (!ELEMENTS.contains(element)) {
      throw refused("element " + element);
    }
    out.append('<').append(element);
    boolean more = true;
    while (more) {
      blanks();
      if (svg.startsWith("/>", at)) {
        at += 2;
        out.append("/>");
        more = false;
      } else if (svg.startsWith(">", at)) {
        at++;
        out.append('>');
        open.push(element);
        more = false;
      } else {
        attribute();
      }
    }
  }

  private void end() {
    at += 2;
    String element = name();
    blanks();
    if (open.isEmpty() || !open.pop().equals(element) || !svg.startsWith(">", at)) {
      throw refused("end of " + element);
    }
    at++;
    out.append("</").append(element).append('>');
  }

  private void attribute() {
    String attribute = name();
    if (!svg.startsWith("=\"", at)) {
      throw refused("attribute " + attribute + " without a quoted value");
    }
    int end = svg.indexOf('"', at + 2);
    if (end < 0 || !ATTRIBUTES.contains(attribute)) {
      throw refused("attribute " + attribute);
    }
    String value = plain(svg.substring(at + 2, end));
    check(attribute, value);
    out.append(' ').append(attribute).append("=\"").append(Markup.escape(value)).append('"');
    at = end + 1;
  }

  private void check(String attribute, String value) {
    String low = value.toLowerCase(java.util.Locale.ROOT);
    boolean url = low.contains("url(");
    if (attribute.equals("xmlns") && !value.equals("http://www.w3.org/2000/svg")
        || attribute.equals("href") && !isLocal(value)
        || url && !(low.startsWith("url(#") && isLocal(value.substring(4, value.length() - 1)))
        || !attribute.equals("xmlns") && low.contains(":") && !attribute.startsWith("aria")) {
      throw refused("value of " + attribute);
    }
  }

  private static boolean isLocal(String value) {
    return value.startsWith("#")
        && value.length() > 1
        && value
            .substring(1)
            .chars()
            .allMatch(c -> Character.isLetterOrDigit(c) || c == '-' || c == '_' || c == '.');
  }

  private void text() {
    int end = svg.indexOf('<', at);
    end = end < 0 ? svg.length() : end;
    String text = plain(svg.substring(at, end));
    if (open.isEmpty() && !text.isBlank()) {
      throw refused("text outside the figure");
    }
    out.append(Markup.escape(text));
    at = end;
  }

  private String name() {
    int start = at;
    while (at < svg.length()
        && (Character.isLetterOrDigit(svg.charAt(at)) || svg.charAt(at) == '-')) {
      at++;
    }
    if (start == at) {
      throw refused("a name was expected");
    }
    return svg.substring(start, at);
  }

  private void blanks() {
    while (at < svg.length() && Character.isWhitespace(svg.charAt(at))) {
      at++;
    }
  }

  /** Resolves the five entities and character references. */
  private String plain(String text) {
    int mark = text.indexOf('&');
    if (mark < 0) {
      return text;
    }
    StringBuilder plain = new StringBuilder(text.length());
    int from = 0;
    while (mark >= 0) {
      int end = text.indexOf(';', mark);
      if (end < 0 || end - mark > 9) {
        throw refused("a stray &");
      }
      plain.append(text, from, mark).appendCodePoint(reference(text.substring(mark + 1, end)));
      from = end + 1;
      mark = text.indexOf('&', from);
    }
    return plain.append(text.substring(from)).toString();
  }

  private int reference(String name) {
    switch (name) {
      case "amp":
        return '&';
      case "lt":
        return '<';
      case "gt":
        return '>';
      case "quot":
        return '"';
      case "apos":
        return '\'';
      default:
        return number(name);
    }
  }

  private int number(String name) {
    try {
      if (name.startsWith("#x")) {
        return Integer.parseInt(name.substring(2), 16);
      }
      if (name.startsWith("#")) {
        return Integer.parseInt(name.substring(1));
      }
    } catch (NumberFormatException e) {
      throw refused("reference " + name);
    }
    throw refused("entity " + name);
  }

  private IllegalArgumentException refused(String what) {
    return new IllegalArgumentException("the figure was refused: " + what + " at " + at);
  }
}
