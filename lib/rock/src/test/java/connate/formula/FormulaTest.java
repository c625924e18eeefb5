package connate.formula;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.percent;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class FormulaTest {

  private static final MethodCard CARD =
      MethodCard.named("toy", "Toy law")
          .equation("k = φ d²")
          .input("φ", "porosity", fraction, Range.from(0).below(1))
          .valid(0.1, 0.4)
          .input("d", "grain diameter", Units.um, Range.POSITIVE)
          .result("k", "permeability", Units.mD)
          .source("made for this test")
          .constants(Constants.EXACT)
          .build();

  private final Formula<Permeability> formula = Formula.of(CARD, Units.mD, (phi, d) -> phi * d * d);
  private final List<String> cautions = new ArrayList<>();
  private final List<String> used = new ArrayList<>();

  @BeforeEach
  void listen() {
    Listening.to(
        new Listener() {
          @Override
          public void used(MethodCard card) {
            used.add(card.id());
          }

          @Override
          public void caution(Caution caution) {
            cautions.add(caution.text());
          }
        });
  }

  @AfterEach
  void stop() {
    Listening.to(Listener.DEAF);
  }

  /** By hand: 0.2 × 10² = 20. */
  @Test
  void valueConvertsUnits() {
    assertEquals(20, formula.value(percent(20), Units.mm(0.01)).in(Units.mD), 1e-12);
    assertEquals(List.of("toy"), used);
    formula.value(percent(20), um(10));
    assertEquals(1, used.size(), "a card is noted once");
  }

  @Test
  void columnEqualsValues() {
    Series phi = Series.of("phi", Units.percent, 20, Double.NaN, 30);
    Series k = formula.series(phi, um(10));
    assertEquals(formula.value(percent(20), um(10)).in(Units.mD), k.value(0), 0);
    assertTrue(Double.isNaN(k.value(1)));
    assertEquals(formula.value(percent(30), um(10)).in(Units.mD), k.value(2), 1e-12);
    assertEquals("permeability", k.name());
  }

  @Test
  void impossibleThrowsAndTellsTheWayOut() {
    var e =
        assertThrows(
            IllegalArgumentException.class, () -> formula.value(Units.fraction(21), um(10)));
    assertTrue(e.getMessage().contains("percent(21)"), e.getMessage());
  }

  @Test
  void outsideThePublishedRangeComputesAndWarns() {
    assertEquals(mD(50), formula.value(percent(50), um(10)));
    assertEquals(1, cautions.size());
    assertTrue(cautions.get(0).contains("0.5"), cautions.get(0));
  }

  @Test
  void impossibleRowsBecomeMissingAndAreCounted() {
    Series phi = Series.of("phi", Units.fraction, 0.2, -0.1, 0.3);
    Series k = formula.series(phi, um(10));
    assertTrue(Double.isNaN(k.value(1)));
    assertTrue(cautions.get(0).contains("1 of 3 rows"), cautions.get(0));
  }

  @Test
  void columnOfPercentWithoutUnitIsAsked() {
    Series phi = Series.of("phi", Unstated.UNIT, 20, 21, 22);
    var e = assertThrows(IllegalArgumentException.class, () -> formula.series(phi, um(10)));
    assertTrue(e.getMessage().contains("phi [%]"), e.getMessage());
  }

  @Test
  void columnOfFractionsWithoutUnitIsReadAndTold() {
    Series phi = Series.of("phi", Unstated.UNIT, 0.2, 0.3);
    assertEquals(20, formula.series(phi, um(10)).value(0), 1e-12);
    assertTrue(cautions.get(0).contains("no unit"), cautions.get(0));
  }

  @Test
  void wrongDimensionIsNamed() {
    var e = assertThrows(IllegalArgumentException.class, () -> formula.value(percent(20), mD(3)));
    assertTrue(e.getMessage().contains("grain diameter must be a length"), e.getMessage());
  }

  @Test
  void columnsOfDifferentLengthAreRefused() {
    Series phi = Series.of("phi", Units.fraction, 0.2, 0.3);
    Series d = Series.of("d", Units.um, 10);
    assertThrows(IllegalArgumentException.class, () -> formula.series(phi, d));
  }

  @Test
  void mutedWorkIsNotTold() {
    Listening.quietly(() -> formula.value(percent(50), um(10)));
    assertTrue(cautions.isEmpty());
    assertTrue(used.isEmpty());
  }
}
