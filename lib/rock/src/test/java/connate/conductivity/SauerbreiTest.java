package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import org.junit.jupiter.api.Test;

class SauerbreiTest {

  /** Independent: the porosity function of Kozeny and Carman, so their ratio is one number. */
  @Test
  @Check(
      method = "sauerbrei",
      kind = Kind.INDEPENDENT,
      source = "ratio to Kozeny–Carman does not depend on porosity or size")
  @Check(
      method = "sauerbrei",
      kind = Kind.INDEPENDENT,
      source =
          "measured conductivity of Dutch sands, de Rijk and others (2024), by TopIntegraalTest")
  void ratioToKozenyCarman() {
    for (double n = 0.2; n < 0.5; n += 0.05) {
      double ratio =
          Sauerbrei.of(mm(0.2), fraction(n), degC(10))
              .ratioTo(BearKozenyCarman.of(mm(0.2), fraction(n), degC(10)));
      assertEquals(3.75 / 8.3, ratio, 1e-12);
    }
    assertThrows(IllegalArgumentException.class, () -> Sauerbrei.of(mm(1), fraction(1), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "sauerbrei", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(8.97530, Sauerbrei.factor(0.18, 0.36));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "SauerbreiTest",
        2,
        d -> Sauerbrei.of(d, fraction(0.36), degC(10)),
        d -> Sauerbrei.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Sauerbrei.of(mm(0.15), fraction(n), degC(10)));
  }
}
