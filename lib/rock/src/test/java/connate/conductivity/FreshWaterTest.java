package connate.conductivity;

import static connate.quantity.Units.degC;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class FreshWaterTest {

  /**
   * Published: 1.0016 mPa·s at 20 °C (the trade's standard value), 0.8937 mPa·s and 997.044 kg/m³
   * at 25 °C as Fetter, Applied Hydrogeology, prints them; 1.3065e-6 and 1.0034e-6 m²/s at 10 and
   * 20 °C. Fetter's viscosity is an older value, 0.4 % high.
   */
  @Test
  @Check(
      method = "water-viscosity",
      kind = Kind.PUBLISHED,
      source = "1.0016 mPa·s at 20 °C; Fetter, Applied Hydrogeology, exercise at 25 °C")
  @Check(
      method = "water-density",
      kind = Kind.PUBLISHED,
      source = "Fetter, Applied Hydrogeology, exercise at 25 °C")
  void handbook() {
    assertEquals(1.0016, FreshWater.viscosity(degC(20)).in(Units.mPaS), 1e-4);
    assertEquals(0.8937, FreshWater.viscosity(degC(25)).in(Units.mPaS), 0.005 * 0.8937);
    assertEquals(997.044, FreshWater.density(degC(25)).in(Units.kgPerM3), 0.002);
    assertEquals(1.3065e-6, 9.80665 / FreshWater.gravityOverViscosity(10), 3e-4 * 1.3065e-6);
    assertEquals(1.0034e-6, 9.80665 / FreshWater.gravityOverViscosity(20), 1e-4 * 1.0034e-6);
  }

  /** Independent: water is densest near 4 °C, 999.97 kg/m³; viscosity falls all the way. */
  @Test
  @Check(method = "water-density", kind = Kind.INDEPENDENT, source = "densest at 3.98 °C")
  void densestAtFour() {
    double most = FreshWater.density(degC(3.98)).in(Units.kgPerM3);
    assertEquals(999.97, most, 0.01);
    assertTrue(most > FreshWater.density(degC(3)).in(Units.kgPerM3));
    assertTrue(most > FreshWater.density(degC(5)).in(Units.kgPerM3));
    double before = 10;
    for (double t = 0; t <= 100; t += 5) {
      double mu = FreshWater.viscosity(degC(t)).in(Units.mPaS);
      assertTrue(mu < before);
      before = mu;
    }
  }

  @Test
  void columns() {
    Series t = Series.of("T", Units.degC, 10, 20);
    assertEquals(
        FreshWater.viscosity(degC(20)).in(Units.mPaS), FreshWater.viscosity(t).value(1), 1e-12);
    assertEquals(
        FreshWater.density(degC(10)).in(Units.kgPerM3), FreshWater.density(t).value(0), 1e-9);
    assertThrows(IllegalArgumentException.class, () -> FreshWater.viscosity(degC(200)));
  }
}
