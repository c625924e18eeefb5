package connate.darcy;

import static connate.quantity.Units.MPa;
import static connate.quantity.Units.bar;
import static connate.quantity.Units.cP;
import static connate.quantity.Units.ft;
import static connate.quantity.Units.m;
import static connate.quantity.Units.m2;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.psi;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class DarcyTest {

  /** By hand: 100 mD, 1 m², 1e5 Pa, 1e-3 Pa·s, 1 m: 9.869233e-6 m³/s by the unit's definition. */
  @Test
  @Check(method = "darcy-linear", kind = Kind.BY_HAND, source = "definition of the darcy")
  void linear() {
    assertEquals(
        9.869233e-6,
        Darcy.linear(mD(100), m2(1), bar(1), cP(1), m(1)).in(Units.m3PerSecond),
        5e-13);
  }

  /** By hand: 100 mD, 10 m, 2 MPa, 1 cP, ln 3000 = 8.006368: 1.549023e-3 m³/s = 133.8355 m³/d. */
  @Test
  @Check(method = "darcy-radial", kind = Kind.BY_HAND, source = "Thiem's equation, by hand")
  void radial() {
    assertEquals(
        133.8355,
        Darcy.radial(mD(100), m(10), MPa(2), cP(1), m(300), m(0.1)).in(Units.m3PerDay),
        5e-5);
  }

  /**
   * Independent: the oilfield constant 0.00708: 100 mD, 30 ft, 500 psi, 0.8 cP, 745/0.25 ft give
   * 1659.88 bbl/d at the rock (1383.235 STB/d at B = 1.2); skin 5 leaves 851.2085 STB/d.
   */
  @Test
  @Check(
      method = "darcy-radial",
      kind = Kind.INDEPENDENT,
      source = "oilfield form with the constant 7.081880e-3 by unit arithmetic")
  void oilfieldUnits() {
    assertEquals(
        1383.235 * 1.2,
        Darcy.radial(mD(100), ft(30), psi(500), cP(0.8), ft(745), ft(0.25)).in(Units.bblPerDay),
        2e-3);
    assertEquals(
        851.2085 * 1.2,
        Darcy.radial(mD(100), ft(30), psi(500), cP(0.8), ft(745), ft(0.25), 5).in(Units.bblPerDay),
        2e-3);
  }

  @Test
  void radiiInTheWrongOrderAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> Darcy.radial(mD(100), m(10), MPa(2), cP(1), m(0.1), m(300)));
    assertThrows(
        IllegalArgumentException.class,
        () -> Darcy.radial(mD(100), m(10), MPa(2), cP(1), m(300), m(0.1), -9));
  }
}
