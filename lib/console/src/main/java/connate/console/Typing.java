package connate.console;

import connate.workbook.Command;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Where in a half-typed command the cursor stands.
 *
 * @param command the command up to the cursor
 * @param word where in it the word at the cursor begins; in a text, where the text begins
 * @param text whether the cursor stands in a text between quotes
 * @param call the name of the call whose text this is, empty where there is none
 */
record Typing(String command, int word, boolean text, String call) {

  private static final Pattern CALL = Pattern.compile("(\\w+)\\s*\\(\\s*(?:\"[^\"]*\"\\s*,\\s*)*$");

  /** Looks at a buffer whose cursor stands at a place. */
  static Typing of(String buffer, int cursor) {
    String typed = lastCommand(buffer.substring(0, cursor));
    int quote = openQuote(typed);
    if (quote >= 0) {
      Matcher call = CALL.matcher(typed.substring(0, quote));
      return new Typing(typed, quote + 1, true, call.find() ? call.group(1) : "");
    }
    int word = typed.length();
    while (word > 0 && Character.isJavaIdentifierPart(typed.charAt(word - 1))) {
      word--;
    }
    return new Typing(typed, word, false, "");
  }

  /** Returns the word, or the text so far. */
  String typedWord() {
    return command.substring(word);
  }

  /** Returns whether the word is the first of its command. */
  boolean first() {
    return !text && command.substring(0, word).isBlank();
  }

  /** Returns whether the next thing to come is an argument. */
  boolean atArgument() {
    String before = command.stripTrailing();
    return !text && (before.endsWith("(") || before.endsWith(","));
  }

  private static String lastCommand(String typed) {
    if (typed.indexOf('\n') < 0 && typed.indexOf(';') < 0) {
      return typed;
    }
    List<Command> commands = Workbook.parse("typed", Path.of(""), typed).commands();
    if (commands.isEmpty()) {
      return "";
    }
    Command last = commands.get(commands.size() - 1);
    boolean ended = typed.stripTrailing().endsWith(";") && last.kind() != Command.Kind.UNFINISHED;
    return ended ? "" : typed.substring(last.codeStart());
  }

  /** Returns where a text begins that is not closed yet, -1 where none is. */
  private static int openQuote(String typed) {
    int open = -1;
    for (int at = 0; at < typed.length(); at++) {
      char c = typed.charAt(at);
      if (c == '\\' && open >= 0) {
        at++;
      } else if (c == '"') {
        open = open < 0 ? at : -1;
      } else if (c == '\n') {
        open = -1;
      } else if (c == '/' && open < 0 && typed.startsWith("//", at)) {
        int end = typed.indexOf('\n', at);
        at = end < 0 ? typed.length() : end;
      }
    }
    return open;
  }
}
