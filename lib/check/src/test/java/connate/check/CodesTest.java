package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Each code of a fault or a caution has a page that explains it. */
class CodesTest {

  private static final Pattern CODE = Pattern.compile("\"([A-Z][0-9]{2})\"");

  private static Path lib() {
    Path at = Path.of("").toAbsolutePath();
    while (!Files.isDirectory(at.resolve("lib/rock"))) {
      at = at.getParent();
    }
    return at.resolve("lib");
  }

  @Test
  void everyCodeHasAPage() throws IOException {
    Set<String> without = new TreeSet<>();
    int seen = 0;
    try (Stream<Path> files = Files.walk(lib())) {
      for (Path file : files.filter(CodesTest::isMainSource).toList()) {
        Matcher codes = CODE.matcher(Files.readString(file, StandardCharsets.UTF_8));
        while (codes.find()) {
          seen++;
          String page = "/connate/help/" + codes.group(1) + ".txt";
          if (CodesTest.class.getResource(page) == null) {
            without.add(codes.group(1) + " in " + file.getFileName());
          }
        }
      }
    }
    assertTrue(seen > 80, "saw only " + seen + " codes");
    assertEquals(Set.of(), without);
  }

  private static boolean isMainSource(Path file) {
    String path = file.toString().replace('\\', '/');
    return path.endsWith(".java") && path.contains("/src/main/");
  }
}
