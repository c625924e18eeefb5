package connate.las;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Each code that the reader of LAS or of wells can tell has a page, and each page a code. */
class LasHelpTest {

  private static final Pattern CODE = Pattern.compile("\"([LW]\\d\\d)\"");

  @Test
  void everyCodeHasAPage() throws IOException {
    Set<String> codes = new TreeSet<>();
    for (String folder : new String[] {"las", "well"}) {
      try (Stream<Path> sources = Files.walk(Path.of("src/main/java/connate", folder))) {
        sources.filter(p -> p.toString().endsWith(".java")).forEach(p -> collect(p, codes));
      }
    }
    assertTrue(codes.size() > 40, "only " + codes);
    for (String code : codes) {
      try (InputStream page = LasFile.class.getResourceAsStream("/connate/help/" + code + ".txt")) {
        assertNotNull(page, "no help page for " + code);
        String text = new String(page.readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(text.startsWith(code + ": "), code);
        assertEquals(3, text.strip().split("\n\n").length, code);
      }
    }
    Set<String> pages = new TreeSet<>();
    try (Stream<Path> files = Files.list(Path.of("src/main/resources/connate/help"))) {
      files
          .map(f -> f.getFileName().toString().replace(".txt", ""))
          .filter(f -> f.matches("[LW]\\d\\d"))
          .forEach(pages::add);
    }
    assertEquals(codes, pages);
  }

  private static void collect(Path source, Set<String> codes) {
    try {
      Matcher matcher = CODE.matcher(Files.readString(source));
      while (matcher.find()) {
        codes.add(matcher.group(1));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
