package connate.las;

import static connate.las.LasTextOf.PARAMETERS;
import static connate.las.LasTextOf.ROWS;
import static connate.las.LasTextOf.VERSION;
import static connate.las.LasTextOf.WELL;
import static connate.las.LasTextOf.bytes;
import static connate.las.LasTextOf.curves;
import static connate.las.LasTextOf.plain;
import static connate.las.LasTextOf.rows;
import static connate.las.LasTextOf.text;
import static connate.las.LasTextOf.wellWith;
import static connate.las.LasTextOf.wrapped;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.fault.Fault;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** By hand: every way in which a LAS file is known to go wrong, as a small made-up file. */
class LasCasesTest {

  private static final double NONE = Double.NaN;

  private static void assertPlain(LasFile file) {
    assertColumn(file, "DEPT", 100, 100.5, 101);
    assertColumn(file, "GR", 50, 60, 70);
    assertColumn(file, "RHOB", 2.2, 2.3, 2.4);
  }

  private static void assertColumn(LasFile file, String name, double... values) {
    assertArrayEquals(values, file.curve(name).orElseThrow().values(), name);
  }

  private static void assertTold(LasFile file, String code, int line) {
    assertTrue(
        file.quirks().stream().anyMatch(q -> q.code().equals(code) && q.line() == line),
        code + " at line " + line + " in " + file.quirks());
  }

  private static void assertQuiet(LasFile file) {
    assertEquals(List.of(), file.quirks());
  }

  private static Fault refused(org.junit.jupiter.api.function.Executable reading) {
    return assertThrows(DataException.class, reading).faults().get(0);
  }

  @Test
  void plainFileIsReadWithoutAWord() {
    assertPlain(text(plain()));
    assertQuiet(text(plain()));
  }

  // 1: line ends, tail, byte order mark

  @ParameterizedTest
  @ValueSource(strings = {"\r\n", "\r", "\n"})
  void everyLineEnd(String end) {
    LasFile file = text(plain().replace("\n", end));
    assertPlain(file);
    assertEquals(4, file.items(LasSection.Kind.WELL).get(0).line() - 1);
  }

  @Test
  void noFinalNewline() {
    assertPlain(text(plain().stripTrailing()));
  }

  @Test
  void controlZAndByteOrderMarkAreLeftOut() {
    LasFile file = text("\uFEFF" + plain() + "\u001A\0\0");
    assertPlain(file);
    assertTold(file, "L70", 1);
    assertTold(file, "L70", 0);
  }

  @Test
  void utf16IsRefusedByName() {
    byte[] wide = plain().getBytes(StandardCharsets.UTF_16LE);
    Fault fault = refused(() -> LasFile.parse("a.las", wide));
    assertEquals("L02", fault.code());
    assertTrue(fault.message().contains("UTF-16"));
  }

  // 2: characters outside ASCII

  @Test
  void degreeSignInUtf8AndInWindows1252() {
    String lines = plain().replace("WELL. A-1", "LATI.DEG 37° 13' : lat\nWELL. A-1");
    byte[] windows = lines.getBytes(Charset.forName("windows-1252"));
    for (LasFile file : List.of(text(lines), LasFile.parse("a.las", windows))) {
      assertEquals("37° 13'", file.item("LATI").orElseThrow().value());
      assertPlain(file);
      assertTold(file, "L71", 9);
    }
  }

