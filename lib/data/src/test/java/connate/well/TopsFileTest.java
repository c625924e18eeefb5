package connate.well;

import static connate.quantity.Units.fraction;
import static connate.quantity.Units.ft;
import static connate.quantity.Units.m;
import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.las.SharedFiles;
import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class TopsFileTest {

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
  }

  /** By hand: rows of two real files (USGS DDS-33, Higley, Pantea and Slatt 1997). */
  @Test
  void feetAndPercentOrMetresAndFractions() {
    TopsFile feet = TopsFile.read(SharedFiles.of("usgs-sussex/4900521053.tops"));
    assertEquals("4900521053", feet.name());
    assertEquals(ft, feet.unit());
    assertEquals("5095.00 FT", feet.header("gl"));
    assertEquals(ft(8125), feet.tops().depth("4900521053", "Ardmore"));
    assertEquals(30, feet.logs().get("Porosity").size());
    assertEquals(percent, feet.logs().get("Porosity").unit());
    TopsFile metres = TopsFile.read(SharedFiles.of("usgs-sussex/4900525210.tops"));
    assertEquals(m, metres.unit());
    assertEquals(fraction, metres.logs().get("Porosity").unit());
    assertEquals(0.085, metres.well("Porosity").get("Porosity").value(0));
    assertEquals(2, heard.stream().filter(c -> c.code().equals("W42")).count());
    assertTrue(heard.stream().anyMatch(c -> c.code().equals("W23")), "absent tops");
    assertEquals(4, feet.tops().zones("4900521053").size());
    assertEquals(2, heard.stream().filter(c -> c.code().equals("W21")).count());
  }

  /** By hand: the file has -0.010 at 2490.22 m. */
  @Test
  void negativePorosityIsMissingAndTold() {
    TopsFile file = TopsFile.read(SharedFiles.of("usgs-sussex/4900524276.tops"));
    assertTrue(Double.isNaN(file.logs().get("Porosity").value(2)));
    assertTrue(
        heard.stream()
            .anyMatch(c -> c.code().equals("W43") && c.text().contains("-0.01 at 2490.22")));
  }

  /** Independent: in every well porosity is between 0 and 30 % and the depths meet the tops. */
  @Test
  void everyWellOfTheFieldHasSoundNumbers() throws IOException {
    Path folder = SharedFiles.of("usgs-sussex");
    List<Tops> all = new ArrayList<>();
    try (Stream<Path> files = Files.list(folder)) {
      for (Path file : files.filter(f -> f.toString().endsWith(".tops")).sorted().toList()) {
        TopsFile read = TopsFile.read(file);
        all.add(read.tops());
        Well well = read.well("Porosity");
        for (double phi : well.get("porosity").in(fraction)) {
          assertTrue(Double.isNaN(phi) || phi >= 0 && phi < 0.3, file + " " + phi);
        }
        assertTrue(well.top().metres() > 1500 && well.base().metres() < 3500, file.toString());
      }
    }
    assertEquals(27, all.size());
    assertEquals(27, Tops.of(all).wells().size());
  }

  private static TopsFile parse(String text) {
    return TopsFile.parse("a/UWI_12.tops", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void refusalsHaveTheirPlace() {
    assertEquals("12", parse("% UNITS: M\n% Tops\nUpper Sand 12.5\n").name());
    Fault word = fault("% UNITS: M\n% Tops\nSand\tdeep\n");
    assertEquals("a/UWI_12.tops:3:1", word.place());
    assertEquals(1, fault("% Tops\nSand 1\n").line());
    assertEquals(1, fault("% UNITS: LEAGUES\n% Tops\nSand 1\n").line());
    assertEquals(1, fault("Sand 1\n").line());
    assertEquals(2, fault("% UNITS: M\n%\n").line());
    assertThrows(DataException.class, () -> TopsFile.read(Path.of("no-such.tops")));
    assertThrows(IllegalArgumentException.class, () -> parse("% UNITS: M\n").well("Porosity"));
  }

  private static Fault fault(String text) {
    return assertThrows(DataException.class, () -> parse(text)).faults().get(0);
  }
}
