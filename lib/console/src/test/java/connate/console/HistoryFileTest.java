package connate.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class HistoryFileTest {

  @TempDir Path folder;

  @Test
  void severalLinesAndBackslashesComeBack() {
    HistoryFile history = new HistoryFile(folder.resolve("deep/history"));
    List<String> typed = List.of("int f() {\n  return 1;\n}", "\"a\\n\\\\b\"", "x");
    typed.forEach(t -> assertTrue(history.add(t)));
    assertEquals(typed, new HistoryFile(folder.resolve("deep/history")).entries());
  }

  @Test
  void twoConsolesAddToOneFile() throws InterruptedException {
    Path file = folder.resolve("history");
    List<Thread> consoles = new ArrayList<>();
    for (String name : List.of("a", "b")) {
      consoles.add(
          new Thread(
              () -> {
                HistoryFile history = new HistoryFile(file);
                for (int i = 0; i < 200; i++) {
                  history.add(name + i);
                }
              }));
    }
    consoles.forEach(Thread::start);
    for (Thread console : consoles) {
      console.join();
    }
    List<String> entries = new HistoryFile(file).entries();
    assertEquals(400, entries.size());
    List<String> own = entries.stream().filter(e -> e.startsWith("a")).toList();
    assertEquals(List.of("a0", "a1"), own.subList(0, 2));
  }

  @Test
  void garbageIsPassedOver() throws IOException {
    Path file = folder.resolve("history");
    byte[] noise = new byte[5000];
    new Random(7).nextBytes(noise);
    Files.write(file, noise);
    HistoryFile history = new HistoryFile(file);
    history.add("\n");
    history.add("var x = 1;");
    List<String> entries = history.entries();
    assertEquals("var x = 1;", entries.get(entries.size() - 1));
    assertTrue(entries.stream().noneMatch(e -> e.codePoints().anyMatch(c -> c < ' ' && c != '\n')));
  }

  @Test
  void fileThatCannotBeWrittenCostsTheHistoryOnly() throws IOException {
    Files.createDirectory(folder.resolve("history"));
    HistoryFile history = new HistoryFile(folder.resolve("history"));
    assertFalse(history.add("x"));
    assertEquals(List.of(), history.entries());
  }

  @Test
  void longHistoryIsCutAtItsOldEnd() {
    Path file = folder.resolve("history");
    HistoryFile history = new HistoryFile(file);
    String many = ("y".repeat(500) + "\n").repeat(18);
    for (int i = 0; i < 300; i++) {
      history.add(i + many);
    }
    List<String> entries = history.entries();
    assertTrue(entries.get(entries.size() - 1).startsWith("299"));
  }
}
