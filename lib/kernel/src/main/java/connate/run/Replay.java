package connate.run;

import connate.compile.Compilation;
import connate.compile.WholeCompiler;
import connate.protocol.Request;
import connate.workbook.Workbook;

/** One run of a workbook from top to bottom in a fresh engine. */
public final class Replay {

  private final Workbook workbook;
  private final ReplaySettings settings;
  private final Watch watch;
  private final Engine engine;

  private Replay(Workbook workbook, ReplaySettings settings, ReplayWatcher watcher) {
    this.workbook = workbook;
    this.settings = settings;
    this.watch = new Watch(watcher, settings.assumptions().keySet());
    this.engine = Engine.start();
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
    try (engine) {
      engine.begin(begin(workbook, settings));
      Compilation compilation = WholeCompiler.compile(workbook, EngineProcess.classPath());
      new WholeRun(workbook, compilation, engine, watch).run();
      return watch.outcome(ReplaySettings.Way.WHOLE, "");
    }
  }

  static Request.Begin begin(Workbook workbook, ReplaySettings settings) {
    String data = settings.data() == null ? "" : settings.data().toAbsolutePath().toString();
    return new Request.Begin(
        workbook.name(),
        workbook.folder().toString(),
        data,
        settings.assumptions(),
        settings.seed());
  }

  /** Stops the run from another thread; {@link #run} then returns with what was done so far. */
  public void stop() {
    watch.stop();
    engine.stop();
  }
}
