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

class BarrTest {

  /** Independent: spheres (Cs = 1) give the law of Kozeny and Carman with 1/180. */
  @Test
  @Check(method = "barr", kind = Kind.INDEPENDENT, source = "Kozeny–Carman with 1/180 for spheres")
  @Check(
      method = "barr",
      kind = Kind.PUBLISHED,
      source = "authors' column, de Rijk and others (2024), by TopIntegraalTest")
  void spheres() {
    double k = Barr.of(mm(0.25), fraction(0.4), degC(10), number(1)).in(Units.mPerDay);
    double other =
        BearKozenyCarman.of(mm(0.25), fraction(0.4), degC(10), number(BearKozenyCarman.SPHERES))
            .in(Units.mPerDay);
    assertEquals(other, k, 1e-12 * k);
    assertThrows(
        IllegalArgumentException.class,
        () -> Barr.of(mm(0.25), fraction(0.4), degC(10), number(0.9)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(method = "barr", kind = Kind.REGRESSION, source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(5.06658, Barr.factor(0.15, 0.36, Barr.ANGULAR));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "BarrTest",
        2,
        d -> Barr.of(d, fraction(0.36), degC(10)),
        d -> Barr.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> Barr.of(mm(0.15), fraction(n), degC(10)));
  }
}
