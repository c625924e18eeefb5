package connate.averages;

import static connate.quantity.Units.degrees;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class AveragesTest {

  private static final Series K = Series.of("k", Units.mD, 100, 10, 1000);
  private static final Series H = Series.of("h", Units.m, 5, 10, 2);

  private static void near(double expected, Permeability found, double relative) {
    assertEquals(expected, found.in(Units.mD), relative * expected);
  }

  /** By hand: h 5, 10, 2 and k 100, 10, 1000: 2600/17 = 152.9412 and 17/1.052 = 16.15970. */
  @Test
  @Check(method = "mean-arithmetic", kind = Kind.BY_HAND, source = "three beds: 2600/17")
  @Check(method = "mean-harmonic", kind = Kind.BY_HAND, source = "three beds: 17/1.052")
  @Check(method = "mean-geometric", kind = Kind.BY_HAND, source = "10, 100, 1000 give 100")
  void beds() {
    near(152.9412, Averages.arithmetic(K, H), 1e-6);
    near(16.15970, Averages.harmonic(K, H), 1e-6);
    near(100, Averages.geometric(K), 1e-12);
    near(370, Averages.arithmetic(K), 1e-12);
    near(27.0270, Averages.harmonic(K), 1e-5);
  }

  /**
   * Independent: the power mean is the three others at 1, 0 and -1, and rises with its exponent.
   */
  @Test
  @Check(method = "mean-power", kind = Kind.INDEPENDENT, source = "the other means at ω = 1, 0, -1")
  void power() {
    near(Averages.arithmetic(K).in(Units.mD), Averages.power(K, 1), 1e-12);
    near(Averages.geometric(K).in(Units.mD), Averages.power(K, 0), 1e-12);
    near(Averages.harmonic(K).in(Units.mD), Averages.power(K, -1), 1e-12);
    near(22.44473, Averages.power(Series.of("k", Units.mD, 1, 100), 1.0 / 3), 1e-6);
    double before = 0;
    for (double omega = -1; omega <= 1; omega += 0.25) {
      double now = Averages.power(K, omega).in(Units.mD);
      assertTrue(now > before);
      before = now;
    }
  }

  /** Independent: of any beds the harmonic mean is the least and the arithmetic the largest. */
  @Test
  void meansKeepTheirOrder() {
    long seed = Long.getLong("seed", 20261201L);
    Random random = new Random(seed);
    for (int i = 0; i < 500; i++) {
      double[] k = random.doubles(6).map(u -> StrictMath.exp(8 * u - 4)).toArray();
      Series s = Series.of("k", Units.mD, k);
      double a = Averages.arithmetic(s).in(Units.mD);
      double g = Averages.geometric(s).in(Units.mD);
      double h = Averages.harmonic(s).in(Units.mD);
      assertTrue(h <= g * (1 + 1e-12) && g <= a * (1 + 1e-12), "-Dseed=" + seed);
    }
  }

  @Test
  void zeroAndMissingBeds() {
    Series some = Series.of("k", Units.mD, 0, 10, Double.NaN);
    near(5, Averages.arithmetic(some), 1e-12);
    assertEquals(0, Averages.harmonic(some).in(Units.mD));
    assertThrows(
        IllegalArgumentException.class,
        () -> Averages.arithmetic(Series.of("k", Units.mD, Double.NaN)));
    assertThrows(
        IllegalArgumentException.class, () -> Averages.arithmetic(Series.of("k", Units.mD, -1)));
  }

  /**
   * Published: bounds of a half-and-half mixture: Wiener 1.818182 and 5.5 for 1 and 10; Hashin and
   * Shtrikman 2.8 to 4.705882 in three and 2.384615 to 4.193548 in two dimensions. By hand from the
   * theorem; they equal Maxwell's spheres.
   */
  @Test
  @Check(method = "wiener-bounds", kind = Kind.BY_HAND, source = "2/(1 + 1/10) and 11/2")
  @Check(
      method = "hashin-shtrikman",
      kind = Kind.INDEPENDENT,
      source = "lower bound equals Maxwell's spheres in the tighter host")
  void bounds() {
    var wiener = Bounds.wiener(mD(1), mD(10), fraction(0.5));
    near(1.818182, wiener.low(), 1e-6);
    near(5.5, wiener.high(), 1e-12);
    var three = Bounds.hashinShtrikman(mD(1), mD(10), fraction(0.5), 3);
    near(2.8, three.low(), 1e-12);
    near(4.705882, three.high(), 1e-6);
    near(4.193548, Bounds.hashinShtrikman(mD(10), mD(1), fraction(0.5), 2).high(), 1e-6);
    near(
        Bounds.hashinShtrikman(mD(1), mD(10), fraction(0.1), 3).low().in(Units.mD),
        Inclusions.spheres(mD(1), mD(10), fraction(0.1)),
        1e-12);
  }

  /** Independent: sealed spheres leave (1 - φ)/(1 + φ/2), sealed cylinders (1 - φ)/(1 + φ). */
  @Test
  @Check(
      method = "maxwell-spheres",
      kind = Kind.INDEPENDENT,
      source = "sealed spheres: (1 - φ)/(1 + φ/2)")
  @Check(
      method = "maxwell-cylinders",
      kind = Kind.INDEPENDENT,
      source = "sealed cylinders: (1 - φ)/(1 + φ)")
  void inclusions() {
    near(0.8571429, Inclusions.spheres(mD(1), mD(0), fraction(0.1)), 1e-6);
    near(0.9 / 1.05, Inclusions.spheres(mD(1), mD(0), fraction(0.1)), 1e-12);
    near(0.9 / 1.1, Inclusions.cylinders(mD(1), mD(0), fraction(0.1)), 1e-12);
    near(1.529412, Inclusions.spheres(mD(1), mD(10), fraction(0.2)), 1e-6);
  }

  /**
   * Independent: two dimensions give the geometric mean whatever σ, one the harmonic mean of a
   * lognormal, exp(-σ²/2); a share of 1 is flow across perfect layers.
   */
  @Test
  @Check(
      method = "lognormal-medium",
      kind = Kind.INDEPENDENT,
      source = "exact limits: geometric mean in 2D, harmonic mean in 1D")
  @Check(
      method = "gelhar-axness",
      kind = Kind.INDEPENDENT,
      source = "a share of 1/3 is the isotropic law, a share of 1 the harmonic mean")
  void lognormal() {
    near(7, LognormalMedium.isotropic(mD(7), 1.5, 2), 1e-12);
    near(StrictMath.exp(-0.5), LognormalMedium.isotropic(mD(1), 1, 1), 1e-12);
    near(1.181360, LognormalMedium.isotropic(mD(1), 1, 3), 1e-6);
    near(0.6065307, LognormalMedium.anisotropic(mD(1), 1, fraction(1)), 1e-6);
    near(
        LognormalMedium.isotropic(mD(1), 1, 3).in(Units.mD),
        LognormalMedium.anisotropic(mD(1), 1, fraction(1.0 / 3)),
        1e-12);
  }

  /** Independent: the invariants of the tensor: k_xx at θ and 90° - θ sum to ka + kh; ends. */
  @Test
  @Check(
      method = "dipping-layers",
      kind = Kind.INDEPENDENT,
      source = "trace of the tensor; ends at 0° and 90°")
  @Check(
      method = "dipping-layers-tube",
      kind = Kind.INDEPENDENT,
      source = "ends at 0° and 90°; below the tensor")
  void layersAtAnAngle() {
    double ka = 50.5;
    double kh = 2 / 1.01;
    near(38.37005, DippingLayers.along(mD(ka), mD(kh), degrees(30)), 1e-6);
    double sum =
        DippingLayers.along(mD(ka), mD(kh), degrees(30)).in(Units.mD)
            + DippingLayers.along(mD(ka), mD(kh), degrees(60)).in(Units.mD);
    assertEquals(ka + kh, sum, 1e-12);
    near(7.087098, DippingLayers.inTube(mD(ka), mD(kh), degrees(30)), 1e-6);
    near(kh, DippingLayers.inTube(mD(ka), mD(kh), degrees(90)), 1e-9);
  }

  /** By hand: a direct solution of the four cells gives 91.81818 for 1, 10, 100, 1000. */
  @Test
  @Check(
      method = "renormalisation",
      kind = Kind.INDEPENDENT,
      source = "two-point flux solution of the same four cells by hand")
  void renormalisation() {
    near(91.81818, Renormalisation.of(mD(1), mD(10), mD(100), mD(1000)), 1e-6);
    near(2.606199, Renormalisation.of(mD(1), mD(100), mD(100), mD(1)), 1e-6);
    near(7, Renormalisation.of(mD(7), mD(7), mD(7), mD(7)), 1e-12);
    near(fourCells(3, 7, 2, 5), Renormalisation.of(mD(3), mD(7), mD(2), mD(5)), 1e-12);
  }

  /**
   * Two by two unit cells, sealed sides, pressure 1 on the left, 0 on the right: k = Q L/(A Δp) =
   * Q.
   */
  private static double fourCells(double k1, double k2, double k3, double k4) {
    double[] left = {2 * k1, 2 * k3};
    double[] right = {2 * k2, 2 * k4};
    double[] row = {2 * k1 * k2 / (k1 + k2), 2 * k3 * k4 / (k3 + k4)};
    double v1 = 2 * k1 * k3 / (k1 + k3);
    double v2 = 2 * k2 * k4 / (k2 + k4);
    double[][] a = {
      {left[0] + row[0] + v1, -row[0], -v1, 0},
      {-row[0], right[0] + row[0] + v2, 0, -v2},
      {-v1, 0, left[1] + row[1] + v1, -row[1]},
      {0, -v2, -row[1], right[1] + row[1] + v2}
    };
    double[] b = {left[0], 0, left[1], 0};
    double[] p =
        new org.apache.commons.math3.linear.LUDecomposition(
                new org.apache.commons.math3.linear.Array2DRowRealMatrix(a))
            .getSolver()
            .solve(new org.apache.commons.math3.linear.ArrayRealVector(b))
            .toArray();
    return left[0] * (1 - p[0]) + left[1] * (1 - p[2]);
  }
}
