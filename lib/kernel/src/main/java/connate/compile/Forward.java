package connate.compile;

import connate.workbook.Command;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;

/**
 * Finds the first command that needs something which stands only further down. One class would hold
 * it, but a workbook runs from top to bottom.
 */
final class Forward {

  private final Map<String, Integer> variables;
  private final Map<String, Integer> others = new HashMap<>();
  private final References references;
  private final Javac.Pass pass;
  private Command command;
  private Element missing;
  private long place;

  Forward(CodePass code, References references, Javac.Pass pass, List<Command> commands) {
    this.variables = code.declared();
    this.references = references;
    this.pass = pass;
    for (Command declaring : commands) {
      if (declaring.kind() == Command.Kind.TYPE || declaring.kind() == Command.Kind.METHOD) {
        declaring.declaredMember().ifPresent(n -> others.putIfAbsent(n, declaring.index()));
      }
    }
    for (Command running : commands) {
      if (command == null && references.element(CodePass.method(running.index())) != null) {
        check(running);
      }
    }
  }

  private void check(Command running) {
    Map<Element, Long> uses = references.of(CodePass.method(running.index())).uses();
    uses.forEach(
        (used, at) -> {
          note(running, used, at);
          references.reach(used).forEach(further -> note(running, further, at));
        });
  }

  private void note(Command running, Element used, long at) {
    String name = used.getSimpleName().toString();
    Map<String, Integer> where = used.getKind() == ElementKind.FIELD ? variables : others;
    if (command == null && where.getOrDefault(name, -1) > running.index()) {
      command = running;
      missing = used;
      place = at;
    }
  }

  /** Returns the command, {@code null} where all is in order. */
  Command command() {
    return command;
  }

  Problem problem(Complaint complaint) {
    String name = missing.getSimpleName().toString();
    return complaint.of(
        pass.sheet().offset(place),
        1,
        command,
        "«" + name + "» is needed here, but stands only further down",
        "move the line that declares «" + name + "» above this one");
  }
}
