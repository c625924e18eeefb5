package connate.logs;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.degF;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.ohmM;
import static connate.quantity.Units.usPerFt;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LogLawsTest {

  /**
   * Published: Sheriff and Geldart, Exploration Seismology, problem 5.4 (quoted by the SEG): grains
   * 6.86 and 5.85 km/s, fluid 1.55 km/s; printed velocities at porosities 0.1, 0.2, 0.3.
   */
  @ParameterizedTest
  @CsvSource({
    "6.86, 0.1, 5.11",
    "6.86, 0.2, 4.07",
    "6.86, 0.3, 3.38",
    "5.85, 0.1, 4.58",
    "5.85, 0.2, 3.76",
    "5.85, 0.3, 3.19"
  })
  @Check(
      method = "wyllie",
      kind = Kind.PUBLISHED,
      source = "Sheriff and Geldart, Exploration Seismology, problem 5.4")
  void timeAverage(double grains, double phi, double velocity) {
    double found = SonicPorosity.wyllie(slow(velocity), slow(grains), slow(1.55), 1).fraction();
    assertEquals(phi, found, 0.002, "velocity printed to three digits");
  }

  private static connate.quantity.Slowness slow(double kmPerSecond) {
    return Units.usPerM(1000 / kmPerSecond);
  }

  /**
   * By hand: 18,000 and 5,300 ft/s at φ 0.2 give V = 0.64 · 18000 + 0.2 · 5300 = 12,580 ft/s,
   * 79.4913 µs/ft, from which φ comes back; Wyllie reads 0.1798 there and the quick form 0.2017.
   */
  @Test
  @Check(
      method = "raymer-hunt-gardner",
      kind = Kind.BY_HAND,
      source = "(1 - 0.2)² 18000 + 0.2 · 5300")
  @Check(
      method = "raymer-quick",
      kind = Kind.INDEPENDENT,
      source = "the full law, within 0.01 between φ 0.1 and 0.25")
  void raymer() {
    double dt = 1e6 / 12_580;
    double matrix = 1e6 / 18_000;
    double fluid = 1e6 / 5300;
    assertEquals(
        0.2, SonicPorosity.raymer(usPerFt(dt), usPerFt(matrix), usPerFt(fluid)).fraction(), 1e-12);
    assertEquals(0.201744, SonicPorosity.quick(usPerFt(dt), usPerFt(matrix)).fraction(), 5e-7);
    for (double phi = 0.1; phi <= 0.25; phi += 0.05) {
      double v = (1 - phi) * (1 - phi) * 18_000 + phi * 5300;
      assertEquals(phi, SonicPorosity.quick(usPerFt(1e6 / v), usPerFt(matrix)).fraction(), 0.01);
    }
  }

  /** By hand: the mean of 0.1 and 0.3, and √((0.01 + 0.09)/2). */
  @Test
  @Check(method = "neutron-density-liquid", kind = Kind.BY_HAND, source = "mean of 0.1 and 0.3")
  @Check(method = "neutron-density-gas", kind = Kind.BY_HAND, source = "√0.05")
  void neutronDensity() {
    assertEquals(0.2, NeutronDensity.liquid(fraction(0.1), fraction(0.3)).fraction(), 1e-15);
    assertEquals(
        StrictMath.sqrt(0.05), NeutronDensity.gas(fraction(0.1), fraction(0.3)).fraction(), 1e-15);
  }

  /** By hand: 0.2 - 0.5 · 0.12 = 0.14; never below 0. */
  @Test
  @Check(method = "effective-porosity", kind = Kind.BY_HAND, source = "0.2 - 0.5 · 0.12")
  void effective() {
    assertEquals(
        0.14, EffectivePorosity.of(fraction(0.2), fraction(0.5), fraction(0.12)).fraction(), 1e-15);
    assertEquals(0, EffectivePorosity.of(fraction(0.01), fraction(1), fraction(0.12)).fraction());
  }

  /** By hand from the printed regressions: 5.59 - 1.386 - 0.218 = 3.986; 3.52 - 0.982 - 0.189. */
  @Test
  @Check(method = "han-p", kind = Kind.BY_HAND, source = "regression of the abstract")
  @Check(method = "han-s", kind = Kind.BY_HAND, source = "regression of the abstract")
  void han() {
    assertEquals(
        3.986, HanVelocity.compressional(fraction(0.2), fraction(0.1)).in(Units.kmPerSecond), 1e-9);
    assertEquals(
        2.349, HanVelocity.shear(fraction(0.2), fraction(0.1)).in(Units.kmPerSecond), 1e-9);
  }

  /** Published: formation factors at φ 0.2: Archie 25, Humble 19.73 (handbook tables). */
  @Test
  @Check(
      method = "archie-factor",
      kind = Kind.PUBLISHED,
      source = "handbook tables of F at φ 0.2: 25 and 19.7")
  @Check(method = "archie", kind = Kind.BY_HAND, source = "√(0.05/(0.04 · 10)) = √0.125")
  void archie() {
    assertEquals(25, Archie.factor(fraction(0.2), 1, 2).value(), 1e-12);
    assertEquals(19.73, Archie.factor(fraction(0.2), 0.62, 2.15).value(), 5e-3);
    assertEquals(
        StrictMath.sqrt(0.125),
        Archie.saturation(ohmM(0.05), ohmM(10), fraction(0.2), 1, 2, 2).fraction(),
        1e-12);
    assertEquals(1, Archie.saturation(ohmM(1), ohmM(1), fraction(0.2), 1, 2, 2).fraction(), 0);
  }

  /** Independent: without shale all three are Archie; put back, each gives its resistivity. */
  @Test
  @Check(
      method = "simandoux",
      kind = Kind.INDEPENDENT,
      source = "Archie at V = 0; the equation put back")
  @Check(
      method = "simandoux-modified",
      kind = Kind.INDEPENDENT,
      source = "Archie at V = 0; the equation put back")
  @Check(
      method = "indonesia",
      kind = Kind.INDEPENDENT,
      source = "Archie at V = 0; the equation put back")
  void shalySand() {
    var rw = ohmM(0.05);
    var rt = ohmM(10);
    var phi = fraction(0.2);
    var rsh = ohmM(4);
    double clean = StrictMath.sqrt(0.125);
    var none = fraction(0);
    assertEquals(clean, ShalySand.simandoux(rw, rt, phi, none, rsh).fraction(), 1e-12);
    assertEquals(clean, ShalySand.modifiedSimandoux(rw, rt, phi, none, rsh).fraction(), 1e-12);
    assertEquals(clean, ShalySand.indonesia(rw, rt, phi, none, rsh).fraction(), 1e-12);
    var v = fraction(0.2);
    double s = ShalySand.simandoux(rw, rt, phi, v, rsh).fraction();
    assertEquals(0.1, 0.04 * s * s / 0.05 + 0.2 * s / 4, 1e-12);
    double mod = ShalySand.modifiedSimandoux(rw, rt, phi, v, rsh).fraction();
    assertEquals(0.1, 0.04 * mod * mod / (0.05 * 0.8) + 0.2 * mod / 4, 1e-12);
    double ind = ShalySand.indonesia(rw, rt, phi, v, rsh).fraction();
    double term = StrictMath.pow(0.2, 0.9) / 2 + 0.2 / StrictMath.sqrt(0.05);
    assertEquals(1 / StrictMath.sqrt(10), term * ind, 1e-12);
    assertTrue(s < clean && mod < s);
  }

  /** Independent: the form in degrees Celsius, with 21.5, within 0.1 %. */
  @Test
  @Check(method = "arps", kind = Kind.INDEPENDENT, source = "form in °C with the constant 21.5")
  void arps() {
    double celsius = 0.1 * (20 + 21.5) / (95 + 21.5);
    assertEquals(
        celsius, Arps.resistivity(ohmM(0.1), degC(20), degC(95)).in(Units.ohmM), 1e-3 * celsius);
    assertThrows(
        IllegalArgumentException.class, () -> Arps.resistivity(ohmM(1), degF(-10), degF(100)));
  }
}
