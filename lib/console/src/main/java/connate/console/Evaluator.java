package connate.console;

import connate.protocol.Event;
import connate.run.ReplaySettings;
import connate.run.Shell;
import java.nio.file.Path;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Consumer;
import java.util.function.Supplier;
import jdk.jshell.SourceCodeAnalysis;

/**
 * The shell behind the console. It is opened and warmed while the user still looks at the prompt;
 * the first command waits for it. Starting afresh opens another in its place.
 */
final class Evaluator implements AutoCloseable {

  private static final String DIED = "died";

  private final Supplier<Shell> shells;
  private CompletableFuture<Shell> shell;
  private volatile Shell running;
  private final ReentrantLock using = new ReentrantLock();
  private int count;

  private Evaluator(Supplier<Shell> shells) {
    this.shells = shells;
    this.shell = open();
  }

  /** Opens a shell whose commands read files of a folder. */
  static Evaluator open(String name, Path folder, ReplaySettings settings) {
    return new Evaluator(() -> Shell.open(name, folder, settings));
  }

  private CompletableFuture<Shell> open() {
    CompletableFuture<Shell> opened = new CompletableFuture<>();
    Thread thread =
        new Thread(
            () -> {
              try {
                Shell made = shells.get();
                opened.complete(made);
                warm(made);
              } catch (RuntimeException | Error e) {
                opened.completeExceptionally(e);
              }
            },
            "shell");
    thread.setDaemon(true);
    thread.start();
    return opened;
  }

  /**
   * Runs a command. An engine that was killed while it idled is found dead only now: its state is
   * back, so the command is given to the new engine once.
   */
  Shell.Result run(String source, Consumer<Event> told) {
    Shell ready = ready();
    count++;
    running = ready;
    using.lock();
    try {
      boolean[] heard = {false};
      Shell.Result result =
          ready.run(
              count,
              1,
              source,
              event -> {
                heard[0] = true;
                told.accept(event);
              });
      boolean died = result.last() instanceof Event.Failed f && f.kind().equals(DIED);
      return died && !heard[0] ? ready.run(count, 1, source, told) : result;
    } finally {
      using.unlock();
      running = null;
    }
  }

  private Shell ready() {
    try {
      return shell.join();
    } catch (CompletionException e) {
      if (e.getCause() instanceof RuntimeException cause) {
        throw cause;
      }
      throw e;
    }
  }

  /** Stops the running command from another thread. */
  void stop() {
    Shell now = running;
    if (now != null) {
      now.stop();
    }
  }

  /** Starts again with nothing declared. */
  void afresh() {
    CompletableFuture<Shell> old = shell;
    shell = open();
    old.thenAccept(Shell::close);
  }

  /** Returns what completes and explains half-typed commands. */
  SourceCodeAnalysis analysis() {
    SourceCodeAnalysis analysis = ready().analysis();
    using.lock();
    using.unlock();
    return analysis;
  }

  /**
   * Does once and unseen what the first key for a completion would have to wait for, unless a
   * command is quicker. The compiler behind the shell serves one at a time.
   */
  private void warm(Shell opened) {
    if (using.tryLock()) {
      try {
        opened.analysis().completionSuggestions("Uni", 3, new int[1]);
      } finally {
        using.unlock();
      }
    }
  }

  @Override
  public void close() {
    if (shell.isDone() && !shell.isCompletedExceptionally()) {
      shell.join().close();
    } else {
      shell.thenAccept(Shell::close);
    }
  }
}
