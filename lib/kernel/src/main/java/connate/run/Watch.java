package connate.run;

import connate.protocol.Event;
import connate.workbook.Command;
import java.util.function.Consumer;
import java.util.function.Function;

/** Tells the watcher of a replay what happens, and remembers how it went. */
final class Watch {

  private final ReplayWatcher watcher;
  private final java.util.Set<String> unused;
  private Command failedCommand;
  private Event.Failed failure;
  private volatile boolean stopped;

  Watch(ReplayWatcher watcher, java.util.Set<String> overrides) {
    this.watcher = watcher;
    this.unused = new java.util.TreeSet<>(overrides);
  }

  /** Runs one command and returns whether the next may run. */
  boolean run(Command command, Function<Consumer<Event>, Event> running) {
    if (stopped) {
      return false;
    }
    watcher.started(command);
    Event last = running.apply(event -> tell(command, event));
    watcher.event(command, last);
    watcher.finished(command);
    if (last instanceof Event.Failed failed) {
      failedCommand = command;
      failure = failed;
      return false;
    }
    return true;
  }

  private void tell(Command command, Event event) {
    if (event instanceof Event.Assumed assumed) {
      unused.remove(assumed.name());
    }
    watcher.event(command, event);
  }

  void stop() {
    stopped = true;
  }

  ReplayOutcome outcome(ReplaySettings.Way way, String why) {
    ReplayOutcome.Kind kind = ReplayOutcome.Kind.COMPLETED;
    if (stopped) {
      kind = ReplayOutcome.Kind.STOPPED;
    } else if (failure != null) {
      boolean refused = failure.kind().equals("refused");
      kind = refused ? ReplayOutcome.Kind.REFUSED : ReplayOutcome.Kind.FAILED;
    }
    return new ReplayOutcome(kind, failedCommand, failure, way, why, unused);
  }
}
