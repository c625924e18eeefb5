package connate.well;

import static connate.quantity.Units.ft;
import static connate.quantity.Units.gAPI;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.las.SharedFiles;
import connate.layers.Layers;
import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.series.Labels;
import connate.series.Series;
import connate.table.Table;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class TopsTest {

  private final List<String> heard = new ArrayList<>();

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
            heard.add(caution.code());
          }
        });
  }

  @AfterEach
  void stopListening() {
    Listening.to(Listener.DEAF);
  }

  private static Tops tops(Object... cells) {
    int rows = cells.length / 3;
    String[] wells = new String[rows];
    String[] names = new String[rows];
    double[] depths = new double[rows];
    for (int i = 0; i < rows; i++) {
      wells[i] = (String) cells[3 * i];
      names[i] = (String) cells[3 * i + 1];
      depths[i] = ((Number) cells[3 * i + 2]).doubleValue();
    }
    return Tops.of(
        Labels.of("well", wells), Labels.of("top", names), Series.of("depth", m, depths));
  }

  private static Well log(String name, double top, double base) {
    return Well.of(name, Series.of("depth", m, top, (top + base) / 2, base))
        .add("GR", Series.of("gr", gAPI, 10, 20, 30));
  }

  /** By hand: rows without order. */
  @Test
  void zonesReachToTheNextTopWhateverTheOrderOfRows() {
    Tops tops =
        tops(
            "A", "Shale", 120, "A", "Sand", 100, "B", "Sand", 90, "A", "Lime", 150, "B", "Shale",
            95);
    List<Zone> zones = tops.zones(log("A", 80, 200));
    assertEquals(
        List.of(
            "Sand in A, 100 m to 120 m", "Shale in A, 120 m to 150 m", "Lime in A, 150 m to 200 m"),
        zones.stream().map(Zone::toString).toList());
    assertEquals(m(20), zones.get(0).thickness());
    assertEquals(2, tops.zones("a").size());
    assertEquals(m(95), tops.depth("b", "SHALE"));
    assertEquals(List.of("A", "B"), tops.wells());
    assertEquals(List.of("Sand", "Shale", "Lime"), tops.names());
    assertEquals(m(120), tops.zone(log("A", 80, 200), "shale").top());
    assertEquals(List.of(), heard);
  }

  @Test
  void deepestTopOpensNoZoneBelowTheLogOrWhenItIsABase() {
    assertEquals(1, tops("A", "Sand", 100, "A", "Lime", 150).zones(log("A", 80, 140)).size());
    assertEquals(1, tops("A", "Sand", 100, "A", "Base", 150).zones(log("A", 80, 200)).size());
  }

  @Test
  void absentEqualDoubledAndInvertedTopsAreTold() {
    Tops absent = tops("A", "Sand", 100, "A", "Shale", -999.25, "A", "Lime", Double.NaN);
    assertEquals(List.of("W23"), heard);
    assertEquals(List.of("Sand"), absent.names());
    heard.clear();
    Tops equal = tops("A", "Sand", 100, "A", "Shale", 100, "A", "Lime", 130);
    assertEquals(List.of("Shale"), equal.zones("A").stream().map(Zone::name).toList());
    assertEquals(List.of("W21"), heard);
    heard.clear();
    tops("A", "Sand", 100, "A", "Shale", 120, "B", "Shale", 80, "B", "Sand", 90);
    assertEquals(List.of("W22"), heard);
    heard.clear();
    tops("A", "Sand", 100, "A", "Sand", 120);
    assertEquals(List.of("W24"), heard);
  }

  @Test
  void missesTellWhatThereIs() {
    Tops tops = tops("TH-1", "Sand", 100, "TH-1", "Shale", 120);
    String well =
        assertThrows(IllegalArgumentException.class, () -> tops.zones("TH-2")).getMessage();
    assertTrue(well.contains("nearest is TH-1"), well);
    String top =
        assertThrows(IllegalArgumentException.class, () -> tops.depth("TH-1", "Sant")).getMessage();
    assertTrue(top.contains("nearest is Sand"), top);
    assertThrows(IllegalArgumentException.class, () -> tops.zone(log("TH-1", 1, 2), "Lime"));
    assertThrows(IllegalArgumentException.class, () -> new Zone("A", "x", m(2), m(2)));
  }

  /** By hand: tops in the file. */
  @Test
  void topsOfAVersion3File() {
    Well well = Well.read(SharedFiles.of("las-kgs/1046114346.las"));
    Tops tops = Tops.of(well);
    assertEquals(17, tops.names().size());
    assertEquals(ft(140), tops.depth("Wellington KGS 2-32", "Wellington"));
    Zone last = tops.zone(well, "Mississippian");
    assertEquals(ft(3658), last.top());
    assertEquals(ft(3870), last.base());
    assertThrows(IllegalArgumentException.class, () -> Tops.of(log("A", 1, 2)));
  }

  @Test
  void layersOfWellsAndTops() {
    Layers layers =
        Layers.of(
            Wells.of(log("A", 80, 200), log("C", 80, 200)),
            tops("A", "Sand", 100, "A", "Shale", 120, "A", "Base", 150, "B", "Sand", 3));
    assertEquals(2, layers.layers().size());
  }

  /** By hand: rows of a table as a workbook reads it. */
  @Test
  void topsOfATable() {
    String csv = "well,zone,top [ft]\nA,Sand,100\nA,Shale,\nA,Base,150\n";
    Table table = Table.read("tops.csv", csv.getBytes(StandardCharsets.UTF_8));
    Tops tops = Tops.of(table);
    assertEquals(ft(150), tops.depth("A", "Base"));
    assertEquals(List.of("W23"), heard);
    assertEquals(1, Layers.of(Wells.of(log("A", 20, 60)), table).layers().size());
  }

  @Test
  void listing() {
    String shown = tops("A", "Sand", 100, "B", "Sand", 90, "A", "Lime", 120).toString();
    assertTrue(shown.contains("tops of 2 wells"), shown);
  }
}
