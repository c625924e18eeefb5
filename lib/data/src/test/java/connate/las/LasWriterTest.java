package connate.las;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What goes in comes out: every file is written and read again. */
class LasWriterTest {

  private static LasFile again(LasFile file) {
    return LasFile.parse("b.las", LasWriter.text(file).getBytes(StandardCharsets.US_ASCII));
  }

  /** Independent: the file's own numbers, to the last bit. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "las-ags/00-10-04-081-05W4-0.LAS", "las-force2020/32_2-1.las", "las-kgs/1044782786.las",
        "las-kgs/1044839000.las", "las-kgs/1044859098.las", "las-kgs/1045637598.las",
        "las-kgs/1046102222.las", "las-kgs/1046102494.las", "las-kgs/1046114346.las",
        "las-pechelbronn/Pechelbronn.las"
      })
  void everySharedFileComesBack(String name) {
    LasFile file = LasFile.read(SharedFiles.of(name));
    LasFile back = again(file);
    assertEquals(LasVersion.V2_0, back.version());
    assertArrayEquals(file.index().values(), back.index().values());
    for (LasCurve curve : file.curves()) {
      LasCurve other = back.curve(curve.name().replace(' ', '_')).orElseThrow();
      assertArrayEquals(curve.values(), other.values(), curve.name());
      assertEquals(LasUnits.ascii(curve.unit()), other.unit());
    }
    for (HeaderLine item : file.items(LasSection.Kind.WELL)) {
      if (!List.of("STRT", "STOP", "STEP", "NULL").contains(item.mnemonic())) {
        assertEquals(
            LasWriter.ascii(item.value()).strip(),
            back.item(item.mnemonic()).orElseThrow().value(),
            item.mnemonic());
      }
    }
  }

  /** By hand: the demands of the standard, line by line. */
  @ParameterizedTest
  @ValueSource(
      strings = {"las-kgs/1044839000.las", "las-kgs/1044859098.las", "las-kgs/1046114346.las"})
  void keepsTheStandard(String name) {
    String text = LasWriter.text(LasFile.read(SharedFiles.of(name)));
    assertTrue(text.chars().allMatch(c -> c == '\n' || c >= 32 && c <= 126));
    List<String> titles = text.lines().filter(l -> l.startsWith("~")).toList();
    assertTrue(titles.get(0).startsWith("~V") && titles.get(1).startsWith("~W"));
    assertTrue(titles.get(titles.size() - 1).startsWith("~A "));
    String data = text.substring(text.indexOf("\n~A ") + 1);
    data = data.substring(data.indexOf('\n') + 1);
    assertTrue(data.indexOf('E') < 0 && data.indexOf('e') < 0, "exponents");
    for (String required :
        List.of(
            "STRT", "STOP", "STEP", "NULL", "COMP", "WELL", "FLD", "LOC", "PROV", "SRVC", "DATE",
            "UWI")) {
      assertTrue(text.lines().anyMatch(l -> l.strip().startsWith(required)), required);
    }
  }

  /** By hand. */
  @Test
  void keepsOriginalLinesAndMakesTheBoundsAnew() {
    String text =
        LasWriter.text(LasTextOf.wellWith("LOC .  LSD 3, near C:\\x  :WHERE {free text}"));
    assertTrue(text.contains("\nLOC .  LSD 3, near C:\\x  :WHERE {free text}\n"), text);
    assertTrue(text.contains("STRT.M          100.0"), text);
    assertTrue(text.contains("STEP.M          0.5"), text);
  }

  /** By hand. */
  @Test
  void newColumnsHaveAsciiUnitsAndNames() {
    LasFile head = LasTextOf.text(LasTextOf.plain());
    String text =
        LasWriter.text(
            head,
            List.of(
                LasColumn.of("DEPT", "m", "", 1, 2, 4),
                LasColumn.of("k.h: air", "g/cm³", "a: b", 1e-7, Double.NaN, 1e12),
                LasColumn.of("DEPT", "°C", "", 1, 2, 3),
                LasColumn.of("X", "µs/ft", "", -999.25, -9999, 3),
                new LasColumn("L", "", "", "", null, new String[] {"fine sand", "", "clay"})));
    assertTrue(text.contains("k_h__air.g/cm3"), text);
    assertTrue(text.contains(": a; b"), text);
    assertTrue(text.contains("DEPT_2.degC"), text);
    assertTrue(text.contains("X.us/ft"), text);
    assertTrue(text.contains("STEP.m          0.0"), text);
    assertTrue(text.contains("NULL.           -99999"), text);
    assertTrue(text.contains("\n1.0 0.00000010 1.0 -999.25 fine_sand\n"), text);
    assertTrue(text.contains("\n2.0 -99999.0 2.0 -9999.0 -99999.0\n"), text);
    LasFile back = LasFile.parse("b.las", text.getBytes(StandardCharsets.US_ASCII));
    assertArrayEquals(
        new double[] {1e-7, Double.NaN, 1e12}, back.curve("K_H__AIR").orElseThrow().values());
  }

  @Test
  void columnsMustFit() {
    LasFile head = LasTextOf.text(LasTextOf.plain());
    assertThrows(IllegalArgumentException.class, () -> LasWriter.text(head, List.of()));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            LasWriter.text(
                head, List.of(LasColumn.of("A", "", "", 1), LasColumn.of("B", "", "", 1, 2))));
  }

  @Test
  void tellsWhichDataSetsAreLeftOut() {
    LasFile file = LasFile.read(SharedFiles.of("las-kgs/1046114346.las"));
    assertTrue(LasWriter.text(file).contains("Left out: the data set Tops of version 3.0"));
  }

  @Test
  void fileIsReplacedWholeAndNothingElseIsLeft(@TempDir Path folder) throws IOException {
    LasFile file = LasTextOf.text(LasTextOf.plain());
    Path path = folder.resolve("a.las");
    Files.writeString(path, "old");
    LasWriter.write(path, file, List.of(LasColumn.of("DEPT", "M", "", 1, 2)));
    assertEquals(2, LasFile.read(path, LasOptions.STRICT).rows());
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(1, files.count());
    }
    assertThrows(
        UncheckedIOException.class,
        () ->
            LasWriter.write(
                folder.resolve("no/such/a.las"),
                file,
                List.of(LasColumn.of("DEPT", "M", "", 1, 2))));
  }
}
