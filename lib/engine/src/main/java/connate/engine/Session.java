package connate.engine;

import connate.method.Listening;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.protocol.Reply;
import connate.protocol.Request;
import java.io.PrintStream;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/** Runs the commands of one workbook, one at a time. */
final class Session {

  private final Teller teller;
  private final UserClasses classes = new UserClasses();
  private final Printing out;
  private final Printing err;
  private final Set<String> kept = new HashSet<>();
  private Mishap mishap = new Mishap(classes, "");
  private Inputs inputs = new Inputs(Path.of("").toAbsolutePath(), null, false);
  private Assumptions assumptions;
  private long seed = 1;
  private int running;
  private int shown;

  Session(Teller teller) {
    this.teller = teller;
    this.assumptions = new Assumptions(Map.of(), teller);
    this.out = new Printing(teller, false);
    this.err = new Printing(teller, true);
  }

  /** Makes this the session that words and printing of the commands go to. */
  void serve() {
    Vocabulary.serve(this);
    Listening.to(teller);
    System.setOut(new PrintStream(out, false, StandardCharsets.UTF_8));
    System.setErr(new PrintStream(err, false, StandardCharsets.UTF_8));
    Thread.currentThread().setContextClassLoader(classes);
  }

  void begin(Request.Begin begin) {
    Path data = begin.data().isEmpty() ? null : Path.of(begin.data());
    mishap = new Mishap(classes, begin.workbook());
    inputs = new Inputs(Path.of(begin.folder()), data, begin.guarded());
    assumptions = new Assumptions(begin.assumptions(), teller);
    seed = begin.seed();
  }

  void load(Request.Load load) {
    classes.add(load.classes());
    teller.send(new Reply.Loaded(""));
  }

  void read(Request.Read read) {
    String text;
    try {
      var field = Class.forName(read.owner(), true, classes).getDeclaredField(read.field());
      field.setAccessible(true);
      Item item = Rendering.of("v", field.get(null));
      text = item instanceof Item.Text plain ? plain.text() : item.toString();
    } catch (ReflectiveOperationException | LinkageError e) {
      text = "";
    }
    teller.send(new Reply.Value(text));
  }

  /** Runs a command to its last event. */
  void invoke(Request.Invoke invoke) {
    running = invoke.command();
    shown = 0;
    teller.begin(invoke.command(), invoke.muted());
    Checkpoint.want(teller.isStopped());
    Event last;
    try {
      last = new Event.Returned(invoke.variable(), invoke.type(), result(invoke));
    } catch (InvocationTargetException e) {
      last = failure(e.getCause());
    } catch (Throwable e) {
      last = failure(e);
    }
    endPrinting();
    teller.end(last);
    Checkpoint.want(false);
    Thread.interrupted();
  }

  private Item result(Request.Invoke invoke) throws ReflectiveOperationException {
    Class<?> owner = Class.forName(invoke.owner(), true, classes);
    Method method = owner.getDeclaredMethod(invoke.method());
    method.setAccessible(true);
    Object value = method.invoke(null);
    return method.getReturnType() == void.class ? null : Rendering.of(nextId(), value);
  }

  private Event.Failed failure(Throwable thrown) {
    try {
      return mishap.of(thrown);
    } catch (StackOverflowError | OutOfMemoryError e) {
      return new Event.Failed("memory", "", "no memory left", java.util.List.of(), false);
    }
  }

  /** Returns a name for the next figure, the same in every run. */
  String nextId() {
    shown++;
    return "c" + running + "f" + shown;
  }

  void endPrinting() {
    System.out.flush();
    System.err.flush();
    out.end();
    err.end();
  }

  void keep(String name, Item.Measure value) {
    if (!kept.add(name)) {
      throw new IllegalArgumentException(
          "«" + name + "» is kept already: give each kept result a name of its own");
    }
    teller.tell(new Event.Kept(name, value));
  }

  void tell(Event event) {
    teller.tell(event);
  }

  Assumptions assumptions() {
    return assumptions;
  }

  Inputs inputs() {
    return inputs;
  }

  Teller teller() {
    return teller;
  }

  long seed() {
    return seed;
  }
}
