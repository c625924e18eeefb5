package connate.conductivity;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.permeability.KozenyCarman;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class BearKozenyCarmanTest {

  /** Independent: with 1/180 it is the permeability law of Kozeny and Carman times ρg/μ. */
  @Test
  @Check(
      method = "kozeny-carman-conductivity",
      kind = Kind.INDEPENDENT,
      source = "permeability by Kozeny–Carman times ρg/μ")
  @Check(
      method = "kozeny-carman-conductivity",
      kind = Kind.PUBLISHED,
      source = "authors' column, de Rijk and others (2024), by TopIntegraalTest")
  void permeabilityTimesWater() {
    for (double n = 0.26; n < 0.48; n += 0.04) {
      double k =
          BearKozenyCarman.of(mm(0.25), fraction(n), degC(15), number(BearKozenyCarman.SPHERES))
              .in(Units.mPerDay);
      double other =
          Conductivity.of(KozenyCarman.of(fraction(n), mm(0.25)), degC(15)).in(Units.mPerDay);
      assertEquals(other, k, 1e-12 * k);
    }
    assertThrows(
        IllegalArgumentException.class, () -> BearKozenyCarman.of(mm(1), fraction(1), degC(10)));
  }

  /** Regression: the worked figure of the catalogue, d 0.15 to 0.2 mm, n 0.36, Cu 2.2, 10 °C. */
  @Test
  @Check(
      method = "kozeny-carman-conductivity",
      kind = Kind.REGRESSION,
      source = "worked figure at 10 °C")
  void workedFigure() {
    Anchors.regression(13.7954, BearKozenyCarman.factor(0.15, 0.36, BearKozenyCarman.VUKOVIC_SORO));
    Anchors.regression(9.23384, BearKozenyCarman.factor(0.15, 0.36, BearKozenyCarman.SPHERES));
  }

  /** Independent: grows as the power of the size; unit invariance; column = value. */
  @Test
  void sizes() {
    Anchors.sizes(
        "BearKozenyCarmanTest",
        2,
        d -> BearKozenyCarman.of(d, fraction(0.36), degC(10)),
        d -> BearKozenyCarman.of(d, fraction(0.36), degC(10)));
  }

  /** Independent: rises with porosity. */
  @Test
  void porosity() {
    Anchors.risesWithPorosity(n -> BearKozenyCarman.of(mm(0.15), fraction(n), degC(10)));
  }
}
