package connate.run;

import connate.compile.Complaint;
import connate.compile.Problem;
import connate.protocol.Event;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.function.Consumer;

/** Runs a workbook command by command. */
final class ShellRun {

  private final Workbook workbook;
  private final Shell shell;
  private final Watch watch;
  private final Complaint complaint;

  ShellRun(Workbook workbook, Shell shell, Watch watch) {
    this.workbook = workbook;
    this.shell = shell;
    this.watch = watch;
    this.complaint = new Complaint(workbook);
  }

  /** Runs the commands in order, until one fails or the run is stopped. */
  void run() {
    for (Command command : workbook.commands()) {
      if (!watch.run(command, told -> run(command, told))) {
        return;
      }
    }
  }

  private Event run(Command command, Consumer<Event> told) {
    int line = workbook.lineAt(command.codeStart());
    Shell.Result result = shell.run(command.index(), line, command.closedCode(), told);
    if (!result.flaws().isEmpty()) {
      return WholeRun.failed(workbook, problem(command, result.flaws().get(0)));
    }
    for (String missing : result.unresolved()) {
      if (!comes(missing.substring(missing.lastIndexOf(' ') + 1), command)) {
        String message = "no " + missing.replaceFirst(" (.*)", " «$1»") + " is known here";
        return WholeRun.failed(
            workbook, complaint.of(command.codeStart(), 1, command, message, ""));
      }
    }
    if (result.last() instanceof Event.Failed failed && failed.kind().equals("compile")) {
      return WholeRun.failed(
          workbook, complaint.of(command.codeStart(), 1, command, failed.message(), ""));
    }
    if (result.last() instanceof Event.Failed failed
        && failed.kind().equals("refused")
        && failed.frames().isEmpty()) {
      String message = failed.message().lines().findFirst().orElse("");
      return Verdict.placed(workbook, command, message, 0);
    }
    return result.last();
  }

  private Problem problem(Command command, Shell.Flaw flaw) {
    int from = Math.min(command.codeStart() + flaw.from(), command.codeEnd());
    return complaint.of(flaw.code(), flaw.text(), from, flaw.to() - flaw.from(), command);
  }

  /** Returns whether another command declares a name: it may stand further down. */
  private boolean comes(String name, Command after) {
    String bare = name.replaceFirst("\\(.*", "");
    return workbook.commands().stream()
        .filter(c -> c.index() != after.index())
        .anyMatch(
            c ->
                c.kind() == Command.Kind.VARIABLE && c.declaredNames().contains(bare)
                    || c.declaredMember().filter(bare::equals).isPresent());
  }
}
