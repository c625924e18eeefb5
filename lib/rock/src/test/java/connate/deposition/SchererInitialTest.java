package connate.deposition;

import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class SchererInitialTest {

  /**
   * Published: the row means of Beard and Weyl's table at the middle of each sorting, within 1.6
   * porosity units; for the worst sorting the class is wide and the middle is the geometric one.
   */
  @Test
  @Check(
      method = "scherer-initial",
      kind = Kind.PUBLISHED,
      source = "row means of Beard and Weyl (1973), within 1.6 porosity units")
  void rowsOfBeardAndWeyl() {
    double[][] rows = {
      {1.05, 42.375}, {1.15, 40.7875}, {1.3, 39.0125}, {1.7, 33.9625}, {2.35, 30.725}, {3.92, 27.9}
    };
    for (double[] row : rows) {
      assertEquals(row[1], SchererInitial.of(number(row[0])).in(Units.percent), 1.6);
    }
  }

  @Test
  void fallsWithSorting() {
    assertEquals(38.525, SchererInitial.of(number(1.3)).in(Units.percent), 5e-4);
    double before = 100;
    for (double so = 1; so < 6; so += 0.2) {
      double phi = SchererInitial.of(number(so)).in(Units.percent);
      assertTrue(phi < before);
      before = phi;
    }
    Series column = SchererInitial.of(Series.of("So", Units.number, 1.3));
    assertEquals(38.525, column.in(Units.percent)[0], 5e-4);
    assertThrows(IllegalArgumentException.class, () -> SchererInitial.of(number(0.7)));
  }
}
