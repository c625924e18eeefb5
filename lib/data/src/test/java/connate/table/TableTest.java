package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Units;
import connate.series.Series;
import connate.series.Unstated;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class TableTest {

  private final List<String> cautions = new ArrayList<>();

  @BeforeEach
  void listen() {
    Listening.to(
        new Listener() {
          @Override
          public void used(MethodCard card) {
            // tables use no method
          }

          @Override
          public void caution(Caution caution) {
            cautions.add(caution.code() + " " + caution.text());
          }
        });
  }

  @AfterEach
  void stop() {
    Listening.to(Listener.DEAF);
  }

  private static Table read(String... lines) {
    return Table.read(
        "plugs.csv", (String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
  }

  private static String fault(String... lines) {
    return assertThrows(DataException.class, () -> read(lines)).getMessage();
  }

  @Test
  void unitsStandInTheHeader() {
    Table t = read("well,depth [m],porosity [%],k_air (mD)", "A,2311.2,18.4,96.2", "B,2312,7,");
    assertEquals(Units.percent, t.get("porosity").unit());
    assertEquals(Units.mD, t.get("k_air").unit());
    assertEquals(0.184, t.get("porosity").in(Units.fraction)[0], 1e-15);
    assertTrue(Double.isNaN(t.get("k_air").value(1)));
    assertEquals("B", t.labels("well").label(1));
    assertEquals(2312, t.get("porosity").depth().orElseThrow().value(1));
    assertEquals(3, t.line(1));
  }

  @Test
  void unitsStandInARowBeneath() {
    Table t = read("Core report 7", "", "depth,porosity,perm", "ft,%,mD", "8200,18,100");
    assertEquals(Units.ft, t.get("depth").unit());
    assertEquals(Units.mD, t.get("perm").unit());
    assertEquals(1, t.rows());
  }

  @Test
  void commentsAndTitlesAboveArePassedOver() {
    Table t = read("# Invented data", "% more", "a [m],b [m]", "1,2");
    assertEquals(List.of("a", "b"), t.names());
    assertEquals(4, t.line(0));
  }

  @Test
  void semicolonsAndDecimalCommas() {
    Table t = read("depth [m];phi [%]", "2311,25;18,4", "2312;7");
    assertEquals(2311.25, t.get("depth").value(0));
    assertEquals(7, t.get("phi").value(1));
  }

  @Test
  void tabsAndAByteOrderMarkAndCrLf() {
    Table t = Table.read("x.tsv", "\uFEFFa [m]\tb\r\n1\tx, y\r\n".getBytes(StandardCharsets.UTF_8));
    assertEquals(List.of("a", "b"), t.names());
    assertEquals("x, y", t.labels("b").label(0));
  }

  @Test
  void oldCharacterSetIsTold() {
    Table t = Table.read("x.csv", "T [°C],b\n95,1\n".getBytes(Charset.forName("windows-1252")));
    assertEquals(Units.degC, t.get("T").unit());
    assertTrue(cautions.get(0).startsWith("T20"), cautions.toString());
  }

  @Test
  void quotesHoldSeparatorsQuotesAndLines() {
    Table t = read("name,v", "\"a, \"\"b\"\"\nc\",1", "d,2");
    assertEquals("a, \"b\"\nc", t.labels("name").label(0));
    assertEquals(4, t.line(1));
  }

  @Test
  void missingValuesHaveManyNames() {
    Table t = read("v", "1", "-999.25", "-999.2500", "NaN", "NA", "-", "-9999", "(null)", "2");
    assertEquals(2, t.get("v").count());
  }

  @Test
  void identifiersKeepTheirZerosAndDatesStayWords() {
    Table t = read("id,date,v", "00123,01/02/2024,1", "00007,2024-02-01,2");
    assertEquals("00123", t.labels("id").label(0));
    assertEquals("01/02/2024", t.labels("date").label(0));
  }

  @Test
  void wordInAColumnOfNumbersIsToldWithItsPlace() {
    String[] lines = new String[5000];
    lines[0] = "depth [m],phi [%]";
    for (int i = 1; i < lines.length; i++) {
      lines[i] = "1000," + (i == 4710 ? "18.x" : "18.2");
    }
    String message = fault(lines);
    assertTrue(message.startsWith("plugs.csv:4711:6: error[T04]"), message);
    assertTrue(message.contains("4711 | 1000,18.x"), message);
    assertTrue(message.contains("^^^^"), message);
  }

  @Test
  void percentUnderAFractionIsAsked() {
    String message = fault("well,porosity [v/v]", "A,0.183", "B,1.83");
    assertTrue(
        message.contains("plugs.csv:3:3: error[T03]: porosity 1.83 is outside 0..1"), message);
    assertTrue(message.contains("help: in percent? name the unit in the header: porosity [%]"));
  }

  @Test
  void fractionsUnderPercentAreDoubted() {
    read("porosity [%]", "0.18", "0.21");
    assertTrue(cautions.get(0).startsWith("T25"), cautions.toString());
  }

  @Test
  void porosityWithoutUnitWaitsForAnAnswer() {
    Table t = read("porosity,v", "18,1", "21,2");
    assertEquals(Unstated.UNIT, t.get("porosity").unit());
    var e =
        assertThrows(IllegalArgumentException.class, () -> t.get("porosity").in(Units.fraction));
    assertTrue(e.getMessage().contains("porosity [%]"), e.getMessage());
    assertEquals(0.18, t.unit("porosity", "%").get("porosity").in(Units.fraction)[0], 1e-15);
  }

  @Test
  void roleDecidesWhatSquareMetresAre() {
    Table t =
        read("permeability_measured,v", "9.0e-15,1", "2e-14,2").unit("permeability_measured", "m2");
    assertEquals(9.119, t.get("permeability").in(Units.mD)[0], 1e-3);
  }

  @Test
  void cellsWithUnitsAreConverted() {
    Table t = read("k,v", "12 mD,1", "0.5 D,2", "7 mD,3");
    assertEquals(500, t.get("k").in(Units.mD)[1], 1e-12);
    assertTrue(cautions.get(0).startsWith("T24"), cautions.toString());
    assertTrue(fault("k [mD],v", "12,1", "3 m,2").contains("T06"));
  }

  @Test
  void raggedRowsAreToldAndShortOnesAreEmpty() {
    assertTrue(fault("a,b", "1,2", "3,4,5").contains("plugs.csv:3:5: error[T05]"));
    assertEquals(1, read("a,b", "1,2", "3").get("b").count());
  }

  @Test
  void missingColumnNamesTheNearest() {
    Table t = read("k_air [mD],porosity [%]", "1,2");
    var e = assertThrows(IllegalArgumentException.class, () -> t.get("k_iar"));
    assertTrue(e.getMessage().contains("nearest is k_air"), e.getMessage());
  }

  @Test
  void emptyFileHeaderAloneAndNoHeader() {
    assertTrue(fault("").contains("T01"));
    assertEquals(0, read("a [m],b").rows());
    assertTrue(fault("1,2", "3,4").contains("T02"));
  }

  @Test
  void columnsOfOneNameAreNumbered() {
    assertEquals(List.of("k", "k (2)"), read("k,k", "1,2").names());
  }

  @Test
  void rowsAreChosenAndSorted() {
    Table t = read("well,v [m]", "A,3", "B,1", "A,2");
    assertEquals(2, t.where("well", "A").rows());
    assertEquals(1, t.sortedBy("v").get("v").value(0));
    assertEquals(4, t.sortedBy("v").line(1));
    assertEquals(1, t.where("v", v -> v > 2.5).rows());
    assertThrows(IllegalArgumentException.class, () -> t.where("well", "C"));
  }

  @Test
  void csvComesBackAndFormulasAreDefused() {
    Table t =
        read("name,depth [m],phi [%]", "\"=SUM(A1)\",2311.25,18.4", "\"a, \"\"b\"\"\",-5,")
            .with("k", Series.of("k", Units.mD, 0.1, 1e-7));
    String csv = t.csv();
    assertTrue(csv.contains("'=SUM(A1),2311.25,18.4,0.1"), csv);
    Table again = Table.read("again.csv", csv.getBytes(StandardCharsets.UTF_8));
    assertEquals("a, \"b\"", again.labels("name").label(1));
    assertEquals(1e-7, again.get("k").value(1));
    assertEquals(Units.percent, again.get("phi").unit());
    assertEquals(-5, again.get("depth").value(1));
  }

  @Test
  void listingTellsRangesGapsAndRepeats() {
    String text = read("well,k [mD]", "A,0", "B,12", "C,", "B,12").toString();
    assertTrue(text.contains("k: 0 to 12 mD, 1 missing, 1 zero"), text);
    assertTrue(text.contains("1 row is the same as an earlier one, the first in line 5"), text);
  }

  @Test
  void tablesawHoldsTheSame() {
    tech.tablesaw.api.Table raw = read("well,k [mD]", "A,1", "B,").tablesaw();
    assertEquals(2, raw.rowCount());
    assertTrue(raw.doubleColumn("k").isMissing(1));
  }

  @Test
  void aMissingWordIsNull() {
    assertNull(read("a,b", "x,1", ",2").labels("a").label(1));
  }
}
