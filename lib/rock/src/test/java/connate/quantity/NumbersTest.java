package connate.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class NumbersTest {

  /** By hand: the fewest digits of numbers that older JDKs write longer, and of plain ones. */
  @Test
  void fullWritesTheFewestDigits() {
    assertEquals("0", Numbers.full(0));
    assertEquals("-5", Numbers.full(-5));
    assertEquals("2311.25", Numbers.full(2311.25));
    assertEquals("0.1", Numbers.full(0.1));
    assertEquals("0.3333333333333333", Numbers.full(1.0 / 3));
    assertEquals("1e-7", Numbers.full(1e-7));
    assertEquals("5333611.25", Numbers.full(5333611.25));
    assertEquals("2e23", Numbers.full(2e23));
    // 2^-44 is 5.684341886080801486968994140625e-14; the doubles beneath it lie closer than those
    // above, so that ..801 is nearer but reads back as another
    assertEquals("5.684341886080802e-14", Numbers.full(StrictMath.pow(2, -44)));
    assertThrows(IllegalArgumentException.class, () -> Numbers.full(Double.NaN));
  }

  /** Independent: reading back gives the same bits, for numbers of all sizes. */
  @Test
  void fullReadsBackAsTheSameNumber() {
    SplittableRandom random = new SplittableRandom(20261201);
    int longest = 0;
    for (int i = 0; i < 20_000; i++) {
      double value = Double.longBitsToDouble(random.nextLong());
      if (Double.isFinite(value)) {
        String text = Numbers.full(value);
        assertEquals(value, Double.parseDouble(text), text);
        assertEquals(text.length(), Numbers.end(text), text);
        longest = Math.max(longest, text.length());
      }
    }
    assertTrue(longest < 26, "longest " + longest);
  }

  /** By hand: four digits for people, whole numbers in full. */
  @Test
  void textHasFourDigits() {
    assertEquals("142", Numbers.text(142));
    assertEquals("1234567", Numbers.text(1234567));
    assertEquals("0.1235", Numbers.text(0.12345678));
    assertEquals("1.235e-5", Numbers.text(1.2345678e-5));
    assertEquals("missing", Numbers.text(Double.NaN));
  }
}
