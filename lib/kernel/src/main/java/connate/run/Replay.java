package connate.run;

import connate.compile.Compilation;
import connate.compile.WholeCompiler;
import connate.guard.Refusal;
import connate.protocol.Event;
import connate.protocol.Request;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.Optional;

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
    Request.Begin begin = begin(workbook.name(), workbook.folder(), settings);
    if (settings.way() == ReplaySettings.Way.SHELL) {
      return commandByCommand(begin, "");
    }
    Compilation compilation = WholeCompiler.compile(workbook, EngineProcess.classPath());
    if (!compilation.isUsable()) {
      if (settings.way() == ReplaySettings.Way.WHOLE) {
        engine.close();
        throw new IllegalArgumentException("cannot be compiled at once: " + compilation.why());
      }
      return commandByCommand(begin, compilation.why());
    }
    try (engine) {
      Optional<Refusal> refusal = Verdict.of(compilation.classes(), settings);
      if (refusal.isPresent()) {
        Command command = Verdict.command(workbook, refusal.get());
        Event.Failed failed =
            Verdict.placed(workbook, command, refusal.get().message(), refusal.get().line());
        watch.run(command, told -> failed);
        return watch.outcome(ReplaySettings.Way.WHOLE, "");
      }
      engine.begin(begin);
      new WholeRun(workbook, compilation, engine, watch).run();
      return watch.outcome(ReplaySettings.Way.WHOLE, "");
    }
  }

  private ReplayOutcome commandByCommand(Request.Begin begin, String why) {
    ShellControl control = new ShellControl(engine, null, begin, Verdict.of(settings));
    try (Shell shell = new Shell(control, workbook.name())) {
      new ShellRun(workbook, shell, watch).run();
      return watch.outcome(ReplaySettings.Way.SHELL, why);
    }
  }

  static Request.Begin begin(String name, Path folder, ReplaySettings settings) {
    String data =
        settings.data() == null ? "" : settings.data().toAbsolutePath().normalize().toString();
    return new Request.Begin(
        name, folder.toString(), data, settings.assumptions(), settings.seed(), settings.guarded());
  }

  /** Stops the run from another thread; {@link #run} then returns with what was done so far. */
  public void stop() {
    watch.stop();
    engine.stop();
  }
}
