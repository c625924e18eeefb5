package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class ZunkerTest {

  /** By hand at n = 0.5, where n/(1 − n) = 1. */
  @Test
  @Check(method = "zunker", kind = Kind.BY_HAND, source = "n = 0.5: K ν/g = β de²")
  @Check(
      method = "zunker",
      kind = Kind.INDEPENDENT,
      source =
          "measured conductivity of Dutch sands, de Rijk and others (2024), by TopIntegraalTest")
  void half() {
    double k = Zunker.of(Units.m(1), fraction(0.5), degC(10), number(2e-3)).metresPerSecond();
    double expected = 2e-3 * FreshWater.gravityOverViscosity(10);
    assertEquals(expected, k, 1e-12 * expected);
    assertThrows(IllegalArgumentException.class, () -> Zunker.of(mm(1), fraction(1), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "zunker", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(7.15623, Zunker.factor(0.15, 0.36, Zunker.MIDDLE));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "ZunkerTest",
        2,
        d -> Zunker.of(d, fraction(0.36), degC(10)),
        d -> Zunker.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Zunker.of(mm(0.15), fraction(n), degC(10)));
  }
}
