package connate.compaction;

import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class HouseknechtTest {

  /**
   * By hand for the rock of {@code CompactionLossTest}, P 15 and C 10: 37.5 and 25 %. Of the
   * original pores, shrinkage counted, the same rock lost 50 and 20 %: the measures differ.
   */
  @Test
  @Check(
      method = "houseknecht-compaction",
      kind = Kind.BY_HAND,
      source = "IGV 25 %: 37.5 % destroyed")
  @Check(method = "houseknecht-cement", kind = Kind.BY_HAND, source = "C 10 %: 25 % destroyed")
  void byHand() {
    assertEquals(37.5, Houseknecht.byCompaction(percent(25)).in(Units.percent), 1e-12);
    assertEquals(25, Houseknecht.byCement(percent(10)).in(Units.percent), 1e-12);
    double copl =
        CompactionLoss.byCompaction(percent(40), percent(15), percent(10)).in(Units.percent);
    assertEquals(50, copl / 40 * 100, 1e-9);
    assertEquals(
        37.5,
        Houseknecht.byCompaction(Series.of("IGV", Units.percent, 25)).in(Units.percent)[0],
        0);
    assertEquals(
        25, Houseknecht.byCement(Series.of("C", Units.percent, 10)).in(Units.percent)[0], 0);
  }

  /** Independent: what compaction, cement and pores make of the first 40 % closes. */
  @Test
  @Check(
      method = "houseknecht-compaction",
      kind = Kind.INDEPENDENT,
      source = "the parts close: compaction, cement and porosity are 40 %")
  void closes() {
    double igv = 27;
    double cement = 9;
    double left = (igv - cement) / 40 * 100;
    assertEquals(
        100,
        Houseknecht.byCompaction(percent(igv)).in(Units.percent)
            + Houseknecht.byCement(percent(cement)).in(Units.percent)
            + left,
        1e-9);
  }
}
