package connate.cementation;

import static connate.quantity.Units.fraction;
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

class GarnTest {

  /** By hand at φ 0.2: φ³/(1 − φ)² = 0.0125, ln k = 10.08803 + 0.71222 · (−4.38203). */
  @Test
  @Check(
      method = "garn",
      kind = Kind.BY_HAND,
      source = "φ 0.2: ln k = 10.08803 - 0.71222 · 4.38203 = 6.96706")
  void byHand() {
    assertEquals(StrictMath.exp(6.96706), Garn.of(percent(20)).in(Units.mD), 0.02);
    assertEquals(
        Garn.of(percent(20)).in(Units.mD),
        Garn.of(Series.of("phi", Units.percent, 20)).value(0),
        1e-9);
  }

  /** Independent: grows more slowly than the law of Kozeny and Carman: exponent below 1. */
  @Test
  @Check(
      method = "garn",
      kind = Kind.INDEPENDENT,
      source = "sublinear against the Kozeny–Carman shape, as the source says")
  void sublinear() {
    double before = Double.MAX_VALUE;
    for (double phi = 0.06; phi < 0.3; phi += 0.02) {
      double ratio =
          Garn.of(fraction(phi))
              .ratioTo(connate.permeability.KozenyCarman.of(fraction(phi), um(300)));
      assertTrue(ratio < before);
      before = ratio;
    }
    assertThrows(IllegalArgumentException.class, () -> Garn.of(fraction(0)));
  }
}
