package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Objects;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Workbooks over real open data give the figures that were computed elsewhere, digit for digit. */
class RealDataReplayTest {

  @TempDir Path folder;

  private static Path data(String name) {
    String set = System.getenv("CONNATE_SHARED");
    Path at = Path.of("").toAbsolutePath();
    while (set == null && at != null && !Files.isDirectory(at.resolve(".ci"))) {
      at = at.getParent();
    }
    Path shared =
        set != null ? Path.of(set) : at == null ? Path.of("shared") : at.resolveSibling("shared");
    Path data = shared.resolve("data").resolve(name);
    Assumptions.assumeTrue(
        Files.isDirectory(data), "skipped: the open data " + name + " are not beside the project");
    return data;
  }

  private Path replay(String name, String data) throws IOException {
    Path source = data(data);
    Path workbook = folder.resolve(name + ".jsh");
    try (InputStream in = getClass().getResourceAsStream("workbooks/" + name + ".jsh")) {
      Files.write(workbook, Objects.requireNonNull(in, name).readAllBytes());
    }
    Run run = Run.of("replay", workbook.toString(), "--data", source.toString());
    assertEquals(0, run.status(), run::toString);
    return folder.resolve(name + ".html");
  }

  /**
   * Independent: plain scripts on the same file give log10 k[mD] = -2.680 + 15.479 φ, R² 0.7326, s
   * 0.539, n 73, geometric mean 84.43 mD.
   */
  @Test
  void plugsOfAsten() throws IOException {
    Path log = replay("ast02", "core-ast02");
    assertEquals(15.479, Run.kept(log, "slope"), 5e-4);
    assertEquals(-2.680, Run.kept(log, "intercept"), 5e-4);
    assertEquals(0.7326, Run.kept(log, "R2"), 5e-5);
    assertEquals(73, Run.kept(log, "n"));
    assertEquals(0.539, Run.kept(log, "scatter"), 5e-4);
    double geometric = StrictMath.pow(10, Run.kept(log, "log10 of the geometric mean in mD"));
    assertEquals(84.43, geometric, 5e-3);
    String page = Files.readString(log);
    assertEquals(2, page.split("<svg", -1).length - 1, "a crossplot and a depth plot");
    assertTrue(page.contains("AST-02"), "the well's name stands over its plot");
  }

  /**
   * Independent: plain scripts give exponents 3.172 (n 71, R² 0.960) and 6.728 (n 55, R² 0.836),
   * arithmetic mean 917.5 mD, geometric mean 64.68 mD; the published exponents are 3.05 and 7.33.
   */
  @Test
  void fontainebleau() throws IOException {
    Path log = replay("fontainebleau", "core-fontainebleau");
    assertEquals(3.172, Run.kept(log, "exponent above 8 %"), 5e-4);
    assertEquals(0.960, Run.kept(log, "R2 above 8 %"), 5e-4);
    assertEquals(71, Run.kept(log, "n above 8 %"));
    assertEquals(6.728, Run.kept(log, "exponent below 8 %"), 5e-4);
    assertEquals(0.836, Run.kept(log, "R2 below 8 %"), 5e-4);
    assertEquals(55, Run.kept(log, "n below 8 %"));
    assertEquals(917.5, Run.kept(log, "arithmetic mean"), 0.05);
    double geometric = StrictMath.pow(10, Run.kept(log, "log10 of the geometric mean in mD"));
    assertEquals(64.68, geometric, 5e-3);
  }

  /** Independent: base R's lm on the data set rock; 12 independent cores of 48 rows are told. */
  @Test
  void rockSlices() throws IOException {
    Path log = replay("rock", "spatial-r");
    assertEquals(5.333, Run.kept(log, "intercept"), 5e-4);
    assertEquals(4.850, Run.kept(log, "area / 1e4"), 5e-4);
    assertEquals(-15.27, Run.kept(log, "peri / 1e4"), 5e-3);
    assertEquals(1.757, Run.kept(log, "shape"), 5e-4);
    assertEquals(0.8521, Run.kept(log, "s"), 5e-5);
    assertEquals(0.7483, Run.kept(log, "R2"), 5e-5);
    assertEquals(0.928806, Run.kept(log, "error, leaving one slice out"), 5e-7);
    assertEquals(1.057836, Run.kept(log, "error, leaving one core out"), 5e-7);
    assertTrue(Files.readString(log).contains("only 12 of 48 values"), "the caution is in the log");
  }

  /**
   * Published: reference statistics of the data's authors: mean log10 Kf 0.47170 over 3,326 sands
   * (de Rijk and others 2024). The error of each formula stands as a figure beside it.
   */
  @Test
  void sandsAgainstMeasuredConductivity() throws IOException {
    Path log = replay("sands", "grain-topintegraal");
    assertEquals(3326, Run.kept(log, "curves"));
    assertEquals(0.47170, Run.kept(log, "mean log10 Kf"), 5e-5);
    assertEquals(1, Files.readString(log).split("<svg", -1).length - 1);
  }
}
