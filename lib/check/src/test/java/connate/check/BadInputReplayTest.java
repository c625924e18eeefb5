package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What a user meets when the input is wrong: a message with its place, and the right exit status.
 */
class BadInputReplayTest {

  @TempDir Path folder;

  private void file(String name, String... lines) throws IOException {
    Files.writeString(
        folder.resolve(name), String.join("\n", lines) + "\n", StandardCharsets.UTF_8);
  }

  private Run replay(String... lines) throws IOException {
    file("w.jsh", lines);
    return Run.of("replay", folder.resolve("w.jsh").toString());
  }

  private static void told(Run run, int status, String... words) {
    assertEquals(status, run.status(), run::toString);
    for (String word : words) {
      assertTrue(run.err().contains(word), () -> "«" + word + "» is missing in " + run);
    }
  }

  @Test
  void missingFileNamesItsPlace() throws IOException {
    told(replay("/// a", "table(\"plugz.csv\")"), 3, "w.jsh:2:1", "plugz.csv", "no such file");
    told(
        Run.of("replay", folder.resolve("none.jsh").toString()), 3, "none.jsh", "no such workbook");
  }

  @Test
  void missingColumnNamesTheNearest() throws IOException {
    file("p.csv", "well,k_air [mD]", "A,1");
    told(
        replay("var t = table(\"p.csv\");", "t.get(\"k_iar\")"),
        1,
        "w.jsh:2:1",
        "nearest is k_air");
  }

  @Test
  void percentTakenForFractionIsAsked() throws IOException {
    file("p.csv", "porosity,k [mD]", "18,10", "20,30", "22,90");
    told(
        replay("var t = table(\"p.csv\");", "LogLinear.fit(t.get(\"porosity\"), t.get(\"k\"))"),
        1,
        "w.jsh:2:1",
        "in percent?",
        "porosity [%]");
    file("q.csv", "porosity [v/v],k [mD]", "0.18,10", "1.83,30");
    told(replay("table(\"q.csv\")"), 3, "q.csv:3:1: error[T03]", "1.83 is outside 0..1");
  }

  @Test
  void mixedDimensionsAndWordsAmongNumbers() throws IOException {
    file("m.csv", "k,v", "12 mD,1", "3 m,2", "5 mD,3");
    told(replay("table(\"m.csv\")"), 3, "m.csv:3:1: error[T06]");
    StringBuilder big = new StringBuilder("depth [m],phi [%]\n");
    for (int line = 2; line <= 6000; line++) {
      big.append("1000,").append(line == 4711 ? "18.x" : "18.2").append('\n');
    }
    Files.writeString(folder.resolve("big.csv"), big);
    told(
        replay("table(\"big.csv\")"), 3, "big.csv:4711:6: error[T04]", "4711 | 1000,18.x", "help:");
  }

  @Test
  void brokenLasFiles() throws IOException {
    String head = "~V\n VERS. 2.0:\n WRAP. NO:\n~W\n STRT.M 1:\n STOP.M 3:\n STEP.M 1:\n";
    String curves = " NULL. -999.25:\n~C\n DEPT.M:\n GR.GAPI:\n";
    file("short.las", head + curves + "~A\n1 50\n2\n3 60");
    told(replay("well(\"short.las\")"), 3, "short.las:14:1: error[L", "help:");
    file("noa.las", head + curves);
    told(replay("well(\"noa.las\")"), 3, "noa.las:", "no section ~A");
    file("first.las", "1 2 3\n" + head + curves + "~A\n1 50");
    told(replay("well(\"first.las\")"), 3, "first.las:1:1: error[L");
  }

  @Test
  void compileErrorInTheMiddleLetsTheRestBeforeItRun() throws IOException {
    Run run = replay("var a = 1;", "keep(\"a\", a);", "var b = nowhere(a);", "keep(\"b\", 2);");
    told(run, 1, "w.jsh:3:9", "nowhere", "^^^^^^^");
    assertTrue(run.out().contains("a  1"), run::toString);
    assertEquals(1, Run.kept(folder.resolve("w.html"), "a"));
  }

  @Test
  void exceptionFromALambdaNamesItsOwnLine() throws IOException {
    told(
        replay(
            "var out = java.util.stream.IntStream.range(0, 2)",
            "    .mapToObj(i -> KozenyCarman.of(percent(50 + 60 * i), um(100)))",
            "    .toList();"),
        1,
        "w.jsh:2",
        "porosity 1.1 is impossible");
  }

  @Test
  void emptyColumnAndExit() throws IOException {
    file("e.csv", "a [m],b [m]", ",1", ",2");
    told(
        replay("var t = table(\"e.csv\");", "t.get(\"a\").mean()"),
        1,
        "w.jsh:2:1",
        "no value in any");
    Run run = replay("keep(\"a\", 1);", "System.exit(3);", "keep(\"b\", 2);");
    assertTrue(run.status() == 1 || run.status() == 4, run::toString);
    assertTrue(run.err().contains("w.jsh:2:"), run::toString);
  }

  @Test
  void assumptionThatNobodyStates() throws IOException {
    file("w.jsh", "var c = assume(\"cutoff\", percent(8));");
    String file = folder.resolve("w.jsh").toString();
    told(Run.of("replay", file, "--assume", "cutof=9 %"), 2, "did you mean «cutoff»");
    told(Run.of("replay", file, "--assume", "cutoff=9 mD"), 1, "no unit of fraction");
    told(Run.of("replay", file, "--assume", "cutoff"), 2, "NAME=VALUE");
    assertEquals(0, Run.of("replay", file, "--assume", "cutoff=9 %").status());
  }

  @Test
  void typosAreGuessedAndNeverRun() {
    told(Run.of("relpay", "x"), 2, "did you mean «replay»");
  }

  @Test
  void guardedWorkbookDoesNotReachOutside() throws IOException {
    told(
        replay("java.nio.file.Files.readString(java.nio.file.Path.of(\"/etc/passwd\"))"),
        4,
        "w.jsh:1",
        "--trust");
    told(replay("new ProcessBuilder(\"id\").start()"), 4, "w.jsh:1");
    told(replay("table(\"../../../../etc/passwd\")"), 4, "w.jsh:1");
  }
}
