package connate.run;

import connate.protocol.Event;
import connate.workbook.Command;
import java.util.Set;

/**
 * How a replay ended.
 *
 * @param kind how
 * @param command the command that did not end well, {@code null} where all did
 * @param failure what befell it, {@code null} where all ended well
 * @param way how the workbook was compiled: {@code WHOLE} or {@code SHELL}
 * @param why why it was compiled command by command, empty where it was not or was told to
 * @param unused the names of assumptions that were to take another value and that no command stated
 */
public record ReplayOutcome(
    Kind kind,
    Command command,
    Event.Failed failure,
    ReplaySettings.Way way,
    String why,
    Set<String> unused) {

  /** How a replay can end. */
  public enum Kind {
    /** All commands ran. */
    COMPLETED,
    /** A command did not compile, threw or took its engine with it; those after it did not run. */
    FAILED,
    /** The guard refused a command; neither it nor any after it ran. */
    REFUSED,
    /** The replay was stopped from outside. */
    STOPPED
  }

  /** Returns whether the failure is one of the input data. */
  public boolean isBadInput() {
    return failure != null && failure.badInput();
  }
}
