package connate.conductivity;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class ShepherdTest {

  /** By hand: 0.3 mm in ft/d; at 1 mm the power is the factor itself. */
  @Test
  @Check(method = "shepherd", kind = Kind.BY_HAND, source = "0.3 mm and 1 mm, ft/d")
  @Check(
      method = "shepherd",
      kind = Kind.PUBLISHED,
      source = "authors' column, de Rijk and others (2024), by TopIntegraalTest")
  void deposits() {
    double[] expected = {61.7252, 194.573, 539.069, 3600};
    for (Shepherd.Deposit deposit : Shepherd.Deposit.values()) {
      double e = expected[deposit.ordinal()];
      assertEquals(e, Shepherd.of(mm(0.3), deposit).in(Units.ftPerDay), 6e-6 * e);
      assertEquals(
          deposit.factorFeetPerDay(), Shepherd.of(mm(1), deposit).in(Units.ftPerDay), 1e-9);
    }
  }

  /** Independent: cleaner, rounder deposits conduct better at each size up to 1 mm. */
  @Test
  void order() {
    for (double d = 0.05; d <= 1; d += 0.05) {
      double before = 0;
      for (Shepherd.Deposit deposit : Shepherd.Deposit.values()) {
        double k = Shepherd.of(mm(d), deposit).metresPerSecond();
        assertTrue(k > before, deposit + " at " + d);
        before = k;
      }
    }
  }

  @Test
  void columns() {
    Series d = Series.of("d50", Units.mm, 0.3);
    assertEquals(Shepherd.of(mm(0.3)).in(Units.mPerDay), Shepherd.of(d).value(0), 1e-12);
    assertEquals(
        450 * 0.3048 * StrictMath.pow(0.3, 1.65),
        Shepherd.of(d, number(450), number(1.65)).value(0),
        1e-9);
  }
}
