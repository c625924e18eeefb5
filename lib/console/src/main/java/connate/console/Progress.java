package connate.console;

import connate.protocol.Event;
import connate.run.ReplayWatcher;
import connate.workbook.Command;

/** Passes a replay on to its log and shows on a terminal how far it is. */
final class Progress implements ReplayWatcher {

  private static final long AFTER_NANOS = 800_000_000L;

  private final ReplayWatcher log;
  private final int total;
  private final boolean shown;
  private final long start = System.nanoTime();
  private boolean drawn;

  Progress(ReplayWatcher log, int total, boolean wanted) {
    this.log = log;
    this.total = total;
    this.shown = wanted && Boolean.getBoolean("connate.terminal.error");
  }

  @Override
  public void started(Command command) {
    draw(command, "");
    log.started(command);
  }

  @Override
  public void event(Command command, Event event) {
    if (event instanceof Event.Progress progress) {
      String part =
          Double.isNaN(progress.done()) ? "" : " " + Math.round(100 * progress.done()) + " %";
      draw(command, ", " + progress.what() + part);
    }
    log.event(command, event);
  }

  @Override
  public void finished(Command command) {
    log.finished(command);
    if (drawn && command.index() == total - 1) {
      System.err.print("\r\u001b[K");
      System.err.flush();
    }
  }

  private void draw(Command command, String more) {
    if (shown && System.nanoTime() - start > AFTER_NANOS) {
      drawn = true;
      System.err.print(
          "\r\u001b[Kline "
              + command.firstLine()
              + ", command "
              + (command.index() + 1)
              + " of "
              + total
              + more);
      System.err.flush();
    }
  }
}
