package connate.file;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/**
 * Writes a file so that a reader sees the old one or the new one, never half: to a temporary file
 * in the same folder, forced to disk, then moved over the old one in one step.
 */
public final class AtomicFile {

  private AtomicFile() {}

  /**
   * Writes a file.
   *
   * @param path where it goes; its folder must exist
   * @param content all its bytes
   * @throws UncheckedIOException if it cannot be written; the old file is then as it was
   */
  public static void write(Path path, byte[] content) {
    Path target = path.toAbsolutePath();
    Path temporary = null;
    try {
      temporary = fresh(target);
      fill(temporary, content);
      move(temporary, target);
      temporary = null;
      syncFolder(target.getParent());
    } catch (IOException e) {
      throw new UncheckedIOException("cannot write " + path + ": " + e.getMessage(), e);
    } finally {
      remove(temporary);
    }
  }

  /** A name of its own beside the target; its rights are those that any new file has. */
  private static Path fresh(Path target) {
    String name = "." + target.getFileName() + "-" + ProcessHandle.current().pid();
    return target.resolveSibling(name + "-" + System.nanoTime() + ".part");
  }

  private static void fill(Path temporary, byte[] content) throws IOException {
    try (FileChannel channel =
        FileChannel.open(temporary, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
      ByteBuffer buffer = ByteBuffer.wrap(content);
      while (buffer.hasRemaining()) {
        channel.write(buffer);
      }
      channel.force(true);
    }
  }

  private static void move(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  /** Makes the new name last; not every system lets a folder be opened, and none needs it then. */
  private static void syncFolder(Path folder) {
    try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (IOException e) {
      return;
    }
  }

  private static void remove(Path temporary) {
    if (temporary == null) {
      return;
    }
    try {
      Files.deleteIfExists(temporary);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot remove " + temporary, e);
    }
  }
}
