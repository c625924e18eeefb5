package connate.compile;

/**
 * Why a command does not compile.
 *
 * @param command the number of the command
 * @param line the line of the workbook
 * @param column the column
 * @param message the place, what is wrong, the line with a mark, and one way out, ready to be read
 */
public record Problem(int command, int line, int column, String message) {}
