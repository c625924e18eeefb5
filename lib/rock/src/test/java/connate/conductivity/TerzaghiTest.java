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

class TerzaghiTest {

  /**
   * Published: Terzaghi's own factors, 800 for smooth and 460 for rough grains, K in cm/s, d in cm,
   * water at 10 °C (from memory).
   */
  @Test
  @Check(
      method = "terzaghi",
      kind = Kind.PUBLISHED,
      source = "Terzaghi (1925): 800 smooth, 460 rough, cm and cm/s at 10 °C, from memory")
  void ownFactors() {
    double n = 0.36;
    double shape = StrictMath.pow((n - 0.13) / StrictMath.cbrt(1 - n), 2);
    double smooth =
        Terzaghi.of(Units.cm(1), fraction(n), degC(10), number(Terzaghi.SMOOTH))
            .in(Units.cmPerSecond);
    double rough =
        Terzaghi.of(Units.cm(1), fraction(n), degC(10), number(Terzaghi.COARSE))
            .in(Units.cmPerSecond);
    assertEquals(800 * shape, smooth, 0.01 * smooth);
    assertEquals(460 * shape, rough, 0.01 * rough);
    double middle = Terzaghi.of(Units.cm(1), fraction(n), degC(10)).in(Units.cmPerSecond);
    assertEquals((smooth + rough) / 2, middle, 1e-9 * middle);
    assertThrows(
        IllegalArgumentException.class, () -> Terzaghi.of(mm(1), fraction(0.13), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "terzaghi", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(11.1214, Terzaghi.factor(0.15, 0.36, Terzaghi.SMOOTH));
    Anchors.regression(6.34025, Terzaghi.factor(0.15, 0.36, Terzaghi.COARSE));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "TerzaghiTest",
        2,
        d -> Terzaghi.of(d, fraction(0.36), degC(10)),
        d -> Terzaghi.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Terzaghi.of(mm(0.15), fraction(n), degC(10)));
  }
}
