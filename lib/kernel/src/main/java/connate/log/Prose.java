package connate.log;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.commonmark.ext.gfm.tables.TablesExtension;
import org.commonmark.node.AbstractVisitor;
import org.commonmark.node.Code;
import org.commonmark.node.Heading;
import org.commonmark.node.Image;
import org.commonmark.node.Link;
import org.commonmark.node.Node;
import org.commonmark.node.SoftLineBreak;
import org.commonmark.node.Text;
import org.commonmark.parser.Parser;
import org.commonmark.renderer.NodeRenderer;
import org.commonmark.renderer.html.HtmlNodeRendererContext;
import org.commonmark.renderer.html.HtmlRenderer;

/**
 * Prose in CommonMark as HTML. Raw HTML shows as text; a link shows its text and its address but
 * leads nowhere; a picture shows its description. So no text of the user reaches a tag or an
 * address.
 */
final class Prose {

  private static final int TOP = 3;
  private static final int DEEPEST = 6;

  private static final Parser PARSER =
      Parser.builder().extensions(List.of(TablesExtension.create())).build();
  private static final HtmlRenderer RENDERER =
      HtmlRenderer.builder()
          .extensions(List.of(TablesExtension.create()))
          .escapeHtml(true)
          .sanitizeUrls(true)
          .nodeRendererFactory(Plain::new)
          .build();

  private Prose() {}

  /** Returns whether prose has the heading of the first level that serves as the title. */
  static boolean hasTitle(String prose) {
    return title(PARSER.parse(prose)) != null;
  }

  /** Returns prose as HTML, where asked without the heading that serves as the title. */
  static String html(String prose, boolean withoutTitle) {
    Node document = PARSER.parse(prose);
    Node title = withoutTitle ? title(document) : null;
    if (title != null) {
      title.unlink();
    }
    return RENDERER.render(document);
  }

  private static Node title(Node document) {
    for (Node node = document.getFirstChild(); node != null; node = node.getNext()) {
      if (node instanceof Heading heading && heading.getLevel() == 1) {
        return heading;
      }
    }
    return null;
  }

  private static String words(Node node) {
    StringBuilder out = new StringBuilder();
    node.accept(
        new AbstractVisitor() {
          @Override
          public void visit(Text text) {
            out.append(text.getLiteral());
          }

          @Override
          public void visit(Code code) {
            out.append(code.getLiteral());
          }

          @Override
          public void visit(SoftLineBreak line) {
            out.append(' ');
          }
        });
    return out.toString();
  }

  /** Headings one below ours, links and pictures without addresses that lead anywhere. */
  private static final class Plain implements NodeRenderer {

    private final HtmlNodeRendererContext context;

    Plain(HtmlNodeRendererContext context) {
      this.context = context;
    }

    @Override
    public Set<Class<? extends Node>> getNodeTypes() {
      return Set.of(Heading.class, Link.class, Image.class);
    }

    @Override
    public void render(Node node) {
      if (node instanceof Heading heading) {
        String tag = "h" + Math.min(DEEPEST, Math.max(TOP, heading.getLevel() + 1));
        context.getWriter().line();
        context.getWriter().tag(tag);
        children(node);
        context.getWriter().tag("/" + tag);
        context.getWriter().line();
      } else if (node instanceof Link link) {
        children(node);
        if (!words(link).equals(link.getDestination())) {
          context.getWriter().text(" (" + link.getDestination() + ")");
        }
      } else {
        context.getWriter().tag("i", Map.of());
        context.getWriter().text("[picture: " + words(node) + "]");
        context.getWriter().tag("/i");
      }
    }

    private void children(Node node) {
      for (Node child = node.getFirstChild(); child != null; child = child.getNext()) {
        context.render(child);
      }
    }
  }
}
