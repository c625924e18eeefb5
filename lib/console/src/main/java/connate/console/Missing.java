package connate.console;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Says that a file is not there, and which like it are. */
final class Missing {

  private Missing() {}

  static String words(String what, Path file) {
    Path folder = file.toAbsolutePath().getParent();
    String name = String.valueOf(file.getFileName());
    if (Files.isDirectory(file)) {
      return file + ": error[W01]: a folder, where a " + what + " was expected";
    }
    if (!Files.isDirectory(folder)) {
      return file + ": error[W01]: there is no folder " + folder;
    }
    return file + ": error[W01]: no such " + what + Help.near(name, names(folder));
  }

  private static List<String> names(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(p -> p.getFileName().toString()).toList();
    } catch (IOException e) {
      return List.of();
    }
  }
}
