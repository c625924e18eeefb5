package connate.log;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.protocol.Event;
import connate.protocol.Item;
import connate.record.LogRecord;
import connate.record.ReplayLog;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

class LogPageTest {

  private static final String HOSTILE =
      "\"'><script>alert(1)</script><img src=x onerror=alert(2)>&amp;&#0;\u0000\u0007]]>--><!--";
  private static final Set<String> OURS =
      Set.of(
          "html",
          "head",
          "meta",
          "title",
          "style",
          "body",
          "main",
          "h1",
          "h2",
          "h3",
          "h4",
          "p",
          "section",
          "div",
          "table",
          "thead",
          "tbody",
          "tr",
          "th",
          "td",
          "caption",
          "span",
          "pre",
          "code",
          "a",
          "ul",
          "li",
          "dl",
          "dt",
          "dd",
          "br",
          "figure",
          "figcaption",
          "svg",
          "path",
          "strong",
          "em",
          "i",
          "script",
          "ol",
          "blockquote",
          "hr");

  private static final String TEXT =
      "/// # A title "
          + HOSTILE.replace("\u0000", "").replace("\u0007", "")
          + "\n"
          + "/// <b onclick=\"x\">raw</b> [link](javascript:alert(1)) ![pic](http://e.org/x.png)\n\n"
          + "var x = 1; // "
          + HOSTILE.replace("\u0000", "").replace("\u0007", "")
          + "\n"
          + "x\n";

  private static ReplayLog log() {
    Workbook workbook = Workbook.parse("a<b>.jsh", Path.of("."), TEXT);
    ReplayLog log = new ReplayLog(workbook, ReplaySettings.PLAIN);
    Item.Measure value = new Item.Measure(HOSTILE, 142.03, HOSTILE, 96, 211, HOSTILE, 4, HOSTILE);
    Command first = workbook.commands().get(0);
    Command second = workbook.commands().get(1);
    log.started(first);
    log.event(first, new Event.Kept(HOSTILE, value));
    log.event(first, new Event.Assumed(HOSTILE, value, value, true));
    log.event(first, new Event.Cautioned("X01", HOSTILE, HOSTILE, 1));
    log.event(first, new Event.Used("id", HOSTILE, HOSTILE, HOSTILE, HOSTILE, HOSTILE));
    log.event(first, new Event.InputRead(HOSTILE, "/a", 3, "00ff", 2, List.of(HOSTILE, HOSTILE)));
    log.event(first, new Event.Printed(HOSTILE, false));
    log.event(
        first,
        new Event.Shown(
            new Item.Grid(
                HOSTILE,
                List.of(new Item.Head(HOSTILE, HOSTILE, true)),
                List.of(List.of(HOSTILE)),
                9,
                List.of(HOSTILE))));
    log.event(
        first,
        new Event.Shown(
            new Item.Picture(
                "<svg><path d=\"M0 0h0\"/></svg>", HOSTILE, HOSTILE, List.of(HOSTILE), "")));
    log.event(first, new Event.Returned("x", "int", value));
    log.finished(first);
    log.started(second);
    Event.Failed failed =
        new Event.Failed(
            "exception", HOSTILE, HOSTILE, List.of(new Event.Frame(HOSTILE, HOSTILE, 3)), true);
    log.event(second, failed);
    log.finished(second);
    log.ended(
        new ReplayOutcome(
            ReplayOutcome.Kind.FAILED, second, failed, ReplaySettings.Way.WHOLE, "", Set.of()));
    return log;
  }

  private static String page(int millis) {
    ReplayLog log = log();
    LogRecord record = LogRecord.of(log, TEXT.getBytes(StandardCharsets.UTF_8), false);
    return LogPage.of(
        log,
        record,
        new RunFacts(Instant.ofEpochSecond(millis), Duration.ofMillis(millis), HOSTILE));
  }

  private static Document parse(String page) throws Exception {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new ByteArrayInputStream(page.getBytes(StandardCharsets.UTF_8)));
  }

  @Test
  void hostileTextInEverySlotMakesNoElementOfItsOwn() throws Exception {
    NodeList all = parse(page(1)).getElementsByTagName("*");
    int scripts = 0;
    List<String> foreign = new ArrayList<>();
    for (int i = 0; i < all.getLength(); i++) {
      Element element = (Element) all.item(i);
      if (!OURS.contains(element.getTagName())) {
        foreign.add(element.getTagName());
      }
      if (element.getTagName().equals("script")) {
        scripts++;
        assertEquals("application/json", element.getAttribute("type"));
      }
      for (int a = 0; a < element.getAttributes().getLength(); a++) {
        String name = element.getAttributes().item(a).getNodeName();
        assertFalse(name.startsWith("on") || name.equals("style"), name);
        if (name.equals("href")) {
          assertTrue(element.getAttribute(name).startsWith("#line-"), element.getAttribute(name));
        }
      }
    }
    assertEquals(List.of(), foreign);
    assertEquals(1, scripts);
    assertTrue(all.getLength() > 80, "saw " + all.getLength());
  }

  @Test
  void rawHtmlInProseShowsAsText() throws Exception {
    String text = parse(page(1)).getElementsByTagName("main").item(0).getTextContent();
    assertTrue(text.contains("<b onclick=\"x\">raw</b>"), text);
    assertTrue(text.contains("javascript:alert(1)"), "an address is text, not a link");
  }

  @Test
  void policyHoldsTheStyleThatIsThere() throws Exception {
    Document page = parse(page(1));
    String style = page.getElementsByTagName("style").item(0).getTextContent();
    String hash =
        Base64.getEncoder()
            .encodeToString(
                MessageDigest.getInstance("SHA-256")
                    .digest(style.getBytes(StandardCharsets.UTF_8)));
    String policy = ((Element) page.getElementsByTagName("meta").item(1)).getAttribute("content");
    assertEquals("default-src 'none'; style-src 'sha256-" + hash + "'; img-src data:", policy);
  }

  @Test
  void onlyTheMarkedBlockDiffers() {
    assertEquals(outside(page(1)), outside(page(2)));
    assertFalse(page(1).equals(page(2)));
  }

  private static String outside(String page) {
    int from = page.indexOf(LogPage.RUN_BEGINS);
    int to = page.indexOf(LogPage.RUN_ENDS);
    assertTrue(from > 0 && to > from);
    return page.substring(0, from) + page.substring(to);
  }

  @Test
  void sectionsStandInTheirOrder() {
    String page = page(1);
    int at = 0;
    for (String id :
        List.of("kept", "cautions", "assumptions", "steps", "inputs", "methods", "made", "run")) {
      int next = page.indexOf("id=\"" + id + "\"");
      assertTrue(next > at, id);
      at = next;
    }
    assertTrue(page.indexOf("licensed practice") > at);
  }
}
