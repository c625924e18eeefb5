package connate.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class AtomicFileTest {

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  @Test
  void replacesTheOldFileAndLeavesNothingElse(@TempDir Path folder) throws IOException {
    Path path = folder.resolve("a.txt");
    AtomicFile.write(path, bytes("old"));
    AtomicFile.write(path, bytes("new"));
    assertEquals("new", Files.readString(path));
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(1, files.count());
    }
  }

  /**
   * A folder that holds something cannot be replaced by a file: the move fails, nothing is left.
   */
  @Test
  void failureLeavesTheOldAndNothingElse(@TempDir Path folder) throws IOException {
    Path taken = Files.createDirectories(folder.resolve("taken"));
    Files.writeString(taken.resolve("x"), "kept");
    assertThrows(UncheckedIOException.class, () -> AtomicFile.write(taken, bytes("new")));
    assertThrows(
        UncheckedIOException.class, () -> AtomicFile.write(folder.resolve("no/a"), bytes("new")));
    assertEquals("kept", Files.readString(taken.resolve("x")));
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(1, files.count());
    }
  }
}
