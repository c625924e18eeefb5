package connate.compaction;

import static connate.quantity.Units.MPa;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.km;
import static connate.quantity.Units.number;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class LanderWalderhaugTest {

  private static double igv(double stress) {
    return LanderWalderhaug.of(
            percent(42), fraction(LanderWalderhaug.RIGID), number(0.06), MPa(stress))
        .in(Units.percent);
  }

  /** By hand: from 42 % with IGVf 28 % and 0.06 per MPa at 0 to 40 MPa. */
  @Test
  @Check(method = "lander-walderhaug", kind = Kind.BY_HAND, source = "42 % at 0, 10, 20 and 40 MPa")
  void byHand() {
    assertEquals(42, igv(0), 1e-12);
    assertEquals(35.6834, igv(10), 6e-5);
    assertEquals(32.2167, igv(20), 6e-5);
    assertEquals(29.2701, igv(40), 6e-5);
  }

  /**
   * Independent: the curve for rigid grains by depth (Paxton and others, 2002), with 12.5 MPa
   * effective stress a km. The two differ most, by 4.6 porosity units, at 1.5 km, where the drawn
   * curve bends; 5 units is the bound.
   */
  @Test
  @Check(
      method = "lander-walderhaug",
      kind = Kind.INDEPENDENT,
      source = "rigid-grain curve of Paxton and others (2002)")
  @Check(
      method = "paxton-igv",
      kind = Kind.INDEPENDENT,
      source = "intergranular volume by stress, Lander and Walderhaug (1999)")
  void nearPaxton() {
    for (double z = 0; z <= 5; z += 0.5) {
      double paxton = IntergranularVolume.rigid(km(z)).in(Units.percent);
      assertEquals(paxton, igv(12.5 * z), 5, z + " km");
    }
    assertEquals(
        igv(20),
        LanderWalderhaug.of(percent(42), percent(28), number(0.06), Series.of("s", Units.MPa, 20))
            .in(Units.percent)[0],
        1e-9);
    assertThrows(
        IllegalArgumentException.class,
        () -> LanderWalderhaug.of(percent(25), percent(28), number(0.06), MPa(3)));
  }
}
