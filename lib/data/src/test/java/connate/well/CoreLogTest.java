package connate.well;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.gAPI;
import static connate.quantity.Units.gPerCm3;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.las.SharedFiles;
import connate.series.Series;
import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Independent: real logs and plugs of well AST-02 (Luijendijk and Gleeson 2015), whose log runs
 * upwards. Reference numbers from NumPy, made by {@code core_shift_reference.py} in the resources.
 */
class CoreLogTest {

  private static double[] column(List<String> lines, String name) {
    int at = List.of(lines.get(0).split(",")).indexOf(name);
    return lines.stream().skip(1).mapToDouble(l -> number(l.split(",", -1)[at])).toArray();
  }

  private static double number(String cell) {
    return cell.isEmpty() ? Double.NaN : Double.parseDouble(cell);
  }

  private static Well logs() throws IOException {
    List<String> lines = Files.readAllLines(SharedFiles.of("core-ast02/well_logs_AST02.csv"));
    return Well.of("AST-02", Series.of("depth", m, column(lines, "depth")))
        .add("GR", Series.of("GR", gAPI, column(lines, "GR")))
        .add("RHOB", Series.of("RHOB", gPerCm3, column(lines, "RHOB")));
  }

  private static Series porosity() throws IOException {
    List<String> lines =
        Files.readAllLines(SharedFiles.of("core-ast02/porperm_data_well_AST02.csv"));
    Series depth = Series.of("depth", m, column(lines, "depth"));
    return Series.of("porosity", fraction, column(lines, "porosity")).atDepth(depth);
  }

  @Test
  void logsAtTheDepthsOfPlugs() throws IOException {
    Well logs = logs();
    assertEquals(12110, logs.rows());
    assertEquals(m(450.0999), logs.top());
    assertEquals(0.1, logs.step().metres(), 1e-9);
    Well at = logs.at(porosity());
    assertEquals(75, at.rows());
    assertEquals(2.244202, at.get("RHOB").value(0), 5e-7);
    assertEquals(2.21595, at.get("RHOB").value(1), 5e-7);
    assertEquals(2.2315934, at.get("RHOB").value(2), 5e-8);
  }

  @Test
  void coreFitsTheDensityLogBestWhenMovedUp() throws IOException {
    CoreShift shift = CoreShift.best(logs().get("RHOB"), porosity(), m(3));
    assertEquals(-1.8, shift.shift().metres(), 1e-9);
    assertEquals(-0.880333, shift.correlation(), 1e-6);
    assertEquals(-0.768834, shift.correlationBefore(), 1e-6);
    assertEquals(66, shift.pairs());
    assertTrue(shift.doubts().isEmpty(), shift.doubts().toString());
  }
}
