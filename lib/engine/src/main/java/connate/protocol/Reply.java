package connate.protocol;

/** What an engine says to the kernel. */
public sealed interface Reply {

  /**
   * The engine is up.
   *
   * @param version the version of the protocol that it speaks
   */
  record Ready(int version) implements Reply {}

  /**
   * Something happened while a command ran.
   *
   * @param command the command's number
   * @param event what happened; {@link Event.Returned} and {@link Event.Failed} are its last
   */
  record Told(int command, Event event) implements Reply {}

  /**
   * Classes were loaded.
   *
   * @param problem why they were not, empty where they were
   */
  record Loaded(String problem) implements Reply {}

  /**
   * A variable was read.
   *
   * @param text its value as text
   */
  record Value(String text) implements Reply {}
}
