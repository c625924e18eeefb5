package connate.grains;

import static connate.quantity.Units.mm;
import static connate.quantity.Units.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class TraskTest {

  /** Independent: for lognormal sizes log2 So = 0.67449 s; a curve must agree with the law. */
  @Test
  @Check(
      method = "trask",
      kind = Kind.INDEPENDENT,
      source = "quartiles of the normal law: log2 So = 0.67449 s")
  @Check(
      method = "trask-lognormal",
      kind = Kind.INDEPENDENT,
      source = "quartiles of a grain-size curve of lognormal sizes")
  void lognormalSizes() {
    for (double s : new double[] {0.2, 0.5, 1.2}) {
      GrainCurve curve = GrainCurveTest.normal(new NormalDistribution(2, s), 0.02);
      double law = Trask.ofPhiSpread(number(s)).value();
      assertEquals(law, Trask.of(curve).value(), 2e-4 * law);
      assertEquals(s, Trask.phiSpread(number(law)).value(), 1e-12);
      assertEquals(Trask.of(curve).value(), Trask.of(GrainCurves.of(curve)).value(0), 1e-12);
    }
    assertEquals(0.20386, Trask.phiSpread(number(1.1)).value(), 5e-6);
    assertEquals(1.48260, Trask.phiSpread(number(2.0)).value(), 5e-6);
  }

  /** By hand: quartiles 0.4 and 0.1 mm give 2. */
  @Test
  @Check(method = "trask", kind = Kind.BY_HAND, source = "quartiles 0.4 and 0.1 mm give 2")
  void quartiles() {
    assertEquals(2, Trask.of(mm(0.4), mm(0.1)).value(), 1e-12);
    Series column = Trask.of(Series.of("d75", Units.mm, 0.4, 0.9), mm(0.1));
    assertEquals(3, column.value(1), 1e-12);
    assertEquals(
        Trask.ofPhiSpread(number(1)).value(),
        Trask.ofPhiSpread(Series.of("s", Units.number, 1)).value(0),
        0);
  }

  @Test
  void turnedOverQuartilesAreNoticed() {
    var e = assertThrows(IllegalArgumentException.class, () -> Trask.of(mm(0.1), mm(0.4)));
    assertTrue(e.getMessage().contains("turned over"), e.getMessage());
    assertThrows(IllegalArgumentException.class, () -> Trask.phiSpread(number(0.9)));
  }
}
