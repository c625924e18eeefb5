package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.las.LasCurve;
import connate.las.LasFile;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * How long a LAS file of 3 MB takes, warm, beside pandas and NumPy on the same numbers in the same
 * run. Runs by name only: {@code mvn test -pl lib/check -am -Dtest=LasBench}. The bound: reading,
 * header and all, in at most half of the time of {@code pandas.read_csv}.
 */
class LasBench {

  private static final int RUNS = 150;
  private static final double BOUND = 0.5;

  @Test
  void threeMegabytesWarm(@TempDir Path folder) throws IOException, InterruptedException {
    Path file = shared("las-kgs/1046114346.las");
    Assumptions.assumeTrue(Files.exists(file), "no shared data at " + file);
    Path numbers = folder.resolve("numbers.csv");
    Files.write(numbers, numbers(Files.readAllBytes(file)));
    double[] times = new double[RUNS];
    LasFile last = null;
    for (int i = 0; i < RUNS; i++) {
      long start = System.nanoTime();
      last = LasFile.read(file);
      times[i] = (System.nanoTime() - start) / 1e6;
    }
    Arrays.sort(times);
    Map<String, String[]> python = python(numbers);
    double total = Double.parseDouble(python.get("sum")[1]);
    assertEquals(total, sum(last), 1e-12 * total, "the same numbers, added in another order");
    double least = times[0];
    double median = times[RUNS / 2];
    double pandas = Double.parseDouble(python.get("pandas")[1]);
    System.err.printf(
        "LAS, 3.1 MB, warm: least %.1f ms, median %.1f ms; pandas %s and %s ms; NumPy %s and %s ms;"
            + " ratio of the least to pandas %.2f%n",
        least,
        median,
        python.get("pandas")[1],
        python.get("pandas")[2],
        python.get("numpy")[1],
        python.get("numpy")[2],
        least / pandas);
    assertTrue(least <= BOUND * pandas, least + " ms against " + pandas + " ms");
  }

  /** Returns the rows of the data section without comments and blank lines. */
  private static byte[] numbers(byte[] content) {
    String text = new String(content, StandardCharsets.ISO_8859_1);
    StringBuilder rows = new StringBuilder();
    text.substring(text.indexOf("~ASCII"))
        .lines()
        .skip(1)
        .filter(l -> !l.isBlank() && !l.startsWith("#"))
        .forEach(l -> rows.append(l.strip()).append('\n'));
    return rows.toString().getBytes(StandardCharsets.ISO_8859_1);
  }

  /** Returns the sum of all numbers as the file has them, nulls included. */
  private static double sum(LasFile file) {
    double sum = 0;
    for (LasCurve curve : file.curves()) {
      for (int row = 0; row < curve.size(); row++) {
        double v = curve.value(row);
        sum += Double.isNaN(v) ? file.nullValue() : v;
      }
    }
    return sum;
  }

  private static Map<String, String[]> python(Path numbers)
      throws IOException, InterruptedException {
    Path script = root().resolve("lib/check/bench/las_numbers.py");
    Process process =
        new ProcessBuilder("/usr/bin/python3", script.toString(), numbers.toString(), "25")
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    int code = process.waitFor();
    Assumptions.assumeTrue(code == 0, "no pandas and NumPy here: " + said);
    Map<String, String[]> times = new HashMap<>();
    said.lines().forEach(l -> times.put(l.split(" ")[0], l.split(" ")));
    return times;
  }

  private static Path shared(String name) {
    String stated = System.getenv("CONNATE_SHARED");
    Path folder = stated == null ? root().resolveSibling("shared") : Path.of(stated);
    return folder.resolve("data").resolve(name);
  }

  private static Path root() {
    Path at = Path.of("").toAbsolutePath();
    while (at.getParent() != null && !Files.isDirectory(at.resolve(".ci"))) {
      at = at.getParent();
    }
    return at;
  }
}
