package connate.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class JournalTest {

  @TempDir Path folder;
  private final List<String> told = new ArrayList<>();

  private Journal start() {
    return new Journals(folder).start(Instant.parse("2026-12-01T10:00:00Z"), 7, told::add);
  }

  @Test
  void whatIsTypedIsOnDiskBeforeItRuns() {
    Journal journal = start();
    int number = journal.typed("var x = 1;\n// two\\lines");
    assertTrue(journal.isOnDisk());
    List<Entry> entries = Journal.read(journal.file());
    assertEquals("var x = 1;\n// two\\lines", entries.get(0).text());
    assertEquals(number, entries.get(0).number());
    journal.close();
  }

  @Test
  void brokenSessionComesBackAndEndedOneDoesNot() {
    Journal journal = start();
    journal.worked(journal.typed("/// # A title"));
    journal.worked(journal.typed("var x = 1;"));
    journal.failed(journal.typed("y"), "no y");
    journal.typed("while (true) {}");
    assertTrue(new Journals(folder).lost().isEmpty(), "a living session is left alone");
    journal.close();
    Journals.Lost lost = new Journals(folder).lost().orElseThrow();
    assertEquals(List.of("/// # A title", "var x = 1;"), lost.book().worked());
    assertEquals(List.of("while (true) {}"), lost.book().open());
    Journal again = new Journals(folder).resume(lost.file(), told::add);
    assertEquals(5, again.typed("more"), "numbers go on");
    again.end();
    assertTrue(new Journals(folder).lost().isEmpty());
    assertTrue(told.isEmpty(), told.toString());
  }

  @Test
  void lineThatWasCutOffIsDroppedAndTheRestGoesOn() throws IOException {
    Journal journal = start();
    journal.worked(journal.typed("var x = 1;"));
    journal.close();
    Files.write(
        journal.file(), "> 2 var hal".getBytes(StandardCharsets.UTF_8), StandardOpenOption.APPEND);
    Journal again = new Journals(folder).resume(journal.file(), told::add);
    again.worked(again.typed("var y = 2;"));
    again.close();
    assertEquals(
        "var x = 1;\nvar y = 2;\n", new Journals(folder).lost().orElseThrow().book().workbook());
  }

  @Test
  void folderThatRefusesIsToldOnceAndNothingIsLost() throws IOException {
    Path blocked = folder.resolve("blocked");
    Files.writeString(blocked, "a file stands where the folder should be");
    Journal journal = new Journals(blocked).start(Instant.EPOCH, 1, told::add);
    journal.typed("var x = 1;");
    journal.typed("var y = 2;");
    assertFalse(journal.isOnDisk());
    assertEquals(1, told.size(), told.toString());
    Files.delete(blocked);
    journal.typed("var z = 3;");
    assertTrue(journal.isOnDisk());
    assertEquals(3, Journal.read(journal.file()).size());
    assertTrue(told.get(1).contains("nothing is missing"), told.toString());
    journal.close();
  }

  @Test
  void workbookHoldsWhatWorkedWithItsProse() {
    SessionBook book = new SessionBook();
    book.typed(1, "/// # Title");
    book.typed(2, "var x = 1;");
    book.worked(2);
    book.typed(3, "x +");
    book.failed(3);
    book.typed(4, "/// More");
    book.typed(5, "keep(\"x\", x);");
    book.worked(5);
    book.typed(6, "var y = 2;");
    book.worked(6);
    assertEquals(6, book.lastWorked());
    book.undone(6);
    assertEquals("/// # Title\n\nvar x = 1;\n\n/// More\n\nkeep(\"x\", x);\n", book.workbook());
    assertEquals(5, book.lastWorked());
  }
}
