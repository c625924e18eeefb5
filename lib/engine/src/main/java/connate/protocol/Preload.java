package connate.protocol;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.zip.ZipFile;

/** The imports that every workbook and every console has without asking. */
public final class Preload {

  private Preload() {}

  /**
   * Returns the imports, such as {@code java.util.*} and {@code static connate.quantity.Units.*}. A
   * package of the library that the class path leaves out is no error.
   */
  public static List<String> imports(String classPath) {
    List<Path> places =
        Arrays.stream(classPath.split(File.pathSeparator))
            .map(Path::of)
            .filter(Preload::isOurs)
            .toList();
    List<String> found = new ArrayList<>();
    List<String> missing = new ArrayList<>(lines());
    for (Path place : places) {
      try (ZipFile jar = Files.isDirectory(place) ? null : new ZipFile(place.toFile())) {
        missing.removeIf(line -> isIn(jar, place, line) && found.add(line));
      } catch (IOException e) {
        throw new UncheckedIOException("cannot read " + place, e);
      }
    }
    return lines().stream().filter(l -> l.startsWith("java.") || found.contains(l)).toList();
  }

  private static boolean isOurs(Path place) {
    Path name = place.getFileName();
    boolean jar = name != null && name.toString().startsWith("connate-");
    return jar && Files.isRegularFile(place) || Files.isDirectory(place);
  }

  private static boolean isIn(ZipFile jar, Path place, String line) {
    String name = line.replace("static ", "").replace(".*", "").replace('.', '/');
    String entry = name + (line.startsWith("static ") ? ".class" : "/");
    return jar == null ? Files.exists(place.resolve(entry)) : jar.getEntry(entry) != null;
  }

  private static List<String> lines() {
    try (InputStream in = Preload.class.getResourceAsStream("preload.txt")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines()
          .map(String::strip)
          .filter(line -> !line.isEmpty() && !line.startsWith("#"))
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
