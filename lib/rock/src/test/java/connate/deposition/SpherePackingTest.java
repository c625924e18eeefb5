package connate.deposition;

import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Told;
import org.junit.jupiter.api.Test;

class SpherePackingTest {

  /** Published: Graton and Fraser (1935): 47.64, 39.54, 30.19, 25.95 %; crystals: 31.98 %. */
  @Test
  @Check(
      method = "sphere-packing",
      kind = Kind.PUBLISHED,
      source = "Graton and Fraser (1935), printed porosities")
  void printed() {
    double[] expected = {0.476401, 0.395400, 0.319825, 0.301868, 0.259520};
    for (SpherePacking packing : SpherePacking.values()) {
      assertEquals(expected[packing.ordinal()], packing.porosity().fraction(), 5e-7);
    }
    assertEquals("body centred", SpherePacking.BODY_CENTRED.toString());
  }

  /** Independent: points tried at random in the cell of the cubic packing. */
  @Test
  @Check(
      method = "sphere-packing",
      kind = Kind.INDEPENDENT,
      source = "points at random in a cell, cubic and body-centred")
  void countedPoints() {
    var random = connate.checks.Seeds.random("SpherePackingTest");
    int cubic = 0;
    int centred = 0;
    int n = 200_000;
    double r = StrictMath.sqrt(3) / 4;
    for (int i = 0; i < n; i++) {
      double x = random.nextDouble() - 0.5;
      double y = random.nextDouble() - 0.5;
      double z = random.nextDouble() - 0.5;
      double square = x * x + y * y + z * z;
      cubic += square > 0.25 ? 1 : 0;
      double a = 0.5 - Math.abs(x);
      double b = 0.5 - Math.abs(y);
      double c = 0.5 - Math.abs(z);
      centred += square > r * r && a * a + b * b + c * c > r * r ? 1 : 0;
    }
    assertEquals(SpherePacking.CUBIC.porosity().fraction(), cubic / (double) n, 0.005);
    assertEquals(SpherePacking.BODY_CENTRED.porosity().fraction(), centred / (double) n, 0.005);
  }

  @Test
  void suspiciousPorosityIsTold() {
    try (Told told = new Told()) {
      assertFalse(SpherePacking.allows(percent(52)));
      assertFalse(SpherePacking.allows(percent(20)));
      assertTrue(told.says("M21", "suspicious"), told.toString());
      assertTrue(SpherePacking.allows(percent(38)));
      assertEquals(2, told.codes().size());
    }
  }
}
