package connate.compile;

import connate.workbook.Command;
import java.util.List;

/** What stands over the commands in both passes: the imports, on one line. */
final class Header {

  /** The class that holds a workbook's commands. */
  static final String OWNER = "$Workbook";

  private Header() {}

  static void write(Sheet sheet, List<Command> commands, List<String> preload) {
    for (String line : preload) {
      sheet.add("import " + line + "; ");
    }
    for (Command command : commands) {
      if (command.kind() == Command.Kind.IMPORT) {
        sheet.copy(command.codeStart(), command.code().replace('\n', ' '));
        sheet.add(closed(command) + " ");
      }
    }
  }

  /** Returns the semicolon that a command lacks. */
  static String closed(Command command) {
    String code = command.code();
    return code.endsWith(";") || code.endsWith("}") ? "" : ";";
  }
}
