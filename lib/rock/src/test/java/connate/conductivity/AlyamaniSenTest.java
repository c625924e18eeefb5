package connate.conductivity;

import static connate.quantity.Units.mm;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class AlyamaniSenTest {

  /** By hand: d10 0.15, d50 0.30: I0 = 0.1125, K = 1300 · 0.11625². */
  @Test
  @Check(method = "alyamani-sen", kind = Kind.BY_HAND, source = "d10 0.15, d50 0.30 mm")
  @Check(
      method = "alyamani-sen",
      kind = Kind.PUBLISHED,
      source = "authors' column, de Rijk and others (2024), by TopIntegraalTest")
  void intercept() {
    double k = AlyamaniSen.of(mm(0.15), mm(0.30)).in(Units.mPerDay);
    assertEquals(1300 * 0.11625 * 0.11625, k, 1e-9);
    Series column = AlyamaniSen.of(Series.of("d10", Units.mm, 0.15, 0.02), mm(0.30));
    assertEquals(k, column.value(0), 1e-12);
    assertEquals(Double.NaN, column.value(1));
  }

  /** Independent: equal grains have I0 = d, so K = 1300 d². */
  @Test
  void equalGrains() {
    assertEquals(52, AlyamaniSen.of(mm(0.2), mm(0.2)).in(Units.mPerDay), 1e-9);
  }

  @Test
  void impossibleIntercepts() {
    assertThrows(IllegalArgumentException.class, () -> AlyamaniSen.of(mm(0.3), mm(0.15)));
    assertThrows(IllegalArgumentException.class, () -> AlyamaniSen.of(mm(0.02), mm(0.30)));
  }
}
