package connate.cementation;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.number;
import static connate.quantity.Units.percent;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class CementedPermeabilityTest {

  /** By hand: 0.26 to 0.15 with q 0, 2/3 and 1. */
  @Test
  @Check(
      method = "cementing-permeability",
      kind = Kind.BY_HAND,
      source = "0.26 to 0.15 with q 0, 2/3 and 1")
  void exponents() {
    double[][] pairs = {{0, 0.192023}, {2.0 / 3, 0.399819}, {1, 0.576923}};
    for (double[] pair : pairs) {
      assertEquals(
          pair[1],
          CementedPermeability.after(mD(1), percent(26), percent(15), number(pair[0])).in(Units.mD),
          5e-7);
    }
    Series column =
        CementedPermeability.after(
            mD(1), percent(26), Series.of("p", Units.percent, 15), number(1));
    assertEquals(0.576923, column.value(0), 5e-7);
  }

  /** Independent: with the surface of spheres and τ 2.5 it is the law of Kozeny and Carman. */
  @Test
  @Check(
      method = "surface-permeability",
      kind = Kind.INDEPENDENT,
      source = "Kozeny–Carman with the surface of spheres and τ 2.5")
  @Check(
      method = "cementing-permeability",
      kind = Kind.INDEPENDENT,
      source = "ratio of two porosities by k = φ³/(2 τ S²) with S kept")
  void spheres() {
    for (double phi = 0.05; phi < 0.5; phi += 0.05) {
      var surface = CementedPermeability.ofSpheres(fraction(phi), um(250));
      double k = CementedPermeability.of(fraction(phi), surface, number(2.5)).in(Units.mD);
      double kc = connate.permeability.KozenyCarman.of(fraction(phi), um(250)).in(Units.mD);
      assertEquals(kc, k, 1e-9 * kc);
      double less = CementedPermeability.of(fraction(phi / 2), surface, number(2.5)).in(Units.mD);
      assertEquals(
          less,
          CementedPermeability.after(mD(k), fraction(phi), fraction(phi / 2), number(0))
              .in(Units.mD),
          1e-9 * kc);
    }
  }

  /** Independent: fibrous cement costs more permeability than the same volume of overgrowth. */
  @Test
  void surfaceOfCement() {
    var grains = CementedPermeability.ofSpheres(percent(25), um(250));
    var smooth = CementedPermeability.withCementSurface(grains, percent(5), Units.perUm(0.03));
    var fibrous = CementedPermeability.withCementSurface(grains, percent(5), Units.perUm(5));
    double overgrown = CementedPermeability.of(percent(20), smooth, number(2.5)).in(Units.mD);
    double illite = CementedPermeability.of(percent(20), fibrous, number(2.5)).in(Units.mD);
    assertTrue(illite < overgrown / 50);
    Series rows = CementedPermeability.of(Series.of("p", Units.percent, 20), smooth, number(2.5));
    assertEquals(overgrown, rows.value(0), 1e-9 * overgrown);
  }

  @Test
  void cementDoesNotOpenPores() {
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> CementedPermeability.after(mD(1), percent(15), percent(26), number(1)));
    assertTrue(e.getMessage().contains("is above that before"), e.getMessage());
  }
}
