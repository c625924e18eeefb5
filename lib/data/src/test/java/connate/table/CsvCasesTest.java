package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.quantity.Units;
import connate.role.Roles;
import connate.series.Series;
import connate.series.Unstated;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Small files as they are met: how they part cells, write numbers and units, and what is wrong with
 * them. By hand: each expected value stands in the case itself.
 */
class CsvCasesTest {

  @AfterEach
  void forget() {
    Missing.reset();
    Roles.reset();
  }

  private static Table read(String text) {
    return Table.read("plugs.csv", text.getBytes(StandardCharsets.UTF_8));
  }

  private static Fault fault(String text) {
    return assertThrows(DataException.class, () -> read(text)).faults().get(0);
  }

  private static String told(String text) {
    return String.join(" ", Heard.codes(() -> read(text)));
  }

  @ParameterizedTest
  @ValueSource(strings = {",", ";", "\t", "|"})
  void everySeparatorIsFound(String separator) {
    Table t = read("a [m]_b_c\n1_x_2.5\n3_y_4.5\n".replace("_", separator));
    assertEquals(List.of("a", "b", "c"), t.names());
    assertEquals(4.5, t.get("c").value(1));
  }

  @ParameterizedTest
  @ValueSource(strings = {"\n", "\r\n", "\r", "\n\n", "\r\n \r\n"})
  void everyLineEndIsFound(String end) {
    Table t = read(String.join(end, "# made up", "a,b", "1,2", "3,4"));
    assertEquals(List.of("a", "b"), t.names());
    assertEquals(2, t.rows());
    assertEquals(4, t.get("b").value(1));
  }

  @Test
  void linesAreCountedAlikeForEveryLineEnd() {
    for (String end : new String[] {"\n", "\r\n", "\r"}) {
      Fault f = fault(String.join(end, "a,b [m]", "", "1,2", "3,x", "5,6"));
      assertEquals("plugs.csv:4:3", f.place());
      assertEquals("3,x", f.text());
    }
  }

  @Test
  void charactersOfTwoBytes() {
    for (var charset : List.of(StandardCharsets.UTF_16LE, StandardCharsets.UTF_16BE)) {
      Table t = Table.read("x.txt", "\uFEFFTiefe [m]\tT [°C]\n1\t95\n".getBytes(charset));
      assertEquals(Units.degC, t.get("T").unit());
    }
  }

