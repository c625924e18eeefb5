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

class ZamarinTest {

  /** By hand at n = 0.5: n³/(1 − n)² = 0.5 and (1.275 − 0.75)² = 0.275625. */
  @Test
  @Check(
      method = "zamarin",
      kind = Kind.BY_HAND,
      source = "n = 0.5: K ν/g = 8.65e-3 · 0.5 · 0.275625 de²")
  @Check(
      method = "zamarin",
      kind = Kind.INDEPENDENT,
      source =
          "measured conductivity of Dutch sands, de Rijk and others (2024), by TopIntegraalTest")
  void half() {
    double k = Zamarin.of(Units.m(1), fraction(0.5), degC(10)).metresPerSecond();
    double expected = 8.65e-3 * 0.5 * 0.275625 * FreshWater.gravityOverViscosity(10);
    assertEquals(expected, k, 1e-12 * expected);
    assertThrows(IllegalArgumentException.class, () -> Zamarin.of(mm(1), fraction(0.86), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "zamarin", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(7.76687, Zamarin.factor(0.15, 0.36));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "ZamarinTest",
        2,
        d -> Zamarin.of(d, fraction(0.36), degC(10)),
        d -> Zamarin.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Zamarin.of(mm(0.15), fraction(n), degC(10)));
  }
}
