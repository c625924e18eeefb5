package connate.workbook;

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
 */
public record Command(
    int index, Kind kind, String source, int offset, int firstLine, int lastLine, int column) {

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

  /** Returns where the command ends in {@link Workbook#text()}. */
  public int end() {
    return offset + source.length();
  }
}
