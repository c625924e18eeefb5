package connate.console;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The page that explains the code of a fault or a caution, such as {@code T03}. */
final class HelpPages {

  private HelpPages() {}

  static Optional<List<String>> of(String code) {
    String wanted = code.strip().toUpperCase(Locale.ROOT);
    if (!wanted.matches("[A-Z][0-9]{2}")) {
      return Optional.empty();
    }
    try (InputStream in = HelpPages.class.getResourceAsStream("/connate/help/" + wanted + ".txt")) {
      return in == null
          ? Optional.empty()
          : Optional.of(
              new String(in.readAllBytes(), StandardCharsets.UTF_8).strip().lines().toList());
    } catch (IOException e) {
      return Optional.empty();
    }
  }
}
