package connate.check;

import com.tngtech.archunit.core.domain.JavaClass;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * The modules from the science up to the console, each with the libraries that it alone brings in.
 * A module may use those of every module before it.
 */
enum Module {
  ROCK("org.apache.commons.math3"),
  DATA(
      "tech.tablesaw",
      "it.unimi.dsi.fastutil",
      "de.siegmar.fastcsv",
      "org.dhatim.fastexcel",
      // the archive under a spreadsheet, walked as its reader walks it
      "org.apache.commons.compress"),
  FIGURE("org.knowm.xchart", "java.awt", "javax.imageio"),
  ENGINE("org.objectweb.asm"),
  KERNEL(
      "com.fasterxml.jackson.core",
      "org.commonmark",
      "org.owasp.encoder",
      "javax.tools",
      "javax.lang.model",
      "com.sun.source",
      "jdk.jshell"),
  CONSOLE("org.jline", "picocli");

  /** What any module may use: the core of the JDK, without screen, compiler or XML. */
  private static final Set<String> EVERYWHERE =
      ModuleLayer.boot().findModule("java.base").orElseThrow().getPackages();

  /** Where a class lies: in a module's folder, in its jar, or in a fixture named after it. */
  private static final Pattern PLACE =
      Pattern.compile(
          "(?:/check/wrong/|/connate-|/lib/)(rock|data|figure|engine|kernel|console)[-/]");

  private final List<String> libraries;

  Module(String... libraries) {
    this.libraries = List.of(libraries);
  }

  /** The module that a class of ours belongs to. */
  static Module of(JavaClass type) {
    String place = type.getSource().orElseThrow().getUri().toString();
    Matcher matcher = PLACE.matcher(place);
    Module found = null;
    while (matcher.find()) {
      found = valueOf(matcher.group(1).toUpperCase(Locale.ROOT));
    }
    if (found == null) {
      throw new IllegalStateException("no module for " + place);
    }
    return found;
  }

  /** Whether a class of this module may depend on the target, a class of ours or of a library. */
  boolean maySee(JavaClass target) {
    String packageName = target.getPackageName();
    if (House.isOurs(target)) {
      Module other = of(target);
      boolean wall = ordinal() > ENGINE.ordinal() && other == ENGINE;
      return other.ordinal() <= ordinal() && (!wall || packageName.equals("connate.protocol"));
    }
    if (packageName.isEmpty() || EVERYWHERE.contains(packageName)) {
      return true;
    }
    return Stream.of(values())
        .filter(module -> module.ordinal() <= ordinal())
        .flatMap(module -> module.libraries.stream())
        .anyMatch(library -> (packageName + ".").startsWith(library + "."));
  }
}
