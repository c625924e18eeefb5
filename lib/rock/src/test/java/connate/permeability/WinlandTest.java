package connate.permeability;

import static connate.quantity.Units.mD;
import static connate.quantity.Units.percent;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Units;
import connate.series.Series;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class WinlandTest {

  /** By hand: 0.732 + 0.588 × 2 - 0.864 × 1.30103 = 0.78391; 10^0.78391 = 6.0801 µm. */
  @Test
  @Check(method = "winland", kind = Kind.BY_HAND, source = "printed equation, logarithms by hand")
  void aPlug() {
    assertEquals(6.0801, Winland.r35(percent(20), mD(100)).in(Units.um), 5e-4);
  }

  @Test
  void risesWithPermeabilityAndIsGraded() {
    assertTrue(Winland.r35(percent(20), mD(10)).isBelow(Winland.r35(percent(20), mD(100))));
    assertEquals("macro", Winland.grade(um(6)));
    assertEquals("mega", Winland.grade(um(12)));
    assertEquals("nano", Winland.grade(um(0.05)));
  }

  @Test
  void correctedPermeabilityIsTold() {
    List<String> told = new ArrayList<>();
    Listening.to(
        new Listener() {
          @Override
          public void used(MethodCard card) {
            // not asked here
          }

          @Override
          public void caution(Caution caution) {
            told.add(caution.text());
          }
        });
    try {
      Series k = Series.of("k", Units.mD, 100).with(Series.FLUID, "liquid");
      Winland.r35(Series.of("phi", Units.percent, 20), k);
    } finally {
      Listening.to(Listener.DEAF);
    }
    assertTrue(told.get(0).contains("air permeability as measured"), told.toString());
  }
}
