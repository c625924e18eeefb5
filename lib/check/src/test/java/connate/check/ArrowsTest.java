package connate.check;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.io.IOException;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** Arrows between modules run downwards only, and none between packages runs in a circle. */
class ArrowsTest {

  private static final ArchRule NO_CIRCLES =
      slices().matching("connate.(**)").should().beFreeOfCycles();

  private static final ArchRule DOWNWARDS =
      classes().should(dependOnlyOnWhatTheirModuleMaySee()).as("arrows run downwards only");

  @Test
  void theHouseIsThere() {
    assertTrue(House.CLASSES.size() >= House.CLASSES_AT_LEAST, "saw only " + House.CLASSES.size());
  }

  @Test
  void packagesFormNoCircle() {
    NO_CIRCLES.check(House.CLASSES);
  }

  @Test
  void twoPackagesThatNeedEachOtherAreFound() {
    assertTrue(NO_CIRCLES.evaluate(House.wrong("one", "two")).hasViolation());
  }

  @Test
  void modulesDependDownwards() {
    DOWNWARDS.check(House.CLASSES);
  }

  @Test
  void rockSeesTheCoreOfJavaAndCommonsMathOnly() {
    Set<String> libraries =
        House.CLASSES.stream()
            .filter(type -> Module.of(type) == Module.ROCK)
            .flatMap(type -> type.getDirectDependenciesFromSelf().stream())
            .map(Dependency::getTargetClass)
            .map(JavaClass::getBaseComponentType)
            .filter(target -> !House.isOurs(target) && !target.isPrimitive())
            .map(JavaClass::getPackageName)
            .filter(name -> !name.startsWith("java."))
            .map(name -> name.replaceAll("^((?:\\w+\\.){3}\\w+).*", "$1"))
            .collect(Collectors.toSet());
    assertEquals(Set.of("org.apache.commons.math3"), libraries);
  }

  /** A science class that draws, and a data class that asks the engine: two arrows upwards. */
  @Test
  void anArrowUpwardsAndALibraryTooLowAreFound() {
    List<String> found = violations(House.wrong("rock", "data", "engine"));
    assertTrue(found.stream().anyMatch(line -> line.contains("java.awt.Point")), found::toString);
    assertTrue(found.stream().anyMatch(line -> line.contains("Asked")), found::toString);
  }

  @Test
  void noPackageIsSplitBetweenModules() {
    Map<String, EnumSet<Module>> homes =
        House.CLASSES.stream()
            .collect(
                Collectors.toMap(
                    JavaClass::getPackageName,
                    type -> EnumSet.of(Module.of(type)),
                    (left, right) -> {
                      left.addAll(right);
                      return left;
                    }));
    homes.values().removeIf(modules -> modules.size() == 1);
    assertEquals(Map.of(), homes);
  }

  @Test
  void everyModuleWithSourcesIsSeen() throws IOException {
    String sources = House.mainSources().toString();
    EnumSet<Module> written = EnumSet.allOf(Module.class);
    written.removeIf(
        module -> !sources.contains("/lib/" + module.name().toLowerCase(Locale.ROOT) + "/"));
    assertEquals(
        written,
        House.CLASSES.stream()
            .map(Module::of)
            .collect(Collectors.toCollection(() -> EnumSet.noneOf(Module.class))));
  }

  private static List<String> violations(JavaClasses classes) {
    return DOWNWARDS.evaluate(classes).getFailureReport().getDetails();
  }

  private static ArchCondition<JavaClass> dependOnlyOnWhatTheirModuleMaySee() {
    return new ArchCondition<>("depend only on what their module may see") {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        Module module = Module.of(type);
        for (Dependency dependency : type.getDirectDependenciesFromSelf()) {
          JavaClass target = dependency.getTargetClass().getBaseComponentType();
          if (!target.isPrimitive() && !module.maySee(target)) {
            events.add(SimpleConditionEvent.violated(type, dependency.getDescription()));
          }
        }
      }
    };
  }
}
