package connate.log;

import connate.protocol.Event;
import connate.protocol.Item;
import connate.record.ReplayLog;
import connate.workbook.Command;
import connate.workbook.Step;
import java.util.ArrayList;
import java.util.List;

/** Sets the steps: prose, and each command with what it gave beside or beneath it. */
final class StepMarkup {

  private final ReplayLog log;
  private final Markup out;
  private final ItemMarkup items;
  private boolean titled;

  StepMarkup(ReplayLog log, Markup out) {
    this.log = log;
    this.out = out;
    this.items = new ItemMarkup(out);
  }

  /** Returns the id of a command in the page. */
  static String id(Command command) {
    return "line-" + command.firstLine();
  }

  void write(Step step) {
    if (!step.prose().isEmpty()) {
      out.open("div", "class", "prose").checked(Prose.html(step.prose(), !titled)).close().line();
      titled = titled || Prose.hasTitle(step.prose());
    }
    step.commands().forEach(this::write);
  }

  private void write(Command command) {
    List<Event> beside = new ArrayList<>();
    List<Event> beneath = new ArrayList<>();
    for (Event event : shown(log.of(command))) {
      (isWide(event) || !beneath.isEmpty() ? beneath : beside).add(event);
    }
    String kind = beside.isEmpty() ? "command alone" : "command";
    out.open("div", "class", log.ran(command) ? kind : kind + " idle", "id", id(command));
    out.leaf("span", Integer.toString(command.firstLine()), "class", "at");
    out.leaf("pre", command.source().strip(), "class", "code");
    block("gave", beside);
    block("gave wide", beneath);
    out.close().line();
  }

  private void block(String kind, List<Event> events) {
    if (!events.isEmpty()) {
      out.open("div", "class", kind);
      events.forEach(this::write);
      out.close();
    }
  }

  /** A statement that gave nothing, and the reading of inputs, need no place of their own. */
  private static List<Event> shown(List<Event> events) {
    return events.stream()
        .filter(
            e ->
                !(e instanceof Event.InputRead
                    || e instanceof Event.Used
                    || e instanceof Event.Progress
                    || e instanceof Event.Returned r && r.item() == null))
        .filter(e -> !(e instanceof Event.Returned r && isTold(r, events)))
        .toList();
  }

  /** The value of {@code var x = assume(…)} stands there once, as the assumption. */
  private static boolean isTold(Event.Returned returned, List<Event> events) {
    return returned.item() instanceof Item.Measure measure
        && events.stream()
            .anyMatch(e -> e instanceof Event.Assumed a && a.value().text().equals(measure.text()));
  }

  private static boolean isWide(Event event) {
    if (event instanceof Event.Shown shown) {
      return ItemMarkup.isWide(shown.item());
    }
    if (event instanceof Event.Returned returned) {
      return ItemMarkup.isWide(returned.item());
    }
    return event instanceof Event.Failed || event instanceof Event.Cautioned;
  }

  private void write(Event event) {
    if (event instanceof Event.Shown shown) {
      items.write(shown.item());
    } else if (event instanceof Event.Returned returned) {
      returned(returned);
    } else if (event instanceof Event.Kept kept) {
      line("kept as ", kept.name(), kept.value().text());
    } else if (event instanceof Event.Assumed assumed) {
      line("assumed: ", assumed.name(), assumed.value().text() + instead(assumed));
    } else if (event instanceof Event.Cautioned caution) {
      out.leaf("div", "Caution: " + caution.text(), "class", "caution");
    } else if (event instanceof Event.Printed printed) {
      out.leaf("pre", printed.text(), "class", "text");
    } else if (event instanceof Event.Failed failed) {
      failed(failed);
    }
  }

  private void returned(Event.Returned returned) {
    if (returned.item() instanceof Item.Grid grid && !returned.variable().isEmpty()) {
      items.write(brief(grid));
    } else {
      items.write(returned.item());
    }
  }

  /**
   * A variable that holds a table shows its caption and notes; the table shows when it is asked.
   */
  private static Item brief(Item.Grid grid) {
    StringBuilder text = new StringBuilder(grid.caption());
    grid.notes().forEach(note -> text.append('\n').append(note));
    return new Item.Text(text.toString().strip());
  }

  static String instead(Event.Assumed assumed) {
    return assumed.overridden() ? ", in place of " + assumed.stated().text() : "";
  }

  private void line(String lead, String name, String value) {
    out.open("div").leaf("span", lead + name, "class", "name").text(" ");
    out.leaf("span", value, "class", "value").close();
  }

  private void failed(Event.Failed failed) {
    out.open("div", "class", "failed", "role", "alert");
    out.leaf("strong", words(failed.kind())).leaf("pre", failed.message());
    List<Event.Frame> frames = failed.frames();
    if (!frames.isEmpty()) {
      out.open("ul", "class", "notes");
      frames.stream()
          .limit(12)
          .forEach(f -> out.leaf("li", "at " + f.where() + " (" + f.file() + ":" + f.line() + ")"));
      out.close();
    }
    out.close();
  }

  static String words(String kind) {
    return switch (kind) {
      case "compile" -> "This command does not compile";
      case "refused" -> "This command was refused by the guard";
      case "stopped" -> "Stopped here";
      case "exit" -> "This command ended its engine";
      case "memory" -> "This command ran out of memory";
      case "died" -> "The engine died in this command";
      default -> "This command failed";
    };
  }
}
