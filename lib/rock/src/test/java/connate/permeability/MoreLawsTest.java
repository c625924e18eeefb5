package connate.permeability;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class MoreLawsTest {

  /**
   * Independent: tubes of one radius r fill at P = 2 γ cos θ/r: with λ = 1 the law is Poiseuille's,
   * k = φ r²/8. r 5 µm, φ 0.2, γ cos θ 367.7 dyn/cm. The printed constant 10.24 lies 4 % lower.
   */
  @Test
  @Check(
      method = "purcell",
      kind = Kind.INDEPENDENT,
      source = "Poiseuille flow in equal tubes: k = φ r²/8")
  void equalTubes() {
    double r = 5e-6;
    double tension = 367.7e-3;
    double pressure = Units.Pa(2 * tension / r).in(Units.psi);
    double expected = Units.squareMetres(0.2 * r * r / 8).in(Units.mD);
    double found = Purcell.of(fraction(0.2), 367.7, 1 / (pressure * pressure), 1).in(Units.mD);
    assertEquals(expected, found, 1e-4 * expected);
  }

  /** By hand: 2 ln 1 + 10.6 rounds to 11; the bounds double from 0.0938 to 48 µm. */
  @Test
  @Check(method = "discrete-rock-type", kind = Kind.BY_HAND, source = "2 ln 1 + 10.6 rounds to 11")
  @Check(
      method = "global-hydraulic-element",
      kind = Kind.BY_HAND,
      source = "doubling series of bounds")
  void rockNumbers() {
    assertEquals(11, RockNumbers.discrete(um(1)).value());
    double bound = 0.09375;
    for (int element = 1; element <= 10; element++) {
      assertEquals(element, RockNumbers.global(um(bound)).value(), "at " + bound);
      assertEquals(element - 1, RockNumbers.global(um(bound * 0.999)).value(), "below " + bound);
      bound *= 2;
    }
    assertEquals(10, RockNumbers.global(um(500)).value());
  }
}
