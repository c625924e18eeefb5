package connate.darcy;

import static connate.quantity.Units.Pa;
import static connate.quantity.Units.PaPerM;
import static connate.quantity.Units.PaS;
import static connate.quantity.Units.cP;
import static connate.quantity.Units.days;
import static connate.quantity.Units.degrees;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.kgPerM3;
import static connate.quantity.Units.m;
import static connate.quantity.Units.m2PerDay;
import static connate.quantity.Units.m3PerDay;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.mNPerM;
import static connate.quantity.Units.mPerSecond;
import static connate.quantity.Units.metresPerSecond;
import static connate.quantity.Units.minutes;
import static connate.quantity.Units.perM;
import static connate.quantity.Units.psi;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FlowLawsTest {

  /** Published: table of the well function, Huisman (1972), Groundwater Recovery, table 4.1. */
  @ParameterizedTest
  @CsvSource({
    "1e-15, 33.9616", "1e-10, 22.4486", "1e-5, 10.9357", "1e-4, 8.63322", "1e-3, 6.33154",
    "0.01, 4.03793", "0.1, 1.82292", "0.5, 0.559774", "1, 0.219384", "2, 0.0489005",
    "3, 0.0130484", "4, 0.00377935", "5, 0.00114830", "7, 1.15482e-4", "9, 1.24474e-5"
  })
  @Check(
      method = "theis",
      kind = Kind.PUBLISHED,
      source = "well function in Huisman (1972), Groundwater Recovery, table 4.1")
  void wellFunction(double u, double expected) {
    assertEquals(expected, Theis.wellFunction(u), 1e-5 * expected);
  }

  /** Independent: both forms of E1 agree where they meet. */
  @Test
  void seriesMeetsFraction() {
    assertEquals(Theis.wellFunction(1), Theis.wellFunction(1 + 1e-12), 1e-11);
  }

  /** Independent: Theis and Cooper–Jacob agree within 0.25 % at u = 0.01 and better below it. */
  @Test
  @Check(method = "cooper-jacob", kind = Kind.INDEPENDENT, source = "Theis at u = 0.01 and below")
  void lateTime() {
    double whole = Theis.drawdown(m3PerDay(900), m2PerDay(500), 2e-4, m(50), days(30)).in(Units.m);
    double late =
        Theis.lateDrawdown(m3PerDay(900), m2PerDay(500), 2e-4, m(50), days(30)).in(Units.m);
    assertEquals(whole, late, 1e-5 * whole);
    assertThrows(
        IllegalArgumentException.class,
        () -> Theis.lateDrawdown(m3PerDay(900), m2PerDay(5), 0.2, m(500), days(1)));
  }

  /**
   * Published: match point in Todd (1980), Groundwater Hydrology: Q 2500 m³/d, W 1 at u 0.01, s
   * 0.18 m give T 1105 m²/d (the book rounds to 1110); put back, s is 0.18 · W(0.01)/1 there.
   */
  @Test
  @Check(
      method = "theis",
      kind = Kind.PUBLISHED,
      source = "Todd (1980), Groundwater Hydrology, match point")
  void matchPoint() {
    double t = 2500 / (4 * StrictMath.PI * 0.18);
    assertEquals(1105.24, t, 5e-3);
    double storativity = 4 * t * 0.01 / 216_000;
    double s =
        Theis.drawdown(
                m3PerDay(2500), m2PerDay(t), storativity, m(StrictMath.sqrt(216_000)), days(1))
            .in(Units.m);
    assertEquals(0.18 * 4.03793, s, 1e-5);
  }

  /** By hand: 0.05² ln 30/(2 · 3 · 600) = 2.361943e-6 m/s. */
  @Test
  @Check(method = "hvorslev", kind = Kind.BY_HAND, source = "0.05² ln 30 / 3600")
  void slugTest() {
    assertEquals(
        2.361943e-6,
        Hvorslev.conductivity(m(0.05), m(0.1), m(3), minutes(10)).in(Units.mPerSecond),
        5e-13);
    assertThrows(
        IllegalArgumentException.class,
        () -> Hvorslev.conductivity(m(0.05), m(1), m(3), minutes(10)));
  }

  /** By hand: 1e-4 · 0.01/0.25 = 4e-6 m/s. */
  @Test
  @Check(method = "seepage-velocity", kind = Kind.BY_HAND, source = "1e-4 · 0.01/0.25")
  void seepage() {
    assertEquals(
        4e-6,
        Seepage.velocity(mPerSecond(1e-4), 0.01, fraction(0.25)).in(Units.metresPerSecond),
        1e-20);
  }

  /** By hand: 9.869233e-14 · 0.5 · 300 · 9.80665 · sin 3°/2e-3 = 3.798967e-9 m/s. */
  @Test
  @Check(
      method = "buoyant-flux",
      kind = Kind.BY_HAND,
      source = "product of its factors, sin 3° = 0.052336")
  void buoyancy() {
    assertEquals(
        3.798967e-9,
        BuoyantFlux.of(mD(100), fraction(0.5), kgPerM3(300), degrees(3), cP(2))
            .in(Units.metresPerSecond),
        5e-15);
    assertEquals(
        0, BuoyantFlux.of(mD(100), fraction(0.5), kgPerM3(300), degrees(0), cP(2)).si(), 0);
  }

  /**
   * By hand: friction 2.0265e6 and inertia 1e8 · 100 · 1e-4 = 1e6 Pa/m; the inverse gives v back.
   */
  @Test
  @Check(method = "forchheimer", kind = Kind.BY_HAND, source = "friction and inertia added")
  @Check(
      method = "forchheimer-flux",
      kind = Kind.INDEPENDENT,
      source = "inverse of the gradient; Darcy at β → 0")
  @Check(
      method = "geertsma-beta",
      kind = Kind.BY_HAND,
      source = "0.005/(0.2^5.5 √(9.869e-10)) per cm")
  void inertia() {
    var g =
        Forchheimer.gradient(mD(100), perM(1e8), kgPerM3(100), PaS(2e-5), metresPerSecond(0.01));
    assertEquals(2e-5 * 0.01 / 9.869233e-14 + 1e6, g.in(Units.PaPerM), 1);
    assertEquals(
        0.01,
        Forchheimer.flux(mD(100), perM(1e8), kgPerM3(100), PaS(2e-5), g).in(Units.metresPerSecond),
        1e-15);
    double darcy = 9.869233e-14 * 1000 / 2e-5;
    assertEquals(
        darcy,
        Forchheimer.flux(mD(100), perM(1), kgPerM3(100), PaS(2e-5), PaPerM(1000)).si(),
        1e-6 * darcy);
    assertEquals(
        1.11215e8, Forchheimer.beta(fraction(0.2), mD(100)).in(Units.perM), 1e-4 * 1.11215e8);
  }

  /** By hand: 2 · 0.025/1e-7 = 5e5 Pa, which holds 5e5/(300 · 9.80665) = 169.9527 m. */
  @Test
  @Check(method = "young-laplace", kind = Kind.BY_HAND, source = "2 · 0.025/1e-7")
  @Check(method = "sealed-column", kind = Kind.BY_HAND, source = "5e5/(300 · 9.80665)")
  void seal() {
    var threshold = Capillary.threshold(mNPerM(25), degrees(0), um(0.1));
    assertEquals(5e5, threshold.in(Units.Pa), 1e-6);
    assertEquals(169.9527, Capillary.column(threshold, Pa(0), kgPerM3(300)).in(Units.m), 5e-5);
    assertEquals(0, Capillary.column(Pa(1), Pa(2), kgPerM3(300)).in(Units.m));
  }

  /** By hand: 25/(480 cos 40°) = 0.0679900; J of 10 psi, 25 dyn/cm, 100 mD, 0.2 = 1.937339. */
  @Test
  @Check(method = "capillary-scaling", kind = Kind.BY_HAND, source = "25/(480 cos 40°)")
  @Check(
      method = "leverett-j",
      kind = Kind.BY_HAND,
      source = "SI arithmetic of 10 psi, 25 mN/m, 100 mD, 0.2")
  void scaling() {
    assertEquals(
        0.06799,
        Capillary.scaled(Pa(1), mNPerM(480), degrees(140), mNPerM(25), degrees(0)).si(),
        5e-7);
    assertEquals(
        1.937339,
        Capillary.leverett(psi(10), mNPerM(25), degrees(0), mD(100), fraction(0.2)).value(),
        5e-7);
  }

  /** By hand: S = 0.3/0.6 = 0.5: 0.5⁴ = 0.0625 and 0.5² = 0.25; end points at the ends. */
  @Test
  @Check(method = "corey-water", kind = Kind.BY_HAND, source = "0.5⁴")
  @Check(method = "corey-oil", kind = Kind.BY_HAND, source = "0.5²")
  void relativePermeability() {
    var c = fraction(0.2);
    assertEquals(0.0625, Corey.water(fraction(0.5), c, c, 1, 4).fraction(), 1e-15);
    assertEquals(0.25, Corey.oil(fraction(0.5), c, c, 1, 2).fraction(), 1e-15);
    assertEquals(0, Corey.water(fraction(0.1), c, c, 1, 4).fraction());
    assertEquals(0.8, Corey.oil(fraction(0.2), c, c, 0.8, 2).fraction(), 1e-15);
    assertThrows(
        IllegalArgumentException.class,
        () -> Corey.water(fraction(0.5), fraction(0.6), fraction(0.5), 1, 4));
  }

  /**
   * Published: Peaceman (1978): r_o near 0.2 Δx on small grids, 0.1985 in the limit. By hand: 100
   * mD, 10 m, Δx 50 m, r_w 0.1 m give WI 1.348731e-12 m³.
   */
  @Test
  @Check(
      method = "peaceman-radius",
      kind = Kind.PUBLISHED,
      source = "Peaceman (1978): 0.2 Δx within 1 %")
  @Check(method = "peaceman-index", kind = Kind.BY_HAND, source = "2π k h/ln(9.9253/0.1)")
  void grid() {
    assertEquals(0.2, WellIndex.equivalentRadius(m(1)).in(Units.m), 0.002);
    assertEquals(0.1985059, WellIndex.equivalentRadius(m(1)).in(Units.m), 5e-8);
    assertEquals(1.348731e-12, WellIndex.of(mD(100), m(10), m(50), m(0.1), 0).si(), 5e-19);
  }

  /** Published: Muskat (1937) as refined by Peaceman (1978): constant 0.6190 in older texts. */
  @Test
  @Check(
      method = "five-spot",
      kind = Kind.PUBLISHED,
      source = "constant 0.6190 of older texts, within 0.1 %")
  void fiveSpot() {
    double q = 1e-3;
    double expected =
        q * 1e-3 * (StrictMath.log(300 / 0.1) - 0.6190) / (StrictMath.PI * 9.869233e-14 * 10);
    assertEquals(
        expected,
        WellIndex.fiveSpotDrop(Units.m3PerSecond(q), cP(1), mD(100), m(10), m(300), m(0.1)).si(),
        1e-3 * expected);
    assertTrue(
        WellIndex.fiveSpotDrop(Units.m3PerSecond(q), cP(1), mD(100), m(10), m(600), m(0.1))
            .isAbove(
                WellIndex.fiveSpotDrop(
                    Units.m3PerSecond(q), cP(1), mD(100), m(10), m(300), m(0.1))));
  }
}
