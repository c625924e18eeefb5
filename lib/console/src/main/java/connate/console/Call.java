package connate.console;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A housekeeping call as typed: a name, and in its brackets nothing or one text. It reads as any
 * call does, but the console answers it itself.
 *
 * @param name the name
 * @param argument the text, empty where the brackets hold nothing
 */
record Call(String name, Optional<String> argument) {

  /** The names that the console answers to. */
  static final List<String> NAMES =
      List.of("help", "methods", "inputs", "results", "undo", "save", "open", "log", "why", "quit");

  private static final Pattern FORM =
      Pattern.compile("\\s*(\\w+)\\s*\\(\\s*(?:\"((?:[^\"\\\\]|\\\\.)*)\")?\\s*\\)\\s*;?\\s*");

  /** Reads a call; returns nothing for any other command. */
  static Optional<Call> parse(String typed) {
    Matcher matcher = FORM.matcher(typed);
    if (!matcher.matches() || !NAMES.contains(matcher.group(1))) {
      return Optional.empty();
    }
    Optional<String> argument =
        Optional.ofNullable(matcher.group(2)).map(t -> t.replaceAll("\\\\(.)", "$1"));
    return Optional.of(new Call(matcher.group(1), argument));
  }

  /** Returns the call that somebody meant who typed a bare name, as other programs have it. */
  static Optional<String> meant(String typed) {
    String bare = typed.strip().replaceAll("[;!?]+$", "");
    String name = bare.equals("exit") || bare.equals("exit()") ? "quit" : bare;
    return NAMES.contains(name) ? Optional.of(name + "()") : Optional.empty();
  }
}
