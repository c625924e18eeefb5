package connate.cementation;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Objects;

/** Values that SciPy gave; the script that made them lies beside them. */
final class Reference {

  private Reference() {}

  static double of(String name) {
    var resource = Objects.requireNonNull(Reference.class.getResourceAsStream("reference.csv"));
    try (var in = new BufferedReader(new InputStreamReader(resource, StandardCharsets.UTF_8))) {
      return in.lines()
          .filter(line -> line.startsWith(name + ","))
          .mapToDouble(line -> Double.parseDouble(line.substring(name.length() + 1)))
          .findFirst()
          .orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
