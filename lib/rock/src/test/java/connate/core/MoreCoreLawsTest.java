package connate.core;

import static connate.quantity.Units.cP;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.psi;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class MoreCoreLawsTest {

  /**
   * By hand: at k = φ in mD both laws are their constants, 13.851 and 43.345 psi. For a tight plug
   * all published laws lie within a factor of three of Jones and Owens.
   */
  @Test
  @Check(method = "sampath-keighin", kind = Kind.BY_HAND, source = "13.851 at k/φ = 1")
  @Check(method = "florence", kind = Kind.BY_HAND, source = "43.345 at k/φ = 1")
  void slipFactors() {
    assertEquals(13.851, PorositySlip.sampath(mD(0.1), fraction(0.1)).in(Units.psi), 1e-12);
    assertEquals(43.345, PorositySlip.florence(mD(0.1), fraction(0.1)).in(Units.psi), 1e-12);
    double jones = JonesOwens.of(mD(0.1)).in(Units.psi);
    assertTrue(13.851 > jones / 3 && 43.345 < jones * 3);
  }

  /** Independent: the correction put back gives the gas permeability. */
  @Test
  void correctionPutBack() {
    var law = PorositySlip.florenceLaw(fraction(0.1));
    double k = Klinkenberg.liquid(mD(0.1), psi(50), law).in(Units.mD);
    double b = PorositySlip.florence(mD(k), fraction(0.1)).in(Units.psi);
    assertEquals(0.1, k * (1 + b / 50), 1e-12);
  }

  /**
   * By hand: nitrogen (0.0176 cP, 28.0) to helium (0.0196 cP, 4.003): factor 1.113636 · 2.644763 =
   * 2.94531; the same gas changes nothing.
   */
  @Test
  @Check(method = "slip-gas-conversion", kind = Kind.BY_HAND, source = "nitrogen to helium")
  void otherGas() {
    assertEquals(
        29.4531,
        GasConversion.slip(psi(10), cP(0.0176), 28.0, cP(0.0196), 4.003).in(Units.psi),
        5e-4);
    assertEquals(
        10, GasConversion.slip(psi(10), cP(0.0176), 28.0, cP(0.0176), 28.0).in(Units.psi), 1e-12);
  }
}
