package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.quantity.Units;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;

/** By hand: small spreadsheets, written here part by part. */
class XlsxTest {

  private static Fault fault(byte[] bytes) {
    return assertThrows(DataException.class, () -> Table.read("plugs.xlsx", bytes)).faults().get(0);
  }

  private static TinyXlsx plugs() {
    return new TinyXlsx()
        .sheet(
            "Plugs",
            TinyXlsx.row(1, "Core report 7")
                + TinyXlsx.row(3, "well", "depth [m]", "porosity [%]", "k_air [mD]")
                + TinyXlsx.row(4, "TH-1", "2311.25", "18.4", "9.0E-2")
                + TinyXlsx.row(5, "TH-1", "2312", "", "0.18400000000000002"));
  }

  @Test
  void headerUnitsLinesAndGaps() {
    Table t = Table.read("plugs.xlsx", plugs().bytes());
    assertEquals(List.of("well", "depth", "porosity", "k_air"), t.names());
    assertEquals(Units.percent, t.get("porosity").unit());
    assertEquals(2311.25, t.get("depth").value(0));
    assertEquals(0.09, t.get("k_air").value(0));
    assertEquals(0.18400000000000002, t.get("k_air").value(1));
    assertTrue(Double.isNaN(t.get("porosity").value(1)));
    assertEquals(5, t.line(1));
  }

  @Test
  void sheetsAreNamed() {
    byte[] two =
        plugs().sheet("Logs", TinyXlsx.row(1, "a", "b") + TinyXlsx.row(2, "1", "2")).bytes();
    assertEquals(List.of("a", "b"), Table.read("x.xlsx", two, "Logs").names());
    DataException e = assertThrows(DataException.class, () -> Table.read("x.xlsx", two, "Lgos"));
    assertEquals("T12", e.faults().get(0).code());
    assertTrue(e.getMessage().contains("nearest is Logs; there are Plugs, Logs"), e.getMessage());
  }

  /** A spreadsheet stores what it shows as 18.4 % as 0.184. */
  @Test
  void percentagesAreWhatTheSheetShows() {
    for (String style : new String[] {"#style1", "#style4"}) {
      byte[] bytes =
          new TinyXlsx()
              .sheet(
                  "S",
                  TinyXlsx.row(1, "well", "porosity [%]", "sw", "phi [v/v]")
                      + TinyXlsx.row(2, "A", "0.184" + style, "0.35" + style, "0.184" + style)
                      + TinyXlsx.row(3, "B", "0.07" + style, "0.9" + style, "0.07" + style))
              .bytes();
      Table t = Table.read("x.xlsx", bytes);
      assertEquals(18.4, t.get("porosity").value(0));
      assertEquals(35, t.get("sw").in(Units.percent)[0], 1e-13);
      assertEquals(0.184, t.get("phi").value(0), 1e-16);
    }
  }

  /** Day 45292 is 1 January 2024 in the count from 1900, four years and a day later from 1904. */
  @Test
  void datesAreWords() {
    String rows =
        TinyXlsx.row(1, "date", "time", "v")
            + TinyXlsx.row(2, "45292#style2", "45292.75#style3", "45292");
    Table t = Table.read("x.xlsx", new TinyXlsx().sheet("S", rows).bytes());
    assertEquals("2024-01-01", t.labels("date").label(0));
    assertEquals("2024-01-01T18:00", t.labels("time").label(0));
    assertEquals(45292, t.get("v").value(0));
    Table later = Table.read("x.xlsx", new TinyXlsx().from1904().sheet("S", rows).bytes());
    assertEquals("2028-01-02", later.labels("date").label(0));
  }

  @Test
  void faultsNameTheCell() {
    byte[] bytes =
        new TinyXlsx()
            .sheet(
                "S",
                TinyXlsx.row(1, "well", "depth [m]", "k [mD]")
                    + TinyXlsx.row(2, "A", "1", "12")
                    + TinyXlsx.row(7, "B", "2", "#DIV/0!"))
            .bytes();
    Fault f = fault(bytes);
    assertEquals("T04", f.code());
    assertEquals("plugs.xlsx:7:3", f.place());
    assertTrue(f.message().startsWith("in cell C7 «#DIV/0!»"), f.message());
  }

  @Test
  void entitiesAreRefused() {
    String type = "<!DOCTYPE x [<!ENTITY a \"b\">]>";
    assertEquals(
        "T14", fault(plugs().part("xl/sharedStrings.xml", type + "<sst/>").bytes()).code());
    // pushed behind what a look at the start alone would see
    String far = "<!--" + "z".repeat(200_000) + "-->" + type + "<sst/>";
    assertEquals("T14", fault(plugs().part("xl/sharedStrings.xml", far).bytes()).code());
    String split = "<!--" + "z".repeat(65_536 - 4 - 3 - 4) + "-->" + type + "<sst/>";
    assertEquals("T14", fault(plugs().part("xl/sharedStrings.xml", split).bytes()).code());
  }

  @Test
  void whatInflatesBeyondTheBoundIsRefused() throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      zip.putNextEntry(new ZipEntry("xl/sharedStrings.xml"));
      byte[] blanks = new byte[1 << 20];
      Arrays.fill(blanks, (byte) ' ');
      for (int i = 0; i < 520; i++) {
        zip.write(blanks);
      }
      zip.closeEntry();
    }
    assertTrue(out.size() < 1 << 20, "a small file: " + out.size());
    assertEquals("T13", fault(out.toByteArray()).code());
  }

  @Test
  void rowsBeyondTheBoundAreRefused() {
    String wide = "<row r=\"2\"><c r=\"XFD2\"><v>1</v></c></row>";
    byte[] bytes = new TinyXlsx().sheet("S", TinyXlsx.row(1, "a", "b") + wide).bytes();
    assertEquals("T16", fault(bytes).code());
  }

  @Test
  void otherArchivesAreRefused() {
    assertEquals("T11", fault(TinyXlsx.zip(Map.of("a.txt", "x"))).code());
  }

  /** Whatever is broken in a file, the message is ours: each seed is printed with its file. */
  @Test
  void brokenFilesNeverEscapeAsAnythingElse() {
    byte[] whole = plugs().bytes();
    for (int seed = 0; seed < 400; seed++) {
      byte[] broken = whole.clone();
      Random random = new Random(seed);
      for (int i = 0; i < 4; i++) {
        broken[4 + random.nextInt(broken.length - 4)] = (byte) random.nextInt();
      }
      try {
        Table.read("x.xlsx", broken);
      } catch (DataException e) {
        assertTrue(e.faults().get(0).code().startsWith("T"), "seed " + seed);
      }
    }
  }
}
