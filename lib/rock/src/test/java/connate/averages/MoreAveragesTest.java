package connate.averages;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MoreAveragesTest {

  /**
   * Independent: in two dimensions half and half give √(k1 k2), Dykhne's theorem; the value lies
   * within the Hashin–Shtrikman bounds; sealed cells in three dimensions close the rock at 2/3.
   */
  @Test
  @Check(
      method = "self-consistent",
      kind = Kind.INDEPENDENT,
      source = "√(k1 k2) for half and half in 2D (Dykhne 1970); percolation at 1/3 in 3D")
  void selfConsistent() {
    assertEquals(
        10, TwoPhaseMedium.selfConsistent(mD(1), mD(100), fraction(0.5), 2).in(Units.mD), 1e-12);
    var bounds = Bounds.hashinShtrikman(mD(1), mD(10), fraction(0.5), 3);
    var k = TwoPhaseMedium.selfConsistent(mD(1), mD(10), fraction(0.5), 3);
    assertTrue(k.isAbove(bounds.low()) && k.isBelow(bounds.high()));
    assertEquals(
        0, TwoPhaseMedium.selfConsistent(mD(1), mD(0), fraction(0.7), 3).in(Units.mD), 1e-12);
    assertTrue(TwoPhaseMedium.selfConsistent(mD(1), mD(0), fraction(0.6), 3).in(Units.mD) > 0.05);
  }

  /**
   * Published: Perrins, McKenzie and McPhedran (1979), perfect cylinders in a square array (table
   * remembered); independent: duality, k(α) k(1/α) = 1, and Maxwell at a small part.
   */
  @ParameterizedTest
  @CsvSource({
    "0.1, 1.222230",
    "0.2, 1.500306",
    "0.3, 1.860188",
    "0.4, 2.350998",
    "0.5, 3.080177",
    "0.6, 4.340907"
  })
  @Check(
      method = "rayleigh-cylinders",
      kind = Kind.PUBLISHED,
      source = "Perrins, McKenzie and McPhedran (1979), perfect cylinders, remembered")
  @Check(
      method = "rayleigh-cylinders",
      kind = Kind.INDEPENDENT,
      source = "duality k(α) k(1/α) = 1 within 0.1 %")
  void cylinders(double part, double expected) {
    double perfect = TwoPhaseMedium.cylinderArray(mD(1), mD(1e15), fraction(part)).in(Units.mD);
    double sealed = TwoPhaseMedium.cylinderArray(mD(1), mD(0), fraction(part)).in(Units.mD);
    assertEquals(expected, perfect, 1e-6 * expected);
    assertEquals(1, perfect * sealed, 1e-3);
  }

  /**
   * By hand: inlet column 1, 100, outlet column 10, 3: tubes 20/11 and 600/103, slices 50.5, 6.5.
   */
  @Test
  @Check(method = "cardwell-parsons", kind = Kind.BY_HAND, source = "two tubes of two cells")
  @Check(
      method = "cardwell-parsons",
      kind = Kind.INDEPENDENT,
      source = "the exact two by two solution lies between")
  void boundsOfABlock() {
    var k = CardwellParsons.of(new double[][] {{1, 10}, {100, 3}});
    assertEquals(3.821712, k.low().in(Units.mD), 5e-7);
    assertEquals(11.51754, k.high().in(Units.mD), 5e-6);
    var exact = Renormalisation.of(mD(1), mD(10), mD(100), mD(3));
    assertTrue(exact.isAbove(k.low()) && exact.isBelow(k.high()), exact.toString());
  }
}
