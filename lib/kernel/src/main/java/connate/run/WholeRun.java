package connate.run;

import connate.compile.Compilation;
import connate.compile.Entry;
import connate.compile.Problem;
import connate.protocol.Event;
import connate.protocol.Request;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.List;

/** Runs a workbook that was compiled at once. */
final class WholeRun {

  private final Workbook workbook;
  private final Compilation compilation;
  private final Engine engine;
  private final Watch watch;

  WholeRun(Workbook workbook, Compilation compilation, Engine engine, Watch watch) {
    this.workbook = workbook;
    this.compilation = compilation;
    this.engine = engine;
    this.watch = watch;
  }

  /** Runs the commands in order, until one fails or the run is stopped. */
  void run() {
    engine.load(compilation.classes());
    for (Entry entry : compilation.entries()) {
      Command command = workbook.commands().get(entry.command());
      if (!watch.run(command, told -> invoke(entry, told))) {
        return;
      }
    }
    Problem problem = compilation.problem();
    if (problem != null) {
      Command command = workbook.commands().get(problem.command());
      watch.run(command, told -> failed(workbook, problem));
    }
  }

  private Event invoke(Entry entry, java.util.function.Consumer<Event> told) {
    if (entry.method().isEmpty()) {
      return new Event.Returned("", "", null);
    }
    return engine.invoke(
        new Request.Invoke(
            entry.command(),
            compilation.owner(),
            entry.method(),
            entry.variable(),
            entry.type(),
            false),
        told);
  }

  static Event.Failed failed(Workbook workbook, Problem problem) {
    Event.Frame frame = new Event.Frame("", workbook.name(), problem.line());
    return new Event.Failed("compile", "", problem.message(), List.of(frame), false);
  }
}
