package connate.permeability;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import org.junit.jupiter.api.Test;

class FlowZoneIndicatorTest {

  private static final String BOOK = "Tiab and Donaldson (2004), Petrophysics, 2nd ed., p. 125–126";

  /**
   * Published: Tiab and Donaldson (2004), p. 125–126: φ 0.15, k 41.0092 mD (from their printed slip
   * of 0.111) give RQI 0.519 and FZI 2.94 µm (printed 2.95).
   */
  @Test
  @Check(method = "reservoir-quality-index", kind = Kind.PUBLISHED, source = BOOK)
  @Check(method = "flow-zone-indicator", kind = Kind.PUBLISHED, source = BOOK)
  void exampleOfTheTextbook() {
    assertEquals(0.519, FlowZoneIndicator.quality(fraction(0.15), mD(41.0092)).in(Units.um), 5e-4);
    assertEquals(2.942, FlowZoneIndicator.of(fraction(0.15), mD(41.0092)).in(Units.um), 5e-4);
  }

  /** By hand: 1/0.0314² = 1014.24, so FZI 1 at φ 0.5 gives 1014.24 × 0.125/0.25 = 507.12 mD. */
  @Test
  @Check(method = "flow-zone-permeability", kind = Kind.BY_HAND, source = "1/0.0314² = 1014.24")
  void permeabilityOfAUnit() {
    assertEquals(507.12, FlowZoneIndicator.permeability(fraction(0.5), um(1)).in(Units.mD), 5e-3);
  }

  /**
   * Independent: indicator and permeability are inverses of each other, values and columns alike.
   */
  @Test
  @Check(
      method = "flow-zone-permeability",
      kind = Kind.INDEPENDENT,
      source = "inverse of the indicator")
  void inverses() {
    Series phi = Series.of("phi", Units.fraction, 0.05, 0.12, 0.3);
    Series k = Series.of("k", Units.mD, 0.01, 30, 2500);
    Series back = FlowZoneIndicator.permeability(phi, FlowZoneIndicator.of(phi, k));
    for (int row = 0; row < 3; row++) {
      assertEquals(k.value(row), back.value(row), 1e-12 * k.value(row));
    }
  }
}
