package connate.workbook;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Set;

/**
 * Tells where a command ends that begins at a given token, and what it is. It knows statements,
 * declarations and brackets; of an expression it knows only where it stops: at a semicolon, or at
 * the end of a line that nothing carries on.
 */
final class Grammar {

  /** The answer where the text ends before the command does. */
  static final int OPEN = -1;

  /** The answer where a bracket closes that was never opened. */
  static final int STRAY = -2;

  private static final Set<String> MODIFIERS =
      Set.of(
          "public",
          "protected",
          "private",
          "static",
          "final",
          "abstract",
          "default",
          "strictfp",
          "transient",
          "volatile",
          "native",
          "synchronized");
  private static final Set<String> PRIMITIVES =
      Set.of("boolean", "byte", "short", "char", "int", "long", "float", "double", "void");
  private static final Set<String> STATEMENTS =
      Set.of(
          "if",
          "for",
          "while",
          "do",
          "try",
          "switch",
          "synchronized",
          "return",
          "throw",
          "break",
          "continue",
          "assert");
  private static final Set<String> RESERVED =
      Set.of(
          "new",
          "this",
          "super",
          "instanceof",
          "true",
          "false",
          "null",
          "case",
          "else",
          "catch",
          "finally",
          "import",
          "package",
          "class",
          "enum",
          "interface",
          "extends",
          "implements",
          "throws",
          "goto",
          "const");
  private static final Set<String> CARRIES_ON =
      Set.of(
          "+",
          "-",
          "*",
          "/",
          "%",
          "&",
          "|",
          "^",
          "!",
          "~",
          "?",
          ":",
          "=",
          "<",
          ">",
          ".",
          ",",
          "->",
          "::",
          "==",
          "<=",
          ">=",
          "!=",
          "&&",
          "||",
          "+=",
          "-=",
          "*=",
          "/=",
          "%=",
          "&=",
          "|=",
          "^=",
          "<<",
          "<<=",
          "new",
          "instanceof",
          "throws",
          "extends",
          "implements",
          "@");
  private static final Set<String> CARRIED_ON =
      Set.of(
          "+",
          "-",
          "*",
          "/",
          "%",
          "&",
          "|",
          "^",
          "?",
          ":",
          "=",
          "<",
          ">",
          ".",
          ",",
          "->",
          "::",
          "==",
          "<=",
          ">=",
          "!=",
          "&&",
          "||",
          "+=",
          "-=",
          "*=",
          "/=",
          "%=",
          "&=",
          "|=",
          "^=",
          "<<",
          "<<=",
          "instanceof",
          "throws",
          ";",
          ")",
          "]");

  private final List<Token> tokens;
  private final Set<Integer> afterProse;
  private Command.Kind kind = Command.Kind.STATEMENT;

  /**
   * Makes a grammar.
   *
   * @param tokens the text without comments and prose
   * @param afterProse the tokens before which prose stands
   */
  Grammar(List<Token> tokens, Set<Integer> afterProse) {
    this.tokens = tokens;
    this.afterProse = afterProse;
  }

  /** Returns what the last command was. */
  Command.Kind kind() {
    return kind;
  }

  /** Returns the token after the command that begins at one, or {@link #OPEN} or {@link #STRAY}. */
  int commandEnd(int from) {
    int start = afterModifiers(from);
    if (start >= tokens.size()) {
      return open(Command.Kind.UNFINISHED);
    }
    if (is(start, "import")) {
      kind = Command.Kind.IMPORT;
      return lineEnd(start + 1);
    }
    if (isType(start)) {
      kind = Command.Kind.TYPE;
      return blockEnd(start + 1, false);
    }
    int name = declaredName(start);
    if (name >= 0) {
      boolean method = is(name + 1, "(");
      kind = method ? Command.Kind.METHOD : Command.Kind.VARIABLE;
      return method ? blockEnd(name + 1, true) : expressionEnd(name + 1);
    }
    boolean statement = isStatement(start);
    kind = statement ? Command.Kind.STATEMENT : Command.Kind.EXPRESSION;
    return statement ? statementEnd(start) : expressionEnd(start);
  }

  private int open(Command.Kind what) {
    kind = what;
    return OPEN;
  }

  private int afterModifiers(int from) {
    int at = from;
    while (at < tokens.size()) {
      if (is(at, "@") && !is(at + 1, "interface")) {
        at = afterAnnotation(at);
      } else if (isModifier(at)) {
        at += is(at, "non") ? 3 : 1;
      } else {
        return at;
      }
    }
    return at;
  }

