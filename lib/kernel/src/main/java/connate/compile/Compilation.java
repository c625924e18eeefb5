package connate.compile;

import connate.protocol.Request;
import java.util.List;

/**
 * What came of compiling a workbook at once.
 *
 * @param owner the class that holds the commands' methods
 * @param classes the class files
 * @param entries the commands that can run, in order
 * @param problem why the command after these does not compile, {@code null} where all do
 * @param why why the workbook must be compiled command by command, empty where it need not
 */
public record Compilation(
    String owner,
    List<Request.Bytecode> classes,
    List<Entry> entries,
    Problem problem,
    String why) {

  static Compilation commandByCommand(String why) {
    return new Compilation("", List.of(), List.of(), null, why);
  }

  /** Returns whether the workbook can be run as it was compiled. */
  public boolean isUsable() {
    return why.isEmpty();
  }
}
