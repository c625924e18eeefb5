package connate.compile;

import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Writes the commands as they will run: variables as static fields, types and methods as static
 * members, and for each command that does something a method. Everything stays on its line, so that
 * the line numbers of class files and messages are the workbook's.
 */
final class CodePass {

  private static final Map<String, String> ZERO = Map.of("boolean", "false", "char", "'\\0'");

  private final List<Command> commands;
  private final List<String> preload;
  private final Map<Integer, List<Variable>> variables;
  private final Sheet sheet;
  private final Map<String, Integer> declared = new HashMap<>();
  private final Map<String, TypeName> types = new HashMap<>();
  private String clash = "";

  CodePass(
      Workbook workbook,
      List<Command> commands,
      Map<Integer, List<Variable>> variables,
      List<String> preload) {
    this.preload = preload;
    this.commands = commands;
    this.variables = variables;
    this.sheet = new Sheet(workbook);
    write();
  }

  Sheet sheet() {
    return sheet;
  }

  /** Returns for each variable the command that declares it first. */
  Map<String, Integer> declared() {
    return declared;
  }

  /** Returns why the commands cannot be written so, empty where they can. */
  String clash() {
    return clash;
  }

  static String method(int command) {
    return "$" + command;
  }

  private void write() {
    Header.write(sheet, commands, preload);
    sheet.add("class " + Header.OWNER + " { ");
    for (Command command : commands) {
      switch (command.kind()) {
        case IMPORT:
          break;
        case TYPE, METHOD:
          sheet.toLineOf(command.codeStart()).add("static ");
          sheet.copy(command.codeStart(), command.unmodified()).add(" ");
          break;
        case VARIABLE:
          declare(command);
          break;
        case EXPRESSION:
          express(command);
          break;
        default:
          sheet.toLineOf(command.codeStart()).add(head("void", command));
          sheet.copy(command.codeStart(), command.code());
          sheet.add(Header.closed(command) + " } ");
          break;
      }
    }
    sheet.add("}\n");
  }

  private static String head(String type, Command command) {
    return "static " + type + " " + method(command.index()) + "() throws Throwable { ";
  }

  private void express(Command command) {
    Variable value = variables.get(command.index()).get(0);
    sheet.toLineOf(value.from());
    boolean typed = value.type().isWritten() && value.type().exact();
    String type = value.isVoid() ? "void" : typed ? value.type().text() : "Object";
    sheet.add(head(type, command)).add(value.isVoid() ? "" : "return ");
    sheet.copy(value.from(), value.to()).add("; } ");
  }

  private void declare(Command command) {
    List<Variable> all = variables.get(command.index());
    sheet.toLineOf(command.codeStart());
    all.forEach(variable -> field(variable, command));
    sheet.add(head(type(all.get(all.size() - 1)), command));
    for (Variable variable : all) {
      assign(variable);
    }
    sheet.add("return " + all.get(all.size() - 1).name() + "; } ");
  }

  private static String type(Variable variable) {
    return variable.type().isWritten() ? variable.type().text() : "Object";
  }

  private void field(Variable variable, Command command) {
    TypeName before = types.put(variable.name(), variable.type());
    if (before == null) {
      declared.put(variable.name(), command.index());
      sheet.add("static ");
      if (variable.typeFrom() < 0) {
        sheet.add(type(variable));
      } else {
        sheet.copy(variable.typeFrom(), type(variable));
      }
      sheet.add(" " + variable.name() + "; ");
    } else if (!before.equals(variable.type()) || !before.exact()) {
      clash =
          "«"
              + variable.name()
              + "» is declared twice with different types, again in line "
              + (command.firstLine());
    }
    if (!variable.type().isWritten() && !variable.broken()) {
      clash = "the type of «" + variable.name() + "» has no name";
    }
  }

  private void assign(Variable variable) {
    if (variable.hasValue()) {
      sheet.toLineOf(variable.from()).add(variable.name() + " = ");
      sheet.add(variable.braces() ? "new " + type(variable) : "");
      sheet.copy(variable.from(), variable.to()).add("; ");
    } else {
      sheet.add(variable.name() + " = " + zero(variable) + "; ");
    }
  }

  private static String zero(Variable variable) {
    String type = variable.type().text();
    boolean primitive = type.matches("[a-z]+");
    return primitive ? ZERO.getOrDefault(type, "0") : "null";
  }
}
