package connate.compile;

import connate.fault.Fault;
import connate.guard.Refusal;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Says in plain words what the compiler found, at the workbook's own line and column. */
public final class Complaint {

  private static final Pattern SYMBOL = Pattern.compile("symbol:\\s+(\\S+) (.+)");
  private static final Pattern WHERE = Pattern.compile("location:\\s+(.+)");
  private static final Map<String, String> PLAIN =
      Map.of(
          "compiler.err.premature.eof", "the command is not finished: a bracket stays open",
          "compiler.err.unclosed.str.lit", "a text begins here that no \" closes",
          "compiler.err.unclosed.comment", "a comment begins here that no */ closes",
          "compiler.err.illegal.start.of.expr", "no expression can begin like this",
          "compiler.err.not.stmt", "this does nothing: neither a call nor an assignment");

  private final Workbook workbook;

  /** Makes complaints about a workbook. */
  public Complaint(Workbook workbook) {
    this.workbook = workbook;
  }

  /**
   * Returns the problem that the compiler tells.
   *
   * @param code the compiler's code for it
   * @param text the compiler's words
   * @param offset the place in the workbook
   * @param length how many letters are meant
   */
  public Problem of(String code, String text, int offset, int length, Command command) {
    String bare = text.replace(Header.OWNER + ".", "");
    String plain = PLAIN.get(code);
    String message = plain == null ? words(code, bare) : plain;
    return of(offset, length, command, message, help(code, bare, command));
  }

  /** Returns a problem at a place. */
  public Problem of(int offset, int length, Command command, String message, String help) {
    Fault fault = fault(offset, length, "J01", message, help);
    return new Problem(command.index(), fault.line(), fault.column(), fault.toString());
  }

  /** Returns at its place, in words ready to be read, that the guard refuses something. */
  public String refused(int offset, Command command, String message) {
    int length = Math.max(1, command.codeEnd() - offset);
    return fault(offset, length, "G01", message, Refusal.HELP).toString();
  }

  private Fault fault(int offset, int length, String code, String message, String help) {
    int place = Math.min(offset, workbook.text().length());
    int line = workbook.lineAt(place);
    int column = workbook.columnAt(place);
    String shown = workbook.lines().get(line - 1);
    int marks = Math.max(1, Math.min(length, shown.length() - column + 1));
    return new Fault(workbook.name(), line, column, marks, code, message, shown, help);
  }

  private static String words(String code, String text) {
    Matcher symbol = SYMBOL.matcher(text);
    if (code.startsWith("compiler.err.cant.resolve") && symbol.find()) {
      String kind = kind(symbol.group(1), symbol.group(2));
      Matcher where = WHERE.matcher(text);
      boolean own =
          !where.find()
              || where.group(1).matches("(class )?\\s*|.*(\\$Workbook|\\$JShell\\$|REPL).*");
      String owner = own ? "" : " in " + where.group(1).replaceFirst("^(class|interface) ", "");
      return "no " + kind + " «" + symbol.group(2).strip() + "» is known" + (own ? " here" : owner);
    }
    return text.lines()
        .map(String::strip)
        .filter(l -> !l.isEmpty())
        .reduce((a, b) -> a + "; " + b)
        .orElse("does not compile");
  }

  /** A name with a capital may be meant as a type, even where the compiler looks for a variable. */
  private static String kind(String said, String name) {
    boolean capital = said.equals("variable") && Character.isUpperCase(name.charAt(0));
    return capital ? "type or variable" : said.equals("class") ? "type" : said;
  }

  private String help(String code, String text, Command command) {
    Matcher symbol = SYMBOL.matcher(text);
    if (!code.startsWith("compiler.err.cant.resolve") || !symbol.find()) {
      return "";
    }
    List<String> names =
        workbook.commands().stream()
            .filter(c -> c.index() < command.index() && c.kind() == Command.Kind.VARIABLE)
            .flatMap(c -> c.declaredNames().stream())
            .toList();
    return Nearby.name(symbol.group(2).strip(), names)
        .map(n -> "did you mean «" + n + "»?")
        .orElse("");
  }
}
