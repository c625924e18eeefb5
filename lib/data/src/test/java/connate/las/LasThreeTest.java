package connate.las;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** By hand: version 3.0, as its text of June 2000 has it. */
class LasThreeTest {

  private static final double NONE = Double.NaN;

  private static String file(String delimiter, String rows) {
    return "~Version\nVERS. 3.0 : v\nWRAP. NO : w\nDLM. "
        + delimiter
        + " : d\n"
        + "~Well\nSTRT.M 100 : s\nSTOP.M 101 : s\nSTEP.M 0.5 : s\nNULL. -999.25 : n\nWELL. A : w\n"
        + "~Log_Parameter[1]\nBS.IN 8.5 : bit {F} | RUN[1]\n"
        + "~Log_Definition[1]\nDEPT.M : depth {F}\nLITH. : rock {S}\nGR.GAPI : gamma {F10.4}\n"
        + "~Log_Data[1] | Log_Definition[1]\n"
        + rows;
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {"COMMA; ','", "TAB; '\t'", "SPACE; ' '", "''; ' '"})
  void delimiters(String word, String delimiter) {
    String rows = "100,SAND,50\n100.5,\"Viking, upper\",60\n101,SHALE,70\n";
    String split =
        rows.replace("Viking, upper", "Viking@ upper").replace(",", delimiter).replace("@", ",");
    LasFile read = LasTextOf.text(file(word, split));
    assertArrayEquals(new double[] {50, 60, 70}, read.curve("GR").orElseThrow().values());
    assertEquals("Viking, upper", read.curve("LITH").orElseThrow().word(1).orElseThrow());
  }

  @Test
  void emptyItemsAreMissing() {
    LasFile read =
        LasTextOf.text(file("COMMA", "100,,50\n100.5,2,\n101,,70\n").replace("{S}", "{F}"));
    assertArrayEquals(new double[] {50, NONE, 70}, read.curve("GR").orElseThrow().values());
    assertArrayEquals(new double[] {NONE, 2, NONE}, read.curve("LITH").orElseThrow().values());
    assertTrue(read.quirks().stream().anyMatch(q -> q.code().equals("L42")));
  }

  @Test
  void formatAndAssociationAreSplitOff() {
    LasFile read = LasTextOf.text(file("COMMA", "100,SAND,50\n101,SAND,50\n"));
    HeaderLine bit = read.item("BS").orElseThrow();
    assertEquals("bit", bit.description());
    assertEquals("F", bit.format());
    assertEquals("RUN[1]", bit.association());
    assertEquals("8.5", bit.value());
  }

  @Test
  void setsMayStandBeforeAndBehindTheLog() {
    String tops =
        "~Tops_Definition\nTOPN. : name {S}\nTOPT.M : top {F}\n"
            + "~Tops_Data | Tops_Definition\n\"Sand, lower\",100.2\nShale,-999.25\n1,2,3\n";
    for (String text :
        List.of(
            file("COMMA", "100,SAND,50\n101,SAND,50\n") + tops,
            file("COMMA", "100,SAND,50\n101,SAND,50\n")
                .replace("~Log_Parameter", tops + "~Log_Parameter"))) {
      LasFile read = LasTextOf.text(text);
      assertEquals(2, read.rows());
      LasSet set = read.sets().get(0);
      assertEquals(List.of("Sand, lower", "Shale"), set.column("topn"));
      assertEquals(List.of("100.2", ""), set.column("TOPT"));
      assertTrue(
          read.quirks().stream()
              .anyMatch(q -> q.code().equals("L55") && q.message().contains("row of 3 items")));
    }
  }

  @Test
  void vendorSectionsAreKeptAsText() {
    LasFile read =
        LasTextOf.text(file("COMMA", "100,SAND,50\n101,SAND,50\n") + "~Vendor_Stuff\nx\n");
    assertEquals(2, read.rows());
    assertEquals(List.of("x"), read.sections().get(5).lines());
  }

  @Test
  void quotesInsideAnItemStay() {
    LasFile read =
        LasTextOf.text(file("COMMA", "100,5\" casing,50\n100.5,7\",60\n101,\"a \"b\" c\",70\n"));
    assertEquals("5\" casing", read.curve("LITH").orElseThrow().word(0).orElseThrow());
    assertEquals("a \"b\" c", read.curve("LITH").orElseThrow().word(2).orElseThrow());
  }
}
