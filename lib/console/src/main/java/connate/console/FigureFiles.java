package connate.console;

import connate.file.AtomicFile;
import connate.log.SvgGate;
import connate.protocol.Item;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/** Puts each figure of a session into a file that any browser shows. */
final class FigureFiles {

  private final Path folder;
  private int count;

  FigureFiles(Path folder) {
    this.folder = folder;
  }

  /** Writes a figure and returns its file; nothing where the disk refuses. */
  Optional<Path> write(Item.Picture picture) {
    try {
      Files.createDirectories(folder);
      count++;
      Path file = folder.resolve("figure-" + count + ".svg");
      AtomicFile.write(file, SvgGate.pass(picture.svg()).getBytes(StandardCharsets.UTF_8));
      return Optional.of(file);
    } catch (IOException | UncheckedIOException | IllegalArgumentException e) {
      return Optional.empty();
    }
  }
}
