package connate.heterogeneity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class VariationTest {

  /**
   * Published: Corbett and Jensen (1992): Cv 0.5 needs 25 samples. By hand: √(e - 1) = 1.310832.
   */
  @Test
  @Check(
      method = "coefficient-of-variation",
      kind = Kind.PUBLISHED,
      source = "Corbett and Jensen (1992), First Break 10, 11–20")
  void ruleAndLognormal() {
    assertEquals(25, new Variation(0.5, 30).samplesNeeded());
    assertEquals(1.310832, Variation.ofLogSpread(1).value(), 5e-7);
  }

  /** By hand: 1, 2, 3 have the mean 2 and the standard deviation 1. */
  @Test
  void measured() {
    Variation v = Variation.of(Series.of("k", Units.mD, 1, 2, 3));
    assertEquals(0.5, v.coefficient(), 1e-15);
    assertEquals("heterogeneous", v.grade());
    assertFalse(v.isSampledEnough());
  }
}
