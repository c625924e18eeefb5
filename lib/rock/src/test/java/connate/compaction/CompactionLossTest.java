package connate.compaction;

import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.checks.Seeds;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Random;
import org.junit.jupiter.api.Test;

class CompactionLossTest {

  private static double copl(double pi, double p, double c) {
    return CompactionLoss.byCompaction(percent(pi), percent(p), percent(c)).in(Units.percent);
  }

  private static double cepl(double pi, double p, double c) {
    return CompactionLoss.byCement(percent(pi), percent(p), percent(c)).in(Units.percent);
  }

  /** By hand: Pi 40, P 15, C 10. */
  @Test
  @Check(method = "compaction-loss", kind = Kind.BY_HAND, source = "Pi 40, P 15, C 10: COPL 20")
  @Check(method = "cement-loss", kind = Kind.BY_HAND, source = "Pi 40, P 15, C 10: CEPL 8")
  @Check(method = "compaction-index", kind = Kind.BY_HAND, source = "Pi 40, P 15, C 10: 0.714286")
  void byHand() {
    assertEquals(20, copl(40, 15, 10), 1e-12);
    assertEquals(8, cepl(40, 15, 10), 1e-12);
    assertEquals(
        0.714286, CompactionLoss.index(percent(40), percent(15), percent(10)).fraction(), 5e-7);
    Series p = Series.of("P", Units.percent, 15);
    assertEquals(
        20, CompactionLoss.byCompaction(percent(40), p, percent(10)).in(Units.percent)[0], 1e-9);
    assertEquals(
        8, CompactionLoss.byCement(percent(40), p, percent(10)).in(Units.percent)[0], 1e-9);
    assertEquals(5.0 / 7, CompactionLoss.index(percent(40), p, percent(10)).value(0), 1e-9);
  }

  /**
   * Independent: the volumes close. What is lost and what is left, all of the first bulk, is Pi.
   */
  @Test
  @Check(
      method = "compaction-loss",
      kind = Kind.INDEPENDENT,
      source = "volume balance: COPL + CEPL + P (1 - COPL) = Pi")
  @Check(
      method = "cement-loss",
      kind = Kind.INDEPENDENT,
      source = "volume balance: COPL + CEPL + P (1 - COPL) = Pi")
  void closes() {
    Random random = Seeds.random("CompactionLossTest");
    for (int i = 0; i < 200; i++) {
      double pi = Seeds.between(random, 35, 48);
      double p = Seeds.between(random, 0, 20);
      double c = Seeds.between(random, 0, 14);
      double lost = copl(pi, p, c);
      double left = p * (100 - lost) / 100;
      assertEquals(pi, lost + cepl(pi, p, c) + left, 1e-9);
    }
    assertEquals(0, cepl(40, 0, 0), 0);
    var e = assertThrows(IllegalArgumentException.class, () -> copl(40, 60, 50));
    assertTrue(e.getMessage().contains("leave no grains"), e.getMessage());
  }
}
