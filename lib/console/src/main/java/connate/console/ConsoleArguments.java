package connate.console;

import java.nio.file.Path;

/**
 * What the console is started with.
 *
 * @param workbook the workbook whose steps are replayed first, {@code null} for none
 * @param data a folder whose files come first, {@code null} for none
 * @param trusted whether the guard is lifted
 * @param asks whether the console may ask a question
 * @param coloured whether colour is wanted
 */
record ConsoleArguments(Path workbook, Path data, boolean trusted, boolean asks, boolean coloured) {

  /**
   * Reads the arguments.
   *
   * @throws IllegalArgumentException if one is not known
   */
  static ConsoleArguments parse(String... arguments) {
    Path workbook = null;
    Path data = null;
    boolean trusted = false;
    boolean asks = true;
    boolean coloured = true;
    for (int at = 0; at < arguments.length; at++) {
      switch (arguments[at]) {
        case "--trust" -> trusted = true;
        case "--no-input" -> asks = false;
        case "--no-color" -> coloured = false;
        case "--data" -> {
          at++;
          data = at < arguments.length ? Path.of(arguments[at]) : missing();
        }
        default -> {
          if (workbook != null || !isWorkbook(arguments[at])) {
            throw new IllegalArgumentException(
                "«" + arguments[at] + "» is not known; connate [FILE.jsh] [--data DIR] [--trust]");
          }
          workbook = Path.of(arguments[at]);
        }
      }
    }
    return new ConsoleArguments(workbook, data, trusted, asks, coloured);
  }

  private static Path missing() {
    throw new IllegalArgumentException("--data takes a folder");
  }

  /** Returns whether an argument names a workbook or is an option of the console. */
  static boolean isFor(String argument) {
    return isWorkbook(argument)
        || argument.equals("--trust")
        || argument.equals("--no-input")
        || argument.equals("--no-color")
        || argument.equals("--data");
  }

  private static boolean isWorkbook(String argument) {
    return argument.endsWith(".jsh");
  }
}
