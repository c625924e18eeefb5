package connate.cementation;

import static connate.quantity.Units.degC;
import static connate.quantity.Units.km;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class GeothermTest {

  /** By hand: 10 °C and 30 °C per km at 2.5 km: 85 °C. */
  @Test
  @Check(method = "geotherm", kind = Kind.BY_HAND, source = "10 + 30 · 2.5 = 85 °C")
  void byHand() {
    assertEquals(85, Geotherm.of(degC(10), Units.degCPerKm(30), km(2.5)).in(Units.degC), 1e-12);
    Series column = Geotherm.of(degC(10), Units.degCPerKm(30), Series.of("z", Units.m, 2500));
    assertEquals(85, column.value(0), 1e-12);
  }
}
