package connate.las;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Assumptions;

/** Finds the data folder that several projects share; tests that need it are skipped without it. */
public final class SharedFiles {

  private SharedFiles() {}

  /** Returns a file of the shared data, or skips the test with the reason. */
  public static Path of(String name) {
    String stated = System.getenv("CONNATE_SHARED");
    Path folder = stated == null ? besideProject() : Path.of(stated);
    Path file = folder.resolve("data").resolve(name);
    boolean isThere = Files.exists(file);
    if (!isThere) {
      System.err.println("skipped: no shared data at " + file + "; set CONNATE_SHARED");
    }
    Assumptions.assumeTrue(isThere, "no shared data at " + file);
    return file;
  }

  private static Path besideProject() {
    Path at = Path.of(System.getProperty("user.dir")).toAbsolutePath();
    while (at != null && !Files.isDirectory(at.resolve("lib").resolve("rock"))) {
      at = at.getParent();
    }
    return at == null ? Path.of("shared") : at.resolve("..").resolve("shared").normalize();
  }
}
