package connate.protocol;

import java.util.List;

/** What can happen while a command runs, in the order in which it happens. */
public sealed interface Event {

  /** {@code show(…)} put an item into the log. */
  record Shown(Item item) implements Event {}

  /** {@code keep(name, …)} kept a result. */
  record Kept(String name, Item.Measure value) implements Event {}

  /**
   * {@code assume(name, …)} stated an assumption.
   *
   * @param name the assumption's name
   * @param value the value in force
   * @param stated the value that the workbook states
   * @param overridden whether the replay was given another value
   */
  record Assumed(String name, Item.Measure value, Item.Measure stated, boolean overridden)
      implements Event {}

  /**
   * The library noticed something that the reader must know.
   *
   * @param code a short stable code
   * @param about what it concerns: a method, a file, a column
   * @param text the caution in one or two sentences
   * @param count how many times the command raised it
   */
  record Cautioned(String code, String about, String text, int count) implements Event {}

  /**
   * A published method was used.
   *
   * @param id the card's id
   * @param title the method's name
   * @param equation the equation
   * @param source the full source
   * @param status whether its constants were checked
   * @param range the published range in words
   */
  record Used(String id, String title, String equation, String source, String status, String range)
      implements Event {}

  /**
   * An input file was read.
   *
   * @param path the path as the workbook's folder sees it, with forward slashes
   * @param absolute the path on this machine, which no log shows; used by {@code --pack}
   * @param bytes the size
   * @param sha256 the digest in lower-case hex
   * @param rows the number of data rows
   * @param mapping what was mapped to what, one line each
   */
  record InputRead(
      String path, String absolute, long bytes, String sha256, int rows, List<String> mapping)
      implements Event {}

  /** The command printed to standard output or, where {@code error}, to standard error. */
  record Printed(String text, boolean error) implements Event {}

  /** Long work tells how far it is, as a fraction of one, or NaN where unknown. */
  record Progress(String what, double done) implements Event {}

  /**
   * The command ended well.
   *
   * @param variable the variable that it declared or assigned, empty where it is an expression
   * @param type the static type's simple name, empty for a statement
   * @param item the value, {@code null} for a statement that gives none
   */
  record Returned(String variable, String type, Item item) implements Event {}

  /**
   * The command did not compile, was refused, threw, or died with its engine.
   *
   * @param kind {@code compile}, {@code refused}, {@code exception}, {@code stopped}, {@code exit},
   *     {@code memory} or {@code died}
   * @param type the exception's class name, empty where none
   * @param message the message in plain words, with place and way out where there is one
   * @param frames the stack as far as it concerns the reader, innermost first
   * @param badInput whether the input data are at fault, which makes the exit status 3
   */
  record Failed(String kind, String type, String message, List<Frame> frames, boolean badInput)
      implements Event {}

  /**
   * A stack frame.
   *
   * @param where class and method
   * @param file the source file's name, empty where unknown
   * @param line the line in it, 0 where unknown; for the workbook, its own line
   */
  record Frame(String where, String file, int line) {}
}
