package connate.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import jdk.jshell.JShell;
import jdk.jshell.SourceCodeAnalysis;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Checks how a workbook is cut, against the JDK's own shell where that has an opinion. */
class WorkbookTest {

  private static Workbook parse(String text) {
    return Workbook.parse("w.jsh", Path.of(""), text);
  }

  private static List<String> codes(String text) {
    return parse(text).commands().stream().map(Command::code).toList();
  }

  /** By hand: prose parts steps, a blank line inside prose stays, comments belong to commands. */
  @Test
  void proseMakesSteps() {
    Workbook workbook =
        parse(
            "// licence\n/// # Title\n///   indented\n\n/// more\n\n// why\nvar a = 1; // so\na\n/// end");
    assertEquals(2, workbook.steps().size());
    Step first = workbook.steps().get(0);
    assertEquals("# Title\n  indented\n\nmore", first.prose());
    assertEquals(2, first.proseLine());
    assertEquals("// why\nvar a = 1; // so", first.commands().get(0).source());
    assertEquals("var a = 1;", first.commands().get(0).code());
    assertEquals(7, first.commands().get(0).firstLine());
    assertEquals("end", workbook.steps().get(1).prose());
    assertTrue(workbook.steps().get(1).commands().isEmpty());
  }

  /** By hand: what looks like prose inside a text or a body is none. */
  @Test
  void slashesInsideACommandAreNoProse() {
    assertEquals(1, parse("var t = \"\"\"\n/// text\n\"\"\";").commands().size());
    assertEquals(1, parse("int f() {\n/// inside\nreturn 1;\n}").commands().size());
    assertEquals(1, parse("/*\n/// inside\n*/ var x = 1;").commands().size());
  }

  /** By hand: any line end, a byte order mark, and places counted from 1. */
  @Test
  void lineEndsAndMarksDoNotMatter() {
    for (String end : List.of("\n", "\r\n", "\r")) {
      Workbook workbook = parse("\uFEFFvar a = 1;" + end + end + "  a + 1" + end);
      Command second = workbook.commands().get(1);
      assertEquals(
          List.of(3, 3, 3), List.of(second.firstLine(), second.lastLine(), second.column()));
      assertEquals("a + 1", second.code());
      assertEquals(1, workbook.lineAt(0));
      assertEquals(3, workbook.lineAt(second.offset()));
      assertEquals(3, workbook.columnAt(second.offset()));
    }
  }

  /** By hand: a bracket that stays open takes no more than its own paragraph with it. */
  @Test
  void unfinishedCommandsEndWithTheirParagraph() {
    List<Command> commands = parse("var a = f(1;\n\nvar b = 2;\n/// p\n)\nvar c").commands();
    assertEquals(Command.Kind.UNFINISHED, commands.get(0).kind());
    assertEquals("var b = 2;", commands.get(1).code());
    assertEquals(Command.Kind.UNFINISHED, commands.get(2).kind());
    assertEquals("var c", commands.get(3).code());
  }

  /** By hand: a line that begins with an operator goes on with the one before. */
  @Test
  void operatorsCarryOn() {
    assertEquals(List.of("a\n  + b", "++c", "(d)"), codes("a\n  + b\n++c\n(d)"));
    assertEquals(List.of("x\n .y()", "z"), codes("x\n .y()\nz"));
    assertEquals(List.of("var a = c ?\n 1\n : 2"), codes("var a = c ?\n 1\n : 2"));
  }

  static Stream<String> commands() {
    return Stream.of(
        "var a = 1;",
        "int b = 2, c[] = {1, 2};",
        "a + b",
        "if (a > 1)\n  f(a);\nelse { b = 3; }",
        "for (int i = 0; i < 3; i++) a += i;",
        "do { a--; } while (a > 0);",
        "for (;;)\n  f();",
        "try { f(); }\ncatch (Exception e) {\n}\nfinally { }",
        "record P(int x, int y) {}",
        "public static <T extends Comparable<T>> T max(List<? super T> x)\n{\n  return null;\n}",
        "Map<String, List<int[]>> mm = new HashMap<>();",
        "a < b",
        "java.util.List<String> z;",
        "String t = \"\"\"\n   ; } {\n   \"\"\";",
        "outer: for (;;) { break outer; }",
        "sealed interface S permits A {}",
        "class A\n  extends B {\n}",
        "enum E { A, B; }",
        "var f = switch (a) { case 1 -> \"x\"; default -> { yield \"y\"; } };",
        "list.stream()\n    .map(x -> { return x; })\n    .toList()",
        "a = 5",
        "++a",
        "x[0] = 3",
        "int[] q = {1,2,3}",
        "new Object() { int n; }.n",
        "while (true)\n  ;",
        "throw new E(\"x\");",
        "@Deprecated\nint old() { return 1; }",
        "import java.util.*;",
        "char c = '\"';",
        "String s = \"a\\\"b{\";",
        "@interface Mark { int value() default 1; }",
        "f(\n  1,\n  2\n)",
        "switch (a) { case 1: f(); break; default: }",
        "synchronized (this) { f(); }",
        "Function<Integer, Integer> g = x -> {\n  return x;\n};",
        "1e-3",
        "0x1p-3",
        "a >>> 2",
        "final int k = 3;",
        "int größe = 1;",
        "return_ = 1",
        "record_ + 1",
        "int[][] g = {{1}, {2}};");
  }

  /** Independent: the JDK's shell calls each of these one complete command, and so do we. */
  @ParameterizedTest
  @MethodSource("commands")
  void agreesWithTheShell(String command) {
    Workbook workbook = parse("var before = 0;\n" + command + "\nvar after = 1;");
    assertEquals(List.of("var before = 0;", command, "var after = 1;"), codes(workbook.text()));
    try (JShell shell = JShell.builder().executionEngine("local").build()) {
      SourceCodeAnalysis.CompletionInfo info =
          shell.sourceCodeAnalysis().analyzeCompletion(workbook.commands().get(1).closedCode());
      assertTrue(info.completeness().isComplete(), info.completeness().toString());
      assertEquals("", info.remaining().strip());
    }
  }

  /** Independent: half of a command is none to the JDK's shell, nor to us. */
  @ParameterizedTest
  @MethodSource("commands")
  void halfACommandGoesOn(String command) {
    String[] lines = command.split("\n");
    for (int n = 1; n < lines.length; n++) {
      String part = String.join("\n", List.of(lines).subList(0, n));
      assertEquals(command, codes(part + "\n" + command.substring(part.length() + 1)).get(0));
    }
  }

  /** By hand: ten thousand lines are cut in well under a second. */
  @Test
  void longWorkbooksAreCutFast() {
    String text = "/// p\nvar a = f(1, 2); // c\nif (a > 1) { f(a); }\n".repeat(10_000);
    long start = System.nanoTime();
    assertEquals(20_000, parse(text).commands().size());
    assertTrue(System.nanoTime() - start < 5e9);
  }
}
