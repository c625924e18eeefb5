package connate.run;

import connate.protocol.Event;
import connate.protocol.Request;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Supplier;
import jdk.jshell.spi.ExecutionControl;

/**
 * Runs what the shell has compiled in an engine of ours. It remembers what was loaded and run, so
 * that a new engine can be brought to where a dead one was.
 *
 * <p>The shell must never see an engine end: it would close itself with all its state. And it hides
 * refusals and stops. So the last event of each command is kept here.
 */
final class ShellControl implements ExecutionControl {

  private final Supplier<Engine> engines;
  private final Request.Begin begin;
  private final Judge judge;
  private final List<Request> journal = new ArrayList<>();
  private volatile Engine engine;
  private int command;
  private Consumer<Event> told = event -> {};
  private Event last;

  /** Says why classes may not be loaded. */
  interface Judge {
    /** Returns the refusal, {@code null} where they may be loaded. */
    Event.Failed judge(List<Request.Bytecode> classes);
  }

  /**
   * Makes a control.
   *
   * @param engines gives an engine in place of one that died, {@code null} where none is wanted
   */
  ShellControl(Engine first, Supplier<Engine> engines, Request.Begin begin, Judge judge) {
    this.engine = first;
    this.engines = engines;
    this.begin = begin;
    this.judge = judge;
    first.begin(begin);
  }

  /** Begins a command, whose events go to a listener. */
  void expect(int number, Consumer<Event> listener) {
    command = number;
    told = listener;
    last = null;
  }

  /** Returns the last event of the command, {@code null} where nothing ran. */
  Event last() {
    return last;
  }

  @Override
  public void load(ClassBytecodes[] loaded) throws ClassInstallException {
    List<Request.Bytecode> classes =
        Arrays.stream(loaded).map(c -> new Request.Bytecode(c.name(), c.bytecodes())).toList();
    Event.Failed refusal = judge.judge(classes);
    if (refusal != null) {
      last = refusal;
      throw new ClassInstallException("refused", new boolean[loaded.length]);
    }
    Request.Load load = new Request.Load(classes);
    journal.add(load);
    engine.load(load.classes());
  }

  @Override
  public void redefine(ClassBytecodes[] classes) throws NotImplementedException {
    throw new NotImplementedException("a class is never changed, a new one takes its place");
  }

  @Override
  public String invoke(String owner, String method) throws RunException {
    if (last instanceof Event.Failed) {
      return "";
    }
    Request.Invoke invoke = new Request.Invoke(command, owner, method, "", "", false);
    last = engine.invoke(invoke, told);
    if (engine.isGone() && engines != null) {
      restore();
    }
    if (last instanceof Event.Failed failed) {
      throw new UserException(failed.message(), failed.type(), ShellFrames.raw(failed.frames()));
    }
    journal.add(new Request.Invoke(command, owner, method, "", "", true));
    return "";
  }

  /**
   * Brings a new engine to where the last one was before its last command; nothing is told twice.
   */
  private void restore() {
    engine.close();
    engine = engines.get();
    engine.begin(begin);
    for (Request request : journal) {
      if (request instanceof Request.Load load) {
        engine.load(load.classes());
      } else if (request instanceof Request.Invoke invoke) {
        engine.invoke(invoke, event -> {});
      }
    }
  }

  @Override
  public String varValue(String owner, String field) {
    return engine.read(owner, field);
  }

  @Override
  public void addToClasspath(String path) {
    // the engine has its class path from the start
  }

  @Override
  public void stop() {
    engine.stop();
  }

  @Override
  public Object extensionCommand(String name, Object argument) throws NotImplementedException {
    throw new NotImplementedException(name);
  }

  @Override
  public void close() {
    engine.close();
  }
}