  private boolean isModifier(int at) {
    if (is(at, "sealed")) {
      return is(at + 1, "class") || is(at + 1, "interface") || is(at + 1, "abstract");
    }
    if (is(at, "non")) {
      return is(at + 1, "-") && is(at + 2, "sealed");
    }
    return MODIFIERS.contains(tokens.get(at).text()) && !is(at + 1, "(") && !is(at + 1, ":");
  }

  private int afterAnnotation(int from) {
    int at = from + 2;
    while (is(at, ".")) {
      at += 2;
    }
    if (is(at, "(")) {
      int close = close(at);
      return close < 0 ? tokens.size() : close;
    }
    return at;
  }

  private boolean isType(int at) {
    if (is(at, "record")) {
      return isName(at + 1) && (is(at + 2, "(") || is(at + 2, "<"));
    }
    return is(at, "class") || is(at, "interface") || is(at, "enum") || is(at, "@");
  }

  private boolean isStatement(int at) {
    Token token = tokens.get(at);
    return is(at, "{")
        || token.isWord() && STATEMENTS.contains(token.text())
        || token.isWord() && is(at + 1, ":");
  }

  /** Returns the name that a declaration at a token declares, negative where there is none. */
  private int declaredName(int from) {
    int type = is(from, "<") ? genericEnd(from) : from;
    int end = type < 0 ? -1 : typeEnd(type);
    boolean named = end >= 0 && isName(end) && !isReserved(type);
    return named && tokens.get(end).line() == endLine(tokens.get(end - 1)) ? end : -1;
  }

  private boolean isReserved(int at) {
    String word = tokens.get(at).text();
    return STATEMENTS.contains(word) || RESERVED.contains(word);
  }

  private int typeEnd(int from) {
    if (!isName(from) && !isPrimitive(from)) {
      return -1;
    }
    int at = from + 1;
    while (is(at, ".") || is(at, "<")) {
      if (is(at, "<")) {
        at = genericEnd(at);
        if (at < 0) {
          return -1;
        }
      } else {
        at += 2;
      }
    }
    while (is(at, "[") && is(at + 1, "]")) {
      at += 2;
    }
    return at;
  }

  private int genericEnd(int from) {
    int depth = 0;
    for (int at = from; at < tokens.size(); at++) {
      String text = tokens.get(at).text();
      boolean word = tokens.get(at).isWord();
      if (text.equals("<")) {
        depth++;
      } else if (text.equals(">")) {
        depth--;
        if (depth == 0) {
          return at + 1;
        }
      } else if (!word && !Set.of(".", ",", "?", "&", "[", "]", "@").contains(text)) {
        return -1;
      }
    }
    return -1;
  }

  private int statementEnd(int from) {
    if (from >= tokens.size()) {
      return OPEN;
    }
    switch (tokens.get(from).text()) {
      case "{":
        return close(from);
      case ";":
        return from + 1;
      case "if":
        return ifEnd(from);
      case "for", "while", "synchronized":
        return thenStatement(headEnd(from + 1));
      case "do":
        return doEnd(from);
      case "try":
        return tryEnd(from);
      case "switch":
        return switchEnd(from);
      default:
        return otherEnd(from);
    }
  }

  private int otherEnd(int from) {
    if (tokens.get(from).isWord() && is(from + 1, ":")) {
      return statementEnd(from + 2);
    }
    return isType(from) ? blockEnd(from + 1, false) : expressionEnd(from);
  }

  private int headEnd(int from) {
    return from >= tokens.size() ? OPEN : is(from, "(") ? close(from) : from;
  }

  private int thenStatement(int from) {
    return from < 0 ? from : statementEnd(from);
  }

  private int ifEnd(int from) {
    int end = thenStatement(headEnd(from + 1));
    return end >= 0 && is(end, "else") ? statementEnd(end + 1) : end;
  }

  private int doEnd(int from) {
    int body = statementEnd(from + 1);
    if (body < 0 || body >= tokens.size()) {
      return body < 0 ? body : OPEN;
    }
    return is(body, "while") ? expressionEnd(body + 1) : body;
  }

