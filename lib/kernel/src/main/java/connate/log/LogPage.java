package connate.log;

import connate.protocol.Event;
import connate.protocol.Item;
import connate.record.Digest;
import connate.record.LogRecord;
import connate.record.ReplayLog;
import connate.record.Versions;
import connate.run.ReplayOutcome;
import connate.workbook.Command;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.List;

/**
 * Writes the log: title, kept results, cautions, assumptions, steps, inputs, methods, how it was
 * made, notice. The same workbook, inputs, assumptions and seed give the same bytes outside the
 * block between the two run marks.
 */
public final class LogPage {

  /** Stands before the block that differs between runs. */
  public static final String RUN_BEGINS = "<!-- run -->";

  /** Stands after the block that differs between runs. */
  public static final String RUN_ENDS = "<!-- /run -->";

  private static final String STYLE = style();

  private final ReplayLog log;
  private final LogRecord record;
  private final String title;
  private final Markup out = new Markup();

  private LogPage(ReplayLog log, LogRecord record) {
    this.log = log;
    this.record = record;
    this.title = log.title();
  }

  /** Returns the log of a replay as one HTML file. */
  public static String of(ReplayLog log, LogRecord record, RunFacts run) {
    return new LogPage(log, record).page(run);
  }

  private String page(RunFacts run) {
    out.checked("<!DOCTYPE html>").line();
    out.open("html", "xmlns", "http://www.w3.org/1999/xhtml", "lang", "en").line();
    head();
    out.open("body").line();
    out.open("main").line();
    out.leaf("h1", title);
    out.leaf("p", "Calculation log of " + log.workbook().name(), "class", "lead").line();
    ending();
    kept();
    cautions();
    assumptions();
    steps();
    inputs();
    methods();
    made(run);
    notice();
    out.close().line();
    data();
    out.close().line().close().line();
    return out.toString();
  }

  private void head() {
    out.open("head").line().empty("meta", "charset", "utf-8").line();
    out.empty(
        "meta",
        "http-equiv",
        "Content-Security-Policy",
        "content",
        "default-src 'none'; style-src 'sha256-" + styleHash() + "'; img-src data:");
    out.line().empty("meta", "name", "viewport", "content", "width=device-width, initial-scale=1");
    out.line().leaf("title", title).line();
    out.open("style").checked(STYLE).close().line().close().line();
  }

  private void ending() {
    ReplayOutcome outcome = log.outcome();
    if (outcome == null || outcome.kind() == ReplayOutcome.Kind.COMPLETED) {
      return;
    }
    out.open("div", "class", "failed", "role", "alert");
    out.leaf("strong", endingWords(outcome));
    if (outcome.command() != null) {
      out.text(" ")
          .leaf("a", place(outcome.command()), "href", "#" + StepMarkup.id(outcome.command()));
    }
    if (outcome.failure() != null) {
      out.leaf("pre", outcome.failure().message());
    }
    out.close().line();
  }

  private static String endingWords(ReplayOutcome outcome) {
    return switch (outcome.kind()) {
      case STOPPED -> "This replay was stopped before its end; what follows is what had run.";
      case REFUSED -> "The guard refused this workbook; nothing ran.";
      default -> "This replay did not reach its end; what follows is what had run.";
    };
  }

  private static String place(Command command) {
    return "line " + command.firstLine();
  }

  private void section(String id, String heading) {
    out.open("section", "id", id, "aria-labelledby", id + "-h");
    out.leaf("h2", heading, "id", id + "-h").line();
  }

  private void endSection() {
    out.close().line();
  }

  private void link(Command command) {
    out.leaf("a", place(command), "href", "#" + StepMarkup.id(command));
  }

  private void kept() {
    section("kept", "Kept results");
    if (log.kept().isEmpty()) {
      out.leaf("p", "None.");
    } else {
      table("kept", "result", "value", "range", "n", "step");
      for (ReplayLog.Of<Event.Kept> of : log.kept()) {
        Item.Measure value = of.event().value();
        out.open("tr").leaf("td", of.event().name());
        out.leaf("td", Values.plain(value)).leaf("td", Values.range(value));
        out.leaf("td", value.count() > 0 ? Integer.toString(value.count()) : "");
        out.open("td");
        link(of.command());
        out.close().close().line();
      }
      endTable();
    }
    endSection();
  }

