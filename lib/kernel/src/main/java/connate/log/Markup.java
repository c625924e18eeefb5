package connate.log;

import java.util.ArrayDeque;
import java.util.Deque;
import org.owasp.encoder.Encode;

/**
 * Writes HTML that is well-formed XML too. Names of elements and attributes come from our code
 * alone; every text and attribute value is escaped here, and nowhere else.
 */
final class Markup {

  private final StringBuilder out = new StringBuilder(1 << 16);
  private final Deque<String> open = new ArrayDeque<>();

  /** Opens an element; attributes come as name and value in turn. */
  Markup open(String element, String... attributes) {
    start(element, attributes);
    out.append('>');
    open.push(element);
    return this;
  }

  /** Writes an element without content. */
  Markup empty(String element, String... attributes) {
    start(element, attributes);
    out.append("/>");
    return this;
  }

  /** Closes the element that was opened last. */
  Markup close() {
    out.append("</").append(open.pop()).append('>');
    return this;
  }

  /** Ends a line, for the eye of who reads the source. */
  Markup line() {
    out.append('\n');
    return this;
  }

  /** Writes text. */
  Markup text(String text) {
    out.append(escape(text));
    return this;
  }

  /** Writes an element that holds text alone. */
  Markup leaf(String element, String text, String... attributes) {
    return open(element, attributes).text(text).close();
  }

  /** Writes markup that has passed its own check: a figure through the gate, rendered prose. */
  Markup checked(String markup) {
    out.append(markup);
    return this;
  }

  static String escape(String text) {
    return Encode.forXml(text);
  }

  private void start(String element, String... attributes) {
    out.append('<').append(element);
    for (int i = 0; i < attributes.length; i += 2) {
      out.append(' ').append(attributes[i]).append("=\"").append(escape(attributes[i + 1]));
      out.append('"');
    }
  }

  @Override
  public String toString() {
    if (!open.isEmpty()) {
      throw new IllegalStateException("elements left open: " + open);
    }
    return out.toString();
  }
}
