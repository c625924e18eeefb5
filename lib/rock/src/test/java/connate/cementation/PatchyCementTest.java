package connate.cementation;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
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

class PatchyCementTest {

  /** By hand: half of 100 mD and 1 mD: 50.5 along, 1.9802 across, 10 mixed. */
  @Test
  @Check(
      method = "patchy-cement",
      kind = Kind.BY_HAND,
      source = "halves of 100 and 1 mD: 50.5, 1.9802 and 10 mD")
  void halves() {
    assertEquals(10, PatchyCement.of(percent(50), mD(100), mD(1)).in(Units.mD), 1e-9);
    assertEquals(50.5, PatchyCement.of(percent(50), mD(100), mD(1), number(1)).in(Units.mD), 1e-9);
    assertEquals(
        2 / 1.01, PatchyCement.of(percent(50), mD(100), mD(1), number(-1)).in(Units.mD), 1e-9);
  }

  /**
   * Independent: bounds of Wiener, limits, and not the law at the mean porosity: half the rock at φ
   * 0.25 and half at 0.02 conducts otherwise than rock at 0.135 throughout.
   */
  @Test
  @Check(
      method = "patchy-cement",
      kind = Kind.INDEPENDENT,
      source = "bounds of Wiener (1912) and the ends")
  void boundsAndEnds() {
    Random random = Seeds.random("PatchyCementTest");
    for (int i = 0; i < 100; i++) {
      double f = random.nextDouble();
      double k1 = Seeds.between(random, 1, 1000);
      double k2 = Seeds.between(random, 0.001, 1);
      double w = Seeds.between(random, -1, 1);
      double k = PatchyCement.of(fraction(f), mD(k1), mD(k2), number(w)).in(Units.mD);
      assertTrue(k <= (1 - f) * k1 + f * k2 + 1e-9);
      assertTrue(k >= 1 / ((1 - f) / k1 + f / k2) - 1e-9);
    }
    assertEquals(7, PatchyCement.of(percent(0), mD(7), mD(1)).in(Units.mD), 1e-12);
    Series column = PatchyCement.of(Series.of("f", Units.percent, 100, 50), mD(7), mD(1));
    assertEquals(1, column.value(0), 1e-12);
    assertEquals(StrictMath.sqrt(7), column.value(1), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> PatchyCement.of(percent(120), mD(7), mD(1)));
  }
}
