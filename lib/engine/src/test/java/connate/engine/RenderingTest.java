package connate.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.protocol.Item;
import connate.quantity.Units;
import connate.series.Estimate;
import connate.series.Listing;
import connate.series.Series;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Checks what becomes of values. All by hand. */
class RenderingTest {

  private static String text(Object value) {
    Item item = Rendering.of("a", value);
    return item instanceof Item.Text text ? text.text() : ((Item.Measure) item).text();
  }

  @Test
  void quantitiesAreMeasures() {
    Item.Measure measure = (Item.Measure) Rendering.of("a", Units.mD(142));
    assertEquals(
        List.of("permeability", "mD", "142 mD"),
        List.of(measure.kind(), measure.unit(), measure.text()));
    assertEquals(142, measure.value());
    assertEquals("", ((Item.Measure) Rendering.of("a", Units.fraction(0.2))).unit());
  }

  @Test
  void rangesAreInTheValuesUnit() {
    Item.Measure measure =
        (Item.Measure)
            Rendering.of(
                "a", new Estimate<>(Units.mD(142), Units.darcy(0.096), Units.darcy(0.211), "80 %"));
    assertEquals(96, measure.low(), 1e-12);
    assertEquals(211, measure.high(), 1e-12);
    assertEquals("80 %", measure.range());
  }

  @Test
  void numbersHaveFourDigits() {
    assertEquals("0.3333", text(1.0 / 3));
    assertEquals("1.1", text(1.1f));
    assertEquals("3", text(3L));
    assertEquals("missing", text(Double.NaN));
    assertEquals("null", text(null));
  }

  @Test
  void collectionsAreCut() {
    assertEquals("[1, 2.5, [a]]", text(List.of(1, 2.5, List.of("a"))));
    assertEquals("{a=[1, 2]}", text(Map.of("a", new int[] {1, 2})));
    String many = text(IntStream.range(0, 1000).boxed().toList());
    assertTrue(many.endsWith("99, … 1000]"), many);
    List<Object> self = new java.util.ArrayList<>();
    self.add(self);
    assertTrue(text(self).length() < 100);
    assertTrue(text("x".repeat(100_000)).endsWith("(100000 characters)"));
    assertTrue(text(Collections.nCopies(100, "y".repeat(1000))).length() < 21_000);
  }

  @Test
  void placesInMemoryAreNotShown() {
    assertEquals("(Object)", text(new Object()));
    Supplier<String> supplier = () -> "x";
    assertEquals("(function)", text(supplier));
    assertEquals("[(Object), (Object)]", text(Arrays.asList(new Object(), new Object())));
    Object speaking =
        new Object() {
          @Override
          public String toString() {
            return "me" + super.toString().substring(super.toString().indexOf('@'));
          }
        };
    assertEquals("me", text(speaking));
  }

  @Test
  void seriesShowHeadAndRange() {
    Series series = Series.of("phi", Units.percent, 18, Double.NaN, 21);
    assertEquals("phi [%]: 18 - 21\n3 values, 1 missing, 18 % to 21 %", text(series));
  }

  @Test
  void listingsAreGrids() {
    Listing listing =
        Listing.titled("rows")
            .column("name")
            .column("k", Units.mD)
            .row("a", Units.darcy(1))
            .build(9);
    Item.Grid grid = (Item.Grid) Rendering.of("a", listing);
    assertEquals(List.of(List.of("a", "1000")), grid.rows());
    assertEquals(new Item.Head("k", "mD", true), grid.heads().get(1));
    assertEquals(9, grid.total());
  }
}