  private int tryEnd(int from) {
    int end = is(from + 1, "(") ? close(from + 1) : from + 1;
    boolean resources = is(from + 1, "(");
    end = end < 0 ? end : thenStatement(end);
    boolean handled = resources;
    while (end >= 0 && (is(end, "catch") || is(end, "finally"))) {
      handled = true;
      int head = is(end, "catch") ? headEnd(end + 1) : end + 1;
      end = thenStatement(head);
    }
    return end >= tokens.size() && !handled ? OPEN : end;
  }

  private int switchEnd(int from) {
    int head = headEnd(from + 1);
    int end = thenStatement(head);
    return end >= 0 && is(end, ".") ? expressionEnd(end) : end;
  }

  /** Returns the end of the first block after a token; a method may end in a semicolon instead. */
  private int blockEnd(int from, boolean method) {
    int at = from;
    while (at >= 0 && at < tokens.size()) {
      if (is(at, "{")) {
        return close(at);
      }
      if (method && is(at, ";")) {
        return at + 1;
      }
      at = isOpening(at) ? close(at) : isClosing(at) ? STRAY : at + 1;
    }
    return at < 0 ? at : OPEN;
  }

  /** Returns the end of an import: its semicolon, or the end of its line. */
  private int lineEnd(int from) {
    int at = from;
    while (at < tokens.size() && tokens.get(at).line() == tokens.get(from - 1).line()) {
      if (is(at, ";")) {
        return at + 1;
      }
      at++;
    }
    return at;
  }

  private int expressionEnd(int from) {
    int at = from;
    while (at < tokens.size()) {
      if (is(at, ";")) {
        return at + 1;
      }
      if (isClosing(at)) {
        return STRAY;
      }
      if (at > from && isEndedBefore(at)) {
        return at;
      }
      int next = isOpening(at) ? close(at) : at + 1;
      if (next < 0) {
        return next;
      }
      at = next;
    }
    return from < tokens.size() && carriesOn(at - 1) ? OPEN : from > tokens.size() ? OPEN : at;
  }

  private boolean isEndedBefore(int at) {
    Token before = tokens.get(at - 1);
    Token token = tokens.get(at);
    if (token.line() == endLine(before) || carriesOn(at - 1)) {
      return false;
    }
    return afterProse.contains(at) || !CARRIED_ON.contains(token.text()) || isLiteral(at);
  }

  private boolean carriesOn(int at) {
    return CARRIES_ON.contains(tokens.get(at).text()) && !isLiteral(at);
  }

  private static int endLine(Token token) {
    int newlines = 0;
    for (int at = token.text().indexOf('\n'); at >= 0; at = token.text().indexOf('\n', at + 1)) {
      newlines++;
    }
    return token.line() + newlines;
  }

  /** Returns the token after the bracket that closes the one at a token. */
  private int close(int from) {
    Deque<Integer> open = new ArrayDeque<>();
    for (int at = from; at < tokens.size(); at++) {
      if (isOpening(at)) {
        open.push(at);
      } else if (is(at, ";") && !mayHold(open.peek())) {
        return OPEN;
      } else if (isClosing(at)) {
        if (!fits(tokens.get(open.pop()).text(), tokens.get(at).text())) {
          return STRAY;
        }
        if (open.isEmpty()) {
          return at + 1;
        }
      }
    }
    return OPEN;
  }

  /** Returns whether a bracket may hold a semicolon: braces, the heads of loops and resources. */
  private boolean mayHold(int bracket) {
    return is(bracket, "{") || bracket > 0 && (is(bracket - 1, "for") || is(bracket - 1, "try"));
  }

  private static boolean fits(String opening, String closing) {
    return "([{".indexOf(opening) == ")]}".indexOf(closing);
  }

  private boolean isOpening(int at) {
    return is(at, "(") || is(at, "[") || is(at, "{");
  }

  private boolean isClosing(int at) {
    return is(at, ")") || is(at, "]") || is(at, "}");
  }

  private boolean isPrimitive(int at) {
    return at < tokens.size() && PRIMITIVES.contains(tokens.get(at).text());
  }

  private boolean isName(int at) {
    return at < tokens.size()
        && tokens.get(at).isWord()
        && !PRIMITIVES.contains(tokens.get(at).text())
        && !RESERVED.contains(tokens.get(at).text());
  }

  private boolean isLiteral(int at) {
    return tokens.get(at).kind() == Token.Kind.LITERAL;
  }

  private boolean is(int at, String symbol) {
    return at < tokens.size() && tokens.get(at).is(symbol);
  }
}
