package connate.console;

import connate.log.Values;
import connate.protocol.Event;
import connate.record.ReplayLog;
import connate.run.ReplayOutcome;
import connate.text.ItemText;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;

/** Prints what a replay came to. */
final class Report {

  private final ReplayLog log;
  private final PrintStream out;
  private final PrintStream err;

  Report(ReplayLog log, PrintStream out, PrintStream err) {
    this.log = log;
    this.out = out;
    this.err = err;
  }

  /** Prints the kept results, aligned, and where the log is. */
  void results(Path written) {
    List<ReplayLog.Of<Event.Kept>> kept = log.kept();
    int name = kept.stream().mapToInt(k -> k.event().name().length()).max().orElse(0);
    int value = kept.stream().mapToInt(k -> value(k).length()).max().orElse(0);
    for (ReplayLog.Of<Event.Kept> of : kept) {
      String range = Values.range(of.event().value());
      String line =
          pad(ItemText.clean(of.event().name()), name)
              + "  "
              + pad(value(of), range.isEmpty() ? 0 : value)
              + (range.isEmpty() ? "" : "  (" + ItemText.clean(range) + ")");
      out.println(line);
    }
    out.println("log: " + written);
  }

  /** Prints the cautions, one line each. */
  void cautions() {
    for (ReplayLog.Of<Event.Cautioned> of : log.cautions()) {
      err.println(
          log.workbook().name()
              + ":"
              + of.command().firstLine()
              + ": caution["
              + of.event().code()
              + "]: "
              + ItemText.clean(of.event().text()));
    }
  }

  /** Says how the replay ended and returns the exit status. */
  int ending(ReplayOutcome outcome, Path written) {
    if (outcome.kind() == ReplayOutcome.Kind.COMPLETED) {
      for (String unused : outcome.unused()) {
        err.println("connate: no command assumes «" + unused + "»" + Help.near(unused, assumed()));
      }
      return outcome.unused().isEmpty() ? Exit.DONE : Exit.USAGE;
    }
    err.println(words(outcome));
    err.println("what ran before is in the log: " + written);
    return switch (outcome.kind()) {
      case STOPPED -> Exit.INTERRUPTED;
      case REFUSED -> Exit.REFUSED;
      default -> outcome.isBadInput() ? Exit.BAD_INPUT : Exit.FAILED;
    };
  }

  private List<String> assumed() {
    return log.assumed().stream().map(a -> a.event().name()).toList();
  }

  private String words(ReplayOutcome outcome) {
    if (outcome.kind() == ReplayOutcome.Kind.STOPPED) {
      return "stopped";
    }
    String message = ItemText.clean(outcome.failure().message());
    if (outcome.command() == null || message.startsWith(log.workbook().name() + ":")) {
      return message;
    }
    return place(outcome) + ": error: " + message;
  }

  /**
   * The line of the command in which it went wrong, where the stack tells; else where it begins.
   */
  private String place(ReplayOutcome outcome) {
    String name = log.workbook().name();
    int first = outcome.command().firstLine();
    int line =
        outcome.failure().frames().stream()
            .filter(f -> f.file().equals(name) && f.line() >= first)
            .mapToInt(Event.Frame::line)
            .findFirst()
            .orElse(first);
    return line == first ? name + ":" + line + ":" + outcome.command().column() : name + ":" + line;
  }

  private static String value(ReplayLog.Of<Event.Kept> of) {
    return ItemText.clean(Values.plain(of.event().value()));
  }

  private static String pad(String text, int width) {
    return text + " ".repeat(Math.max(0, width - text.length()));
  }
}
