package connate.run;

import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.workbook.Workbook;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Checks that both ways to compile give the same events. */
class AgreementTest {

  /** Independent: the JDK's shell, command by command, tells what the whole must give. */
  @ParameterizedTest
  @ValueSource(strings = {"types.jsh", "statements.jsh", "library.jsh", "names.jsh"})
  void bothWaysTellTheSame(String name) throws IOException {
    try (InputStream in = AgreementTest.class.getResourceAsStream(name)) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      Workbook workbook = Workbook.parse(name, Path.of("target"), text);
      Replays whole =
          Replays.run(workbook, ReplaySettings.PLAIN.compiled(ReplaySettings.Way.WHOLE));
      Replays shell =
          Replays.run(workbook, ReplaySettings.PLAIN.compiled(ReplaySettings.Way.SHELL));
      assertEquals(String.join("\n", shell.lines), String.join("\n", whole.lines));
      assertEquals(shell.outcome.kind(), whole.outcome.kind());
    }
  }

  /** By hand: what one class cannot hold is run command by command, and says why. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "var a = 1;\nvar a = \"text\";\na",
        "int f() { return 1; }\nint f() { return 2; }\nf()",
        "record P(int a) {}\nrecord P(String b) {}\nnew P(\"x\")",
        "var a = 1;\nimport java.time.LocalDate;\nLocalDate.of(2026, 12, 1)",
        "var o = new Object() { int n = 4; };\no.n",
        "var m = Map.of(\"a\", 1, \"b\", 2.5);\nm.get(\"a\").compareTo(null)",
      })
  void fallsBackToTheShell(String text) {
    Replays replay = Replays.run(text, ReplaySettings.PLAIN);
    assertEquals(ReplaySettings.Way.SHELL, replay.outcome.way());
    assertEquals(false, replay.outcome.why().isEmpty());
  }

  /** By hand: what is declared again with the same type is a plain assignment. */
  @Test
  void sameTypeAgainIsNoReasonToFallBack() {
    Replays replay =
        Replays.run("var a = 1;\nvar a = 2;\nint a;\nint b = a, c = b;", ReplaySettings.PLAIN);
    assertEquals(ReplaySettings.Way.WHOLE, replay.outcome.way());
    assertEquals(ReplayOutcome.Kind.COMPLETED, replay.outcome.kind());
  }
}
