package connate.well;

import static connate.quantity.Units.ft;
import static connate.quantity.Units.gAPI;
import static connate.quantity.Units.gPerCm3;
import static connate.quantity.Units.inches;
import static connate.quantity.Units.kgPerM3;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.fault.Nearest;
import connate.las.LasFile;
import connate.las.SharedFiles;
import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Fraction;
import connate.role.Roles;
import connate.series.Series;
import connate.series.Unstated;
import connate.table.Table;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WellTest {

  private static final double NONE = Double.NaN;
  private final List<Caution> heard = new ArrayList<>();

  @BeforeEach
  void listen() {
    Listening.to(
        new Listener() {
          @Override
          public void used(MethodCard card) {
            // not asked here
          }

          @Override
          public void caution(Caution caution) {
            heard.add(caution);
          }
        });
  }

  @AfterEach
  void stopListening() {
    Listening.to(Listener.DEAF);
    Roles.reset();
  }

  /** An invented log, 0.5 m, with a gap in GR at 101.5 and a long gap in RHOB. */
  private static String text() {
    return """
        ~V
        VERS. 2.0 : v
        WRAP. NO : w
        ~W
        STRT.M 100 : s
        STOP.M 103 : s
        STEP.M 0.5 : s
        NULL. -999.25 : n
        WELL. TH-9 : well
        FLD . Tarn Hill (invented) : field
        ~C
        DEPT.M : depth
        GR.GAPI : gamma
        RHOB.G/C3 : density
        NPHI. : neutron
        XYZ.FURLONG : unknown unit
        ~P
        BS.IN 8.5 : bit
        ~A
        100.0 10 2.0 0.1 1
        100.5 20 -999.25 0.2 1
        101.0 30 -999.25 0.3 1
        101.5 -999.25 2.3 0.4 1
        102.0 50 2.4 0.5 1
        102.5 60 2.5 0.6 1
        103.0 70 2.6 0.7 1
        """;
  }

  private static Well well() {
    return Well.of(LasFile.parse("th-9.las", text().getBytes(StandardCharsets.UTF_8)));
  }

  /** By hand: the rows above. */
  @Test
  void curvesHaveUnitsDepthsAndNulls() {
    Well well = well();
    assertEquals("TH-9", well.name());
    assertEquals("Tarn Hill (invented)", well.header("FLD"));
    assertEquals("8.5", well.header("bs"));
    assertEquals("", well.header("NOPE"));
    assertEquals(List.of("GR", "RHOB", "NPHI", "XYZ"), well.names());
    Series gr = well.get("gr");
    assertEquals(gAPI, gr.unit());
    assertArrayEquals(new double[] {10, 20, 30, NONE, 50, 60, 70}, gr.values());
    assertEquals(103, gr.depth().orElseThrow().value(6));
    assertArrayEquals(
        new double[] {2000, NONE, NONE, 2300, 2400, 2500, 2600},
        well.get("RHOB").in(kgPerM3),
        1e-9);
    assertEquals(Unstated.UNIT, well.get("NPHI").unit());
    assertEquals(Unstated.UNIT, well.get("XYZ").unit());
    assertEquals(m(100), well.top());
    assertEquals(m(103), well.base());
    assertEquals(m(0.5), well.step());
    assertEquals(well.depth(), well.get("depth"));
  }

  @Test
  void rolesAreFoundByNameAndUnit() {
    Well well = well();
    assertEquals("RHOB", well.get("bulk density").name());
    assertEquals("GR", well.get("Gamma Ray").name());
    assertEquals("NPHI", well.get("neutron porosity").name());
    assertTrue(well.has("gamma ray"));
    assertFalse(well.has("sonic"));
    assertThrows(IllegalArgumentException.class, () -> well.get("sonic"));
    Roles.add("sonic", "XYZ");
    assertEquals("XYZ", well.get("sonic").name());
    assertEquals("XYZ", well.roles().get("sonic"));
    assertEquals("GR", well.roles().get("gamma ray"));
    assertThrows(IllegalArgumentException.class, () -> Roles.add("colour", "XYZ"));
  }

  @Test
  void severalCurvesForARoleAreTold() {
    String two = text().replace("XYZ.FURLONG", "SGR.GAPI");
    Well well = Well.of(LasFile.parse("a.las", two.getBytes(StandardCharsets.UTF_8)));
    assertEquals("GR", well.get("gamma ray").name());
    assertTrue(heard.stream().anyMatch(c -> c.code().equals("W01") && c.text().contains("SGR")));
  }

  @Test
  void missTellsTheNearestName() {
    String message =
        assertThrows(IllegalArgumentException.class, () -> well().get("RHBO")).getMessage();
    assertEquals(
        "well TH-9 has no curve «RHBO»; nearest is RHOB; there are GR, RHOB, NPHI, XYZ", message);
    assertEquals(1, Nearest.distance("RHBO", "RHOB"));
    assertEquals(3, Nearest.distance("kitten", "sitting"));
  }

  @Test
  void addedCurvesMustFit() {
    Well well = well();
    Series phi = well.get("RHOB").map(connate.quantity.Units.fraction, v -> (2.65 - v) / 1.65);
    well.add("PHI", phi);
    assertEquals(phi.value(3), well.get("phi").value(3));
    assertEquals("PHI", well.get("PHI").name());
    assertEquals("PHI", well.get("porosity").name());
    well.add("PHI", phi.map(v -> v + 0.01));
    assertEquals(phi.value(3) + 0.01, well.get("PHI").value(3));
    assertThrows(IllegalArgumentException.class, () -> well.add("GR", phi));
    assertThrows(IllegalArgumentException.class, () -> well.add("DEPT", phi));
    assertThrows(
        IllegalArgumentException.class,
        () -> well.add("X", Series.of("x", Fraction.DIMENSION.siUnit(), 1, 2)));
    Series moved = phi.atDepth(well.depth().map(d -> d + 0.1));
    assertThrows(IllegalArgumentException.class, () -> well.add("X", moved));
  }

  @Test
  void wellsAndTablesTurnIntoEachOther() {
    Table table = well().table();
    assertEquals(List.of("DEPT", "GR", "RHOB", "NPHI", "XYZ"), table.names());
    assertArrayEquals(well().get("RHOB").values(), table.get("bulk density").values());
    Well back = Well.of("TH-9", table);
    assertEquals(well().names(), back.names());
    assertEquals(gPerCm3, back.get("RHOB").unit());
    assertEquals(103, back.get("GR").depth().orElseThrow().value(6));
  }

  /**
   * By hand: at 100.25 half between 10 and 20; at 101.5 GR lacks one sample, its neighbours are two
   * steps apart, so 40; RHOB lacks two samples, so its neighbours are three steps apart: missing.
   */
  @Test
  void sampledAtOtherDepthsButNeverAcrossGaps() {
    Series depths = Series.of("depth", m, 100.25, 101.5, 100.0, 100.75, 102.25, 99, 104, NONE);
    Well at = well().at(depths);
    assertArrayEquals(
        new double[] {15, 40, 10, 25, 55, NONE, NONE, NONE}, at.get("GR").values(), 1e-12);
    assertArrayEquals(
        new double[] {NONE, 2.3, 2.0, NONE, 2.45, NONE, NONE, NONE},
        at.get("RHOB").values(),
        1e-12);
    assertEquals(gPerCm3, at.get("RHOB").unit());
  }

  /** By hand: 328.9042 ft is 100.25 m. */
  @Test
  void depthsOfAnotherUnitAreConverted() {
    Well at = well().at(Series.of("depth", ft, 100.25 / 0.3048));
    assertEquals(15, at.get("GR").value(0), 1e-9);
    assertEquals(ft, at.depth().unit());
  }

  /** By hand. */
  @Test
  void partsAndResampling() {
    Well part = well().between(m(100.5), m(101.5));
    assertArrayEquals(new double[] {100.5, 101, 101.5}, part.depth().values());
    assertArrayEquals(new double[] {20, 30, NONE}, part.get("GR").values());
    Well in = well().in(new Zone("TH-9", "A", m(100.5), m(101.5)));
    assertArrayEquals(new double[] {100.5, 101}, in.depth().values());
    assertThrows(
        IllegalArgumentException.class, () -> well().in(new Zone("TH-8", "A", m(100.5), m(101.5))));
    Well feet =
        Well.of("F", Series.of("depth", ft, 79.1, 79.3, 79.7))
            .add("X", Series.of("x", gAPI, 1, 2, 3));
    assertEquals(3, feet.between(feet.top(), feet.base()).rows());
    Well even = well().resample(m(0.25));
    assertEquals(13, even.rows());
    assertEquals(15, even.get("GR").value(1), 1e-12);
    assertThrows(IllegalArgumentException.class, () -> well().resample(m(0)));
  }

  /** Independent: a log run upwards samples to the same values. */
  @Test
  void fallingAndUnorderedDepthsSampleAlike() {
    Series depths = Series.of("depth", m, 4, 3, 2, 1, 0);
    Well falling = Well.of("A", depths).add("X", Series.of("x", gAPI, 40, 30, 20, 10, 0));
    Well mixed =
        Well.of("A", Series.of("depth", m, 2, 0, 4, 1, 3, 2))
            .add("X", Series.of("x", gAPI, 20, 0, 40, 10, 30, 99));
    Series wanted = Series.of("depth", m, 0.5, 2, 3.75);
    assertArrayEquals(new double[] {5, 20, 37.5}, falling.at(wanted).get("X").values());
    assertArrayEquals(new double[] {5, 20, 37.5}, mixed.at(wanted).get("X").values());
  }

  @Test
  void showsWhatNeedsALook() {
    String shown = well().toString();
    assertTrue(
        shown.contains("TH-9   7 rows, 100 to 103 m, step 0.5 m, from th-9.las (LAS 2.0)"), shown);
    assertTrue(shown.contains("bulk density"), shown);
    assertTrue(shown.contains("no unit"), shown);
    assertTrue(shown.contains("the same in every row"), shown);
    Well odd = well().add("K", Series.of("k", connate.quantity.Units.mD, 1, 2, 3, 4, 5, -6, 2e5));
    assertTrue(odd.toString().contains("2 outside 0 to 100000 mD"), odd.toString());
  }

  @Test
  void writtenAndReadAgain(@TempDir Path folder) {
    Path path = folder.resolve("out.las");
    Well well =
        well().add("PHI", Series.of("x", connate.quantity.Units.percent, 1, 2, NONE, 4, 5, 6, 7));
    well.writeLas(path);
    Well back = Well.read(path);
    assertEquals("TH-9", back.name());
    assertEquals("Tarn Hill (invented)", back.header("FLD"));
    assertArrayEquals(well.get("PHI").values(), back.get("PHI").values());
    assertEquals(connate.quantity.Units.percent, back.get("PHI").unit());
    assertArrayEquals(well.get("RHOB").values(), back.get("RHOB").values());
    Path own = folder.resolve("own.las");
    Well.of("Made", Series.of("depth", ft, 1, 2))
        .add("CAL", Series.of("c", inches, 8, 9))
        .writeLas(own);
    assertEquals("Made", Well.read(own).name());
    assertEquals(ft, Well.read(own).depth().unit());
    assertEquals(9, Well.read(own).get("caliper").value(1));
  }

  @Test
  void wellsAreReadInTheOrderOfTheirNames(@TempDir Path folder) throws IOException {
    Files.createDirectories(folder.resolve("wells/deep"));
    for (String name : List.of("b.las", "a.LAS", "c.las", "deep/d.las")) {
      String own =
          text()
              .replace(
                  "TH-9", name.replaceAll("\\..*|deep/", "").toUpperCase(java.util.Locale.ROOT));
      Files.writeString(folder.resolve("wells/" + name), own);
    }
    Files.writeString(folder.resolve("wells/notes.txt"), "no log");
    Wells wells = Wells.read(folder, "wells/*.las");
    assertEquals(List.of("A", "B", "C"), wells.names());
    assertEquals(4, Wells.read(folder, "wells/**.las").size());
    assertEquals("B", wells.named("b").name());
    assertTrue(wells.has("c"));
    String miss = assertThrows(IllegalArgumentException.class, () -> wells.named("D")).getMessage();
    assertTrue(miss.contains("there are A, B, C"), miss);
    assertThrows(DataException.class, () -> Wells.read(folder, "none/*.las"));
    Wells.of(wells.named("A"), wells.named("A"));
    assertTrue(heard.stream().anyMatch(c -> c.code().equals("W03")));
    assertTrue(wells.toString().contains("GR RHOB NPHI XYZ"), wells.toString());
  }

  /** Independent: real files; counts and mean stand in the README beside them. */
  @Test
  void realWellsHaveUnitsAndRoles() {
    Well well = Well.read(SharedFiles.of("las-kgs/1046114346.las"));
    assertEquals("Wellington KGS 2-32", well.name());
    assertEquals(81.058, well.get("gamma ray").mean().number(), 0.5e-4);
    assertEquals(gAPI, well.get("GR").unit());
    assertEquals("RHOB", well.get("bulk density").name());
    assertEquals("RT90", well.get("RT90").name());
    assertEquals(ft, well.depth().unit());
    assertTrue(
        heard.stream().anyMatch(c -> c.code().equals("L34") && c.text().contains("line 8359")));
    Well north = Well.read(SharedFiles.of("las-force2020/32_2-1.las"));
    assertEquals("ohm·m", north.get("deep resistivity").unit().symbol());
    assertEquals("DTC", north.get("sonic").name());
  }

  @Test
  void wellsOfOneRowOrNone() {
    Well one = Well.of("A", Series.of("depth", m, 5));
    assertTrue(one.toString().contains("1 rows, 5 to 5 m"), one.toString());
    assertThrows(IllegalArgumentException.class, one::step);
    Well none = Well.of("A", Series.of("depth", m));
    assertTrue(none.toString().contains("0 rows"), none.toString());
    assertThrows(IllegalArgumentException.class, none::top);
  }

  @Test
  void indexThatIsNoDepthIsRefused() {
    String time = text().replace("DEPT.M", "TIME.S").replace("STRT.M", "STRT.S");
    LasFile file = LasFile.parse("t.las", time.getBytes(StandardCharsets.UTF_8));
    DataException refusal = assertThrows(DataException.class, () -> Well.of(file));
    assertEquals("t.las:12:1", refusal.faults().get(0).place());
    String none = text().replace("DEPT.M", "DEPT.").replace("STRT.M", "STRT.");
    LasFile bare = LasFile.parse("t.las", none.getBytes(StandardCharsets.UTF_8));
    assertThrows(DataException.class, () -> Well.of(bare));
    assertEquals(ft, Well.of(bare, ft).depth().unit());
  }
}
