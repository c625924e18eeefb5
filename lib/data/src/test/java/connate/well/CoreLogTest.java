package connate.well;

import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.las.SharedFiles;
import connate.series.Series;
import connate.table.Table;
import java.io.IOException;
import java.nio.file.Files;
import org.junit.jupiter.api.Test;

/**
 * Independent: real logs and plugs of well AST-02 (Luijendijk and Gleeson 2015), whose log runs
 * upwards. Reference numbers from NumPy, made by {@code core_shift_reference.py} in the resources.
 */
class CoreLogTest {

  private static Table table(String name) throws IOException {
    return Table.read(name, Files.readAllBytes(SharedFiles.of("core-ast02/" + name)));
  }

  private static Well logs() throws IOException {
    return Well.of("AST-02", table("well_logs_AST02.csv").unit("depth", m));
  }

  private static Series porosity() throws IOException {
    return table("porperm_data_well_AST02.csv").unit("depth", m).get("porosity");
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
