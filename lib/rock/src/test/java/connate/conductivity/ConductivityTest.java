package connate.conductivity;

import static connate.quantity.Units.cmPerSecond;
import static connate.quantity.Units.darcy;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mPerDay;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.grains.GrainCurve;
import connate.grains.GrainCurves;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import org.junit.jupiter.api.Test;

class ConductivityTest {

  private static final Series LIMITS =
      Series.of("d", Units.mm, 0.063, 0.125, 0.18, 0.25, 0.355, 0.5, 1);
  private static final GrainCurve FINE =
      GrainCurve.of(LIMITS, Series.of("fine", Units.percent, 8, 22, 30, 25, 13, 2));
  private static final GrainCurve COARSE =
      GrainCurve.of(LIMITS, Series.of("coarse", Units.percent, 0, 2, 3, 5, 20, 70));
  private static final GrainCurve SILTY =
      GrainCurve.sieve(
          Series.of("o", Units.mm, 0.5, 0.25, 0.125, 0.063, 0),
          Series.of("silty", Unstated.UNIT, 0, 30, 30, 15, 25));

  /**
   * Published: Fetter, Applied Hydrogeology: 1.03e-2 cm/s at 25 °C, 0.008937 P, 0.997044 g/cm³ is
   * 9.4147e-8 cm² (g 980.67 cm/s²).
   */
  @Test
  @Check(
      method = "conductivity-permeability",
      kind = Kind.PUBLISHED,
      source = "Fetter, Applied Hydrogeology, 9.4147e-8 cm²")
  void fetter() {
    double k =
        Conductivity.permeability(cmPerSecond(1.03e-2), Units.mPaS(0.8937), Units.gPerCm3(0.997044))
            .in(Units.squareCentimetres);
    assertEquals(9.4147e-8, k, 1e-4 * 9.4147e-8);
    Series column =
        Conductivity.permeability(
            Series.of("K", Units.cmPerSecond, 1.03e-2),
            Units.mPaS(0.8937),
            Units.gPerCm3(0.997044));
    assertEquals(k, column.to(Units.squareCentimetres).value(0), 1e-12 * k);
  }

  /**
   * Published: one darcy of water at 20 °C is 0.8334 m/d; Freeze and Cherry (1979), table 2.3,
   * print 9.66e-6 m/s (from memory).
   */
  @Test
  @Check(
      method = "conductivity-permeability",
      kind = Kind.PUBLISHED,
      source = "Freeze and Cherry (1979), table 2.3: 9.66e-6 m/s per darcy, from memory")
  void oneDarcy() {
    assertEquals(0.833381, Conductivity.of(darcy(1), degC(20)).in(Units.mPerDay), 1e-4);
    assertEquals(9.66e-6, Conductivity.of(darcy(1), degC(20)).metresPerSecond(), 2e-8);
    assertEquals(7.40907e-6, Conductivity.of(darcy(1), degC(10)).metresPerSecond(), 3e-9);
    assertEquals(
        1,
        Conductivity.permeability(Conductivity.of(darcy(1), degC(7)), degC(7)).in(Units.darcy),
        1e-12);
  }

  /** Independent: each cell of the table is what the formula itself gives. */
  @Test
  void tableHoldsTheFormulas() {
    ConductivityTable table = Conductivity.all(FINE, percent(36), degC(11));
    assertEquals(13, table.formulas().size());
    assertEquals(
        Hazen.of(FINE.d(10), fraction(0.36), degC(11)).in(Units.mPerDay),
        table.get("hazen").value(0),
        1e-12);
    assertEquals(Shepherd.of(FINE.d(50)).in(Units.mPerDay), table.get("shepherd").value(0), 1e-9);
    assertEquals(
        Zunker.of(connate.grains.EffectiveDiameter.zunker(FINE), fraction(0.36), degC(11))
            .in(Units.mPerDay),
        table.get("zunker").value(0),
        1e-9);
    assertTrue(table.toString().contains("Alyamani"));
    assertThrows(IllegalArgumentException.class, () -> table.get("darcy"));
  }

