package connate.heterogeneity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class LorenzTest {

  private static Lorenz curve(double... k) {
    double[] phi = new double[k.length];
    double[] h = new double[k.length];
    java.util.Arrays.fill(phi, 0.2);
    java.util.Arrays.fill(h, 1);
    return Lorenz.of(
        Series.of("k", Units.mD, k),
        Series.of("phi", Units.fraction, phi),
        Series.of("h", Units.m, h));
  }

  /** By hand: two equal layers 100 and 10 mD: L = 2((0.5 · 10/11/2 + 0.5 (10/11 + 1)/2) - 1/2). */
  @Test
  @Check(method = "lorenz", kind = Kind.BY_HAND, source = "two and three equal layers")
  void twoAndThreeLayers() {
    assertEquals(0.4090909, curve(10, 100).coefficient().value(), 5e-8);
    assertEquals(0.5945946, curve(3, 300, 30).coefficient().value(), 5e-8);
  }

  /** Independent: erf(σ/2) of a lognormal permeability (error function tables). */
  @Test
  void lognormal() {
    assertEquals(0.5204999, Lorenz.ofLogSpread(1).value(), 5e-8);
    assertEquals(0.8427008, Lorenz.ofLogSpread(2).value(), 5e-8);
    assertEquals(0.6054180, Lorenz.ofLogSpread(1.2039728).value(), 5e-8);
  }

  /** Independent: 20,000 equal layers at the quantiles of a lognormal come close to erf(σ/2). */
  @Test
  @Check(method = "lorenz", kind = Kind.INDEPENDENT, source = "erf(σ/2) of a lognormal law")
  void manyLayersApproachTheLognormal() {
    var normal = new org.apache.commons.math3.distribution.NormalDistribution(null, 0, 1);
    int n = 20_000;
    double[] k = new double[n];
    for (int i = 0; i < n; i++) {
      k[i] = StrictMath.exp(normal.inverseCumulativeProbability((i + 0.5) / n));
    }
    assertEquals(0.5204999, curve(k).coefficient().value(), 5e-4);
  }

  @Test
  void uniformRockIsZeroAndDepthOrderMayBeNegative() {
    assertEquals(0, curve(5, 5, 5).coefficient().value(), 1e-12);
    Lorenz down =
        Lorenz.inDepthOrder(
            Series.of("k", Units.mD, 1, 100),
            Series.of("phi", Units.fraction, 0.2, 0.2),
            Series.of("h", Units.m, 1, 1));
    assertTrue(down.coefficient().value() < 0);
    assertEquals(1, down.flow().value(2), 1e-12);
  }
}
