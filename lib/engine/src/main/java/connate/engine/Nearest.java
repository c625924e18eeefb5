package connate.engine;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/** Finds the name that somebody may have meant. */
final class Nearest {

  private Nearest() {}

  /** Returns a way out for a file that is not there. */
  static String file(Path wanted) {
    String name = wanted.getFileName().toString();
    try (Stream<Path> files = Files.list(wanted.getParent())) {
      List<String> names = files.map(p -> p.getFileName().toString()).sorted().toList();
      return of(name, names).map(n -> "did you mean «" + n + "»?").orElse("check name and folder");
    } catch (IOException e) {
      return "the folder " + wanted.getParent().getFileName() + " is not there either";
    }
  }

  /** Returns the nearest of some names, where one is near. */
  static Optional<String> of(String wanted, List<String> names) {
    String low = wanted.toLowerCase(Locale.ROOT);
    int most = Math.max(2, wanted.length() / 3);
    return names.stream()
        .filter(n -> connate.fault.Nearest.distance(low, n.toLowerCase(Locale.ROOT)) <= most)
        .min(
            Comparator.comparingInt(
                n -> connate.fault.Nearest.distance(low, n.toLowerCase(Locale.ROOT))));
  }
}
