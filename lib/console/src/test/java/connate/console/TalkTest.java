package connate.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.jline.terminal.Terminal;
import org.jline.terminal.impl.DumbTerminal;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Talks with the whole console, engine included, over a terminal of bytes. */
class TalkTest {

  @TempDir Path folder;

  @BeforeAll
  static void engineFindsItsClasses() {
    String path = System.getProperty("surefire.test.class.path");
    if (path != null) {
      System.setProperty("connate.engine.classpath", path);
    }
    System.setProperty("connate.engine.options", "-Xmx256m");
  }

  /** Types all of a text and returns what stands on the screen when the console has ended. */
  private String talk(String typed, String... arguments) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    Terminal terminal =
        new DumbTerminal(
            "test",
            Terminal.TYPE_DUMB,
            new ByteArrayInputStream((typed + "\u0004").getBytes(StandardCharsets.UTF_8)),
            out,
            StandardCharsets.UTF_8);
    ConsoleArguments parsed = ConsoleArguments.parse(arguments);
    Console console = new Console(parsed, Map.of(), folder.resolve("state"), folder);
    assertEquals(Exit.DONE, console.talk(terminal));
    return out.toString(StandardCharsets.UTF_8);
  }

  @Test
  void savedSessionReplaysToTheSameResults() throws IOException {
    Files.writeString(folder.resolve("p.csv"), "porosity [%],k [mD]\n10,1\n20,100\n15,10\n");
    String screen =
        talk(
            """
            /// # A try
            var p = table("p.csv");
            y +* 3
            int twice(int x) {
              return 2 * x;
            }
            keep("rows", twice(p.rows()))
            var wrong = 3;
            undo()
            results()
            log("s.html")
            save("s")
            """);
    assertTrue(screen.contains("kept rows: 6"), screen);
    assertTrue(screen.contains("taken back: var wrong = 3;"), screen);
    String saved = Files.readString(folder.resolve("s.jsh"));
    assertEquals(
        "/// # A try\n\nvar p = table(\"p.csv\");\nint twice(int x) {\n  return 2 * x;\n}\n"
            + "keep(\"rows\", twice(p.rows()));\n",
        saved);
    String log = Files.readString(folder.resolve("s.html"));
    assertTrue(log.contains("A try") && log.contains("p.csv"), "the log tells title and input");
    String again = talk("results()\n", folder.resolve("s.jsh").toString());
    assertTrue(again.contains("  rows: 6"), again);
    assertTrue(again.contains("s> "), "the prompt names the workbook");
  }

  @Test
  void pasteOfTenCommandsRunsAsTen() throws IOException {
    String pasted =
        IntStream.rangeClosed(1, 10)
            .mapToObj(i -> "keep(\"n" + i + "\", " + i + ");")
            .collect(Collectors.joining("\n"));
    String screen = talk(pasted + "\n");
    for (int i = 1; i <= 10; i++) {
      assertTrue(screen.contains("kept n" + i + ": " + i), screen);
    }
  }

  @Test
  void mistakesAreToldInPlainWords() throws IOException {
    String screen =
        talk(
            """
            Klinkenburg.of(3)
            x = 4
            exit
            throw new IllegalArgumentException("too deep");
            why()
            percent(21).in(fraction)
            """);
    assertTrue(screen.contains("no type or variable «Klinkenburg» is known here"), screen);
    assertTrue(screen.contains("did you mean «Klinkenberg»?"), screen);
    assertTrue(screen.contains("a new name begins with var: var x = …"), screen);
    assertTrue(screen.contains("did you mean quit()?"), screen);
    assertTrue(screen.contains("error: too deep"), screen);
    assertFalse(screen.contains("java.lang"), screen);
    assertTrue(screen.contains("0.21"), "the session goes on: " + screen);
  }

  @Test
  void helpLeadsFromAFileToAFigure() throws IOException {
    Files.writeString(
        folder.resolve("core-plugs.csv"),
        "porosity [%],k_air [mD]\n10,1\n20,100\n15,10\n12,2\n18,50\n");
    List<String> commands =
        new Guide()
            .start(folder).stream()
                .filter(l -> l.startsWith("  "))
                .map(String::strip)
                .collect(Collectors.toList());
    assertEquals(5, commands.size());
    String screen = talk(String.join("\n", commands) + "\n");
    assertFalse(screen.contains("error:"), screen);
    assertTrue(screen.contains("figure: "), screen);
    Path figure =
        Path.of(
            screen.lines().filter(l -> l.startsWith("figure: ")).findFirst().get().substring(8));
    assertTrue(Files.readString(figure).startsWith("<svg"));
  }
}
