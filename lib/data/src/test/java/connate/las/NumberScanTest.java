package connate.las;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class NumberScanTest {

  /** Independent: the JDK's correctly rounded {@link Double#parseDouble}. */
  @Test
  void agreesWithTheJdkToTheLastBitOnRandomNumbers() {
    long seed = Long.getLong("seed", 20261201L);
    Random random = new Random(seed);
    for (int i = 0; i < 300_000; i++) {
      String text = randomNumber(random);
      assertEquals(
          Double.doubleToRawLongBits(Double.parseDouble(text)),
          Double.doubleToRawLongBits(NumberScan.plain(text)),
          () -> text + ", seed " + seed);
    }
  }

  private static String randomNumber(Random random) {
    StringBuilder out = new StringBuilder(random.nextInt(3) == 0 ? "-" : "");
    int before = random.nextInt(12);
    for (int i = 0; i < before; i++) {
      out.append(random.nextInt(10));
    }
    int behind = before == 0 ? 1 + random.nextInt(12) : random.nextInt(14);
    if (behind > 0 || random.nextBoolean()) {
      out.append('.');
    }
    for (int i = 0; i < behind; i++) {
      out.append(random.nextInt(10));
    }
    if (random.nextInt(6) == 0) {
      out.append(random.nextBoolean() ? "e" : "E").append(random.nextInt(60) - 30);
    }
    return out.toString();
  }

  /** By hand: hard cases of rounding, from the literature on reading floating point numbers. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "0",
        "-0",
        "-0.0",
        "9007199254740991",
        "9007199254740992",
        "9007199254740993",
        "123456789012345678",
        "1234567890123456789",
        "0.1",
        "0.30000000000000004",
        "8.10109172351e-10",
        "1.7976931348623157e308",
        "4.9e-324",
        "2.2250738585072011e-308",
        "6929495644600919.5",
        "3.7455744005952583e15",
        "-999.25",
        "+12.5",
        ".5",
        "5.",
        "0.000000000000000000001",
        "1e22",
        "1e23"
      })
  void hardCases(String text) {
    assertEquals(Double.parseDouble(text), NumberScan.plain(text));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "", "-", ".", "-.", "1.2.3", "1,5", "e5", "1e", "1e+", "0x10", "NaN", "1.0D3", "1 2", "1-2",
        "1e999"
      })
  void isNotANumber(String text) {
    assertTrue(Double.isNaN(NumberScan.plain(text)), text);
  }
}
