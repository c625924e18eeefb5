package connate.calibration;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;

/** Values that base R gave; the script that made them lies beside them. */
final class Reference {

  private static final Map<String, Double> VALUES = read();

  private Reference() {}

  static double of(String name) {
    return Objects.requireNonNull(VALUES.get(name), "no reference value " + name);
  }

  private static Map<String, Double> read() {
    Map<String, Double> values = new HashMap<>();
    try (var in =
        new BufferedReader(
            new InputStreamReader(
                Objects.requireNonNull(Reference.class.getResourceAsStream("reference.csv")),
                StandardCharsets.UTF_8))) {
      in.lines()
          .skip(1)
          .map(line -> line.split(","))
          .forEach(cells -> values.put(cells[0], Double.valueOf(cells[1])));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return values;
  }
}
