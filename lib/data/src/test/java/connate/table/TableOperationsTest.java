package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** By hand, but where a test says otherwise. */
class TableOperationsTest {

  private static final String[] WORDS = {
    "=SUM(A1)",
    "+N/-S",
    "@x",
    "'=x",
    "''=x",
    "it's",
    "a, b",
    "a \"b\"",
    "two\nlines",
    "µ–é",
    "'",
    "x"
  };

  private static Table read(String text) {
    return Table.read("plugs.csv", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void joinSetsColumnsBesideEachOther() {
    Table plugs = read("well,k [mD]\nB,1\nA,2\nC,3\nB,4\n");
    Table wells = read("well,kb [m],k,operator\nA,25,7,x\nB,31,8,y\n");
    Table both = plugs.join(wells, "well");
    assertEquals(List.of("well", "k", "kb", "k (plugs.csv)", "operator"), both.names());
    assertEquals(31, both.get("kb").value(3));
    assertEquals(Units.m, both.get("kb").unit());
    assertTrue(Double.isNaN(both.get("kb").value(2)));
    assertNull(both.labels("operator").label(2));
    assertEquals(5, both.line(3));
  }

  @Test
  void joinByNumbersMindsTheirUnit() {
    Table logs = read("depth [m],gr [gAPI]\n2438.4,60\n2499.36,70\n");
    Table core = read("depth [ft],k [mD]\n8200,12\n8000,9\n");
    Table both = logs.join(core, "depth");
    assertEquals(9, both.get("k").value(0));
    assertEquals(12, both.get("k").value(1));
  }

  @Test
  void joinRefusesAKeyThatStandsTwice() {
    Table plugs = read("well,k\nA,1\n");
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> plugs.join(read("well,v\nA,1\nB,2\nA,3\n"), "well"));
    assertTrue(e.getMessage().contains("«A» in well twice, in lines 2 and 4"), e.getMessage());
  }

  /** Independent: what is written and read again is the same, bit by bit; the seed is fixed. */
  @Test
  void whatGoesOutComesBackIn() {
    SplittableRandom random = new SplittableRandom(7);
    int rows = 500;
    double[] numbers = new double[rows];
    String[] words = new String[rows];
    for (int row = 0; row < rows; row++) {
      double wild = Double.longBitsToDouble(random.nextLong());
      numbers[row] = row % 7 == 0 || !Double.isFinite(wild) ? Double.NaN : wild;
      words[row] = row % 5 == 0 ? null : WORDS[random.nextInt(WORDS.length)];
    }
    Table table =
        Table.of("t", Series.of("k [1]", Units.mD, numbers), Series.of("v", Units.m, numbers))
            .with("=words, \"all\"", Labels.of("w", words));
    Table again = Table.read("t", table.csv().getBytes(StandardCharsets.UTF_8));
    assertEquals(table.names(), again.names());
    assertEquals(rows, again.rows());
    for (int row = 0; row < rows; row++) {
      assertEquals(numbers[row], again.get("v").value(row), "row " + row);
      assertEquals(words[row], again.labels("=words, \"all\"").label(row), "row " + row);
    }
    assertEquals(Units.mD, again.get("k [1]").unit());
    assertEquals(table.csv(), again.csv());
  }

  @Test
  void emptyRowsComeBackToo() {
    Table one = read("v\n1\nNaN\n3\n");
    assertEquals("v\n1\nNaN\n3\n", one.csv());
    assertEquals("a,b\n1,x\nNaN,\n2,y\n", read("a,b\n1,x\nNaN,\n2,y\n").csv());
  }

  @Test
  void describesWhatAColumnStandsFor() {
    Table t = read("well,Depth [m],k_air [mD],phi,note\nA,1,2,0.1,x\n");
    assertEquals("k_air in mD (permeability)", t.describe("k_air"));
    assertEquals("phi: numbers, no unit (porosity)", t.describe("phi"));
    assertEquals("Depth in m", t.describe("depth"));
    assertEquals("well: words", t.describe("well"));
    assertEquals("note: words", t.describe("note"));
  }

  @Test
  void formulasAreWrittenAsWords() {
    assertTrue(read("w,v\n\"=1+1\",-5\n").csv().contains("'=1+1,-5"));
  }

  @Test
  void writesAFileInOneStep(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("out.csv");
    Files.writeString(file, "old");
    read("depth [m],phi [%]\n2311.25,18.4\n").writeCsv(file);
    assertEquals("depth [m],phi [%]\n2311.25,18.4\n", Files.readString(file));
    try (var files = Files.list(folder)) {
      assertEquals(1, files.count());
    }
  }

  @Test
  void listingTellsWhatNeedsALook() {
    String text = read("well,depth [m],k_air [mD]\nA,1,-5\nB,2,12\nA,1,-5\n").toString();
    assertTrue(
        text.contains("k_air: 2 values outside 0 to 100000 mD, such as -5, in line 2"), text);
    assertTrue(text.contains("1 row is the same as an earlier one, the first in line 4"), text);
  }

  @Test
  void listingShowsNoMoreDigitsThanWereMeasured() {
    Table t =
        read("utm,k [mD]\n5333611.25,1e-16\n").with("third", Series.of("x", Units.number, 1.0 / 3));
    assertTrue(t.toString().contains("5333611.25"), t.toString());
    assertTrue(t.toString().contains("0.333333333"), t.toString());
    assertTrue(!t.toString().contains("0.3333333333"), t.toString());
  }

  @Test
  void repeatsAreCountedOverEveryColumn() {
    StringBuilder text = new StringBuilder("a,b\n");
    for (int i = 0; i < 3000; i++) {
      text.append(i / 2).append(',').append(i % 4 < 2 ? "x" : "x" + i).append('\n');
    }
    // rows 0 and 1 of each four are the same
    Repeats repeats = Repeats.of(read(text.toString()));
    assertEquals(750, repeats.count());
    assertEquals(1, repeats.first());
  }

  /** Whatever is broken in a file, the message is ours; the seed of a failure is in its text. */
  @Test
  void brokenFilesNeverEscapeAsAnythingElse() {
    byte[] whole =
        ("# made up\nwell;depth [m];phi [%];k_air [mD];date\n\"TH-1\";2311,25;18,4;<0.1;1/2\n"
                + "TH-2;2312;7;12 mD;\n\"a\nb\";1.234,5;-999.25;NaN;00123\n")
            .getBytes(StandardCharsets.UTF_8);
    int read = 0;
    for (int seed = 0; seed < 4000; seed++) {
      SplittableRandom random = new SplittableRandom(seed);
      byte[] broken = whole.clone();
      for (int i = 0; i < 1 + seed % 5; i++) {
        int from = random.nextInt(whole.length);
        broken[random.nextInt(broken.length)] =
            seed % 3 == 0 ? (byte) random.nextInt() : whole[from];
      }
      try {
        assertTrue(Table.read("x.csv", broken).toString().startsWith("x.csv: "));
        read++;
      } catch (DataException e) {
        assertTrue(e.faults().get(0).code().startsWith("T"), "seed " + seed);
      } catch (RuntimeException e) {
        throw new AssertionError("seed " + seed, e);
      }
    }
    assertTrue(read > 100, "only " + read + " files were read");
  }
}
