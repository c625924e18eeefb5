package connate.workbook;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Splits a workbook's text into steps and commands. */
final class Splitting {

  private final String text;
  private final List<Token> all;
  private final List<Token> code = new ArrayList<>();
  private final Set<Integer> afterProse = new HashSet<>();
  private final List<Step> steps = new ArrayList<>();
  private final List<Command> commands = new ArrayList<>();
  private List<Token> prose = new ArrayList<>();
  private int count;
  private int done;
  private boolean open;

  private Splitting(String text) {
    this.text = text;
    this.all = Lexer.tokens(text);
    boolean told = false;
    for (Token token : all) {
      if (token.kind() == Token.Kind.PROSE) {
        told = true;
      } else if (token.kind() != Token.Kind.COMMENT) {
        if (told) {
          afterProse.add(code.size());
        }
        told = false;
        code.add(token);
      }
    }
  }

  static List<Step> of(String text) {
    return new Splitting(text).split();
  }

  /** Returns whether a text ends before its last command does. */
  static boolean isOpen(String text) {
    Splitting splitting = new Splitting(text);
    splitting.split();
    return splitting.open;
  }

  private List<Step> split() {
    Grammar grammar = new Grammar(code, afterProse);
    int from = 0;
    while (from < code.size()) {
      proseBefore(code.get(from).start());
      if (code.get(from).is(";")) {
        done = code.get(from).end();
        from++;
      } else {
        int end = grammar.commandEnd(from);
        boolean whole = end > from;
        open = end == Grammar.OPEN;
        int next = whole ? end : end == Grammar.OPEN ? openEnd(from) : lineEnd(from);
        add(from, next, whole ? grammar.kind() : Command.Kind.UNFINISHED);
        from = next;
      }
    }
    proseBefore(text.length());
    closeStep();
    return List.copyOf(steps);
  }

  private void add(int from, int next, Command.Kind kind) {
    int start = leadingComments(code.get(from).start());
    int end = trailingComment(code.get(next - 1));
    int line = lineOf(code.get(from), start);
    int column = start - text.lastIndexOf('\n', start - 1);
    String source = text.substring(start, end);
    commands.add(
        new Command(
            count,
            kind,
            source,
            start,
            line,
            line + newlines(source),
            column,
            code.get(from).start(),
            code.get(next - 1).end()));
    count++;
    done = end;
  }

  /** Takes the prose between the last command and a place; any ends the step before it. */
  private void proseBefore(int place) {
    List<Token> found = new ArrayList<>();
    for (int at = firstFrom(done); at < all.size() && all.get(at).start() < place; at++) {
      if (all.get(at).kind() == Token.Kind.PROSE) {
        found.add(all.get(at));
      }
    }
    if (!found.isEmpty()) {
      closeStep();
      prose = found;
    }
  }

  /** Returns the first of all tokens that begins at a place or after it. */
  private int firstFrom(int place) {
    int low = 0;
    int high = all.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (all.get(middle).start() < place) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  private void closeStep() {
    if (!prose.isEmpty() || !commands.isEmpty()) {
      int line = prose.isEmpty() ? 0 : prose.get(0).line();
      steps.add(new Step(steps.size(), proseText(), line, List.copyOf(commands)));
    }
    prose = new ArrayList<>();
    commands.clear();
  }

  private String proseText() {
    StringBuilder out = new StringBuilder();
    int line = prose.isEmpty() ? 0 : prose.get(0).line();
    for (Token part : prose) {
      out.append("\n".repeat(part.line() - line)).append(strip(part.text()));
      line = part.line();
    }
    return out.toString();
  }

  private static String strip(String marked) {
    String words = marked.substring(3);
    return words.startsWith(" ") ? words.substring(1) : words;
  }

  /** Returns where an unfinished command is cut: at a blank line or prose outside of braces. */
  private int openEnd(int from) {
    int braces = 0;
    for (int at = from; at < code.size(); at++) {
      if (at > from && braces == 0 && isGapBefore(at)) {
        return at;
      }
      braces += code.get(at).is("{") ? 1 : code.get(at).is("}") ? -1 : 0;
    }
    return code.size();
  }

  private boolean isGapBefore(int at) {
    Token before = code.get(at - 1);
    return afterProse.contains(at)
        || code.get(at).line() > before.line() + newlines(before.text()) + 1;
  }

  private int lineEnd(int from) {
    int at = from + 1;
    while (at < code.size() && code.get(at).line() == code.get(at - 1).line()) {
      at++;
    }
    return at;
  }

  /** Returns where the comments begin that stand over a command. */
  private int leadingComments(int start) {
    int begin = start;
    int at = firstFrom(start) - 1;
    while (at >= 0 && all.get(at).start() >= done && all.get(at).kind() == Token.Kind.COMMENT) {
      begin = all.get(at).start();
      at--;
    }
    return begin;
  }

  /** Returns where a command ends with the comment that follows its last word on the same line. */
  private int trailingComment(Token last) {
    int line = last.line() + newlines(last.text());
    int end = last.end();
    for (int at = firstFrom(end); at < all.size() && all.get(at).line() == line; at++) {
      if (all.get(at).kind() != Token.Kind.COMMENT) {
        return end;
      }
      end = all.get(at).end();
    }
    return end;
  }

  private int lineOf(Token first, int start) {
    return first.line() - newlines(text.substring(start, first.start()));
  }

  private static int newlines(String part) {
    int count = 0;
    for (int at = part.indexOf('\n'); at >= 0; at = part.indexOf('\n', at + 1)) {
      count++;
    }
    return count;
  }
}
