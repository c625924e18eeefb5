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

class HazenTest {

  /**
   * Published: the short form K = C d10² with C from 80 to 120 for medium to coarse sand
   * (Groundwater Project, exercise 6); at 10 °C and a porosity of 0.36 the long form must give such
   * a C.
   */
  @Test
  @Check(
      method = "hazen",
      kind = Kind.PUBLISHED,
      source = "short form with C from 80 to 120, Groundwater Project, exercise 6")
  void shortForm() {
    double long10 = Hazen.of(mm(0.3), fraction(0.36), degC(10)).in(Units.cmPerSecond);
    double factor = long10 / (0.03 * 0.03);
    assertEquals(100, factor, 20);
    assertEquals(
        HazenSimple.of(mm(0.3), number(factor)).in(Units.mPerDay),
        Hazen.of(mm(0.3), fraction(0.36), degC(10)).in(Units.mPerDay),
        1e-9);
  }

  /** Warmer water flows more easily: 1.302 times at 20 °C, as the viscosities say. */
  @Test
  void temperature() {
    double ratio =
        Hazen.of(mm(0.3), fraction(0.36), degC(20))
            .ratioTo(Hazen.of(mm(0.3), fraction(0.36), degC(10)));
    assertEquals(1.30207, ratio, 5e-4);
    assertThrows(IllegalArgumentException.class, () -> Hazen.of(mm(0.3), fraction(0.1), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "hazen", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(17.5101, Hazen.factor(0.15, 0.36));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "HazenTest",
        2,
        d -> Hazen.of(d, fraction(0.36), degC(10)),
        d -> Hazen.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Hazen.of(mm(0.15), fraction(n), degC(10)));
  }
}
