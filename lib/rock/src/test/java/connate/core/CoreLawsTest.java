package connate.core;

import static connate.quantity.Units.atm;
import static connate.quantity.Units.cP;
import static connate.quantity.Units.cm;
import static connate.quantity.Units.cm2;
import static connate.quantity.Units.cm3;
import static connate.quantity.Units.cm3PerSecond;
import static connate.quantity.Units.darcy;
import static connate.quantity.Units.degrees;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.mNPerM;
import static connate.quantity.Units.perPsi;
import static connate.quantity.Units.psi;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class CoreLawsTest {

  /** By hand: q 1, μ 1, L 3, A 2, Δp 1 give 1.5 D by the definition of the darcy. */
  @Test
  @Check(method = "plug-liquid", kind = Kind.BY_HAND, source = "definition of the darcy: 3/2")
  void liquid() {
    assertEquals(
        1.5, PlugFlow.liquid(cm3PerSecond(1), cP(1), cm(3), cm2(2), atm(1)).in(darcy), 1e-12);
  }

  /**
   * By hand: Q 2 at 1 atm, μ 0.0178, L 5, d 3.81 (A 11.4009), 2 to 1 atm: 10.4085 mD. Independent:
   * for a small difference of pressure gas flows as a liquid of the mean pressure does.
   */
  @Test
  @Check(method = "plug-gas", kind = Kind.BY_HAND, source = "2 · 2 · 0.0178 · 5/(11.4009 · 3)")
  @Check(method = "plug-gas", kind = Kind.INDEPENDENT, source = "liquid law at a small difference")
  void gas() {
    assertEquals(
        10.4085,
        PlugFlow.gas(cm3PerSecond(2), atm(1), cP(0.0178), cm(5), cm2(11.4009), atm(2), atm(1))
            .in(mD),
        5e-4);
    double asGas =
        PlugFlow.gas(cm3PerSecond(2), atm(5), cP(0.02), cm(5), cm2(10), atm(5.0001), atm(4.9999))
            .in(mD);
    double asLiquid =
        PlugFlow.liquid(cm3PerSecond(2), cP(0.02), cm(5), cm2(10), atm(0.0002)).in(mD);
    assertEquals(asLiquid, asGas, 1e-9 * asLiquid);
    assertThrows(
        IllegalArgumentException.class,
        () -> PlugFlow.gas(cm3PerSecond(2), atm(1), cP(0.02), cm(5), cm2(10), atm(1), atm(2)));
  }

  /** By hand: 30 - 20.5 (100/60.2 - 1) = 16.4468 cm³; of 20 cm³ bulk 17.766 % are pores. */
  @Test
  @Check(method = "boyle-grain-volume", kind = Kind.BY_HAND, source = "30 - 20.5 (100/60.2 - 1)")
  @Check(method = "boyle-porosity", kind = Kind.BY_HAND, source = "(20 - 16.4468)/20")
  void gasExpansion() {
    var grains = BoylePorosity.grainVolume(cm3(30), cm3(20.5), psi(100), psi(60.2));
    assertEquals(16.4468, grains.in(Units.cm3), 5e-5);
    assertEquals(0.17766, BoylePorosity.porosity(cm3(20), grains).fraction(), 5e-6);
    assertThrows(IllegalArgumentException.class, () -> BoylePorosity.porosity(cm3(10), cm3(12)));
  }

  /** By hand: e^-1 at γ σ = 1; (0.1/0.2)³ = 1/8. */
  @Test
  @Check(method = "stress-exponential", kind = Kind.BY_HAND, source = "e^-1 at γ σ = 1")
  @Check(method = "stress-power", kind = Kind.BY_HAND, source = "half the porosity, cubed")
  void stress() {
    assertEquals(
        1 / StrictMath.E, StressLaws.exponential(mD(1), perPsi(1e-3), psi(1000)).in(mD), 1e-12);
    assertEquals(0.125, StressLaws.power(mD(1), fraction(0.1), fraction(0.2), 3).in(mD), 1e-12);
    assertTrue(
        StressLaws.exponential(mD(1), perPsi(1e-4), psi(2000))
            .isBelow(StressLaws.exponential(mD(1), perPsi(1e-4), psi(1000))));
  }

  /** Published: mercury and air at 480 mN/m and 140°: r[µm] = 107/P[psi] (common practice). */
  @Test
  @Check(
      method = "washburn",
      kind = Kind.PUBLISHED,
      source = "107/P[psi], common practice of core analysis")
  void mercury() {
    assertEquals(107, MercuryThroat.radius(mNPerM(480), degrees(140), psi(1)).in(Units.um), 0.5);
  }
}
