package connate.core;

import static connate.quantity.Units.MPa;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.psi;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class JonesStressTest {

  /** By hand: exp(e^(-4/3) - 1)/(1.012) = exp(-0.736403)/1.012 = 0.478833/1.012 = 0.473155. */
  @Test
  @Check(method = "jones-stress", kind = Kind.BY_HAND, source = "printed equation, by hand")
  void aPlug() {
    assertEquals(0.473155, JonesStress.atStress(mD(1), psi(4000), 1).in(Units.mD), 5e-7);
  }

  /**
   * Independent: no stress changes nothing; more stress leaves less; clean sand loses 5 to 30 %.
   */
  @Test
  @Check(
      method = "jones-stress",
      kind = Kind.INDEPENDENT,
      source = "limits; losses of clean sands of 5 to 30 %, common practice")
  void limits() {
    assertEquals(mD(7), JonesStress.atStress(mD(7), psi(0), 1));
    assertTrue(
        JonesStress.atStress(mD(7), psi(4000), 1)
            .isBelow(JonesStress.atStress(mD(7), psi(2000), 1)));
    double kept = JonesStress.atStress(mD(100), MPa(24)).in(Units.mD) / 100;
    assertTrue(kept > 0.70 && kept < 0.95, "kept " + kept);
  }

  @Test
  void stressedOnceOnly() {
    Series k = JonesStress.atStress(Series.of("k", Units.mD, 1, 10), MPa(24));
    assertEquals("in situ", k.traits().get(Series.STRESS));
    assertThrows(IllegalArgumentException.class, () -> JonesStress.atStress(k, MPa(24)));
  }
}
