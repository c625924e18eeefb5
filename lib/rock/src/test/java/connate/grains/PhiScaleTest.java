package connate.grains;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Seeds;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class PhiScaleTest {

  private static final String MCCABE =
      "McCabe, Smith and Harriott, Unit Operations, table of standard sieves";

  /** Published: openings and phi numbers of standard sieves, printed to two decimals. */
  @Test
  @Check(method = "phi-scale", kind = Kind.PUBLISHED, source = MCCABE)
  @Check(method = "phi-size", kind = Kind.PUBLISHED, source = MCCABE)
  void standardSieves() {
    double[][] sieves = {{1.168, -0.22}, {0.833, 0.26}, {0.417, 1.26}, {0.104, 3.27}};
    for (double[] sieve : sieves) {
      assertEquals(sieve[1], PhiScale.of(mm(sieve[0])).value(), 0.005);
      assertEquals(sieve[0], PhiScale.size(number(sieve[1])).in(Units.mm), 0.004 * sieve[0]);
    }
  }

  /** Independent: each is the other's inverse; half the size is one more; the unit is free. */
  @Test
  void inverseAndStep() {
    Random random = Seeds.random("PhiScaleTest");
    for (int i = 0; i < 200; i++) {
      double phi = Seeds.between(random, -8, 12);
      double size = PhiScale.size(number(phi)).in(Units.mm);
      assertEquals(phi, PhiScale.of(mm(size)).value(), 1e-12);
      assertEquals(phi + 1, PhiScale.of(mm(size / 2)).value(), 1e-12);
      assertEquals(phi, PhiScale.of(um(size * 1000)).value(), 1e-12);
    }
  }

  @Test
  void columnsAndImpossible() {
    Series phi = PhiScale.of(Series.of("d", Units.um, 500, 250));
    assertEquals(1, phi.value(0), 1e-12);
    assertEquals(2, phi.value(1), 1e-12);
    assertEquals(0.25, PhiScale.size(phi).value(1), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> PhiScale.of(mm(0)));
  }
}
