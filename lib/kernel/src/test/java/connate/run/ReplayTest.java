package connate.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.protocol.Event;
import connate.protocol.Item;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.Timer;
import java.util.TimerTask;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * Checks what a replay tells when all is well, and above all when it is not. All values by hand.
 */
@Timeout(120)
class ReplayTest {

  private static ReplaySettings by(ReplaySettings.Way way) {
    return ReplaySettings.PLAIN.trusted().compiled(way);
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void commandsBeforeACompileErrorRun(ReplaySettings.Way way) {
    Replays replay =
        Replays.run(
            "var porosity = 1;\n/// p\nporosity + 1\n  var x =\n    porositty + 1;\nx", by(way));
    assertEquals(ReplayOutcome.Kind.FAILED, replay.outcome.kind());
    assertEquals(2, replay.outcome.command().index());
    Event.Failed failed = replay.failure();
    assertEquals("compile", failed.kind());
    assertTrue(
        failed.message().startsWith("w.jsh:5:5: error[J01]: no variable «porositty» is known here"),
        failed.message());
    assertTrue(failed.message().contains("5 |     porositty + 1;"), failed.message());
    assertTrue(failed.message().contains("did you mean «porosity»?"), failed.message());
    assertEquals(List.of(new Event.Frame("", "w.jsh", 5)), failed.frames());
    assertTrue(replay.lines.contains("3 started"), replay.lines.toString());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void unknownTypesAndMethodsAreTold(ReplaySettings.Way way) {
    for (String text :
        java.util.List.of(
            "Fooo x = null;",
            "var x = fooo(1);",
            "Fooo[] x;",
            "List<Fooo> x = null;",
            "fooo(1)",
            "int f(Fooo v) { return 1; }",
            "var x = new Fooo();",
            "record R(Fooo v) {}",
            "for (Fooo v : List.of()) { }",
            "fooo",
            "int x = 1, y = fooo;")) {
      Event.Failed failed = Replays.run("1\n" + text, by(way)).failure();
      assertEquals("compile", failed.kind(), text);
      assertTrue(failed.message().startsWith("w.jsh:2:"), failed.message());
      assertTrue(
          failed.message().toLowerCase(java.util.Locale.ROOT).contains("«fooo"), failed.message());
    }
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void aBracketLeftOpenIsToldWhereItStands(ReplaySettings.Way way) {
    Replays replay = Replays.run("var a = 1;\nvar b = List.of(1;\n\nvar c = 2;", by(way));
    assertTrue(
        replay.failure().message().startsWith("w.jsh:2:18: error[J01]: "),
        replay.failure().message());
    assertEquals(1, replay.outcome.command().index());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void exceptionsTellTheWorkbooksLines(ReplaySettings.Way way) {
    String text =
        "int zero() {\n  return 0;\n}\nint f(int v) {\n  return List.of(v).stream()\n"
            + "      .map(x ->\n          x / zero())\n      .findFirst().get();\n}\n"
            + "class C {\n  int go() {\n    return f(\n      4);\n  }\n}\n\n1 +\n  new C().go()";
    Event.Failed failed = Replays.run(text, by(way)).failure();
    assertEquals("java.lang.ArithmeticException", failed.type());
    assertEquals(
        List.of(
            new Event.Frame("lambda", "w.jsh", 7),
            new Event.Frame("f", "w.jsh", 8),
            new Event.Frame("C.go", "w.jsh", 12),
            new Event.Frame("", "w.jsh", 18)),
        failed.frames());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void librarysExceptionsFromALambdaEndAtTheCommand(ReplaySettings.Way way) {
    Event.Failed failed =
        Replays.run("List.of(-1.0).forEach(v ->\n  Permeability.parse(\"x\"));", by(way)).failure();
    assertEquals("java.lang.IllegalArgumentException", failed.type());
    List<Event.Frame> frames = failed.frames();
    assertTrue(frames.get(0).where().startsWith("connate.quantity."), frames.toString());
    assertEquals(new Event.Frame("lambda", "w.jsh", 2), frames.get(frames.size() - 2));
    assertEquals(new Event.Frame("", "w.jsh", 1), frames.get(frames.size() - 1));
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void whatStandsFurtherDownIsNotKnownYet(ReplaySettings.Way way) {
    Replays replay = Replays.run("int f() { return later; }\nf()\nvar later = 2;", by(way));
    assertEquals(1, replay.outcome.command().index());
    assertEquals("compile", replay.failure().kind());
    assertTrue(replay.failure().message().contains("later"), replay.failure().message());
    assertEquals(
        1, Replays.run("later\nvar later = 2;", by(way)).outcome.failure().frames().size());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void anExitCostsItsCommand(ReplaySettings.Way way) {
    Replays replay = Replays.run("System.out.print(\"before\");\nSystem.exit(3);\n1", by(way));
    assertEquals("exit", replay.failure().kind());
    assertTrue(replay.failure().message().contains("System.exit(3)"));
    assertTrue(replay.events.contains(new Event.Printed("before", false)));
    assertEquals("died", Replays.run("Runtime.getRuntime().halt(7);", by(way)).failure().kind());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void fullMemoryAndFullStackAreExceptions(ReplaySettings.Way way) {
    String memory = "var l = new ArrayList<long[]>();\nwhile (true) l.add(new long[10_000_000]);";
    assertEquals("memory", Replays.run(memory, by(way)).failure().kind());
    Event.Failed stack =
        Replays.run("int f(int n) { return f(n + 1) + 1; }\nf(1)", by(way)).failure();
    assertEquals("java.lang.StackOverflowError", stack.type());
    assertEquals(new Event.Frame("f", "w.jsh", 1), stack.frames().get(0));
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void anEndlessLoopIsStoppedAtOnce(ReplaySettings.Way way) {
    String text = "var a = 1;\nwhile (true) { try { a++; } catch (Throwable t) { } }\na";
    assertTrue(stopped(text, 2, way) < 500, "took longer than half a second");
    String method = "int f(int n) { return n == 0 ? 1 : f(n - 1) + f(n - 1); }\nf(60)";
    assertTrue(stopped(method, 2, way) < 500, "took longer than half a second");
  }

  @Test
  void whatCannotBeWokenIsKilled() {
    String text = "var s = new java.util.concurrent.Semaphore(0);\ns.acquireUninterruptibly();";
    long millis = stopped(text, 2, ReplaySettings.Way.WHOLE);
    assertTrue(millis >= 1400 && millis < 3000, millis + " ms");
  }

  /**
   * Runs a workbook, stops the command on a line 300 ms after it began, returns the time it took.
   */
  private static long stopped(String text, int line, ReplaySettings.Way way) {
    Replays replays = new Replays();
    long[] asked = new long[1];
    Replay[] replay = new Replay[1];
    ReplayWatcher watcher =
        new ReplayWatcher() {
          @Override
          public void started(Command command) {
            if (command.firstLine() == line) {
              TimerTask stop =
                  new TimerTask() {
                    @Override
                    public void run() {
                      asked[0] = System.nanoTime();
                      replay[0].stop();
                    }
                  };
              new Timer(true).schedule(stop, 300);
            }
          }

          @Override
          public void event(Command command, Event event) {
            replays.event(command, event);
          }

          @Override
          public void finished(Command command) {
            replays.finished(command);
          }
        };
    replay[0] = Replay.of(Workbook.parse("w.jsh", Path.of("target"), text), by(way), watcher);
    ReplayOutcome outcome = replay[0].run();
    assertEquals(ReplayOutcome.Kind.STOPPED, outcome.kind());
    assertEquals("stopped", replays.failure().kind());
    return (System.nanoTime() - asked[0]) / 1_000_000;
  }

  @Test
  void assumptionsTakeOtherValues() {
    String text = "assume(\"density\", gPerCm3(2.65))\nassume(\"n\", 3)\nassume(\"gas\", false)";
    Replays replay =
        Replays.run(
            text,
            ReplaySettings.PLAIN
                .withAssumption("density", "2700 kg/m3")
                .withAssumption("gas", "yes")
                .withAssumption("typo", "1"));
    Event.Assumed density = (Event.Assumed) replay.events.get(0);
    assertTrue(density.overridden());
    assertEquals(2700, density.value().value());
    assertEquals(2.65, density.stated().value());
    assertEquals(new Item.Text("true"), ((Event.Returned) replay.events.get(5)).item());
    assertEquals(Set.of("typo"), replay.outcome.unused());
    Event.Failed wrong =
        Replays.run(text, ReplaySettings.PLAIN.withAssumption("density", "2.7")).failure();
    assertTrue(wrong.message().contains("«density» is to be «2.7»"), wrong.message());
  }

  @Test
  void aMissingFileIsBadInput() {
    Replays replay = Replays.run("well(\"nope.las\")", ReplaySettings.PLAIN);
    assertTrue(replay.outcome.isBadInput());
    assertTrue(replay.failure().message().startsWith("nope.las: error[F01]: no such file"));
    assertEquals(List.of(new Event.Frame("", "w.jsh", 1)), replay.failure().frames());
  }

  @ParameterizedTest
  @EnumSource(names = {"WHOLE", "SHELL"})
  void theGuardNamesCommandCallAndWayOut(ReplaySettings.Way way) {
    Replays replay =
        Replays.run(
            "var a = 1;\n// why\nint n =\n  System.getenv().size();",
            ReplaySettings.PLAIN.compiled(way));
    assertEquals(ReplayOutcome.Kind.REFUSED, replay.outcome.kind());
    assertEquals(1, replay.outcome.command().index());
    String message = replay.failure().message();
    int line = way == ReplaySettings.Way.WHOLE ? 4 : 3;
    assertTrue(message.startsWith("w.jsh:" + line + ":"), message);
    assertTrue(message.contains("error[G01]: «java.lang.System.getenv» is not allowed"), message);
    assertTrue(message.contains("--trust"), message);
  }

  @Test
  void filesOutsideOfTheFoldersAreRefused() {
    Replays replay = Replays.run("well(\"../pom.xml\")", ReplaySettings.PLAIN);
    assertEquals(ReplayOutcome.Kind.REFUSED, replay.outcome.kind());
    assertEquals(
        ReplayOutcome.Kind.FAILED,
        Replays.run("well(\"../pom.xml\")", ReplaySettings.PLAIN.trusted()).outcome.kind());
  }

  @Test
  void resultsHaveNamesOfTheirOwn() {
    Event.Failed failed =
        Replays.run("keep(\"a\", 1);\nkeep(\"a\", 2);", ReplaySettings.PLAIN).failure();
    assertTrue(failed.message().contains("«a» is kept already"), failed.message());
  }

  @Test
  void floodsOfPrintingAreCut() {
    Replays replay =
        Replays.run(
            "for (int i = 0; i < 300_000; i++) System.out.println(\"line \" + i);",
            ReplaySettings.PLAIN);
    int told =
        replay.events.stream()
            .filter(Event.Printed.class::isInstance)
            .mapToInt(e -> ((Event.Printed) e).text().length())
            .sum();
    assertTrue(told < 1_100_000, told + " letters");
    assertEquals(ReplayOutcome.Kind.COMPLETED, replay.outcome.kind());
  }

  @Test
  void emptyWorkbooksAreDoneAtOnce() {
    assertEquals(
        ReplayOutcome.Kind.COMPLETED,
        Replays.run("/// only prose", ReplaySettings.PLAIN).outcome.kind());
    assertEquals(
        ReplayOutcome.Kind.COMPLETED, Replays.run("", ReplaySettings.PLAIN).outcome.kind());
  }
}
