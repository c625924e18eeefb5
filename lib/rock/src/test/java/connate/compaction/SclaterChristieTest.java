package connate.compaction;

import static connate.quantity.Units.km;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class SclaterChristieTest {

  /**
   * Published: Wangen (2010), Physical Principles of Sedimentary Basin Analysis, table 2.1: φ0 and
   * 1/c. For shaly sand the table has 2464 m where 1/0.39 km is 2564 m; the others agree.
   */
  @Test
  @Check(
      method = "sclater-christie",
      kind = Kind.PUBLISHED,
      source = "Wangen (2010), table 2.1, φ0 and 1/c")
  void tableOfWangen() {
    double[] initial = {0.63, 0.49, 0.70, 0.56};
    double[] lengths = {1960, 3703, 1408, 2464};
    for (SclaterChristie rock : SclaterChristie.values()) {
      assertEquals(initial[rock.ordinal()], rock.initial().fraction(), 0);
      double off = 1000 / rock.perKm().value() - lengths[rock.ordinal()];
      assertEquals(rock == SclaterChristie.SHALY_SAND ? 100 : 0.5, off, 0.6, rock.toString());
    }
  }

  /** By hand: porosities at 1, 2 and 3 km. */
  @Test
  @Check(method = "sclater-christie", kind = Kind.BY_HAND, source = "1, 2 and 3 km")
  void depths() {
    double[][] phi = {
      {0.37831, 0.22717, 0.13642},
      {0.37406, 0.28555, 0.21798},
      {0.34415, 0.16920, 0.08319},
      {0.37915, 0.25671, 0.17381}
    };
    for (SclaterChristie rock : SclaterChristie.values()) {
      Series column = rock.at(Series.of("z", Units.km, 1, 2, 3));
      for (int i = 0; i < 3; i++) {
        assertEquals(phi[rock.ordinal()][i], rock.at(km(i + 1)).fraction(), 6e-6);
        assertEquals(rock.at(km(i + 1)).fraction(), column.value(i), 1e-12);
      }
    }
    assertEquals(2650, SclaterChristie.SAND.grainDensity().in(Units.kgPerM3), 0);
  }
}
