package connate.run;

import connate.workbook.Workbook;

/** One run of a workbook from top to bottom in a fresh engine. */
public final class Replay {

  private final Workbook workbook;
  private final ReplaySettings settings;
  private final ReplayWatcher watcher;

  private Replay(Workbook workbook, ReplaySettings settings, ReplayWatcher watcher) {
    this.workbook = workbook;
    this.settings = settings;
    this.watcher = watcher;
  }

  /** Prepares a replay and starts its engine, which boots while the caller goes on. */
  public static Replay of(Workbook workbook, ReplaySettings settings, ReplayWatcher watcher) {
    return new Replay(workbook, settings, watcher);
  }

  /** Runs a workbook to its end. */
  public static ReplayOutcome run(
      Workbook workbook, ReplaySettings settings, ReplayWatcher watcher) {
    return of(workbook, settings, watcher).run();
  }

  /** Runs the commands and returns when the last has ended, one failed, or {@link #stop} came. */
  public ReplayOutcome run() {
    throw new UnsupportedOperationException(workbook + " " + settings + " " + watcher);
  }

  /** Stops the run from another thread; {@link #run} then returns with what was done so far. */
  public void stop() {
    // lands with the engine
  }
}
