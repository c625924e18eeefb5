package connate.grains;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SizeClassTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "F0_01-0_1; 0.00001; 0.0001",
        "F1680-2000; 1.68; 2",
        "0-2_micron; 0; 0.002",
        "63-75; 0.063; 0.075",
        "63–75 µm; 0.063; 0.075",
        "0,063-0,125 mm; 0.063; 0.125",
        "0_1-16 µm; 0.0001; 0.016",
        "63 to 75 [um]; 0.063; 0.075",
        "<63; 0; 0.063",
        "< 63 µm; 0; 0.063",
        "fraction 0.5-1 mm; 0.5; 1",
        ">2 mm; 2; Infinity"
      })
  void readsHeaders(String header, double low, double high) {
    assertTrue(SizeClass.isHeader(header));
    SizeClass size = SizeClass.parse(header, Optional.of(Units.um));
    assertEquals(low, size.lowMm(), 1e-12);
    assertEquals(high, size.highMm(), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"depth", "Kf", "porosity", "63", "K_Barr", "logK", "d50-d10"})
  void leavesOthersAside(String header) {
    assertFalse(SizeClass.isHeader(header));
    assertThrows(IllegalArgumentException.class, () -> SizeClass.parse(header));
  }

  @Test
  void unitIsNotGuessed() {
    var e = assertThrows(IllegalArgumentException.class, () -> SizeClass.parse("63-75"));
    assertTrue(e.getMessage().contains("has no unit"), e.getMessage());
    assertThrows(IllegalArgumentException.class, () -> SizeClass.parse("75-63 µm"));
    assertEquals("below 0.063 mm", SizeClass.parse("<63 µm").toString());
    assertEquals("above 2 mm", SizeClass.parse(">2 mm").toString());
    assertEquals("0.063 to 0.125 mm", SizeClass.parse("63-125 um").toString());
  }
}
