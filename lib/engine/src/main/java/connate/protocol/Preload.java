package connate.protocol;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The imports that every workbook and every console has without asking. */
public final class Preload {

  private static final List<String> IMPORTS = load();

  private Preload() {}

  /** Returns the imports: {@code java.util.*}, {@code static connate.quantity.Units.*}. */
  public static List<String> imports() {
    return IMPORTS;
  }

  private static List<String> load() {
    try (InputStream in = Preload.class.getResourceAsStream("preload.txt")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines()
          .map(String::strip)
          .filter(line -> !line.isEmpty() && !line.startsWith("#"))
          .filter(Preload::exists)
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A package of the library that this installation leaves out is no error. */
  private static boolean exists(String line) {
    if (line.startsWith("java.")) {
      return true;
    }
    boolean member = line.startsWith("static ");
    String name = line.replace("static ", "").replace(".*", "").replace('.', '/');
    String resource = member ? name + ".class" : name;
    return Preload.class.getClassLoader().getResource(resource) != null;
  }
}
