package connate.compaction;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.km;
import static connate.quantity.Units.m;
import static connate.quantity.Units.number;
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

class AthyTest {

  /** Independent: a step of 1/c divides the porosity by e; steps of depth multiply; limits. */
  @Test
  @Check(
      method = "athy",
      kind = Kind.INDEPENDENT,
      source = "porosity falls by e over 1/c; steps of depth multiply")
  void exponential() {
    Random random = Seeds.random("AthyTest");
    for (int i = 0; i < 100; i++) {
      double phi = Seeds.between(random, 0.2, 0.8);
      double c = Seeds.between(random, 0.1, 1.2);
      double z = Seeds.between(random, 0, 5);
      double there = Athy.of(fraction(phi), number(c), km(z)).fraction();
      double deeper = Athy.of(fraction(phi), number(c), km(z + 1 / c)).fraction();
      assertEquals(there / Math.E, deeper, 1e-12);
      assertTrue(deeper < there);
      double inSteps = Athy.of(fraction(there), number(c), m(700)).fraction();
      assertEquals(Athy.of(fraction(phi), number(c), km(z + 0.7)).fraction(), inSteps, 1e-12);
    }
    assertEquals(0.4, Athy.of(fraction(0.4), number(0.3), km(0)).fraction(), 0);
  }

  @Test
  void columnAndImpossible() {
    Series phi = Athy.of(percent(49), number(0.27), Series.of("z", Units.m, 1000, 2000));
    assertEquals(0.37406, phi.value(0), 5e-6);
    assertThrows(IllegalArgumentException.class, () -> Athy.of(percent(49), number(0.27), km(-1)));
    assertThrows(IllegalArgumentException.class, () -> Athy.of(fraction(49), number(0.27), km(1)));
  }
}
