package connate.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class TypingTest {

  private static Typing at(String typed) {
    return Typing.of(typed, typed.length());
  }

  @Test
  void findsTheWordAtTheCursor() {
    assertEquals("ge", at("plugs.ge").typedWord());
    assertTrue(at("tab").first());
    assertFalse(at("var x = tab").first());
    assertEquals("pl", Typing.of("plugs.get", 2).typedWord());
  }

  @Test
  void findsTheTextAtTheCursorAndWhoseItIs() {
    Typing typing = at("show(crossplot(core.get(\"poro");
    assertTrue(typing.text());
    assertEquals("poro", typing.typedWord());
    assertEquals("get", typing.call());
    assertEquals("where", at("core.where(\"well\", \"TH").call());
    assertFalse(at("table(\"a\\\"b\")").text());
    assertFalse(at("x // it's \"open").text());
  }

  @Test
  void looksAtTheLastOfSeveralCommands() {
    assertEquals("var b = a.", at("var a = 1;\nvar b = a.").command());
    assertTrue(at("var a = 1;\nta").first());
  }

  @Test
  void knowsWhereAnArgumentComes() {
    assertTrue(at("mD(").atArgument());
    assertTrue(at("f(1, ").atArgument());
    assertFalse(at("f(1").atArgument());
  }
}
