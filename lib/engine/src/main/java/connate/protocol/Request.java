package connate.protocol;

import java.util.List;
import java.util.Map;

/** What the kernel asks of an engine. */
public sealed interface Request {

  /**
   * Settles with what the commands run; comes first.
   *
   * @param workbook the workbook's file name, as it stands in stack frames
   * @param folder the folder of the workbook
   * @param data the folder in which data are looked for first, empty for none
   * @param assumptions the assumptions that take another value
   * @param seed the seed of all random numbers
   * @param guarded whether files outside of the two folders are refused
   */
  record Begin(
      String workbook,
      String folder,
      String data,
      Map<String, String> assumptions,
      long seed,
      boolean guarded)
      implements Request {}

  /**
   * Loads classes.
   *
   * @param classes the classes, woven by the engine before they are defined
   */
  record Load(List<Bytecode> classes) implements Request {}

  /**
   * A class file.
   *
   * @param name the class's binary name, with dots
   * @param bytes the class file
   */
  record Bytecode(String name, byte[] bytes) {}

  /**
   * Runs one command.
   *
   * @param command the command's number, which its events carry
   * @param owner the class
   * @param method the static method without parameters
   * @param variable the variable that it sets, empty for none
   * @param type the static type's simple name, empty where there is no value
   * @param muted whether its events are dropped because they were told before
   */
  record Invoke(
      int command, String owner, String method, String variable, String type, boolean muted)
      implements Request {}

  /**
   * Asks for the text of a variable.
   *
   * @param owner the class
   * @param field the static field
   */
  record Read(String owner, String field) implements Request {}

  /**
   * Stops a command, if it still runs.
   *
   * @param command the command's number
   */
  record Stop(int command) implements Request {}

  /** Ends the engine. */
  record Close() implements Request {}
}