  // 3 and 4: colons and dots

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "TIME. 12:31:05 : time logged; TIME; ''; 12:31:05; time logged",
        "PATH. C:\\logs\\a.las : source file; PATH; ''; C:\\logs\\a.las; source file",
        "PATH. C:\\logs\\a.las; PATH; ''; C:\\logs\\a.las; ''",
        "TIME. 12:31:05; TIME; ''; 12:31:05; ''",
        "NOTE. a : b : c; NOTE; ''; a : b; c",
        "DATE. 2013/12/13 08:50 :created {YYYY/MM/DD hh:mm}; DATE; ''; 2013/12/13 08:50; "
            + "created {YYYY/MM/DD hh:mm}",
        "RT.ohm.m 3.5 : res; RT; ohm.m; 3.5; res",
        "TDEP..1IN 7 : depth; TDEP; .1IN; 7; depth",
        "EKB .M  12.5 : kelly; EKB; M; 12.5; kelly",
        "A B.C\t1 2\t: tabs; A B; C; 1 2; tabs",
        "RM.OHMM_DEGF 1.30 @ 72F: mud; RM; OHMM_DEGF; 1.30 @ 72F; mud",
        "EMPTY. :; EMPTY; ''; ''; ''"
      })
  void headerLines(String line, String name, String unit, String value, String description) {
    HeaderLine item = wellWith(line).item(name).orElseThrow();
    assertEquals(unit, item.unit());
    assertEquals(value, item.value());
    assertEquals(description, item.description());
    assertEquals(line, item.text());
  }

  // 5 and 6: odd names and units

  @Test
  void oddNamesAndUnits() {
    LasFile file =
        curves(
            "~C\nDEPT.M : d\n+N/-S.1000 lbf : n\nAMC[0]. _ : a\n", "100 1 2\n100.5 3 4\n101 5 6\n");
    assertEquals(
        List.of("DEPT", "+N/-S", "AMC[0]"), file.curves().stream().map(LasCurve::name).toList());
    assertEquals("1000 lbf", file.curves().get(1).unit());
    assertTold(file, "L73", 12);
    assertTold(file, "L74", 12);
  }

  @ParameterizedTest
  @ValueSource(strings = {"_", "NONE", "none", "unitless", "-"})
  void wordsForNoUnit(String unit) {
    LasFile file = curves("~C\nDEPT.M : d\nVSH." + unit + " : v\n", "100 1\n100.5 1\n101 1\n");
    assertEquals("", file.curve("VSH").orElseThrow().unit());
    assertEquals(unit, file.curve("VSH").orElseThrow().header().unit());
  }

  // 7 and 8: doubles

  @Test
  void doubledCurvesAreNamedApartInOrder() {
    LasFile file =
        curves(
            "~C\nDEPT.M : d\nRT.OHMM : a\nRT_2.OHMM : b\nrt.OHMM : c\n",
            "100 1 2 3\n100.5 1 2 1\n101 1 2 1\n");
    assertEquals(
        List.of("DEPT", "RT", "RT_2", "rt_3"), file.curves().stream().map(LasCurve::name).toList());
    assertColumn(file, "RT_3", 3, 1, 1);
    assertTold(file, "L36", 14);
  }

  @Test
  void doubledHeaderNamesKeepTheFirst() {
    LasFile file = wellWith("WELL. B-2 : WELL");
    assertEquals("A-1", file.item("WELL").orElseThrow().value());
    assertTold(file, "L37", 10);
  }

  // 9: many curves, long lines

  @Test
  void manyCurvesAndLongLines() {
    StringBuilder names = new StringBuilder("~C\nDEPT.M : d\n");
    StringBuilder row = new StringBuilder();
    for (int i = 1; i < 2000; i++) {
      names.append("C").append(i).append(".X : c\n");
      row.append(' ').append(i);
    }
    LasFile file = curves(names.toString(), "100" + row + "\n100.5" + row + "\n101" + row + "\n");
    assertEquals(2000, file.curves().size());
    assertColumn(file, "C1999", 1999, 1999, 1999);
    assertTrue(file.quirks().stream().anyMatch(q -> q.code().equals("L72")));
  }

  // 10: the index is not where it should be

  @Test
  void labelsTellTheOrder() {
    LasFile file =
        text(
            VERSION
                + WELL
                + "~C\nGR.GAPI : g\nRHOB.G/C3 : r\nDEPT.M : d\n"
                + "~A Depth GR RHOB\n"
                + ROWS);
    assertPlain(file);
    assertEquals("DEPT", file.index().name());
    assertTold(file, "L30", 13);
  }

  @Test
  void commentLabelsTellTheOrder() {
    String header = VERSION + WELL + "~C\nGR.GAPI : g\nRHOB.G/C3 : r\nDEPT.M : d\n";
    assertPlain(text(header + "~A\n# DEPT GR RHOB\n" + ROWS));
    assertPlain(text(header + "# DEPT GR RHOB\n~A\n" + ROWS));
    assertPlain(text((header + "# DEPT GR RHOB\n~A\n" + ROWS).replace("\n", "\r\n")));
  }

  @Test
  void indexMayStandInAnotherColumn() {
    LasFile file = curves("~C\nGR.GAPI : g\nDEPT.M : d\n", "50 100\n60 100.5\n70 101\n");
    assertEquals("DEPT", file.index().name());
    assertColumn(file, "GR", 50, 60, 70);
    assertTold(file, "L30", 12);
  }

  @Test
  void contradictionWithoutLabelsIsRefused() {
    Fault fault = refused(() -> curves("~C\nGR.GAPI : g\nRHOB.G/C3 : r\nDEPT.M : d\n", ROWS));
    assertEquals("L10", fault.code());
    assertEquals(13, fault.line());
  }

  @Test
  void startThatNoColumnHasIsRefusedWithItsPlaceAndAWayOut() {
    String rows = "90.0 50 2.2\n90.5 60 2.3\n";
    Fault fault = refused(() -> rows(rows));
    assertEquals("L09", fault.code());
    assertEquals(5, fault.line());
    assertTrue(fault.help().contains("withIndex(\"DEPT\")"), fault.help());
    LasFile file = rows(rows, LasOptions.STRICT.withIndex("dept"));
    assertColumn(file, "DEPT", 90, 90.5);
  }

  // 11 and 12: start, stop and step that do not fit

  @Test
  void upLogIsKeptAsItStands() {
    LasFile file =
        well(
            "~W\nSTRT.M 101 : s\nSTOP.M 100 : s\nSTEP.M -0.5 : s\nNULL. -999.25 : n\nWELL. A : w\n",
            "101 70 2.4\n100.5 60 2.3\n100 50 2.2\n");
    assertColumn(file, "DEPT", 101, 100.5, 100);
    assertTold(file, "L80", 0);
    assertTrue(file.quirks().stream().noneMatch(Quirk::isCaution), file.quirks().toString());
  }

  @Test
  void dataRunningTheOtherWayAreKeptWithACaution() {
    LasFile file = rows("101 70 2.4\n100.5 60 2.3\n100 50 2.2\n");
    assertColumn(file, "DEPT", 101, 100.5, 100);
    assertTold(file, "L31", 5);
    assertTold(file, "L31", 7);
  }

  @Test
  void stopOfAnotherDepth() {
    LasFile file = rows("100 50 2.2\n100.5 60 2.3\n");
    assertTold(file, "L33", 6);
    assertTrue(file.quirks().get(0).message().contains("STOP is 101, but the data end at 100.5"));
  }

  @Test
  void floatNoiseInStopIsOnlyANote() {
    LasFile file = well(WELL.replace("STOP.M 101.0", "STOP.M 101.00001"));
    assertTold(file, "L33", 6);
    assertTrue(file.quirks().stream().noneMatch(Quirk::isCaution));
  }

  // 13: steps

  @Test
  void irregularStepWithStepZeroIsANote() {
    LasFile file = well(WELL.replace("STEP.M 0.5", "STEP.M 0"), "100 1 1\n100.3 1 1\n101 1 1\n");
    assertTold(file, "L32", 19);
    assertTrue(file.quirks().stream().noneMatch(Quirk::isCaution));
  }

  @Test
  void unevenStepIsACaution() {
    LasFile file = rows("100 1 1\n100.5 1 1\n101.5 1 1\n102 1 1\n");
    assertTold(file, "L32", 19);
  }

  @Test
  void repeatedAndTurningIndexAreTold() {
    assertTold(rows("100 1 1\n100.5 1 1\n100.5 1 1\n101 1 1\n"), "L34", 19);
    assertTold(rows("100 1 1\n100.5 1 1\n100.2 1 1\n101 1 1\n"), "L35", 19);
  }

  // 14 and 15: nulls

  @ParameterizedTest
  @ValueSource(
      strings = {
        "-999.25",
        "-999.2500",
        "-999.25000000",
        "-9.9925e2",
        "NULL",
        "NaN",
        "(null)",
        "-",
        "n/a"
      })
  void declaredNullAndWordsAreMissing(String item) {
    assertColumn(rows("100 " + item + " 2.2\n100.5 60 2.3\n101 70 2.4\n"), "GR", NONE, 60, 70);
  }

  @ParameterizedTest
  @ValueSource(strings = {"-999", "-9999", "999.25", "-99999", "100000"})
  void undeclaredMarksAreKeptWithACaution(String mark) {
    LasFile file = rows("100 " + mark + " 2.2\n100.5 60 2.3\n101 70 2.4\n");
    assertColumn(file, "GR", Double.parseDouble(mark), 60, 70);
    assertTold(file, "L39", 12);
  }

  @ParameterizedTest
  @CsvSource({"-9999, -9999.00", "-999.25, -999.2500", "0, 0.0", "-99999, -99999.0"})
  void nullIsComparedAsANumber(String declared, String printed) {
    LasFile file =
        well(
            WELL.replace("NULL. -999.25", "NULL. " + declared),
            "100 1 " + printed + "\n100.5 2 1\n101 3 1\n");
    assertColumn(file, "RHOB", NONE, 1, 1);
  }

  @Test
  void noNullIsDeclared() {
    LasFile file = well(WELL.replace("NULL. -999.25 : null\n", ""), "100 -999.25 1\n101 3 1\n");
    assertColumn(file, "GR", -999.25, 3);
    assertTold(file, "L41", 0);
    assertTold(file, "L39", 11);
  }

  @Test
  void nullThatIsAnOrdinaryValueIsTold() {
    LasFile file = well(WELL.replace("NULL. -999.25", "NULL. 0"), "100 0 -1\n100.5 2 0\n101 3 1\n");
    assertTold(file, "L40", 8);
    assertTold(file, "L40", 13);
    assertColumn(file, "RHOB", -1, NONE, 1);
  }

  @Test
  void nullAsIndexIsKeptWhereItFitsElseTheRowIsLeftOut() {
    String zero =
        WELL.replace("NULL. -999.25", "NULL. 0")
            .replace("STRT.M 100.0", "STRT.M -0.5")
            .replace("STOP.M 101.0", "STOP.M 0.5");
    assertColumn(well(zero, "-0.5 1 1\n0.0 2 2\n0.5 3 3\n"), "DEPT", -0.5, 0, 0.5);
    LasFile file = rows("100 1 1\n-999.25 2 2\n101 3 3\n");
    assertColumn(file, "DEPT", 100, 101);
    assertColumn(file, "GR", 1, 3);
    assertTold(file, "L40", 18);
  }

  // 16: wrapped

  @Test
  void wrappedLinesMayBeRagged() {
    assertPlain(wrapped("100.0\n50\n2.2\n100.5\n60 2.3\n101.0\n 70 2.4 \n"));
  }

  @Test
  void wrapSaysYesYetRowsStandOnOneLine() {
    LasFile file = wrapped(ROWS);
    assertPlain(file);
    assertTold(file, "L48", 17);
  }

  @Test
  void wrapSaysNoYetRowsAreWrapped() {
    LasFile file = rows("100.0\n50 2.2\n100.5\n60 2.3\n101.0\n70 2.4\n");
    assertPlain(file);
    assertTold(file, "L48", 17);
  }

  @Test
  void wrappedRowThatRunsOverIsRefused() {
    Fault fault = refused(() -> wrapped("100.0\n50 2.2\n100.5\n60 2.3 9\n101.0\n70 2.4\n"));
    assertEquals("L12", fault.code());
    assertEquals(20, fault.line());
    assertEquals(8, fault.column());
  }

  @Test
  void wrappedRowThatIsShortNeverShiftsColumns() {
    Fault fault = refused(() -> wrapped("100.0\n50 2.2\n100.5\n60\n101.0\n70 2.4\n"));
    assertEquals("L12", fault.code());
  }

  @Test
  void wrappedFragmentAtTheEnd() {
    LasFile file = wrapped("100.0\n50 2.2\n100.5\n60 2.3\n101.0\n70 2.4\n101.5\n80\n");
    assertPlain(file);
    assertTold(file, "L43", 23);
  }

  @Test
  void wordsAndTextInWrappedData() {
    assertColumn(wrapped("100.0\nNaN 2.2\n100.5\n60 2.3\n101.0\n70 2.4\n"), "GR", NONE, 60, 70);
    Fault fault = refused(() -> wrapped("100.0\n50 2.2\n100.5\nsand 2.3\n101.0\n70 2.4\n"));
    assertEquals("L08", fault.code());
    assertEquals("a.las:20:1", fault.place());
  }

  // 17, 18, 19: fragments, garbage, comments

  @Test
  void fragmentAtTheEndIsToldAndLeftOut() {
    LasFile file = rows(ROWS + "59\n");
    assertPlain(file);
    assertTold(file, "L43", 20);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"\u0001\u0002junk\u0003", "DEPT GR RHOB", "metres", "*** start *** of data ***"})
  void strayLineBeforeTheFirstRow(String line) {
    LasFile file = rows(line + "\n" + ROWS);
    assertPlain(file);
    assertTold(file, "L44", 17);
  }

  @Test
  void commentsAndBlankLinesAmongTheData() {
    LasFile file = rows("# labels\n\n100.0 50 2.2\n  # note\n100.5 60 2.3\n\n101.0 70 2.4\n\n");
    assertPlain(file);
    assertTold(file, "L75", 17);
    assertTold(file, "L75", 18);
  }

  // 20: parameters and other sections

  @Test
  void parametersMayBeMissingEmptyOrElsewhere() {
    assertPlain(text(VERSION + WELL + LasTextOf.CURVES + "~A\n" + ROWS));
    assertPlain(text(VERSION + WELL + LasTextOf.CURVES + "~P\n~A\n" + ROWS));
    LasFile file = text(VERSION + WELL + PARAMETERS + LasTextOf.CURVES + "~A\n" + ROWS);
    assertPlain(file);
    assertTold(file, "L76", 10);
  }

  @Test
  void otherTextMayBeLongAndHoldTildes() {
    String other =
        "~Other\n" + "Remark: a.b : c\n".repeat(500) + "~ about 5 m of fill\n~Approx 3\n";
    LasFile file = text(VERSION + WELL + LasTextOf.CURVES + other + "~A\n" + ROWS);
    assertPlain(file);
    LasSection kept = file.sections().get(3);
    assertEquals(502, kept.lines().size());
    assertEquals("~Approx 3", kept.lines().get(501));
  }

  // 21: version 1.2 and its look-alikes

  @Test
  void textsBehindTheColonInAnOldFile() {
    LasFile file =
        text(
            VERSION.replace("2.0", "1.2")
                + WELL.replace(
                    "WELL. A-1 : WELL",
                    "WELL. WELL : A-1: x\n" + "FLD. : Tarn Hill\nCOMP. COMPANY :")
                + LasTextOf.CURVES
                + "~A\n"
                + ROWS);
    assertEquals("A-1: x", file.item("WELL").orElseThrow().value());
    assertEquals("Tarn Hill", file.item("FLD").orElseThrow().value());
    assertEquals("", file.item("COMP").orElseThrow().value());
    assertTold(file, "L78", 0);
  }

  @Test
  void labelOnTheOtherSideBeatsTheVersion() {
    LasFile file = well(WELL.replace("WELL. A-1 : WELL", "WELL. WELL : A-1"));
    assertEquals("A-1", file.item("WELL").orElseThrow().value());
    assertTold(file, "L50", 9);
    LasFile old = text(VERSION.replace("2.0", "1.20") + WELL + LasTextOf.CURVES + "~A\n" + ROWS);
    assertEquals("A-1", old.item("WELL").orElseThrow().value());
    assertTold(old, "L50", 9);
  }

  // 25: order and number of sections

  @Test
  void dataMayStandBeforeTheCurves() {
    assertPlain(text(VERSION + WELL + "~A\n" + ROWS + LasTextOf.CURVES + PARAMETERS));
  }

  @Test
  void twoDataSectionsAreRefused() {
    Fault fault = refused(() -> text(plain() + "~A\n" + ROWS));
    assertEquals("L11", fault.code());
    assertEquals(20, fault.line());
  }

  @Test
  void noDataSectionIsRefused() {
    Fault fault = refused(() -> text(VERSION + WELL + LasTextOf.CURVES));
    assertEquals("L04", fault.code());
    assertEquals(13, fault.line());
  }

  @Test
  void dataBeforeTheHeaderAreRefused() {
    Fault fault = refused(() -> text("100.0 50 2.2\n" + plain()));
    assertEquals("a.las:1:1", fault.place());
    assertEquals("L03", fault.code());
  }

  @Test
  void otherRefusals() {
    assertEquals("L02", refused(() -> text("hello\n")).code());
    assertEquals("L02", refused(() -> text("")).code());
    assertEquals("L05", refused(() -> text(VERSION + WELL + "~A\n" + ROWS)).code());
    assertEquals("L06", refused(() -> text(plain().replace("VERS. 2.0", "VERS. 7"))).code());
    assertEquals("L01", refused(() -> LasFile.read(java.nio.file.Path.of("no-such.las"))).code());
    assertEquals("L01", refused(() -> LasFile.read(java.nio.file.Path.of("."))).code());
  }

  @Test
  void zeroRowsAndBlankBounds() {
    LasFile none = rows("");
    assertEquals(0, none.rows());
    assertTold(none, "L54", 0);
    LasFile blank =
        well(WELL.replace("STRT.M 100.0", "STRT.M ").replace("STOP.M 101.0", "STOP.M nan"));
    assertPlain(blank);
    assertTold(blank, "L51", 5);
    assertTold(blank, "L51", 6);
  }

  @Test
  void startThatIsNoNumberIsRefused() {
    Fault fault = refused(() -> well(WELL.replace("STRT.M 100.0", "STRT.M top")));
    assertEquals("L15", fault.code());
    assertEquals(5, fault.line());
  }

  // 26 and 27: numbers written oddly

  @Test
  void runTogetherNumbersAreSplitWhereTheCountFits() {
    LasFile file = rows("100.000-999.250-999.250\n100.5 60 2.3\n101.0 70-2.4\n");
    assertColumn(file, "GR", NONE, 60, 70);
    assertColumn(file, "RHOB", NONE, 2.3, -2.4);
    assertTold(file, "L46", 17);
  }

  @Test
  void decimalCommaIsReadWhereItIsClear() {
    LasFile file = rows("100,0 50 2,25\n100,5 60 2,35\n101,0 70 2,45\n");
    assertColumn(file, "DEPT", 100, 100.5, 101);
    assertColumn(file, "RHOB", 2.25, 2.35, 2.45);
    assertTold(file, "L47", 17);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {"1.2.3; L08", "1,234.5; L14", "1,234; L14", "12,5; L14", "12a; L08", "1-2-3; L08"})
  void unclearNumbersAreRefusedWithTheirPlace(String item, String code) {
    Fault fault = refused(() -> rows("100.0 50 2.2\n100.5 " + item + " 2.3\n101.0 70 2.4\n"));
    assertEquals(code, fault.code());
    assertEquals("a.las:18:7", fault.place());
    assertEquals(item.length(), fault.length());
  }

  @ParameterizedTest
  @CsvSource({
    "1.0E-03, 0.001",
    "1.0e+2, 100",
    "1.0D-03, 0.001",
    "1.0d2, 100",
    "1.0-03, 0.001",
    "2.5+02, 250",
    "*****, NaN",
    "Inf, NaN",
    "-Infinity, NaN",
    "1.#INF, NaN",
    "1e999, NaN"
  })
  void exponentsAndOverflows(String item, double value) {
    LasFile file = rows("100.0 " + item + " 2.2\n100.5 60 2.3\n101.0 70 2.4\n");
    assertColumn(file, "GR", value, 60, 70);
  }

  // 28: text in columns

  @Test
  void columnsOfTimesAndWordsAreKeptAsText() {
    LasFile file =
        curves(
            "~C\nDEPT.M : d\nTIM. : t\nLITH. : l\n",
            "100 12:31:05 SAND\n100.5 12:31:06 -999.25\n101 12:31:07 \"fine sand\"\n");
    assertTrue(file.curve("TIM").orElseThrow().isText());
    assertEquals("12:31:06", file.curve("TIM").orElseThrow().word(1).orElseThrow());
    assertEquals("fine sand", file.curve("LITH").orElseThrow().word(2).orElseThrow());
    assertTrue(file.curve("LITH").orElseThrow().word(1).isEmpty());
    assertEquals(1, file.curve("LITH").orElseThrow().missing());
  }

  @Test
  void oneWordInANumberColumnIsRefused() {
    StringBuilder rows = new StringBuilder();
    for (int i = 0; i < 6000; i++) {
      rows.append(100 + i * 0.5).append(i == 4710 ? " SAND" : " 50").append(" 2.2\n");
    }
    Fault fault = refused(() -> rows(rows.toString()));
    assertEquals("L08", fault.code());
    assertEquals(16 + 4711, fault.line());
    assertEquals(8, fault.column());
  }

  @Test
  void indexOfWordsIsRefused() {
    Fault fault =
        refused(
            () ->
                text(
                    VERSION
                        + "~W\nNULL. -999.25 : n\nWELL. A : w\n~C\nTIME.S : t\nGR.GAPI : g\n"
                        + "~A\n12:31:05 50\n12:31:06 60\n"));
    assertTrue(List.of("L09", "L17").contains(fault.code()), fault.toString());
  }

  // 29: rows that are too short or too long

  @ParameterizedTest
  @ValueSource(strings = {"100.5 60", "100.5 60 2.3 9"})
  void rowOfAnotherLengthIsRefusedOrSetAside(String row) {
    String rows = "100.0 50 2.2\n" + row + "\n101.0 70 2.4\n";
    Fault fault = refused(() -> rows(rows));
    assertEquals("L07", fault.code());
    assertEquals(18, fault.line());
    LasFile file = rows(rows, LasOptions.STRICT.settingRowsAside());
    assertColumn(file, "GR", 50, 70);
    assertColumn(file, "RHOB", 2.2, 2.4);
    assertTold(file, "L45", 18);
  }

  @Test
  void severalFaultsAreToldTogether() {
    String rows = ROWS + "1 2\n".repeat(30) + ROWS;
    DataException all = assertThrows(DataException.class, () -> rows(rows));
    assertTrue(all.getMessage().contains("and 10 more of this kind"), all.getMessage());
  }

  // 30 and 31: version and header lines

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "VERS. 2.00 : v; 2.0",
        "VERS. 2 : v; 2.0",
        "VERS.2.0 : v; 2.0",
        "VERS. 1.20 : v; 1.2",
        "VERS. 2.0: CWLS log; 2.0",
        "vers . 2.0 CWLS : v; 2.0",
        "VERS. 3.0 : v; 3.0"
      })
  void versions(String line, String version) {
    LasFile file = text(plain().replace("VERS. 2.0 : version", line));
    assertEquals(version, file.version().toString());
    assertPlain(file);
  }

  @Test
  void missingVersionIsTold() {
    LasFile file = text(plain().replace("VERS. 2.0 : version\n", ""));
    assertPlain(file);
    assertTold(file, "L51", 0);
  }

  @Test
  void headerLinesWithoutColonOrDot() {
    LasFile file = wellWith("FLD.  Tarn Hill\nRIG  7 : rig\nwords alone");
    assertEquals("Tarn Hill", file.item("FLD").orElseThrow().value());
    assertEquals("7", file.item("RIG").orElseThrow().value());
    assertTold(file, "L52", 10);
    assertTold(file, "L52", 11);
    assertTold(file, "L52", 12);
  }

  @Test
  void numbersThatTouchTheDot() {
    LasFile file = well(WELL.replace("NULL. -999.25", "NULL.-999.25"), "100 -999.25 1\n101 1 1\n");
    assertEquals(-999.25, file.nullValue());
    assertColumn(file, "GR", NONE, 1);
  }

  // 32: units of depth

  @ParameterizedTest
  @CsvSource({"M, METRES, false", "F, FT, false", "FEET, FOOT, false", "FT, M, true"})
  void unitsOfDepth(String stated, String used, boolean differs) {
    String start = differs ? "328.0839895" : "100.0";
    String stop = differs ? "331.3648294" : "101.0";
    String step = differs ? "1.640419948" : "0.5";
    LasFile file =
        text(
            VERSION
                + "~W\nSTRT."
                + stated
                + " "
                + start
                + " : s\nSTOP."
                + stated
                + " "
                + stop
                + " : s\nSTEP."
                + stated
                + " "
                + step
                + " : s\nNULL. -999.25 : n\nWELL. A-1 : WELL\n"
                + LasTextOf.CURVES.replace("DEPT.M", "DEPT." + used)
                + PARAMETERS
                + "~A\n"
                + ROWS);
    assertPlain(file);
    assertEquals(differs, file.quirks().stream().anyMatch(q -> q.code().equals("L49")));
  }

  // 33: empty curves

  @Test
  void curveWithoutAnyValueStays() {
    LasFile file = rows("100 -999.25 1\n100.5 -999.25 1\n101 -999.25 1\n");
    assertEquals(3, file.curve("GR").orElseThrow().missing());
    assertTold(file, "L38", 12);
  }

  // 24: titles

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "~v;~w;~c;~p;~a",
        "~Version;~Well;~Curves;~Params;~Ascii | Curve",
        "~ V;~ W;~ C;~ P;~ A",
        " ~VERSION:;~WELL:;~CURVE:;~PARAMETER:;~A:",
        "~V.x;~W.x;~C.x;~P.x;~ASCII LOG DATA"
      })
  void titles(String v, String w, String c, String p, String a) {
    assertPlain(
        text(
            v
                + VERSION.substring(2)
                + w
                + WELL.substring(2)
                + c
                + LasTextOf.CURVES.substring(2)
                + p
                + PARAMETERS.substring(2)
                + a
                + "\n"
                + ROWS));
  }

  @Test
  void hugeNumbersOfColumnsAreRefused() {
    String many = "~C\nDEPT.M : d\n" + "X.Y : x\n".repeat(10_000);
    assertEquals("L16", refused(() -> curves(many, ROWS)).code());
  }

  private static LasFile well(String lines, String rows) {
    return text(VERSION + lines + LasTextOf.CURVES + PARAMETERS + "~A\n" + rows);
  }

  private static LasFile well(String lines) {
    return well(lines, ROWS);
  }

  /** Independent: the same rows in any layout are the same numbers. */
  @Test
  void layoutsAgree() {
    for (String row :
        List.of("100.0,50,2.2", "100.0\t50\t2.2", "100.0 ; 50 ; 2.2", "100.0, 50, 2.2")) {
      String rows =
          row
              + "\n"
              + row.replace("100.0", "100.5").replace("50", "60").replace("2.2", "2.3")
              + "\n"
              + row.replace("100.0", "101.0").replace("50", "70").replace("2.2", "2.4")
              + "\n";
      assertPlain(rows(rows));
    }
  }

  @Test
  void firstColumnThatIsNoIndexMayHaveWordsForNoValue() {
    LasFile file = curves("~C\nGR.GAPI : g\nDEPT.M : d\n", "NaN 100\n60 100.5\n70 101\n");
    assertColumn(file, "GR", NONE, 60, 70);
    LasFile lost = rows("100 50 2.2\nNaN 60 2.3\n101 70 2.4\n");
    assertColumn(lost, "GR", 50, 70);
    assertTold(lost, "L40", 18);
  }

  @Test
  void sectionsOfOneKindAreOne() {
    LasFile file =
        text(VERSION + WELL + LasTextOf.CURVES + PARAMETERS + "~P\nTD.M 9 : t\n~A\n" + ROWS);
    assertPlain(file);
    assertEquals("8.5", file.item("BS").orElseThrow().value());
    assertEquals("9", file.item("TD").orElseThrow().value());
  }

  @Test
  void curveSectionWithoutUnitTextAndLongLines() {
    assertEquals("", wellWith("X.Y:z").item("X").orElseThrow().value());
    String endless = VERSION + "~O\n" + "x".repeat(17 << 20) + "\n";
    assertEquals("L16", refused(() -> text(endless + plain())).code());
  }

  @Test
  void hostileBytesNeverEscapeAsAnotherException() {
    long seed = Long.getLong("seed", 7L);
    java.util.Random random = new java.util.Random(seed);
    for (int i = 0; i < 4000; i++) {
      byte[] b = bytes(plain());
      for (int k = 1 + random.nextInt(8); k > 0; k--) {
        b[random.nextInt(b.length)] = (byte) random.nextInt(256);
      }
      byte[] cut = Arrays.copyOf(b, random.nextInt(b.length));
      byte[] some = random.nextBoolean() ? b : cut;
      try {
        LasFile.parse("a.las", some);
      } catch (DataException e) {
        assertTrue(e.getMessage().contains("error[L"), e.getMessage());
      } catch (RuntimeException e) {
        throw new AssertionError(
            "seed " + seed + ", case " + i + ": " + new String(some, StandardCharsets.ISO_8859_1),
            e);
      }
    }
  }
}
