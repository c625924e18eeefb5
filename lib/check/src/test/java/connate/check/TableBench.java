package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.table.Table;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * How long a CSV file of a million rows and six columns takes, beside pandas on the same file in
 * the same run. Runs by name only: {@code mvn test -pl lib/check -am -Dtest=TableBench}. The bound:
 * five seconds, for a reader that judges every cell and knows its line.
 */
class TableBench {

  private static final int ROWS = 1_000_000;
  private static final int RUNS = 5;
  private static final double BOUND = 5000;

  @Test
  void aMillionRows(@TempDir Path folder) throws IOException, InterruptedException {
    Path file = folder.resolve("plugs.csv");
    Files.write(file, plugs());
    byte[] content = Files.readAllBytes(file);
    double first = 0;
    double least = Double.POSITIVE_INFINITY;
    Table table = null;
    for (int i = 0; i < RUNS; i++) {
      long start = System.nanoTime();
      table = Table.read("plugs.csv", content);
      double took = (System.nanoTime() - start) / 1e6;
      first = i == 0 ? took : first;
      least = Math.min(least, took);
    }
    long start = System.nanoTime();
    assertTrue(table.toString().contains("1000000 rows"));
    double shown = (System.nanoTime() - start) / 1e6;
    String[] pandas = pandas(file);
    double sum = Double.parseDouble(pandas[2]);
    double own = 0;
    for (double value : table.get("porosity").values()) {
      own += value;
    }
    assertEquals(sum, own, 1e-9 * sum, "the same numbers, added in another order");
    System.err.printf(
        Locale.ROOT,
        "CSV, %d rows, %.0f MB: first %.0f ms, least %.0f ms, shown in %.0f ms; pandas %s ms%n",
        ROWS,
        content.length / 1e6,
        first,
        least,
        shown,
        pandas[1]);
    assertTrue(first <= BOUND, first + " ms");
  }

  private static byte[] plugs() {
    SplittableRandom random = new SplittableRandom(1);
    StringBuilder out = new StringBuilder(40 * ROWS);
    out.append("well,depth [m],porosity [%],k_air [mD],rhob [g/cm3],facies\n");
    for (int row = 0; row < ROWS; row++) {
      out.append("W-").append(row % 7).append(',');
      out.append(1000 + row / 10).append('.').append(row % 10).append(',');
      out.append(random.nextInt(3000) / 100.0).append(',');
      out.append(random.nextInt(1_000_000) / 1000.0).append(',');
      out.append(2 + random.nextInt(10_000) / 10_000.0).append(",F").append(row % 5).append('\n');
    }
    return out.toString().getBytes(StandardCharsets.US_ASCII);
  }

  private static String[] pandas(Path file) throws IOException, InterruptedException {
    Path root = Path.of("").toAbsolutePath();
    while (root.getParent() != null && !Files.isDirectory(root.resolve(".ci"))) {
      root = root.getParent();
    }
    String script = root.resolve("lib/check/bench/table_rows.py").toString();
    Process process =
        new ProcessBuilder("/usr/bin/python3", script, file.toString(), "3")
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    int code = process.waitFor();
    Assumptions.assumeTrue(code == 0, "no pandas here: " + said);
    return said.strip().split(" ");
  }
}
