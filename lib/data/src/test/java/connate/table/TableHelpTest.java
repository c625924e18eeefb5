package connate.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Each code that the reader of tables can tell has a page, and each page a code. */
class TableHelpTest {

  private static final Pattern CODE = Pattern.compile("\"(T\\d\\d)\"");
  private static final Path PAGES = Path.of("src/main/resources/connate/help");

  @Test
  void everyCodeHasAPage() throws IOException {
    Set<String> codes = new TreeSet<>();
    try (Stream<Path> sources = Files.list(Path.of("src/main/java/connate/table"))) {
      sources.forEach(
          p -> CODE.matcher(text(p)).results().forEach(match -> codes.add(match.group(1))));
    }
    Set<String> pages = new TreeSet<>();
    try (Stream<Path> files = Files.list(PAGES)) {
      files
          .map(f -> f.getFileName().toString().replace(".txt", ""))
          .filter(f -> f.matches("T\\d\\d"))
          .forEach(pages::add);
    }
    assertTrue(codes.size() > 20, "only " + codes);
    assertEquals(codes, pages);
    for (String code : codes) {
      String page = text(PAGES.resolve(code + ".txt"));
      assertTrue(page.startsWith(code + ": "), code);
      assertEquals(3, page.strip().split("\n\n").length, code);
    }
  }

  private static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
