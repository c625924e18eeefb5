package connate.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.protocol.Item;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class ItemTextTest {

  private static final Item.Grid GRID =
      new Item.Grid(
          "plugs",
          List.of(
              new Item.Head("well", "", false),
              new Item.Head("porosity", "%", true),
              new Item.Head("k_air", "mD", true)),
          List.of(List.of("TH-1", "18.4", "96.2"), List.of("TH-3", "7", "0.1")),
          214,
          List.of("2 zeros in k_air"));

  @Test
  void tableIsAligned() {
    assertEquals(
        List.of(
            "plugs",
            "  well  porosity  k_air",
            "               %     mD",
            "  TH-1      18.4   96.2",
            "  TH-3         7    0.1",
            "  … 212 more rows",
            "  2 zeros in k_air"),
        new ItemText(80, Ink.none()).lines(GRID));
  }

  @Test
  void narrowTerminalNamesTheColumnsThatDoNotFit() {
    List<String> lines = new ItemText(20, Ink.none()).lines(GRID);
    assertTrue(lines.contains("  … 1 more columns: k_air"), lines.toString());
    assertTrue(lines.stream().limit(5).allMatch(l -> l.length() <= 20), lines.toString());
  }

  @Test
  void controlCharactersDoNotReachTheTerminal() {
    String line = new ItemText(80, Ink.none()).lines(new Item.Text("a\u001b[2Jb\u0007")).get(0);
    assertFalse(line.contains("\u001b"));
    assertFalse(line.contains("\u0007"));
  }

  @Test
  void colourIsRuledOut() {
    assertTrue(Ink.of(Map.of("TERM", "xterm"), true, true).isOn());
    assertFalse(Ink.of(Map.of("NO_COLOR", "1"), true, true).isOn());
    assertTrue(Ink.of(Map.of("NO_COLOR", ""), true, true).isOn());
    assertFalse(Ink.of(Map.of("TERM", "dumb"), true, true).isOn());
    assertFalse(Ink.of(Map.of(), false, true).isOn());
    assertEquals("x", Ink.none().error("x"));
  }
}
