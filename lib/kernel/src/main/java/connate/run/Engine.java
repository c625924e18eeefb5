package connate.run;

import connate.protocol.Channel;
import connate.protocol.Event;
import connate.protocol.Reply;
import connate.protocol.Request;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;

/** An engine and the talk with it. One thread at a time asks; any thread may stop. */
final class Engine implements AutoCloseable {

  /** How long a command may take to heed a stop before its engine is killed. */
  static final long GRACE_MILLIS = 1500;

  private static final long END_MILLIS = 2000;

  private final EngineProcess process;
  private final Channel channel;
  private final ScheduledExecutorService timer;
  private volatile int running = -1;
  private volatile boolean stopping;
  private boolean gone;

  private Engine(EngineProcess process) {
    this.process = process;
    this.channel =
        new Channel(process.process().getInputStream(), process.process().getOutputStream());
    this.timer =
        Executors.newSingleThreadScheduledExecutor(
            work -> {
              Thread thread = new Thread(work, "grace");
              thread.setDaemon(true);
              return thread;
            });
  }

  /** Starts an engine, which boots while the caller goes on. */
  static Engine start() {
    return new Engine(EngineProcess.start());
  }

  /** Settles with what the commands run. */
  void begin(Request.Begin begin) {
    send(begin);
  }

  /** Loads classes. */
  void load(List<Request.Bytecode> classes) {
    send(new Request.Load(classes));
  }

  /**
   * Runs a command, tells its events and returns the last one. An engine that dies on the way gives
   * {@link Event.Failed}.
   */
  Event invoke(Request.Invoke invoke, Consumer<Event> told) {
    stopping = false;
    try {
      send(invoke);
      running = invoke.command();
      return gone ? lost() : await(invoke.command(), told);
    } finally {
      running = -1;
    }
  }

  private Event await(int command, Consumer<Event> told) {
    while (true) {
      Optional<Reply> reply = receive();
      if (reply.isEmpty()) {
        return lost();
      }
      if (reply.get() instanceof Reply.Told event && event.command() == command) {
        if (event.event() instanceof Event.Failed failed) {
          return failed.kind().equals("exit") ? exit() : failed;
        }
        if (event.event() instanceof Event.Returned) {
          return event.event();
        }
        told.accept(event.event());
      }
    }
  }

  /** Returns the text of a variable. */
  String read(String owner, String field) {
    send(new Request.Read(owner, field));
    while (!gone) {
      Optional<Reply> reply = receive();
      if (reply.isPresent() && reply.get() instanceof Reply.Value value) {
        return value.text();
      }
    }
    return "";
  }

  /** Returns whether the process has gone. */
  boolean isGone() {
    return gone;
  }

  /** Stops the running command, if there is one; kills the engine where it does not heed. */
  void stop() {
    int command = running;
    stopping = true;
    if (command < 0) {
      return;
    }
    send(new Request.Stop(command));
    timer.schedule(
        () -> {
          if (running == command) {
            process.process().destroyForcibly();
          }
        },
        GRACE_MILLIS,
        TimeUnit.MILLISECONDS);
  }

  private void send(Request request) {
    try {
      channel.send(request);
    } catch (IOException e) {
      gone = true;
    }
  }

  private Optional<Reply> receive() {
    Optional<Reply> reply;
    try {
      reply = channel.reply();
    } catch (IOException e) {
      // a broken frame is as good as none: such an engine is not talked to any longer
      process.process().destroyForcibly();
      reply = Optional.empty();
    }
    gone |= reply.isEmpty();
    if (reply.isPresent()
        && reply.get() instanceof Reply.Ready ready
        && ready.version() != Channel.VERSION) {
      process.process().destroyForcibly();
      throw new IllegalStateException(
          "the engine speaks version " + ready.version() + ", the kernel " + Channel.VERSION);
    }
    return reply;
  }

  private Event.Failed exit() {
    gone = true;
    int status = process.end(END_MILLIS);
    String message = "the command ended its own engine with System.exit(" + status + ")";
    return new Event.Failed("exit", "", message, List.of(), false);
  }

  private Event.Failed lost() {
    gone = true;
    int status = process.end(END_MILLIS);
    if (stopping) {
      return new Event.Failed("stopped", "", "stopped", List.of(), false);
    }
    String errors = process.errors();
    String message =
        "the engine died with status " + status + (errors.isEmpty() ? "" : ": " + errors);
    return new Event.Failed("died", "", message, List.of(), false);
  }

  @Override
  public void close() {
    timer.shutdownNow();
    if (!gone) {
      send(new Request.Close());
    }
    gone = true;
  }
}
