package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class SlichterTest {

  /**
   * Published: Slichter's table of 1/c by porosity, c 84.3, 52.5, 28.8, 20.3, 12.8 at 0.26, 0.30,
   * 0.36, 0.40, 0.46, with K = 0.01022 (g/ν) d²/c (from memory); the power is a fit to it.
   */
  @Test
  @Check(
      method = "slichter",
      kind = Kind.PUBLISHED,
      source = "Slichter (1899), table of c by porosity, from memory")
  void table() {
    double[][] table = {{0.26, 84.3}, {0.30, 52.5}, {0.36, 28.8}, {0.40, 20.3}, {0.46, 12.8}};
    for (double[] row : table) {
      double k = Slichter.of(mm(1), fraction(row[0]), degC(10)).metresPerSecond();
      double expected = FreshWater.gravityOverViscosity(10) * 0.01022 / row[1] * 1e-6;
      assertEquals(expected, k, 0.025 * expected, "porosity " + row[0]);
    }
    assertThrows(IllegalArgumentException.class, () -> Slichter.of(mm(1), fraction(1), degC(10)));
  }

  /** By hand: the two sands of the Groundwater Project's exercise 6 (cm/s at 10 °C). */
  @Test
  void exercise() {
    double coarse = Slichter.of(mm(0.66), fraction(0.26), degC(10)).in(Units.cmPerSecond);
    double fine = Slichter.of(mm(0.058), fraction(0.30), degC(10)).in(Units.cmPerSecond);
    assertEquals(0.0390406, coarse, 3e-4 * coarse);
    assertEquals(4.82575e-4, fine, 3e-4 * fine);
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "slichter", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(5.07778, Slichter.factor(0.15, 0.36));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "SlichterTest",
        2,
        d -> Slichter.of(d, fraction(0.36), degC(10)),
        d -> Slichter.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Slichter.of(mm(0.15), fraction(n), degC(10)));
  }
}
