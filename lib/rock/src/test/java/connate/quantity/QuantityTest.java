package connate.quantity;

import static connate.quantity.Units.bar;
import static connate.quantity.Units.bbl;
import static connate.quantity.Units.darcy;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.degF;
import static connate.quantity.Units.ft;
import static connate.quantity.Units.m;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.percent;
import static connate.quantity.Units.psi;
import static connate.quantity.Units.squareMetres;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class QuantityTest {

  /** Published: 1 darcy = 9.869233e-13 m² (SPE, The SI Metric System of Units, 1984, table 2.2). */
  @Test
  void darcyInSquareMetres() {
    assertEquals(9.869233e-13, darcy(1).in(squareMetres), 5e-20);
  }

  /** Published: NIST SP 811, appendix B: 1 psi = 6.894757e3 Pa, 1 bbl = 1.589873e-1 m³. */
  @Test
  void factorsOfNist() {
    assertEquals(6.894757e3, psi(1).pascals(), 5e-4);
    assertEquals(1.589873e-1, bbl(1).cubicMetres(), 5e-8);
  }

  /** By hand: fixed points of the temperature scales. */
  @Test
  void temperaturesHaveAnOffset() {
    assertEquals(273.15, degC(0).kelvins(), 1e-12);
    assertEquals(100, degF(212).in(Units.degC), 1e-9);
  }

  @Test
  void numberComesBackAsItWasMade() {
    assertEquals(0.1, mD(0.1).in(Units.mD), 0);
    assertEquals("250 mD", mD(250).toString());
    assertEquals("21 %", percent(21).toString());
    assertEquals("0.21", Fraction.of(0.21, Units.fraction).toString());
  }

  @Test
  void equalAcrossUnitsButNotAcrossDimensions() {
    assertEquals(m(0.3048), ft(1));
    assertNotEquals((Object) Area.ofSquareMetres(1), Permeability.ofSquareMetres(1));
    assertTrue(bar(2).isAbove(bar(1)));
    assertFalse(bar(1).isAbove(bar(1)));
  }

  @ParameterizedTest
  @CsvSource({
    "250 mD, 2.467308e-13",
    "9.87e-13 m2, 9.87e-13",
    "9.87e-13 m², 9.87e-13",
    "1.5 D, 1.480385e-12",
    "  .5mD , 4.934617e-16"
  })
  void permeabilityIsParsed(String text, double si) {
    assertEquals(si, Permeability.parse(text).squareMetres(), si * 1e-6);
  }

  @ParameterizedTest
  @CsvSource({"mD", "250", "250 m3", "x 250 mD", "''"})
  void whatIsNoPermeabilityIsRefused(String text) {
    assertThrows(IllegalArgumentException.class, () -> Permeability.parse(text));
  }

  @Test
  void noNumberIsNoQuantity() {
    assertThrows(IllegalArgumentException.class, () -> mD(Double.NaN));
    assertThrows(IllegalArgumentException.class, () -> mD(Double.POSITIVE_INFINITY));
  }

  @Test
  void symbolsAreFoundInTheirCase() {
    assertEquals(Units.darcy, Unit.find("D").orElseThrow());
    assertEquals(Units.days, Unit.find("d").orElseThrow());
    assertEquals(Units.gPerCm3, Unit.find("G/CC").orElseThrow());
    assertEquals(Units.usPerFt, Unit.find("US/FT").orElseThrow());
    assertTrue(Unit.find("F").isEmpty(), "feet or degrees: the dimension decides");
    assertEquals(Units.ft, Length.DIMENSION.find("F").orElseThrow());
  }

  @ParameterizedTest
  @CsvSource({
    "142.037, 142",
    "0.123456, 0.1235",
    "0.00012345, 1.234e-4",
    "12110, 12110",
    "1234567.8, 1.235e6",
    "0, 0",
    "-2.31, -2.31",
    "1e-15, 1e-15"
  })
  void numbersForPeople(double value, String text) {
    assertEquals(text, Numbers.text(value));
  }

  @ParameterizedTest
  @CsvSource({
    "0.1, 0.1",
    "0.30000000000000004, 0.3",
    "123456789012345, 1.23456789e14",
    "9.869232667160128e-16, 9.869232667e-16"
  })
  void numbersForRecords(double value, String text) {
    assertEquals(text, Numbers.record(value));
  }

  /** Independent: every unit goes to SI and back to within rounding. */
  @Test
  void everyUnitReturns() {
    for (Unit<?> unit : Permeability.DIMENSION.units()) {
      assertEquals(3.7, unit.fromSi(unit.toSi(3.7)), 3.7e-14, unit.symbol());
    }
    for (Unit<?> unit : Temperature.DIMENSION.units()) {
      assertEquals(3.7, unit.fromSi(unit.toSi(3.7)), 1e-12, unit.symbol());
    }
  }
}
