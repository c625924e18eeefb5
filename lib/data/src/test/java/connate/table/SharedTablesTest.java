package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.las.SharedFiles;
import connate.quantity.Units;
import connate.series.Series;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Every table of the shared data is read without a wrong value, or refused with its places. */
class SharedTablesTest {

  /** Four rows beneath the profile hold its median, maximum and so on: they are no rows of it. */
  private static final String WITH_SUMMARY = "fault-luangwa/chipola_scarp_measurements.csv";

  private static Table read(String name) {
    try {
      Path file = SharedFiles.of(name);
      return Table.read(file.getFileName().toString(), Files.readAllBytes(file));
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  /**
   * Independent: counts and sums of each column that Python takes for numbers from end to end, by
   * shared_tables.py beside the values. Sums differ by the order of adding, 1e-9 of the sum of
   * sizes.
   */
  @Test
  void countsAndSumsAreThoseOfAnotherProgram() throws IOException {
    Map<String, Table> tables = new HashMap<>();
    List<String> lines = lines("shared_tables.csv");
    assertTrue(lines.size() > 150, "only " + lines.size());
    for (String line : lines.subList(1, lines.size())) {
      String[] want = line.split(",");
      if (want[0].equals(WITH_SUMMARY)) {
        continue;
      }
      Table table = tables.computeIfAbsent(want[0], SharedTablesTest::read);
      assertEquals(Integer.parseInt(want[1]), table.rows(), want[0]);
      String column = table.names().get(Integer.parseInt(want[2]));
      if (table.isNumeric(column)) {
        check(line, table.get(column), Integer.parseInt(want[3]), Double.parseDouble(want[4]));
      } else {
        assertTrue(List.of("Facies", "facies_threshold_0.3").contains(column), line);
      }
    }
    assertEquals(29, tables.size());
  }

  private static void check(String what, Series series, int count, double sum) {
    double[] present = series.present();
    assertEquals(count, present.length, what);
    double got = 0;
    double size = 0;
    for (double value : present) {
      got += value;
      size += Math.abs(value);
    }
    assertEquals(sum, got, 1e-9 * size, what);
  }

  private static List<String> lines(String resource) throws IOException {
    try (InputStream in = SharedTablesTest.class.getResourceAsStream(resource)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
    }
  }

  /** Published with the data: 75 plugs, 73 of them with permeability (README of core-ast02). */
  @Test
  void plugsOfAst02() {
    Table plugs = read("core-ast02/porperm_data_well_AST02.csv");
    assertEquals(75, plugs.rows());
    assertEquals(73, plugs.get("permeability").count());
    assertEquals("AST-02", plugs.labels("well").label(0));
    Series k = plugs.unit("permeability_measured", "m2").get("permeability");
    // by hand: 9.020478962e-15 m² / 9.869233e-16 m² per mD
    assertEquals(9.14, k.in(Units.mD)[0], 0.001);
  }

  /** Independent: column sums of R's data set rock, by base R 4.2: colSums(rock). */
  @Test
  void sumsOfRock() {
    Table rock = read("spatial-r/rock.csv");
    assertEquals(48, rock.rows());
    assertEquals(345011, java.util.Arrays.stream(rock.get("area").values()).sum());
    assertEquals(19941.6, java.util.Arrays.stream(rock.get("perm").values()).sum(), 1e-9);
  }

  /** Published (de Rijk et al. 2024, statistics shipped with the data): mean and n of log10 Kf. */
  @Test
  void sandsOfTheDutchSubsurface() {
    Table sand = read("grain-topintegraal/psd_kf_sand.csv");
    Table stated = read("grain-topintegraal/reference_data_sand_stats.csv");
    assertEquals(3326, sand.rows());
    assertEquals(stated.get("logK").value(0), sand.get("logK").count());
    assertEquals(stated.get("logK").value(1), sand.get("logK").mean().number(), 1e-12);
    assertEquals(stated.get("porosity").value(0), sand.get("porosity").count());
    assertEquals(stated.get("porosity").value(1), sand.get("porosity").mean().number(), 1e-12);
  }

  /** The file's own header says km and m for one name, and blank where nothing was measured. */
  @Test
  void scarpsHaveTheirNamesInAComment() {
    Table scarps = read("fault-luangwa/chitembo_scarp_measurements.csv");
    assertEquals(429, scarps.rows());
    assertEquals(Units.m, scarps.get("Scarp Height").unit());
    // published with the data (REFERENCE): n 118, mean 19.441, maximum 60.44
    assertEquals(118, scarps.get("Scarp Height").count());
    assertEquals(19.441, scarps.get("Scarp Height").mean().number(), 0.0005);
    assertEquals(60.44, scarps.get("Scarp Height").max().number());
    assertEquals(Units.km, scarps.get("Distance Along Fault").unit());
  }

  @Test
  void summaryRowsBeneathATableAreNoRowsOfIt() {
    String message = assertThrows(DataException.class, () -> read(WITH_SUMMARY)).getMessage();
    assertTrue(
        message.startsWith("chipola_scarp_measurements.csv:1860:7: error[T04]: «med»"), message);
  }

  /** 80,000 bytes of numbers as a machine holds them, and no text. */
  @Test
  void bytesThatAreNoTextAreRefused() {
    DataException e =
        assertThrows(DataException.class, () -> read("synthetic-ut/porosity_truth_map.dat"));
    assertEquals("T15", e.faults().get(0).code());
  }
}
