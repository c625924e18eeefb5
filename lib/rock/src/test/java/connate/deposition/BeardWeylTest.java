package connate.deposition;

import static connate.deposition.BeardWeyl.Size.COARSE_UPPER;
import static connate.deposition.BeardWeyl.Size.FINE_UPPER;
import static connate.deposition.BeardWeyl.Size.MEDIUM_LOWER;
import static connate.deposition.BeardWeyl.Sorting.EXTREMELY_WELL;
import static connate.deposition.BeardWeyl.Sorting.POORLY;
import static connate.deposition.BeardWeyl.Sorting.VERY_POORLY;
import static connate.deposition.BeardWeyl.Sorting.WELL;
import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Told;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class BeardWeylTest {

  private static double rowMean(BeardWeyl.Sorting sorting) {
    double sum = 0;
    for (BeardWeyl.Size size : BeardWeyl.Size.values()) {
      sum += BeardWeyl.porosity(size, sorting).in(Units.percent);
    }
    return sum / BeardWeyl.Size.values().length;
  }

  /** Published: the abstract gives 42.4 % for the best and 27.9 % for the worst sorting. */
  @Test
  @Check(
      method = "beard-weyl-porosity",
      kind = Kind.PUBLISHED,
      source = "row means of the abstract, 42.4 and 27.9 %")
  void rowMeansOfTheAbstract() {
    assertEquals(42.4, rowMean(EXTREMELY_WELL), 0.05);
    assertEquals(27.9, rowMean(VERY_POORLY), 0.05);
  }

  /** Published: SPE's handbook (vol. I, ch. 14) gives the range as 23 to 43 %. */
  @Test
  void extremes() {
    double low = 100;
    double high = 0;
    for (BeardWeyl.Sorting sorting : BeardWeyl.Sorting.values()) {
      for (BeardWeyl.Size size : BeardWeyl.Size.values()) {
        double phi = BeardWeyl.porosity(size, sorting).in(Units.percent);
        low = Math.min(low, phi);
        high = Math.max(high, phi);
      }
    }
    assertEquals(23.4, low, 1e-12);
    assertEquals(43.5, high, 1e-12);
  }

  /**
   * Independent: Krumbein and Monk's law k = 760 d² exp(−1.31 s), darcy, mm and phi, at the middle
   * of the coarsest class, s from Trask's So by the normal law. The best sorted sands agree within
   * 20 %, all within a factor of 1.6.
   */
  @Test
  @Check(
      method = "beard-weyl-permeability",
      kind = Kind.INDEPENDENT,
      source = "Krumbein and Monk (1943), k = 760 d² exp(-1.31 s)")
  void nearKrumbeinAndMonk() {
    double[] trask = {1.05, 1.15, 1.3, 1.7, 2.35, 4.2};
    for (BeardWeyl.Sorting sorting : BeardWeyl.Sorting.values()) {
      double s = connate.grains.Trask.phiSpread(number(trask[sorting.ordinal()])).value();
      double d2 = 0.71;
      double law = 760 * d2 * StrictMath.exp(-1.31 * s);
      double k = BeardWeyl.permeability(COARSE_UPPER, sorting).in(Units.darcy);
      assertTrue(k / law < 1.6 && k / law > 1 / 1.6, sorting + ": " + k + " and " + law);
    }
  }

  /** Independent: a class of half the size has a quarter of the permeability, roughly. */
  @Test
  void permeabilityFallsWithSizeAndSorting() {
    for (BeardWeyl.Sorting sorting : BeardWeyl.Sorting.values()) {
      double before = 1e9;
      for (BeardWeyl.Size size : BeardWeyl.Size.values()) {
        double k = BeardWeyl.permeability(size, sorting).in(Units.darcy);
        assertTrue(k < before);
        before = k;
      }
    }
  }

  @Test
  void computedCellsAreTold() {
    try (Told told = new Told()) {
      BeardWeyl.permeability(FINE_UPPER, POORLY);
      assertTrue(told.says("M20", "computed, not measured"), told.toString());
    }
    try (Told told = new Told()) {
      BeardWeyl.permeability(MEDIUM_LOWER, VERY_POORLY);
      assertTrue(told.says("M20", "remembered with doubt"), told.toString());
    }
    try (Told told = new Told()) {
      BeardWeyl.permeability(MEDIUM_LOWER, WELL);
      assertTrue(told.codes().isEmpty());
    }
    assertEquals(48, BeardWeyl.table().rows().size());
  }

  @Test
  void cellsBySizeAndSorting() {
    assertEquals(38.8, BeardWeyl.porosity(um(300), number(1.3)).in(Units.percent), 1e-12);
    assertEquals(38, BeardWeyl.permeability(um(300), number(1.3)).in(Units.darcy), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> BeardWeyl.porosity(mm(2), number(1.3)));
    assertThrows(IllegalArgumentException.class, () -> BeardWeyl.porosity(um(20), number(1.3)));
    assertThrows(IllegalArgumentException.class, () -> BeardWeyl.porosity(um(300), number(6)));
    Series phi =
        BeardWeyl.porosity(
            Series.of("d", Units.um, 300, 5000), Series.of("So", Units.number, 1.3, 1.3));
    assertEquals(0.388, phi.value(0), 1e-12);
    assertEquals(Double.NaN, phi.value(1));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            BeardWeyl.porosity(
                Series.of("d", Units.um, 300), Series.of("So", Units.number, 1.3, 1.3)));
  }
}
