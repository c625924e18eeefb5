package connate.cementation;

import static connate.quantity.Units.Ma;
import static connate.quantity.Units.cm;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Seeds;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class WalderhaugTest {

  private static final double GRAIN_CM = 0.03;

  private static double after(double t1, double t2, double ma, double coat) {
    return Walderhaug.porosity(
            fraction(0.26),
            fraction(0.26),
            degC(t1),
            degC(t2),
            Ma(ma),
            cm(GRAIN_CM),
            fraction(0.65),
            fraction(coat))
        .fraction();
  }

  /**
   * Independent: the differential equation integrated by SciPy's DOP853, without the closed form;
   * the script lies beside reference.csv.
   */
  @Test
  @Check(
      method = "walderhaug",
      kind = Kind.INDEPENDENT,
      source = "the rate law integrated by SciPy's DOP853, reference.py")
  void integrated() {
    assertEquals(Reference.of("isothermal"), after(100, 100, 10, 0), 1e-8);
    assertEquals(Reference.of("heating"), after(80, 140, 60, 0), 1e-8);
    assertEquals(Reference.of("coated"), after(80, 140, 60, 0.9), 1e-8);
    double held =
        Walderhaug.porosity(
                fraction(after(80, 120, 40, 0)),
                fraction(0.26),
                degC(120),
                degC(120),
                Ma(20),
                cm(GRAIN_CM),
                fraction(0.65),
                fraction(0))
            .fraction();
    assertEquals(Reference.of("held"), held, 1e-8);
  }

  /**
   * Independent: the activation energy that b implies, b ln10 R T², is 46.7, 58.6 and 75.4 kJ/mol
   * at 60, 100 and 150 °C, about the 61 kJ/mol of Walderhaug's later Arrhenius law (2000, from
   * memory).
   */
  @Test
  @Check(
      method = "walderhaug",
      kind = Kind.INDEPENDENT,
      source = "activation energy about the 61 kJ/mol of Walderhaug (2000)")
  void activationEnergy() {
    double[][] pairs = {{60, 46.75}, {100, 58.65}, {150, 75.42}};
    for (double[] pair : pairs) {
      double t = pair[0] + 273.15;
      double h = 0.01;
      double slope =
          (StrictMath.log(Walderhaug.rateMolPerCm2Second(degC(pair[0] + h)))
                  - StrictMath.log(Walderhaug.rateMolPerCm2Second(degC(pair[0] - h))))
              / (2 * h);
      assertEquals(pair[1], slope * 8.314462618 * t * t / 1000, 0.01);
    }
    assertEquals(3.13809e-20, Walderhaug.rateMolPerCm2Second(degC(100)), 1e-25);
  }

  /** Independent: two halves of a path are the whole; coats, coarse grains and cold keep pores. */
  @Test
  void limitsAndOrder() {
    Random random = Seeds.random("WalderhaugTest");
    for (int i = 0; i < 100; i++) {
      double t1 = Seeds.between(random, 60, 150);
      double t2 = Seeds.between(random, 60, 150);
      double ma = Seeds.between(random, 0.1, 80);
      double whole = Walderhaug.precipitated(t1, t2, ma);
      double middle = (t1 + t2) / 2;
      double halves =
          Walderhaug.precipitated(t1, middle, ma / 2) + Walderhaug.precipitated(middle, t2, ma / 2);
      assertEquals(whole, halves, 1e-12 * whole);
      assertEquals(whole, Walderhaug.precipitated(t2, t1, ma), 1e-12 * whole);
      assertTrue(after(t1, t2, ma, 0.5) > after(t1, t2, ma, 0));
    }
    assertEquals(0.26, after(100, 140, 50, 1), 0);
    assertEquals(0.26, after(100, 140, 0, 0), 0);
    assertEquals(
        Walderhaug.precipitated(100, 100, 10),
        Walderhaug.precipitated(100, 100 + 1e-10, 10),
        1e-10 * Walderhaug.precipitated(100, 100, 10));
  }

  @Test
  void columnAndImpossible() {
    Series column =
        Walderhaug.porosity(
            percent(26),
            percent(26),
            degC(80),
            Series.of("T", Units.degC, 140),
            Ma(60),
            mm(0.3),
            percent(65),
            percent(0));
    assertEquals(after(80, 140, 60, 0), column.value(0), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> after(80, 140, -60, 0));
    assertThrows(IllegalArgumentException.class, () -> after(80, 140, 60, 1.2));
    assertThrows(IllegalArgumentException.class, () -> after(80, 600, 60, 0));
  }
}
