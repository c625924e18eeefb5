package connate.workbook;

/** A word, literal or symbol of a workbook's Java, or a comment between them. */
record Token(Kind kind, int start, int end, int line, String text) {

  enum Kind {
    WORD,
    LITERAL,
    SYMBOL,
    COMMENT,
    PROSE
  }

  boolean is(String symbol) {
    return kind != Kind.LITERAL && text.equals(symbol);
  }

  boolean isOpening() {
    return is("(") || is("[") || is("{");
  }

  boolean isClosing() {
    return is(")") || is("]") || is("}");
  }

  boolean isWord() {
    return kind == Kind.WORD;
  }
}
