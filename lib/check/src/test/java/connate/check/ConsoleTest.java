package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Sits before a real terminal and does what a user does, and what befalls one. */
class ConsoleTest {

  private static final String BACK = "broke off. Bring it back? [Y/n]";

  @TempDir Path folder;

  @BeforeEach
  void needsATerminal() throws IOException {
    assumeTrue(Pane.isPossible(), "skipped: tmux is not installed");
    Files.writeString(
        folder.resolve("core-plugs.csv"),
        "well,porosity [%],k_air [mD]\nA,10,1\nA,20,100\nA,15,10\nB,12,2\nB,18,50\n");
  }

  @Test
  void completesNamesFilesAndColumns() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.type("var plugs = tabl").press("Tab").await("table(");
      pane.type("\"core").press("Tab").await("\"core-plugs.csv\"");
      pane.enter(");").await("5 rows");
      pane.type("plugs.get(\"por").press("Tab").await("\"porosity\"");
      pane.enter(")").await("porosity [%]: 10 20 15 12 18");
      pane.type("plugs.get(").press("Tab").await("Series Table.get(String");
    }
  }

  @Test
  void entersMethodsOverSeveralLinesAndFindsThemAgain() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("int twice(int x) {").enter("  return 2 * x;").enter("}");
      pane.enter("twice(21)").await("42");
      pane.enter("var other = 1;").await("\nother = 1");
      pane.press("C-r").type("twice(2").await("twice(21)");
      pane.press("Enter").enter("other + 2").await("\n3");
    }
  }

  @Test
  void pasteOfTenCommandsRunsAsTen() {
    String ten =
        IntStream.rangeClosed(1, 10)
            .mapToObj(i -> "keep(\"n" + i + "\", " + i + ");")
            .collect(Collectors.joining("\n"));
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.paste(ten).press("Enter").await("kept n10: 10");
      assertTrue(pane.screen().contains("kept n1: 1"), pane.screen());
    }
  }

  @Test
  void stopsWhatNeverEndsAndKeepsTheState() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("var kept = 7;").await("\nkept = 7");
      pane.enter("while (true) {}").press("Enter");
      whileBusy(pane);
      pane.press("C-c").await("stopped; what was declared before is still there");
      pane.enter("kept + 1").await("\n8");
      pane.enter("IntStream.iterate(0, i -> 0).filter(i -> i > 0).findFirst()");
      whileBusy(pane);
      pane.press("C-c");
      pane.enter("kept + 2").await("\n9");
    }
  }

  /** Waits until the engine has worked for a while. */
  private static void whileBusy(Pane pane) {
    long before = cpu(pane);
    while (cpu(pane) - before < 300) {
      Thread.onSpinWait();
    }
  }

  private static long cpu(Pane pane) {
    return pane.engine().info().totalCpuDuration().orElseThrow().toMillis();
  }

  @Test
  void engineThatIsKilledCostsNothing() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("var a = 40;").await("\na = 40");
      for (int i = 1; i <= 3; i++) {
        pane.engine().destroyForcibly();
        pane.enter("a + " + i).await("\n" + (40 + i));
      }
    }
  }

  @Test
  void sessionOfAKilledConsoleComesBack() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("/// # A try").enter("var a = 40;").await("\na = 40");
      pane.enter("while (true) {}");
      whileBusy(pane);
      pane.kill();
    }
    try (Pane pane = Pane.open(folder)) {
      pane.await(BACK);
      pane.press("y").press("Enter").await("it is back: 2 entries");
      assertTrue(pane.screen().contains("is not run again: while (true) {}"), pane.screen());
      pane.enter("a + 2").await("\n42");
      pane.leave();
    }
    try (Pane pane = Pane.open(folder)) {
      assertFalse(pane.await("\n>").contains(BACK), "an ended session is not offered again");
    }
  }

  @Test
  void savesAndReplaysToTheSameResultsWithAFigure() throws IOException {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("/// # First look");
      pane.enter("var plugs = table(\"core-plugs.csv\");").await("5 rows");
      pane.enter("var fit = LogLinear.fit(plugs.get(\"porosity\"), plugs.get(\"k_air\"));");
      pane.await("Log-linear transform");
      pane.enter("show(crossplot(plugs.get(\"porosity\"), plugs.get(\"k_air\")).line(fit));");
      pane.await("figure: ");
      pane.enter("no.such(1)").await("error:");
      pane.enter("keep(\"slope\", fit.slope());").await("kept slope: ");
      pane.enter("save(\"first.jsh\")").await("saved first.jsh");
      pane.leave();
    }
    String saved = Files.readString(folder.resolve("first.jsh"));
    assertTrue(saved.startsWith("/// # First look\n\nvar plugs"), saved);
    assertFalse(saved.contains("no.such"), saved);
    try (Pane pane = Pane.open(folder, "first.jsh")) {
      String slope = slope(pane.await("kept slope: "));
      pane.await("\nfirst>");
      pane.enter("results()").await("  slope: ");
      assertEquals(
          "20.87", slope, "regression: five invented plugs, fitted in an engine of its own");
    }
  }

  private static String slope(String screen) {
    return screen.replaceAll("(?s).*kept slope: (\\S+).*", "$1");
  }

  @Test
  void windowMayChangeItsSizeAndHelpFits() {
    try (Pane pane = Pane.open(folder)) {
      pane.await("\n>");
      pane.enter("var a = 1;").await("\na = 1");
      pane.resize(50, 20).enter("help()").await("help(\"…\") tells");
      pane.await("From a file to a figure:");
      int widest = pane.screen().lines().mapToInt(String::length).max().orElse(0);
      assertTrue(widest <= 100, "nothing runs over the edge");
      pane.resize(120, 30).enter("a + 1").await("\n2");
    }
  }
}