  private void cautions() {
    section("cautions", "Cautions");
    if (log.cautions().isEmpty()) {
      out.leaf("p", "None.");
    }
    for (ReplayLog.Of<Event.Cautioned> of : log.cautions()) {
      out.open("div", "class", "caution").text(of.event().text() + " ");
      link(of.command());
      out.close().line();
    }
    endSection();
  }

  private void assumptions() {
    section("assumptions", "Assumptions");
    if (log.assumed().isEmpty()) {
      out.leaf("p", "None.");
    } else {
      table("", "assumption", "value", "", "step");
      for (ReplayLog.Of<Event.Assumed> of : log.assumed()) {
        Event.Assumed a = of.event();
        out.open("tr").leaf("td", a.name()).leaf("td", a.value().text());
        out.leaf("td", a.overridden() ? "overridden; stated " + a.stated().text() : "");
        out.open("td");
        link(of.command());
        out.close().close().line();
      }
      endTable();
    }
    endSection();
  }

  private void steps() {
    section("steps", "Calculation");
    StepMarkup markup = new StepMarkup(log, out);
    log.workbook().steps().forEach(markup::write);
    endSection();
  }

  private void inputs() {
    section("inputs", "Inputs");
    if (log.inputs().isEmpty()) {
      out.leaf("p", "None.");
    } else {
      table("", "file", "bytes", "rows", "SHA-256 and what was read as what");
      for (ReplayLog.Of<Event.InputRead> of : log.inputs()) {
        Event.InputRead in = of.event();
        out.open("tr").leaf("td", in.path());
        out.leaf("td", Long.toString(in.bytes()), "class", "n");
        out.leaf("td", Integer.toString(in.rows()), "class", "n");
        out.open("td").leaf("code", in.sha256(), "class", "hash");
        notes(in.mapping());
        out.close().close().line();
      }
      endTable();
    }
    endSection();
  }

  private void methods() {
    section("methods", "Methods used");
    if (log.methods().isEmpty()) {
      out.leaf("p", "No published method was used.");
    }
    for (ReplayLog.Of<Event.Used> of : log.methods()) {
      Event.Used m = of.event();
      out.open("div", "class", "method").leaf("h3", m.title());
      out.leaf("code", m.equation());
      out.open("ul", "class", "notes").leaf("li", "Source: " + m.source());
      if (!m.range().isEmpty()) {
        out.leaf("li", "Range: " + m.range());
      }
      out.leaf("li", m.status()).close().close().line();
    }
    endSection();
  }

  private void made(RunFacts run) {
    section("made", "How it was made");
    out.open("dl");
    fact("Connate", Versions.connate());
    fact("workbook", log.workbook().name());
    fact("workbook SHA-256", record.workbookSha256());
    fact("seed", Long.toString(log.settings().seed()));
    fact("guard", log.settings().guarded() ? "on" : "lifted by --trust");
    out.close().line();
    out.checked(RUN_BEGINS).line();
    out.open("section", "id", "run").open("dl");
    run.lines().forEach(this::fact);
    out.close().close().line();
    out.checked(RUN_ENDS).line();
    endSection();
  }

  private void fact(String name, String value) {
    out.leaf("dt", name).leaf("dd", value);
  }

  private void notice() {
    out.leaf(
        "p",
        "These results are estimates. Decisions on drilling, injection, groundwater or waste rest"
            + " with local codes and licensed practice.",
        "class",
        "notice",
        "role",
        "note");
    out.line();
  }

  private void data() {
    out.open("script", "type", "application/json", "id", "connate-record");
    out.checked(record.json()).close().line();
    record
        .pack()
        .ifPresent(
            pack -> {
              out.open("script", "type", "application/json", "id", "connate-pack");
              out.checked(pack).close().line();
            });
  }

  private void table(String kind, String... heads) {
    out.open("div", "class", "scroll").open("table", "class", kind).open("thead").open("tr");
    for (String head : heads) {
      out.leaf("th", head, "scope", "col");
    }
    out.close().close().open("tbody").line();
  }

  private void endTable() {
    out.close().close().close().line();
  }

  private void notes(List<String> lines) {
    if (!lines.isEmpty()) {
      out.open("ul", "class", "notes");
      lines.forEach(line -> out.leaf("li", line));
      out.close();
    }
  }

  private static String styleHash() {
    return Base64.getEncoder()
        .encodeToString(Digest.sha256(STYLE.getBytes(StandardCharsets.UTF_8)));
  }

  private static String style() {
    try (InputStream in = LogPage.class.getResourceAsStream("log.css")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
