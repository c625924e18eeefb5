package connate.console;

import connate.compile.Complaint;
import connate.fault.Nearest;
import connate.protocol.Event;
import connate.run.Shell;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.Suggestion;

/** Puts into plain words why a typed command failed. */
final class Wrong {

  private static final Pattern PLACE = Pattern.compile("^[^\\n]*?: error\\[\\w+\\]: ");

  /** What stands before names that the user wrote without it: the shell's class, java.lang. */
  private static final Pattern OWNER =
      Pattern.compile("REPL\\.\\$JShell\\$\\w+\\.|\\bjava\\.(?:lang|util)\\.(?=[A-Z])");

  private static final Pattern UNKNOWN =
      Pattern.compile("no [a-z ]+ «(\\w+)(?:\\(.*\\))?» is known");

  private Wrong() {}

  /** Returns what is wrong with the source of a command that did not compile. */
  static String compiled(String source, Shell.Flaw flaw, SourceCodeAnalysis analysis) {
    Workbook workbook = Workbook.parse("typed", Path.of(""), source);
    if (workbook.commands().isEmpty()) {
      return "error: " + flaw.text();
    }
    int from = Math.min(flaw.from(), source.length());
    String message =
        new Complaint(workbook)
            .of(flaw.code(), flaw.text(), from, flaw.to() - from, workbook.commands().get(0))
            .message();
    String bare = OWNER.matcher(message).replaceAll("");
    String plain = PLACE.matcher(bare).replaceFirst("error: ");
    return plain.contains("did you mean") ? plain : plain + near(plain, source, from, analysis);
  }

  private static String near(String message, String source, int from, SourceCodeAnalysis analysis) {
    Matcher unknown = UNKNOWN.matcher(message);
    if (!unknown.find()) {
      return "";
    }
    String word = unknown.group(1);
    int start = source.indexOf(word, from);
    if (start < 0) {
      return "";
    }
    return nearest(word, source.substring(0, start), analysis)
        .map(n -> "\nhelp: did you mean «" + n + "»?")
        .orElse(declares(source, start + word.length(), word));
  }

  private static String declares(String source, int after, String word) {
    boolean assigned = source.substring(after).stripLeading().matches("(?s)=[^=].*");
    return assigned ? "\nhelp: a new name begins with var: var " + word + " = …" : "";
  }

  /** Asks what could stand there and takes the nearest. */
  private static Optional<String> nearest(String word, String before, SourceCodeAnalysis analysis) {
    for (int letters = Math.min(2, word.length()); letters >= 0; letters--) {
      String asked = before + word.substring(0, letters);
      List<String> names =
          analysis.completionSuggestions(asked, asked.length(), new int[1]).stream()
              .map(Suggestion::continuation)
              .map(c -> c.replaceFirst("\\(.*", ""))
              .distinct()
              .toList();
      Optional<String> found =
          names.stream()
              .filter(n -> !n.equals(word))
              .filter(n -> Nearest.distance(n, word) <= word.length() / 3)
              .min(Comparator.comparingInt(n -> Nearest.distance(n, word)));
      if (found.isPresent()) {
        return found;
      }
    }
    return Optional.empty();
  }

  /** Returns what befell a command that ran. */
  static String ran(Event.Failed failed) {
    String message = failed.message();
    return switch (failed.kind()) {
      case "stopped" -> "stopped; what was declared before is still there";
      case "exit" -> message + "; the rest is still there. quit() ends the console";
      case "died" -> message + "\nhelp: the state before this command is back";
      case "exception" -> exception(failed);
      default -> message.startsWith("error") ? message : "error: " + message;
    };
  }

  private static String exception(Event.Failed failed) {
    if (failed.badInput() || failed.message().contains(": error[")) {
      return failed.message();
    }
    String type = failed.type().substring(failed.type().lastIndexOf('.') + 1);
    String words =
        switch (type) {
          case "IllegalArgumentException", "IllegalStateException", "NoConvergence" -> "error";
          case "ArithmeticException" -> "arithmetic";
          case "NullPointerException" -> "nothing (null) where a value is needed";
          case "ArrayIndexOutOfBoundsException", "IndexOutOfBoundsException" -> "out of range";
          case "NoSuchElementException" -> "there is none";
          default -> type;
        };
    String message = OWNER.matcher(failed.message()).replaceAll("");
    return message.isEmpty() ? "error: " + words : words + ": " + message;
  }

  /** Returns where a failure happened, innermost first. */
  static List<String> trace(Event.Failed failed) {
    return failed.frames().stream()
        .map(
            f ->
                "  at "
                    + (f.where().isEmpty() ? "the command" : f.where())
                    + (f.file().isEmpty() ? "" : " (" + f.file() + ":" + f.line() + ")"))
        .toList();
  }
}
