package connate.compaction;

import static connate.quantity.Units.usPerFt;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class MagaraShaleTest {

  /**
   * Published: Chapman, Petroleum Geology, pp. 49–50: 165 µs/ft is 0.5, 55 is none, 110 is 0.25.
   */
  @Test
  @Check(
      method = "magara-shale",
      kind = Kind.PUBLISHED,
      source = "Chapman, Petroleum Geology, pp. 49–50")
  void chapman() {
    assertEquals(0.5, MagaraShale.of(usPerFt(165)).fraction(), 1e-12);
    assertEquals(0.25, MagaraShale.of(usPerFt(110)).fraction(), 1e-12);
    assertEquals(0, MagaraShale.of(usPerFt(55)).fraction(), 0);
    assertEquals(0.25, MagaraShale.of(Series.of("DT", Units.usPerM, 110 / 0.3048)).value(0), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> MagaraShale.of(usPerFt(50)));
  }
}
