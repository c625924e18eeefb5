package connate.console;

import connate.protocol.Event;
import connate.run.Shell;
import connate.session.Journal;
import connate.session.SessionBook;
import connate.workbook.Command;
import connate.workbook.Step;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What is typed comes here: it is cut into commands, each of which is written to the journal, run
 * and noted with what it gave.
 */
final class Desk {

  private final Screen screen;
  private final Printer printer;
  private final Path folder;
  private final Evaluator evaluator;
  private final Journal journal;
  private final SessionBook book;
  private final Map<Integer, List<Event>> events = new HashMap<>();
  private Event.Failed failure;

  /** What is to follow. */
  enum Next {
    GO_ON,
    FAILED,
    QUIT
  }

  /** Answers housekeeping calls. */
  interface Answering {
    /** Answers a call and says what is to follow. */
    Next answer(Call call);
  }

  Desk(
      Screen screen,
      Printer printer,
      Path folder,
      Evaluator evaluator,
      Journal journal,
      SessionBook book) {
    this.screen = screen;
    this.printer = printer;
    this.folder = folder;
    this.evaluator = evaluator;
    this.journal = journal;
    this.book = book;
  }

  /** Does all that was typed, in order, up to the first command that fails. */
  Next enter(String typed, Answering answering) {
    Workbook workbook = Workbook.parse("typed", folder, typed);
    int left = workbook.commands().size();
    for (Step step : workbook.steps()) {
      if (!step.prose().isEmpty()) {
        prose(step.prose());
      }
      for (Command command : step.commands()) {
        left--;
        Optional<Call> call = Call.parse(command.code());
        Next next = call.isPresent() ? answering.answer(call.get()) : run(command);
        if (next != Next.GO_ON) {
          tellLeft(next, left);
          return next;
        }
      }
    }
    return Next.GO_ON;
  }

  private void tellLeft(Next next, int left) {
    if (next == Next.FAILED && left > 0) {
      String commands = left == 1 ? "the command" : "the " + left + " commands";
      screen.line(screen.ink().caution(commands + " after this one did not run"));
    }
  }

  private void prose(String text) {
    StringBuilder lines = new StringBuilder();
    text.lines().forEach(l -> lines.append(l.isEmpty() ? "///\n" : "/// " + l + "\n"));
    String prose = lines.toString().stripTrailing();
    int number = journal.typed(prose);
    journal.worked(number);
    book.typed(number, prose);
  }

  private Next run(Command command) {
    String text = closed(command);
    int number = journal.typed(text);
    book.typed(number, text);
    Event.Failed failed = evaluate(number, command, true);
    if (failed == null) {
      journal.worked(number);
      book.worked(number);
      return Next.GO_ON;
    }
    journal.failed(number, failed.kind());
    book.failed(number);
    failure = failed;
    return Next.FAILED;
  }

  /** Returns a command's text as it can stand in a workbook: with the semicolon that it lacks. */
  private static String closed(Command command) {
    String code = command.closedCode();
    boolean bare = command.kind() == Command.Kind.EXPRESSION && !code.endsWith(";");
    int start = command.codeStart() - command.offset();
    int end = command.codeEnd() - command.offset();
    String whole = command.source();
    return whole.substring(0, start) + code + (bare ? ";" : "") + whole.substring(end);
  }

  /** Runs a command; returns why it failed, {@code null} where it worked. */
  private Event.Failed evaluate(int number, Command command, boolean told) {
    List<Event> heard = new ArrayList<>();
    printer.begins();
    String source = command.closedCode();
    Shell.Result result =
        evaluator.run(
            source,
            event -> {
              heard.add(event);
              if (told) {
                printer.event(event);
              }
            });
    heard.add(result.last());
    events.put(number, heard);
    if (result.last() instanceof Event.Failed failed) {
      if (told) {
        tell(source, failed, result);
      }
      return failed;
    }
    if (told && result.last() instanceof Event.Returned returned) {
      printer.returned(returned);
    }
    if (told && !result.unresolved().isEmpty()) {
      missing(result.unresolved());
    }
    return null;
  }

  /** A method or type may need what is not declared yet; that is no failure. */
  private void missing(List<String> names) {
    screen.line(screen.ink().caution("caution: not declared yet: " + String.join(", ", names)));
  }

  private void tell(String source, Event.Failed failed, Shell.Result result) {
    if (!result.flaws().isEmpty()) {
      String meant = Call.meant(source).map(c -> "\nhelp: did you mean " + c + "?").orElse("");
      String words = Wrong.compiled(source, result.flaws().get(0), evaluator.analysis());
      printer.failed(meant.isEmpty() ? words : words.replaceFirst("\\nhelp: .*", "") + meant);
    } else if (failed.kind().equals("compile")) {
      printer.failed("error: " + failed.message());
    } else {
      printer.failed(Wrong.ran(failed));
    }
  }

  /** Runs again what worked, unseen, in a shell that has nothing declared yet. */
  void again() {
    List<Integer> numbers = book.workedNumbers();
    int done = 0;
    for (int number : numbers) {
      done++;
      screen.status("bringing back command " + done + " of " + numbers.size());
      if (!book.isProse(number)) {
        again(number);
      }
    }
    screen.clearStatus();
  }

  private void again(int number) {
    for (Command command : Workbook.parse("typed", folder, book.text(number)).commands()) {
      Event.Failed failed = evaluate(number, command, false);
      if (failed != null) {
        book.failed(number);
        journal.failed(number, failed.kind());
        screen.line(
            screen
                .ink()
                .caution("caution: this worked before and does not now: " + command.code()));
        printer.failed(Wrong.ran(failed));
      }
    }
  }

  /** Takes the last command back; returns its text, nothing where there is none. */
  Optional<String> undo() {
    int last = book.lastWorked();
    if (last == 0) {
      return Optional.empty();
    }
    String text = book.text(last);
    journal.undone(last);
    book.undone(last);
    events.remove(last);
    evaluator.afresh();
    again();
    return Optional.of(text);
  }

  /** Stops the running command from another thread. */
  void stop() {
    evaluator.stop();
  }

  Path folder() {
    return folder;
  }

  SessionBook book() {
    return book;
  }

  Journal journal() {
    return journal;
  }

  Evaluator evaluator() {
    return evaluator;
  }

  Optional<Event.Failed> failure() {
    return Optional.ofNullable(failure);
  }

  /** Returns what happened in a command. */
  List<Event> events(int number) {
    return events.getOrDefault(number, List.of());
  }

  /** Returns what happened in all commands that worked, in order. */
  List<Event> events() {
    return book.workedNumbers().stream().flatMap(n -> events(n).stream()).toList();
  }
}
