package connate.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.HashSet;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xml.sax.InputSource;

/** Reads a figure back and holds it to what a page lets through. */
final class SvgRules {

  private static final Set<String> ELEMENTS =
      Set.of("svg", "title", "desc", "defs", "clipPath", "g", "path", "rect", "text", "tspan");

  private static final Set<String> ATTRIBUTES =
      Set.of(
          "xmlns",
          "role",
          "aria-labelledby",
          "id",
          "width",
          "height",
          "viewBox",
          "x",
          "y",
          "dy",
          "d",
          "transform",
          "clip-path",
          "fill",
          "stroke",
          "stroke-width",
          "stroke-linejoin",
          "stroke-linecap",
          "stroke-dasharray",
          "opacity",
          "font-family",
          "font-size",
          "font-weight",
          "text-anchor");

  private SvgRules() {}

  /** Draws, parses and checks. */
  static Document check(Figure figure) {
    return check(figure.svg("a1"), "a1");
  }

  static Document check(String svg, String prefix) {
    Document document = parse(svg);
    Element root = document.getDocumentElement();
    assertEquals("svg", root.getTagName());
    assertEquals("img", root.getAttribute("role"));
    assertEquals(prefix + "-t " + prefix + "-d", root.getAttribute("aria-labelledby"));
    Set<String> ids = new HashSet<>();
    walk(root, prefix, ids);
    assertTrue(ids.contains(prefix + "-t") && ids.contains(prefix + "-d"));
    return document;
  }

  static Document parse(String svg) {
    try {
      DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
      factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
      return factory.newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    } catch (Exception e) {
      throw new AssertionError("not well-formed: " + e.getMessage(), e);
    }
  }

  private static void walk(Element element, String prefix, Set<String> ids) {
    assertTrue(ELEMENTS.contains(element.getTagName()), element.getTagName());
    for (int i = 0; i < element.getAttributes().getLength(); i++) {
      Node attribute = element.getAttributes().item(i);
      assertTrue(ATTRIBUTES.contains(attribute.getNodeName()), attribute.getNodeName());
      String value = attribute.getNodeValue();
      if (attribute.getNodeName().equals("id")) {
        assertTrue(value.startsWith(prefix + "-") && ids.add(value), value);
      } else if (attribute.getNodeName().equals("clip-path")) {
        assertTrue(ids.contains(value.replaceAll("url\\(#(.*)\\)", "$1")), value);
      } else if (!attribute.getNodeName().equals("xmlns")) {
        assertTrue(!value.contains("url") && !value.contains(":"), value);
      }
    }
    for (Node child = element.getFirstChild(); child != null; child = child.getNextSibling()) {
      if (child instanceof Element inner) {
        walk(inner, prefix, ids);
      }
    }
  }
}
