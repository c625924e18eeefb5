package connate.record;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.compare.Comparison;
import connate.compare.Verification;
import connate.fault.DataException;
import connate.log.LogPage;
import connate.log.RunFacts;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StoredLogTest {

  private static final String TEXT =
      "\uFEFF/// # Trick </script><b> & \u2028 \"quoted\"\r\n\r\nvar k = 1;\r\n// end, no newline";

  @TempDir Path folder;

  private Path input() throws IOException {
    Path data = folder.resolve("sub/plugs.csv");
    Files.createDirectories(data.getParent());
    if (!Files.exists(data)) {
      Files.write(data, "a,b\n1,2\n".repeat(500).getBytes(StandardCharsets.UTF_8));
    }
    return data;
  }

  private Path write(String name, double k, boolean pack) throws IOException {
    byte[] bytes = TEXT.getBytes(StandardCharsets.UTF_8);
    Workbook workbook = Workbook.parse("north.jsh", folder, TEXT);
    ReplayLog log = new ReplayLog(workbook, ReplaySettings.PLAIN);
    Command command = workbook.commands().get(0);
    Path data = input();
    log.started(command);
    log.event(
        command,
        new Event.InputRead(
            "sub/plugs.csv",
            data.toString(),
            Files.size(data),
            Digest.hex(Files.readAllBytes(data)),
            500,
            List.of("a in m")));
    log.event(
        command,
        new Event.Kept(
            "k along",
            new Item.Measure("permeability", k, "mD", k / 2, k * 2, "80 %", 4, k + " mD")));
    Item.Measure cutoff =
        new Item.Measure("fraction", 10, "%", Double.NaN, Double.NaN, "", 0, "10 %");
    log.event(command, new Event.Assumed("cutoff", cutoff, cutoff, true));
    log.finished(command);
    log.ended(
        new ReplayOutcome(
            ReplayOutcome.Kind.COMPLETED, null, null, ReplaySettings.Way.WHOLE, "", Set.of()));
    LogRecord record = LogRecord.of(log, bytes, pack);
    Path file = folder.resolve(name);
    Files.writeString(
        file,
        LogPage.of(log, record, new RunFacts(Instant.EPOCH, Duration.ZERO, "")),
        StandardCharsets.UTF_8);
    return file;
  }

  @Test
  void workbookAndDataComeBackByteForByte() throws IOException {
    StoredLog log = StoredLog.read(write("a.html", 142.037, true));
    assertArrayEquals(TEXT.getBytes(StandardCharsets.UTF_8), log.workbook());
    Path target = folder.resolve("unpacked");
    log.unpack(target);
    assertArrayEquals(
        Files.readAllBytes(input()), Files.readAllBytes(target.resolve("sub/plugs.csv")));
    assertArrayEquals(
        TEXT.getBytes(StandardCharsets.UTF_8), Files.readAllBytes(target.resolve("north.jsh")));
    assertEquals("142.037", log.kept().get("k along").value());
    assertEquals("10 %", log.overrides().get("cutoff"));
    assertTrue(Files.size(log.file()) < 30_000, "500 rows alike are packed small");
  }

  @Test
  void anyChangedByteOfTheWorkbookIsSeen() throws IOException {
    Path file = write("a.html", 142, false);
    String page = Files.readString(file);
    Files.writeString(file, page.replace("var k = 1;\\r", "var k = 2;\\r"));
    StoredLog log = StoredLog.read(file);
    assertTrue(
        assertThrows(DataException.class, log::workbook).getMessage().contains("SHA-256 differs"));
  }

  @Test
  void anyChangedByteOfThePackIsSeen() throws IOException {
    Path file = write("a.html", 142, true);
    String page = Files.readString(file);
    int at = page.indexOf("\"data\":\"") + 20;
    char other = page.charAt(at) == 'A' ? 'B' : 'A';
    Files.writeString(file, page.substring(0, at) + other + page.substring(at + 1));
    StoredLog log = StoredLog.read(file);
    assertThrows(DataException.class, log::files);
  }

  @Test
  void pathThatLeavesTheFolderIsRefused() throws IOException {
    Path file = write("a.html", 142, true);
    String page = Files.readString(file);
    Files.writeString(file, page.replace("sub/plugs.csv", "../../evil.csv"));
    assertThrows(
        DataException.class, () -> StoredLog.read(file).unpack(folder.resolve("unpacked")));
    assertFalse(Files.exists(folder.getParent().resolve("evil.csv")));
  }

  @Test
  void whatIsNoLogIsRefused() throws IOException {
    Path file = folder.resolve("x.html");
    for (String text :
        List.of(
            "",
            "<html></html>",
            "<script type=\"application/json\" id=\"connate-record\">{</script>",
            "<script type=\"application/json\" id=\"connate-record\">[]</script>",
            "<script type=\"application/json\" id=\"connate-record\">{\"schema\":\"x\"}</script>")) {
      Files.writeString(file, text);
      assertThrows(DataException.class, () -> StoredLog.read(file), text);
    }
    assertThrows(DataException.class, () -> StoredLog.read(folder.resolve("none.html")));
  }

  @Test
  void comparisonTellsTheFactorAndTheOldRange() throws IOException {
    StoredLog old = StoredLog.read(write("a.html", 142, false));
    StoredLog now = StoredLog.read(write("b.html", 355, false));
    Comparison comparison = Comparison.of(old, now);
    assertEquals(1, comparison.changes().size());
    assertEquals(
        "142 became 355 mD (× 2.5), outside of the old range 71 to 284",
        comparison.changes().get(0).words());
    assertTrue(Comparison.of(old, StoredLog.read(write("c.html", 142, false))).isSame());
  }

  @Test
  void verificationIsExactWithinOrNot() throws IOException {
    StoredLog log = StoredLog.read(write("a.html", 142, false));
    assertTrue(Verification.of(log, StoredLog.read(write("b.html", 142, false)), 0).isReproduced());
    StoredLog near = StoredLog.read(write("c.html", 142.0000001, false));
    assertEquals(
        Verification.Verdict.WITHIN, Verification.of(log, near, 1e-8).results().get(0).verdict());
    assertEquals(
        Verification.Verdict.DIFFERS, Verification.of(log, near, 1e-12).results().get(0).verdict());
    assertFalse(Verification.of(log, near, 1e-8).isPageSame());
  }
}
