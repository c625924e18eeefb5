package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.mm;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class UsbrBialasTest {

  /** Published: the simple form K = 0.36 d20^2.3, cm/s and mm. */
  @Test
  @Check(
      method = "usbr",
      kind = Kind.PUBLISHED,
      source = "simple form K = 0.36 d20^2.3 in cm/s and mm")
  void simpleForm() {
    for (double d : new double[] {0.1, 0.2, 0.5, 1}) {
      double simple = 0.36 * StrictMath.pow(d, 2.3);
      assertEquals(simple, UsbrBialas.of(mm(d), degC(10)).in(Units.cmPerSecond), 0.002 * simple);
    }
    assertThrows(IllegalArgumentException.class, () -> UsbrBialas.of(mm(0), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "usbr", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(7.68308, UsbrBialas.factor(0.20));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "UsbrBialasTest", 2.3, d -> UsbrBialas.of(d, degC(10)), d -> UsbrBialas.of(d, degC(10)));
  }
}
