package connate.check;

import static java.util.stream.Collectors.groupingBy;
import static java.util.stream.Collectors.mapping;
import static java.util.stream.Collectors.toCollection;
import static java.util.stream.Collectors.toSet;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaModifier;
import java.io.IOException;
import java.net.URI;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;

/**
 * A user's commands see all packages of the library at once, beside {@code java.lang} and {@code
 * java.util}: a simple name must mean one class.
 */
class NamesTest {

  @Test
  void publicNamesAreUnique() {
    assertTrue(House.CLASSES.size() >= House.CLASSES_AT_LEAST, "saw only " + House.CLASSES.size());
    assertEquals(Map.of(), shared(House.CLASSES));
  }

  @Test
  void publicNamesAreNotThoseOfJava() throws IOException {
    Set<String> taken = namesOfJava();
    assertTrue(taken.containsAll(Set.of("String", "List", "Optional")), taken::toString);
    Set<String> ours = publicTypes(House.CLASSES).map(JavaClass::getSimpleName).collect(toSet());
    assertTrue(ours.size() >= House.CLASSES_AT_LEAST / 4, "saw only " + ours.size());
    ours.retainAll(taken);
    assertEquals(Set.of(), ours);
  }

  @Test
  void aSharedNameAndANameOfJavaAreFound() throws IOException {
    assertEquals(Set.of("Scanner"), shared(House.wrong("one", "two")).keySet());
    assertTrue(namesOfJava().contains("Scanner"));
  }

  /** The simple names that several public classes share, each with the packages. */
  private static Map<String, Set<String>> shared(Iterable<JavaClass> classes) {
    Map<String, Set<String>> packages =
        publicTypes(classes)
            .collect(
                groupingBy(
                    JavaClass::getSimpleName,
                    TreeMap::new,
                    mapping(JavaClass::getPackageName, toCollection(TreeSet::new))));
    packages.values().removeIf(places -> places.size() == 1);
    return packages;
  }

  private static Stream<JavaClass> publicTypes(Iterable<JavaClass> classes) {
    return StreamSupport.stream(classes.spliterator(), false)
        .filter(type -> type.isTopLevelClass() && !type.getSimpleName().equals("package-info"))
        .filter(type -> type.getModifiers().contains(JavaModifier.PUBLIC));
  }

  /** The classes that Java's two packages hold in the JDK that runs this test. */
  private static Set<String> namesOfJava() throws IOException {
    Set<String> names = new TreeSet<>();
    Path base = FileSystems.getFileSystem(URI.create("jrt:/")).getPath("modules", "java.base");
    for (String name : new String[] {"java/lang", "java/util"}) {
      try (Stream<Path> files = Files.list(base.resolve(name))) {
        files
            .map(file -> file.getFileName().toString())
            .filter(file -> file.endsWith(".class") && !file.contains("$"))
            .forEach(file -> names.add(file.substring(0, file.length() - ".class".length())));
      }
    }
    return names;
  }
}