  @Test
  void firstLineMayStateTheSeparator() {
    Table t = read("sep=;\na;b\n1,5;x, y, z\n2,5;u, v, w\n");
    assertEquals(List.of("a", "b"), t.names());
    assertEquals(1.5, t.get("a").value(0));
    assertEquals(3, t.line(0));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "18,4;7,25 | 18.4",
        "1.234,5;7,25 | 1234.5",
        "-0,5;7,25 | -0.5",
        "2,345;7,25 | 2.345",
        "1 234,5;7,25 | 1234.5",
        "1,5e-3;7,25 | 0.0015",
        "1234567,25;7,25 | 1234567.25",
        "1.234.567;7,25 | 1234567"
      })
  void decimalCommas(String row, double value) {
    assertEquals(value, read("a;b\n" + row + "\n3;8,5\n").get("a").value(0));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "18.4 | 18.4",
        "'1,234.5' | 1234.5",
        "'1,234,567' | 1234567",
        "1 234.5 | 1234.5",
        "1.5E-3 | 0.0015",
        ".5 | 0.5",
        "5. | 5",
        "+3 | 3",
        "−2.5 | -2.5",
        "2.345 | 2.345",
        "1'234.5 | 1234.5"
      })
  void decimalPoints(String cell, double value) {
    Table t = read("a;b\n" + cell + ";7.25\n3;8.5\n");
    assertEquals(value, t.get("a").value(0));
  }

  @Test
  void commaInQuotesIsADecimalSignToo() {
    Table t = read("a,b\n\"18,4\",x\n\"7,25\",y\n");
    assertEquals(18.4, t.get("a").value(0));
  }

  @Test
  void thousandOrDecimalIsAsked() {
    Fault f = fault("a;b\n1,234;1\n2,500;2\n");
    assertEquals("T07", f.code());
    assertEquals("plugs.csv:2:1", f.place());
    assertEquals("T07", fault("a;b\n1.234;1,5\n2,5;2,5\n3,5;1\n1,5;1\n7,5;2\n").code());
  }

  @Test
  void eachColumnHasItsDecimalSign() {
    Table t = read("id;phi\n3.1;18,4\n3.2;7,25\n");
    assertEquals(3.1, t.get("id").value(0));
    assertEquals(18.4, t.get("phi").value(0));
  }

  @Test
  void twoDecimalSignsInOneColumnAreAFault() {
    Fault f = fault("a;b\n1.5;1\n2.5;1\n3.5;1\n4.5;1\n5,5;1\n");
    assertEquals("plugs.csv:6:1", f.place());
    assertEquals("T04", f.code());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "depth [m]",
        "depth (m)",
        "depth [M]",
        "depth [ft]",
        "depth, m",
        "depth / m",
        "depth [ m ]"
      })
  void unitsInTheHeader(String head) {
    Series depth = read("\"" + head + "\";b\n8200;1\n").get("depth");
    assertEquals(head.contains("ft") ? Units.ft : Units.m, depth.unit());
  }

  @ParameterizedTest
  @ValueSource(strings = {"porosity [%]", "porosity (%)", "porosity %", "porosity, %"})
  void percentInTheHeader(String head) {
    Series phi = read("\"" + head + "\";b\n18.4;1\n").get("porosity");
    assertEquals(Units.percent, phi.unit());
  }

  @Test
  void bracketsThatAreNoUnitStayInTheName() {
    assertEquals(
        List.of("AMC[0]", "AMC[1]", "offset (1km)", "k (2)"),
        read("AMC[0],AMC[1],offset (1km),k (2)\n1,2,3,4\n").names());
    assertEquals("T21", told("a [furlong],b\n1,2\n"));
    assertEquals(
        List.of("sample (S)", "well (D)", "note"),
        read("sample (S),well (D),\"note, s\"\na,b,c\nd,e,f\n").names());
  }

  @Test
  void unitsBeneathTheHeader() {
    Table t = read("depth;phi;perm;rock\n[m];[%];[mD];-\n8200;18;100;sand\n");
    assertEquals(Units.m, t.get("depth").unit());
    assertEquals(Units.mD, t.get("perm").unit());
    assertEquals("sand", t.labels("rock").label(0));
    assertEquals(1, t.rows());
  }

  @Test
  void wordsThatLookLikeUnitsAreARowOfData() {
    Table t = read("well,facies\nA,K\nB,S\nC,M\n");
    assertEquals(3, t.rows());
    assertEquals("A", t.labels("well").label(0));
  }

  @Test
  void commentAboveNumbersHoldsTheNames() {
    Table t = read("# made up\n# depth (m), phi (%)\n1,18\n2,19\n");
    assertEquals(List.of("depth", "phi"), t.names());
    assertEquals(Units.percent, t.get("phi").unit());
    assertEquals(3, t.line(0));
    assertEquals("T30", told("# a, b\n1,2\n"));
    assertEquals(List.of("%sand", "clay"), read("%sand,clay\n1,2\n").names());
  }

  @Test
  void titlesAboveTheHeader() {
    Table t = read("Core report 7;;;\nWell;TH-1;;\n\nwell;depth [m];phi [%];k [mD]\nA;1;2;3\n");
    assertEquals(List.of("well", "depth", "phi", "k"), t.names());
    assertEquals(5, t.line(0));
  }

  @Test
  void namesOfDigitsKeepThem() {
    Table t = read("id,uwi,v\n00123,49005210530000001,1\n12345,49005210530000002,2\n");
    assertEquals("00123", t.labels("id").label(0));
    assertEquals("49005210530000001", t.labels("uwi").label(0));
    assertEquals(7.5, read("v,b\n07,1\n7.5,2\n8.5,2\n").get("v").value(1));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"12A", "7H", "12 V", "1D", "3F", "2024-02-01", "01/02/2024", "12:30", "2c"})
  void namesThatBeginLikeNumbersAreWords(String cell) {
    Table t = read("plug,b\n" + cell + ",1\n" + cell + ",2\n");
    assertEquals(cell, t.labels("plug").label(0));
  }

  @Test
  void cellsWithUnits() {
    Table t = read("k,T,w\n12 mD,95 °C,3%\n0.5D,203 °F,21 %\n");
    assertEquals(500, t.get("k").in(Units.mD)[1], 1e-12);
    assertEquals(95, t.get("T").in(Units.degC)[1], 1e-10);
    assertEquals(0.21, t.get("w").in(Units.fraction)[1], 1e-15);
  }

  @Test
  void bareNumberAmongMeasuredOnesIsAsked() {
    Fault f = fault("sample,k\n1,12 mD\n2,0.5\n3,7 mD\n");
    assertEquals("T09", f.code());
    assertEquals("plugs.csv:3:3", f.place());
    assertEquals(0.5, read("s,k [mD]\n1,12 mD\n2,0.5\n").get("k").value(1));
  }

  @Test
  void boundsOfDetectionAreFaults() {
    Fault f = fault("well,k_air [mD]\nA,<0.01\nB,< 0.01\nC,12\n");
    assertEquals("T08", f.code());
    assertEquals("plugs.csv:2:3", f.place());
    assertEquals(5, f.length());
  }

  @Test
  void unitInTheHeaderMeansNumbersWhateverTheMajority() {
    Fault f = fault("well,k [mD]\nA,tight\nB,tight\nC,12\n");
    assertEquals("T04", f.code());
    assertEquals("T23", told("well,k [mD]\nA,tight\nB,tight\n"));
    assertEquals("T23", told("well,porosity\nA,tight\nB,tight\nC,12\n"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"inf", "-Infinity", "1e999", "0x1F", "1.5d", "1_000", "١٢"})
  void whatIsNoFiniteDecimalNumberIsAFault(String cell) {
    assertEquals("T04", fault("v [m],b\n1,1\n" + cell + ",2\n").code());
  }

  @Test
  void cellsOnLaterLinesOfARowAreFound() {
    Fault f = fault("note,size [m],v [m]\n\"two\nlines; \"\"quoted\"\"\", 7 ,x\nb,8,9\n");
    assertEquals("plugs.csv:3:24", f.place());
    assertEquals("lines; \"\"quoted\"\"\", 7 ,x", f.text());
  }

  @Test
  void inchesQuoteNothing() {
    Table t = read("size,v\n8 1/2\",1\n9 5/8\",2\n");
    assertEquals("8 1/2\"", t.labels("size").label(0));
    assertEquals("plugs.csv:2:8", fault("size,v [m]\n8 1/2\",x\n9 5/8\",2\n").place());
  }

  @Test
  void quoteThatIsNeverClosed() {
    Fault f = fault("a,b\n1,2\n3,\"four\n5,6\n");
    assertEquals("T10", f.code());
    assertEquals("plugs.csv:3", f.place());
    assertEquals("3,\"four", f.text());
  }

  @Test
  void faultsOfATableAreToldTogether() {
    String rows =
        IntStream.range(0, 200)
            .mapToObj(i -> i % 6 == 0 ? "x" + i + ",1" : i + ".5,1")
            .collect(Collectors.joining("\n"));
    DataException e = assertThrows(DataException.class, () -> read("v,b\n" + rows + "\n"));
    assertEquals(20, e.faults().size());
    assertTrue(e.getMessage().endsWith("and 14 more of this kind"), e.getMessage());
    assertEquals("plugs.csv:8:1", e.faults().get(1).place());
  }

  @Test
  void marksOfTheWorkbookCountAsMissing() {
    Missing.add("-1");
    Missing.add("n.b.");
    Table t = read("v,w\n1,a\n-1,b\nN.B.,-\n3,NaN\n-1.00,c\n");
    assertEquals(2, t.get("v").count());
    assertNull(t.labels("w").label(2));
    assertNull(t.labels("w").label(3));
    Missing.reset();
    assertEquals(-1, read("v,w\n1,a\n-1,b\n").get("v").value(1));
  }

  @Test
  void markAmongValuesLikeItIsTold() {
    assertEquals("T26", told("tvdss,b\n-998,1\n-999,2\n-1000,3\n"));
    assertEquals("", told("gr,b\n60,1\n-999,2\n70,3\n"));
    assertEquals(1, read("gr,b\n-999.2500,1\n-9999.00,1\n1.0E+30,2\n5,2\n").get("gr").count());
  }

  @Test
  void valuesOutsideOfTheUsualRangeAreTold() {
    List<connate.method.Caution> cautions =
        Heard.during(() -> read("well,k_air [mD]\nA,12\nB,-3\nC,4\n"));
    assertEquals(
        "plugs.csv: «k_air» has 1 value outside 0 to 100000 mD, such as -3, first in line 3",
        cautions.get(0).text());
    assertEquals("T27", cautions.get(0).code());
  }

  @Test
  void rowsThatEndEarlyAreTold() {
    assertEquals("T29", told("a,b,c\n1,2,3\n4,5\n"));
    assertEquals("", told("a,b,c\n1,2,3\n4,5,\n"));
    assertEquals("", told("a;b;\n1;2;\n4;5;\n"));
    assertEquals(List.of("a", "b"), read("a;b;\n1;2;\n4;5;\n").names());
  }

  @Test
  void columnWithoutAnyValueHoldsNumbersOrWords() {
    Table t = read("a,empty\n1,\n2,\n");
    assertEquals(0, t.get("empty").count());
    assertNull(t.labels("empty").label(1));
  }

  @Test
  void roleIsFoundByNameAndUnit() {
    Table t = read("well,CPERM (mD),PHIX [%],k [W]\nA,12,18,2\n");
    assertFalse(t.has("porosity"));
    Roles.add("porosity", "PHIX");
    assertEquals("PHIX", t.get("porosity").name());
    Table two = read("k_air [mD],k_liquid [mD]\n12,9\n");
    assertEquals(List.of("T28"), Heard.codes(() -> two.get("permeability")));
    assertEquals(List.of(), Heard.codes(() -> two.get("k_liquid")));
  }

  @Test
  void nameTellsTheFluid() {
    Table t = read("k_air [mD],k liquid [mD],k_brine [mD],perm [mD]\n1,2,3,4\n");
    assertEquals("air", t.get("k_air").traits().get(Series.FLUID));
    assertEquals("liquid", t.get("k liquid").traits().get(Series.FLUID));
    assertFalse(t.get("perm").traits().containsKey(Series.FLUID));
  }

  @Test
  void layersOfBrokenNumbersAreNumbers() {
    assertEquals(14.8, read("surface,b\n14.8,1\n15.2,2\n").get("surface").value(0));
    assertEquals("3", read("layer,b\n3,1\n4,2\n").labels("layer").label(0));
  }

  @Test
  void filesOfOtherKindsAreSentOn() {
    assertEquals("T15", fault("~Version\nVERS. 2.0 : x\n").code());
    byte[] old = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0, 1, 2};
    assertEquals(
        "T15",
        assertThrows(DataException.class, () -> Table.read("a.xls", old)).faults().get(0).code());
  }

  @Test
  void boundsHold() {
    assertEquals("T16", fault("a\n" + "z".repeat((1 << 20) + 1) + "\n").code());
    assertEquals("T16", fault("a" + ",a".repeat(10_000) + "\n").code());
  }

  /** The machine's own language must not matter: Turkish has an i without a dot. */
  @Test
  void languageOfTheMachineDoesNotMatter() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(new Locale("tr", "TR"));
      Table t =
          read(
              "DEPTH [FT],POROSITY [%],WELL ID\n8200,18,MISSING\n8300,NIL,x\n"
                  .replace("NIL", "NaN"));
      assertEquals(Units.ft, t.get("depth").unit());
      assertEquals(1, t.get("porosity").count());
      Locale.setDefault(Locale.GERMANY);
      assertEquals(
          "depth [ft]\n8200.5\n",
          Table.of("x", t.get("depth").rows(0).map(v -> v + 0.5).named("depth")).csv());
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void numbersWithoutUnitSayHowToStateIt() {
    Table t = read("k,b\n12,1\n");
    assertEquals(Unstated.UNIT, t.get("k").unit());
    var e = assertThrows(IllegalArgumentException.class, () -> t.get("k").in(Units.mD));
    assertTrue(e.getMessage().contains("table.unit(\"k\", \"mD\")"), e.getMessage());
    var other =
        assertThrows(IllegalArgumentException.class, () -> read("k [mD],b\n12,1\n").unit("k", "D"));
    assertTrue(other.getMessage().contains("is in mD by its header"), other.getMessage());
  }
}
