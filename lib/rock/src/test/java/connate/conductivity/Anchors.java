package connate.conductivity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Seeds;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import java.util.function.Function;

/** What the tests of the formulas share. */
final class Anchors {

  /** g/ν at 10 °C with the ν that the worked figures of the catalogue used, 1.3065e-6 m²/s. */
  static final double G_OVER_NU = 9.80665 / 1.3065e-6;

  private Anchors() {}

  /** Checks K in m/d from K ν/g, to six digits. */
  static void regression(double metresPerDay, double factor) {
    assertEquals(metresPerDay, G_OVER_NU * factor * 86400, 6e-6 * metresPerDay);
  }

  /** Checks that K grows as a power of the size, in any unit of length, and column = value. */
  static void sizes(
      String test,
      double power,
      Function<Length, HydraulicConductivity> one,
      Function<Series, Series> column) {
    Random random = Seeds.random(test);
    for (int i = 0; i < 50; i++) {
      double mm = Seeds.between(random, 0.05, 1);
      HydraulicConductivity k = one.apply(Units.mm(mm));
      double larger = one.apply(Units.mm(2 * mm)).ratioTo(k);
      assertEquals(StrictMath.pow(2, power), larger, 1e-9);
      assertEquals(1, one.apply(Units.um(mm * 1000)).ratioTo(k), 1e-12);
      Series rows = column.apply(Series.of("d", Units.um, mm * 1000, Double.NaN));
      assertEquals(k.in(Units.mPerDay), rows.value(0), 1e-12 * rows.value(0));
      assertEquals(Units.mPerDay, rows.unit());
      assertTrue(Double.isNaN(rows.value(1)));
    }
  }

  /** Checks that K rises with porosity. */
  static void risesWithPorosity(Function<Double, HydraulicConductivity> of) {
    double before = 0;
    for (double n = 0.2; n < 0.55; n += 0.01) {
      double k = of.apply(n).metresPerSecond();
      assertTrue(k > before, "at porosity " + n);
      before = k;
    }
  }
}
