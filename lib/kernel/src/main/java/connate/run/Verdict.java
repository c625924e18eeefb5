package connate.run;

import connate.compile.Complaint;
import connate.guard.Guard;
import connate.guard.Refusal;
import connate.protocol.Event;
import connate.protocol.Request;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.List;
import java.util.Optional;

/** What the guard says of commands, in the words of a failed command. */
final class Verdict {

  private Verdict() {}

  /** Returns the judge of commands that are compiled on their own. */
  static ShellControl.Judge of(ReplaySettings settings) {
    if (!settings.guarded()) {
      return classes -> null;
    }
    Guard guard = new Guard();
    return classes -> guard.judge(classes).map(Verdict::bare).orElse(null);
  }

  private static Event.Failed bare(Refusal refusal) {
    String message = refusal.message() + "\nhelp: " + Refusal.HELP;
    return new Event.Failed("refused", "", message, List.of(), false);
  }

  /** Returns what the guard refuses of a whole workbook's classes. */
  static Optional<Refusal> of(List<Request.Bytecode> classes, ReplaySettings settings) {
    return settings.guarded() ? new Guard().judge(classes) : Optional.empty();
  }

  /** Returns the command in which a refusal lies. */
  static Command command(Workbook workbook, Refusal refusal) {
    Command found = workbook.commands().get(0);
    for (Command command : workbook.commands()) {
      if (command.firstLine() <= refusal.line()) {
        found = command;
      }
    }
    return found;
  }

  /** Returns the refusal with its place. */
  static Event.Failed placed(Workbook workbook, Command command, String message, int line) {
    int at = Math.max(workbook.lineAt(command.codeStart()), line);
    int offset = workbook.startOf(at) + indent(workbook.lines().get(at - 1));
    String text = new Complaint(workbook).refused(offset, command, message);
    Event.Frame frame = new Event.Frame("", workbook.name(), at);
    return new Event.Failed("refused", "", text, List.of(frame), false);
  }

  private static int indent(String line) {
    return line.length() - line.stripLeading().length();
  }
}
