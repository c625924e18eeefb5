package connate.las;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Independent: real files of the Kansas Geological Survey, the Alberta Geological Survey, FORCE
 * 2020 and the first wireline log of 1927; counts and means stand in the README beside the files,
 * where they were computed with another program.
 */
class LasSharedFilesTest {

  private static LasFile read(String name) {
    return LasFile.read(SharedFiles.of(name));
  }

  @ParameterizedTest
  @CsvSource({
    "las-ags/00-10-04-081-05W4-0.LAS, 2.0, 7, 508, 122.1, 274.2, 2",
    "las-force2020/31_2-7.las, 2.0, 20, 8647, 353.30493164, 1667.4969316, 34724",
    "las-force2020/32_2-1.las, 2.0, 21, 6059, 379.0676, 1299.8836, 32364",
    "las-kgs/1044782786.las, 2.0, 8, 64, 173.0, 5580.0, 0",
    "las-kgs/1044839000.las, 2.0, 327, 641, 5270.5, 4950.5, 8910",
    "las-kgs/1044859098.las, 1.2, 23, 6579, 9.0, 3298.0, 0",
    "las-kgs/1045637598.las, 2.0, 22, 8976, 0.0, 4487.5, 15686",
    "las-kgs/1046102222.las, 2.0, 11, 2071, 1051.0, 16.0, 136",
    "las-kgs/1046102494.las, 2.0, 4, 6274, 3345.0, 9618.0, 78",
    "las-kgs/1046114346.las, 3.0, 55, 7585, 79.0, 3870.0, 52855",
    "las-pechelbronn/Pechelbronn.las, 2.0, 2, 141, 139.0, 279.0, 0"
  })
  void countsAndEndsOfEveryFile(
      String name, String version, int curves, int rows, double first, double last, int nulls) {
    LasFile file = read(name);
    assertEquals(version, file.version().toString());
    assertEquals(curves, file.curves().size());
    assertEquals(rows, file.rows());
    assertEquals(first, file.index().value(0));
    assertEquals(last, file.index().value(rows - 1));
    assertEquals(nulls, file.curves().stream().mapToInt(LasCurve::missing).sum());
  }

  /** The means stand in the README to four decimals, without trailing zeros. */
  @ParameterizedTest
  @CsvSource({
    "las-ags/00-10-04-081-05W4-0.LAS, GR, 508, 72.2242",
    "las-force2020/31_2-7.las, GR, 8571, 61.6042",
    "las-force2020/32_2-1.las, GR, 5761, 84.3962",
    "las-kgs/1044839000.las, GR_EDTC, 641, 57.4681",
    "las-kgs/1044859098.las, GR, 6579, 62.675",
    "las-kgs/1045637598.las, GR, 8898, 60.2156",
    "las-kgs/1046102494.las, GR, 6274, 40.2911",
    "las-kgs/1046114346.las, GR, 7310, 81.058",
    "las-pechelbronn/Pechelbronn.las, RES, 141, 4.4329"
  })
  void meanOfOneCurve(String name, String curve, int count, double mean) {
    double[] present =
        Arrays.stream(read(name).curve(curve).orElseThrow().values())
            .filter(v -> !Double.isNaN(v))
            .toArray();
    assertEquals(count, present.length);
    assertEquals(mean, Arrays.stream(present).average().orElseThrow(), 0.5e-4);
  }

