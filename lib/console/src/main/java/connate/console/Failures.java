package connate.console;

import connate.fault.DataException;
import java.io.IOException;
import java.io.UncheckedIOException;

/** Tells what went wrong in words and gives the exit status. */
final class Failures {

  private Failures() {}

  static int tell(Exception failure, boolean debug) {
    if (debug) {
      failure.printStackTrace();
    }
    if (failure instanceof DataException) {
      System.err.println(failure.getMessage());
      return Exit.BAD_INPUT;
    }
    if (failure instanceof UncheckedIOException || failure instanceof IOException) {
      System.err.println("connate: " + words(failure));
      return Exit.FAILED;
    }
    System.err.println(
        "connate: our fault: " + failure + "\nplease report it; --debug shows where it happened");
    return Exit.OUR_FAULT;
  }

  private static String words(Exception failure) {
    return failure.getMessage() == null ? failure.toString() : failure.getMessage();
  }
}
