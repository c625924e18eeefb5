package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import org.junit.jupiter.api.Test;

class BeyerTest {

  /**
   * Published: Beyer's own table, K [m/s] = c d10² [mm], c 0.0110, 0.0100, 0.0090, 0.0080, 0.0070
   * for Cu 1 to 1.9, 2 to 2.9, 3 to 4.9, 5 to 9.9, 10 to 19.9 (from memory), at the middle of each.
   * The natural logarithm, which one page prints, would give 2.3 times as much.
   */
  @Test
  @Check(
      method = "beyer",
      kind = Kind.PUBLISHED,
      source = "Beyer (1964), table of c by uniformity, from memory")
  void table() {
    double[][] table = {
      {1.45, 0.0110}, {2.45, 0.0100}, {3.95, 0.0090}, {7.45, 0.0080}, {14.95, 0.0070}
    };
    for (double[] row : table) {
      double k = Beyer.of(mm(1), number(row[0]), degC(10)).metresPerSecond();
      assertEquals(row[1], k, 0.055 * row[1], "Cu " + row[0]);
    }
    assertThrows(IllegalArgumentException.class, () -> Beyer.of(mm(0.3), number(0.5), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "beyer", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(20.6317, Beyer.factor(0.15, 2.2));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "BeyerTest",
        2,
        d -> Beyer.of(d, number(2.2), degC(10)),
        d -> Beyer.of(d, number(2.2), degC(10)));
  }
}
