package connate.check;

import connate.console.Main;
import connate.record.StoredLog;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/**
 * The command line run inside the test's own process, with what it printed.
 *
 * @param status the exit status
 * @param out standard output
 * @param err standard error
 */
record Run(int status, String out, String err) {

  static synchronized Run of(String... arguments) {
    PrintStream out = System.out;
    PrintStream err = System.err;
    ByteArrayOutputStream told = new ByteArrayOutputStream();
    ByteArrayOutputStream warned = new ByteArrayOutputStream();
    try {
      System.setOut(new PrintStream(told, true, StandardCharsets.UTF_8));
      System.setErr(new PrintStream(warned, true, StandardCharsets.UTF_8));
      int status = Main.run(arguments);
      return new Run(
          status, told.toString(StandardCharsets.UTF_8), warned.toString(StandardCharsets.UTF_8));
    } finally {
      System.setOut(out);
      System.setErr(err);
    }
  }

  /** Returns a kept result of a log, as the record writes it. */
  static double kept(Path log, String name) {
    return Double.parseDouble(StoredLog.read(log).kept().get(name).value());
  }

  @Override
  public String toString() {
    return "status " + status + "\n" + out + err;
  }
}
