package connate.compile;

import java.io.File;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/**
 * The part of a class path that workbooks name. The compiler lists every jar for every import of a
 * whole package, and most jars are libraries' own needs. What compiles against the part compiles
 * the same against the whole; what does not is tried again.
 */
final class LeanPath {

  private static final List<String> NAMED = List.of("connate-", "commons-math3-", "tablesaw-core-");

  private LeanPath() {}

  static String of(String classPath) {
    return Arrays.stream(classPath.split(File.pathSeparator))
        .filter(LeanPath::isNamed)
        .collect(Collectors.joining(File.pathSeparator));
  }

  private static boolean isNamed(String entry) {
    String file = new File(entry).getName();
    return !file.endsWith(".jar") || NAMED.stream().anyMatch(file::startsWith);
  }
}
