package connate.check;

import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Members of libraries that our classes must not touch. Each is looked up, so none is misspelt. */
final class Forbidden {

  private final Set<String> members = new TreeSet<>();

  /** Adds a method with these parameters. */
  Forbidden method(Class<?> owner, String name, Class<?>... parameters) {
    try {
      owner.getMethod(name, parameters);
    } catch (NoSuchMethodException e) {
      throw new IllegalArgumentException(e);
    }
    members.add(fullName(owner, name, parameters));
    return this;
  }

  /** Adds a constructor with these parameters. */
  Forbidden constructor(Class<?> owner, Class<?>... parameters) {
    try {
      owner.getConstructor(parameters);
    } catch (NoSuchMethodException e) {
      throw new IllegalArgumentException(e);
    }
    members.add(fullName(owner, "<init>", parameters));
    return this;
  }

  /** Adds a field. */
  Forbidden field(Class<?> owner, String name) {
    try {
      owner.getField(name);
    } catch (NoSuchFieldException e) {
      throw new IllegalArgumentException(e);
    }
    members.add(owner.getName() + "." + name);
    return this;
  }

  /** How many members are on the list. */
  int size() {
    return members.size();
  }

  /** The members on the list that one of the classes touches. */
  Set<String> touchedBy(Iterable<JavaClass> classes) {
    Set<String> touched = new TreeSet<>();
    for (JavaClass type : classes) {
      type.getAccessesFromSelf().stream()
          .map(access -> access.getTarget().getFullName())
          .filter(members::contains)
          .forEach(touched::add);
    }
    return touched;
  }

  /** The condition that a class touches none of them. */
  ArchCondition<JavaClass> untouched(String reason) {
    return new ArchCondition<>("touch nothing of: " + reason) {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        for (JavaAccess<?> access : type.getAccessesFromSelf()) {
          if (members.contains(access.getTarget().getFullName())) {
            events.add(SimpleConditionEvent.violated(type, access.getDescription()));
          }
        }
      }
    };
  }

  private static String fullName(Class<?> owner, String name, Class<?>... parameters) {
    return Stream.of(parameters)
        .map(Class::getName)
        .collect(Collectors.joining(", ", owner.getName() + "." + name + "(", ")"));
  }
}