  /** One code for each quirk that the READMEs name. */
  @ParameterizedTest
  @CsvSource({
    "las-ags/00-10-04-081-05W4-0.LAS, L33 L81",
    "las-force2020/31_2-7.las, L33 L74 L79",
    "las-force2020/32_2-1.las, L33 L74 L79",
    "las-kgs/1044782786.las, L32 L71 L73 L76",
    "las-kgs/1044839000.las, L36 L38 L71 L72 L73 L74 L80",
    "las-kgs/1044859098.las, L76 L78",
    "las-kgs/1045637598.las, L39 L75 L79 L82",
    "las-kgs/1046102222.las, L30 L39",
    "las-kgs/1046102494.las, L43 L75 L76",
    "las-kgs/1046114346.las, L33 L34 L36 L55",
    "las-pechelbronn/Pechelbronn.las, L31 L32 L33"
  })
  void tellsEachQuirk(String name, String codes) {
    var told = read(name).quirks().stream().map(Quirk::code).collect(Collectors.toSet());
    assertTrue(told.containsAll(List.of(codes.split(" "))), codes + " in " + told);
  }

  @Test
  void fragmentAndRepeatedIndexHaveTheirLine() {
    assertEquals(6315, line(read("las-kgs/1046102494.las"), "L43"));
    assertEquals(8359, line(read("las-kgs/1046114346.las"), "L34"));
  }

  @Test
  void sixCurvesOfTheWideFileAreDoubledAndSixAreEmpty() {
    List<Quirk> quirks = read("las-kgs/1044839000.las").quirks();
    assertEquals(6, quirks.stream().filter(q -> q.code().equals("L36")).count());
    assertEquals(6, quirks.stream().filter(q -> q.code().equals("L38")).count());
  }

  /** By hand: the labels of the data name the columns; the first row of the file is read off. */
  @Test
  void columnsFollowTheLabelsWhereTheCurveSectionHasAnotherOrder() {
    LasFile file = read("las-kgs/1046102222.las");
    assertEquals("DEPT", file.index().name());
    assertEquals(4.5, file.curve("CASEOD").orElseThrow().value(0));
    assertEquals(2.71, file.curve("MATRXDEN").orElseThrow().value(0));
    assertEquals(100000, file.curve("RILD").orElseThrow().value(0));
    assertEquals(30.934, file.curve("SP").orElseThrow().value(0));
    assertTrue(Double.isNaN(file.curve("GR").orElseThrow().value(0)));
  }

  /** By hand: texts of the file. */
  @Test
  void textsOfTheOldVersionStandBehindTheColon() {
    LasFile file = read("las-kgs/1044859098.las");
    assertEquals("Roger SWD 1", file.item("WELL").orElseThrow().value());
    assertEquals("SHL: 200' FSL X 1200' FWL", file.item("LOC").orElseThrow().value());
    assertEquals("Noble Energy  Inc", file.item("CN").orElseThrow().value());
  }

  /** By hand: texts of the file. */
  @Test
  void keepsDegreesColonsDotsAndBraces() {
    LasFile file = read("las-kgs/1044839000.las");
    assertEquals("37° 13' 5.029\" N", file.item("LATI").orElseThrow().value());
    assertEquals("2013/12/13 08:50", file.item("CREA").orElseThrow().value());
    assertEquals(".1IN", file.curve("TDEP").orElseThrow().unit());
    assertEquals("", read("las-force2020/32_2-1.las").curve("ROPA").orElseThrow().unit());
    assertEquals("ohm.m", read("las-force2020/32_2-1.las").curve("RDEP").orElseThrow().unit());
  }

  /** By hand: rows of the file. */
  @Test
  void dataSetsBesideTheLogAreRead() {
    List<LasSet> sets = read("las-kgs/1046114346.las").sets();
    assertEquals(
        List.of("Tops", "IQ_Control", "IQ_Geo_Report"), sets.stream().map(LasSet::name).toList());
    LasSet tops = sets.get(0);
    assertEquals(17, tops.rows().size());
    assertEquals("Wellington", tops.column("TOPN").get(0));
    assertEquals("140.0", tops.column("TOPT").get(0));
    assertEquals("", tops.column("SSYS").get(0));
  }

  private static int line(LasFile file, String code) {
    return file.quirks().stream()
        .filter(q -> q.code().equals(code))
        .findFirst()
        .orElseThrow()
        .line();
  }
}
