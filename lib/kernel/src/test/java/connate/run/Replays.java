package connate.run;

import connate.protocol.Event;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Runs workbooks for tests and writes down what happened. */
final class Replays implements ReplayWatcher {

  static {
    String path = System.getProperty("surefire.test.class.path");
    if (path != null) {
      System.setProperty("connate.engine.classpath", path);
    }
    System.setProperty("connate.engine.options", "-Xmx256m");
  }

  final List<String> lines = new ArrayList<>();
  final List<Event> events = new ArrayList<>();
  ReplayOutcome outcome;

  static Replays run(String text, ReplaySettings settings) {
    return run(Workbook.parse("w.jsh", Path.of("target"), text), settings);
  }

  static Replays run(Workbook workbook, ReplaySettings settings) {
    Replays replays = new Replays();
    replays.outcome = Replay.run(workbook, settings, replays);
    return replays;
  }

  /** Returns the last event of the command on a line. */
  Event.Failed failure() {
    return (Event.Failed) events.get(events.size() - 1);
  }

  @Override
  public void started(Command command) {
    lines.add(command.firstLine() + " started");
  }

  @Override
  public void event(Command command, Event event) {
    events.add(event);
    lines.add(command.firstLine() + " " + event);
  }

  @Override
  public void finished(Command command) {
    lines.add(command.firstLine() + " finished");
  }
}
