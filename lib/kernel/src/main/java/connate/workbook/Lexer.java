package connate.workbook;

import java.util.ArrayList;
import java.util.List;

/**
 * Cuts Java into words, literals, symbols, comments and lines of prose. It never fails: what is
 * left open ends with its line or with the text, and the compiler says what is wrong with it.
 */
final class Lexer {

  private static final List<String> LONG_SYMBOLS =
      List.of(
          "...", "<<=", "->", "::", "++", "--", "==", "<=", ">=", "!=", "&&", "||", "+=", "-=",
          "*=", "/=", "%=", "&=", "|=", "^=", "<<");

  private final String text;
  private final List<Token> tokens = new ArrayList<>();
  private int at;
  private int line = 1;

  private Lexer(String text) {
    this.text = text;
  }

  static List<Token> tokens(String text) {
    Lexer lexer = new Lexer(text);
    while (lexer.at < text.length()) {
      lexer.next();
    }
    return lexer.tokens;
  }

  private void next() {
    char c = text.charAt(at);
    if (c == '\n') {
      line++;
      at++;
    } else if (Character.isWhitespace(c)) {
      at++;
    } else if (text.startsWith("//", at)) {
      take(comment(), lineEnd(at));
    } else if (text.startsWith("/*", at)) {
      take(Token.Kind.COMMENT, after("*/", at + 2));
    } else if (text.startsWith("\"\"\"", at)) {
      take(Token.Kind.LITERAL, textBlockEnd());
    } else if (c == '"' || c == '\'') {
      take(Token.Kind.LITERAL, quoteEnd(c));
    } else {
      nextWord(c);
    }
  }

  private void nextWord(char c) {
    if (Character.isDigit(c) || c == '.' && isDigit(at + 1)) {
      take(Token.Kind.LITERAL, numberEnd());
    } else if (Character.isJavaIdentifierStart(text.codePointAt(at))) {
      take(Token.Kind.WORD, wordEnd());
    } else {
      take(Token.Kind.SYMBOL, at + symbolLength());
    }
  }

  private void take(Token.Kind kind, int end) {
    String part = text.substring(at, end);
    tokens.add(new Token(kind, at, end, line, part));
    for (int newline = part.indexOf('\n');
        newline >= 0;
        newline = part.indexOf('\n', newline + 1)) {
      line++;
    }
    at = end;
  }

  private Token.Kind comment() {
    boolean first = text.substring(text.lastIndexOf('\n', at) + 1, at).isBlank();
    return first && text.startsWith("///", at) ? Token.Kind.PROSE : Token.Kind.COMMENT;
  }

  private int lineEnd(int from) {
    int end = text.indexOf('\n', from);
    return end < 0 ? text.length() : end;
  }

  private int after(String mark, int from) {
    int found = text.indexOf(mark, from);
    return found < 0 ? text.length() : found + mark.length();
  }

  private int textBlockEnd() {
    int from = at + 3;
    while (from < text.length() && !text.startsWith("\"\"\"", from)) {
      from += text.charAt(from) == '\\' ? 2 : 1;
    }
    return Math.min(text.length(), from + 3);
  }

  private int quoteEnd(char quote) {
    int limit = lineEnd(at);
    int from = at + 1;
    while (from < limit && text.charAt(from) != quote) {
      from += text.charAt(from) == '\\' ? 2 : 1;
    }
    return Math.min(limit, from + 1);
  }

  private int numberEnd() {
    int end = at;
    while (end < text.length() && isNumberPart(end)) {
      end++;
    }
    return end;
  }

  private boolean isNumberPart(int index) {
    char c = text.charAt(index);
    boolean signed = (c == '+' || c == '-') && "eEpP".indexOf(text.charAt(index - 1)) >= 0;
    boolean hex = text.startsWith("0x", at) || text.startsWith("0X", at);
    boolean exponent = signed && !(hex && "eE".indexOf(text.charAt(index - 1)) >= 0);
    return exponent
        || Character.isLetterOrDigit(c)
        || c == '_'
        || c == '.' && (index + 1 == text.length() || text.charAt(index + 1) != '.');
  }

  private boolean isDigit(int index) {
    return index < text.length() && Character.isDigit(text.charAt(index));
  }

  private int wordEnd() {
    int end = at;
    while (end < text.length() && Character.isJavaIdentifierPart(text.codePointAt(end))) {
      end += Character.charCount(text.codePointAt(end));
    }
    return end;
  }

  private int symbolLength() {
    for (String symbol : LONG_SYMBOLS) {
      if (text.startsWith(symbol, at)) {
        return symbol.length();
      }
    }
    return Character.charCount(text.codePointAt(at));
  }
}
