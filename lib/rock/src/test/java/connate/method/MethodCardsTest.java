package connate.method;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.reflect.Method;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * The catalogue is complete, each method has a check that is more than a regression, and the page
 * {@code METHODS.md} says so. To write the page anew: {@code mvn -Dfast -pl lib/rock test
 * -Dtest=MethodCardsTest -Dmethods.write=true}.
 */
class MethodCardsTest {

  private static final Pattern CARD =
      Pattern.compile("public static final MethodCard [A-Z_0-9]+ =");

  private static Path module() {
    Path here = Path.of("").toAbsolutePath();
    return Files.isDirectory(here.resolve("lib/rock")) ? here.resolve("lib/rock") : here;
  }

  private static String read(Path file) {
    try {
      return Files.readString(file, StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static List<Path> sources(String folder) throws IOException {
    try (Stream<Path> all = Files.walk(module().resolve(folder))) {
      return all.filter(p -> p.toString().endsWith(".java")).sorted().toList();
    }
  }

  private static String className(Path file, String folder) {
    String path = module().resolve(folder).relativize(file).toString();
    return path.substring(0, path.length() - 5).replace('/', '.').replace('\\', '.');
  }

  @Test
  void everyClassWithACardIsListed() throws IOException {
    String folder = "src/main/java";
    Set<String> found = new TreeSet<>();
    for (Path file : sources(folder)) {
      if (CARD.matcher(read(file)).find()) {
        found.add(className(file, folder));
      }
    }
    assertEquals(new ArrayList<>(found), MethodCards.classes(), "methods.txt, sorted and complete");
    assertTrue(MethodCards.all().size() >= found.size());
  }

  /** Which checks there are, by method, as the tests' annotations say. */
  private static Map<String, Map<Kind, Set<String>>> checks() throws Exception {
    Map<String, Map<Kind, Set<String>>> checks = new TreeMap<>();
    String folder = "src/test/java";
    for (Path file : sources(folder)) {
      if (read(file).contains("@Check(")) {
        for (Method test : Class.forName(className(file, folder)).getDeclaredMethods()) {
          for (Check check : test.getAnnotationsByType(Check.class)) {
            checks
                .computeIfAbsent(check.method(), m -> new TreeMap<>())
                .computeIfAbsent(check.kind(), k -> new TreeSet<>())
                .add(check.source());
          }
        }
      }
    }
    return checks;
  }

  @Test
  void everyMethodHasACheckThatIsMoreThanARegression() throws Exception {
    Map<String, Map<Kind, Set<String>>> checks = checks();
    List<String> unchecked = new ArrayList<>();
    for (MethodCard card : MethodCards.all()) {
      Set<Kind> kinds = EnumSet.noneOf(Kind.class);
      kinds.addAll(checks.getOrDefault(card.id(), Map.of()).keySet());
      kinds.remove(Kind.REGRESSION);
      if (kinds.isEmpty()) {
        unchecked.add(card.id());
      }
    }
    assertEquals(List.of(), unchecked, "methods without a published, independent or hand check");
    Set<String> unknown = new TreeSet<>(checks.keySet());
    MethodCards.all().forEach(card -> unknown.remove(card.id()));
    assertEquals(Set.of(), unknown, "checks of methods that are not there");
  }

  @Test
  void pageIsUpToDate() throws Exception {
    String page = page(checks());
    Path file = module().resolve("METHODS.md");
    if (Boolean.getBoolean("methods.write")) {
      Files.writeString(file, page, StandardCharsets.UTF_8);
    }
    assertEquals(page, read(file), "METHODS.md is stale; the class comment says how to renew it");
  }

  private static String page(Map<String, Map<Kind, Set<String>>> checks) {
    StringBuilder out = new StringBuilder("# Published methods\n\n");
    out.append("Made from the cards and the tests; do not edit. *Constants*: whether somebody read")
        .append(
            " them in a source. *Checked*: what a test compares with, besides regressions.\n\n");
    out.append("| method | equation | source | constants | checked |\n|---|---|---|---|---|\n");
    for (MethodCard card : MethodCards.all()) {
      out.append("| ").append(cell(card.title())).append(" (`").append(card.id()).append("`) | ");
      out.append(cell(card.equation())).append(" | ").append(cell(card.source())).append(" | ");
      out.append(card.constants()).append(" | ");
      out.append(cell(told(checks.getOrDefault(card.id(), Map.of())))).append(" |\n");
    }
    return out.toString();
  }

  private static String told(Map<Kind, Set<String>> checks) {
    List<String> lines = new ArrayList<>();
    checks.forEach(
        (kind, sources) ->
            lines.add(
                kind.name().toLowerCase(java.util.Locale.ROOT).replace('_', ' ')
                    + ": "
                    + String.join("; ", sources)));
    return String.join(". ", lines);
  }

  private static String cell(String text) {
    return text.replace("|", "\\|").replace("\n", " ");
  }

  @Test
  void wordsFindMethods() {
    assertEquals("timur", MethodCards.find("timur").get(0).id());
    assertTrue(
        MethodCards.find("gas slip").stream().anyMatch(card -> card.id().equals("klinkenberg")));
    assertTrue(MethodCards.find("zebra").isEmpty());
    assertFalse(MethodCards.find("porosity sandstone").isEmpty());
    assertTrue(MethodCards.card("Timur").toString().contains("Source: Timur (1968)"));
    var e = assertThrows(IllegalArgumentException.class, () -> MethodCards.card("timmur"));
    assertTrue(e.getMessage().contains("nearest is timur"), e.getMessage());
  }
}
