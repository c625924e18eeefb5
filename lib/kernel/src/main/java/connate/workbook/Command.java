package connate.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * One command of a workbook: a declaration, a statement or an expression.
 *
 * @param index the number of the command in its workbook, counted from 0
 * @param kind what the command is, as far as its first words tell
 * @param source the text as it stands in the workbook, lines parted by {@code \n}
 * @param offset where it begins in {@link Workbook#text()}
 * @param firstLine the line on which it begins, counted from 1
 * @param lastLine the line on which it ends
 * @param column the column in which it begins, counted from 1
 * @param codeStart where its first word begins in the text, after the comments over it
 * @param codeEnd where its last word ends in the text, before the comment that follows it
 */
public record Command(
    int index,
    Kind kind,
    String source,
    int offset,
    int firstLine,
    int lastLine,
    int column,
    int codeStart,
    int codeEnd) {

  private static final Set<String> MODIFIERS =
      Set.of("public", "protected", "private", "static", "final", "strictfp");
  private static final Set<String> ENDS_NAME = Set.of("=", ";", ",");
  private static final Set<String> TYPES = Set.of("class", "record", "enum", "interface");
  private static final Set<String> HEADS = Set.of("abstract", "sealed", "non", "-", "synchronized");

  /** What a command is. */
  public enum Kind {
    /** An import. */
    IMPORT,
    /** A class, record, enum or interface. */
    TYPE,
    /** A method. */
    METHOD,
    /** One or several variables. */
    VARIABLE,
    /** An expression, with or without a semicolon. */
    EXPRESSION,
    /** Any other statement. */
    STATEMENT,
    /** Text that is no complete command; compiling it tells why. */
    UNFINISHED
  }

  /** Returns the text from the first word to the last. */
  public String code() {
    return source.substring(codeStart - offset, codeEnd - offset);
  }

  /** Returns the name of the method or type that the command declares. */
  public Optional<String> declaredMember() {
    List<Token> tokens = Lexer.tokens(unmodified());
    for (int at = 1; at < tokens.size(); at++) {
      boolean type = kind == Kind.TYPE && TYPES.contains(tokens.get(at - 1).text());
      boolean method = kind == Kind.METHOD && at + 1 < tokens.size() && tokens.get(at + 1).is("(");
      if ((type || method) && tokens.get(at).isWord() && !tokens.get(at - 1).is("@")) {
        return Optional.of(tokens.get(at).text());
      }
    }
    return Optional.empty();
  }

  /** Returns the names of the variables that the command declares, possibly a few words more. */
  public List<String> declaredNames() {
    List<Token> tokens =
        Lexer.tokens(code()).stream().filter(t -> t.kind() != Token.Kind.COMMENT).toList();
    List<String> names = new ArrayList<>();
    int depth = 0;
    boolean value = false;
    for (int at = 0; at < tokens.size(); at++) {
      Token token = tokens.get(at);
      String next = at + 1 < tokens.size() ? tokens.get(at + 1).text() : ";";
      boolean array = next.equals("[") && (at + 3 >= tokens.size() || !tokens.get(at + 3).isWord());
      if (depth == 0 && !value && token.isWord() && (ENDS_NAME.contains(next) || array)) {
        names.add(token.text());
      }
      depth += token.isOpening() ? 1 : token.isClosing() ? -1 : 0;
      value = depth > 0 ? value : token.is("=") || value && !token.is(",");
    }
    return names;
  }

  /** Returns the code with the semicolon that it lacks; an expression needs none. */
  public String closedCode() {
    String code = code();
    boolean closed = code.endsWith(";") || code.endsWith("}") && kind != Kind.VARIABLE;
    return closed || kind == Kind.EXPRESSION ? code : code + ";";
  }

  /**
   * Returns the code with blanks in place of the modifiers that mean nothing at the top of a
   * workbook: access, {@code static}, {@code final}.
   */
  public String unmodified() {
    StringBuilder out = new StringBuilder(code());
    int depth = 0;
    boolean annotated = false;
    for (Token token : Lexer.tokens(code())) {
      depth += token.is("(") ? 1 : token.is(")") ? -1 : 0;
      boolean keeps = annotated || depth > 0 || token.is("@") || token.is(".") || token.is(")");
      annotated = token.is("@") || token.is(".");
      if (MODIFIERS.contains(token.text()) && token.isWord()) {
        out.replace(token.start(), token.end(), " ".repeat(token.end() - token.start()));
      } else if (!keeps && token.kind() != Token.Kind.COMMENT && !HEADS.contains(token.text())) {
        return out.toString();
      }
    }
    return out.toString();
  }

  /** Returns where the command ends in {@link Workbook#text()}. */
  public int end() {
    return offset + source.length();
  }
}
