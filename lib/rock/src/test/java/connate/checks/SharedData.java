package connate.checks;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Assumptions;

/** Open data that lie beside the project; where they are absent a test is skipped and says so. */
public final class SharedData {

  private SharedData() {}

  /** Returns a file of the open data, or skips the test. */
  public static Path file(String relative) {
    Path file = folder().resolve("data").resolve(relative);
    Assumptions.assumeTrue(
        Files.exists(file),
        "skipped: the open data file " + relative + " is not beside the project");
    return file;
  }

  /** Returns the cells of a plain CSV file without quoted commas, header first. */
  public static List<String[]> csv(String relative) {
    try {
      return Files.readAllLines(file(relative)).stream()
          .map(line -> line.replace("\"", "").split(",", -1))
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Returns a column of a plain CSV file; an empty cell is NaN. */
  public static double[] column(List<String[]> rows, String name) {
    int at = List.of(rows.get(0)).indexOf(name);
    return rows.stream()
        .skip(1)
        .mapToDouble(r -> r[at].isEmpty() ? Double.NaN : Double.parseDouble(r[at]))
        .toArray();
  }

  private static Path folder() {
    String set = System.getenv("CONNATE_SHARED");
    if (set != null) {
      return Path.of(set);
    }
    Path at = Path.of("").toAbsolutePath();
    while (at != null && !Files.isDirectory(at.resolve(".ci"))) {
      at = at.getParent();
    }
    return at == null || at.getParent() == null
        ? Path.of("shared")
        : at.getParent().resolve("shared");
  }
}
