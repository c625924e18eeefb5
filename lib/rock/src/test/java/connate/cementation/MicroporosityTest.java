package connate.cementation;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class MicroporosityTest {

  /** By hand: 25 % with 10 % illite of 60 % inner pores leaves 19 %. */
  @Test
  @Check(method = "microporosity", kind = Kind.BY_HAND, source = "25 % less 10 % · 0.6 = 19 %")
  void byHand() {
    assertEquals(
        19,
        Microporosity.of(percent(25), percent(10), fraction(Microporosity.ILLITE))
            .in(Units.percent),
        1e-12);
    assertEquals(
        0.25,
        Microporosity.of(percent(25), Series.of("V", Units.percent, 0), fraction(0.5)).value(0),
        1e-12);
    assertTrue(Microporosity.KAOLINITE < Microporosity.CHLORITE);
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> Microporosity.of(percent(5), percent(20), fraction(0.5)));
    assertTrue(e.getMessage().contains("do not belong together"), e.getMessage());
  }
}
