package connate.run;

import connate.protocol.Event;
import connate.protocol.Request;
import java.util.List;

/** What the guard says of the classes of a command that is compiled on its own. */
final class Verdict {

  private Verdict() {}

  static ShellControl.Judge of(String workbook, ReplaySettings settings) {
    return classes -> judge(workbook, settings, classes);
  }

  private static Event.Failed judge(
      String workbook, ReplaySettings settings, List<Request.Bytecode> classes) {
    return null;
  }
}
