package connate.run;

import connate.protocol.Event;
import connate.workbook.Command;

/**
 * Follows a replay. All calls come from the thread that runs it, in the order in which things
 * happen: for each command {@code started}, its events, {@code finished}.
 */
public interface ReplayWatcher {

  /** A command begins. */
  void started(Command command);

  /**
   * Something happened while a command ran. The last event of a command is {@link Event.Returned}
   * or {@link Event.Failed}.
   */
  void event(Command command, Event event);

  /** A command has ended, well or not. */
  void finished(Command command);
}