  /**
   * By hand: d50 0.213 mm, Cu near 1.9: fine sand, for which USBR, Zamarin, Krüger are not made.
   */
  @Test
  void outOfRangeIsMarkedAndLeftOut() {
    ConductivityTable table = Conductivity.all(FINE, percent(36), degC(11));
    assertEquals("", table.outside("hazen", 0));
    assertTrue(table.outside("usbr", 0).contains("d50"), table.outside("usbr", 0));
    assertTrue(table.outside("kruger", 0).contains("Cu"), table.outside("kruger", 0));
    assertTrue(table.outside("zamarin", 0).contains("below 0.5 mm"));
    ConductivityTable within = table.within();
    assertEquals(Double.NaN, within.get("usbr").value(0));
    double mean = within.geometricMean().in(Units.mPerDay);
    assertTrue(mean > within.range().low().in(Units.mPerDay));
    assertTrue(mean < within.range().high().in(Units.mPerDay));
    assertEquals(mean, within.geometricMeans().value(0), 1e-9);
    assertTrue(within.spread().value() > 0.05 && within.spread().value() < 0.6);
  }

  /** A silty sand with a quarter in an open pan: what needs d10 has no value, the rest has. */
  @Test
  void openPanGivesNoValue() {
    ConductivityTable table = Conductivity.all(SILTY, percent(36), degC(11));
    assertEquals(Double.NaN, table.get("hazen").value(0));
    assertTrue(table.get("shepherd").value(0) > 0);
    ConductivityTable clay =
        Conductivity.all(
            GrainCurve.sieve(
                Series.of("o", Units.mm, 0.063, 0), Series.of("clay", Unstated.UNIT, 10, 90)),
            percent(36),
            degC(11));
    assertThrows(IllegalArgumentException.class, () -> clay.within().geometricMean());
  }

  /** A soil with 15 % finer than 2 µm is cohesive: no formula counts, and the table says why. */
  @Test
  void clayeySoilIsMarkedThroughout() {
    GrainCurve soil =
        GrainCurve.of(
            Series.of("d", Units.mm, 0.0001, 0.002, 0.063, 0.25, 0.5),
            Series.of("soil", Units.percent, 15, 25, 40, 20));
    ConductivityTable table = Conductivity.all(soil, percent(40), degC(10));
    for (String formula : table.formulas()) {
      assertTrue(table.outside(formula, 0).contains("clay 15 above 10 %"), formula);
    }
    assertThrows(IllegalArgumentException.class, () -> table.within().geometricMean());
  }

  /**
   * A conductivity is no permeability: m² where m/s is meant is refused, and the other way round.
   */
  @Test
  void conductivityIsNoPermeability() {
    Series k = Series.of("k", Units.squareMetres, 1e-12);
    assertThrows(
        IllegalArgumentException.class,
        () -> Conductivity.permeability(k, Units.mPaS(1), Units.gPerCm3(1)));
  }

  @Test
  void manySandsAndTheirPorosity() {
    GrainCurves curves = GrainCurves.of(FINE, COARSE);
    ConductivityTable own = Conductivity.all(curves, degC(11));
    ConductivityTable given =
        Conductivity.all(curves, Series.of("n", Units.percent, 36, 34), degC(11));
    assertEquals(2, given.size());
    assertTrue(given.get("hazen").value(1) > given.get("hazen").value(0));
    assertTrue(own.get("hazen").value(0) > given.get("hazen").value(0));
    assertEquals(13, own.listing().rows().size());
    assertThrows(
        IllegalArgumentException.class,
        () -> Conductivity.all(curves, Series.of("n", Units.percent, 36), degC(11)));
    assertThrows(
        IllegalArgumentException.class, () -> Conductivity.all(curves, mPerDay(3), degC(11)));
    assertThrows(
        IllegalArgumentException.class, () -> Conductivity.permeability(cmPerSecond(-1), degC(10)));
  }
}
