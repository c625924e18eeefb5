package connate.check;

import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.lang.reflect.Executable;
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
      members.add(fullName(owner.getMethod(name, parameters), name));
    } catch (NoSuchMethodException e) {
      throw new IllegalArgumentException(e);
    }
    return this;
  }

  /** Adds a constructor with these parameters. */
  Forbidden constructor(Class<?> owner, Class<?>... parameters) {
    try {
      members.add(fullName(owner.getConstructor(parameters), "<init>"));
    } catch (NoSuchMethodException e) {
      throw new IllegalArgumentException(e);
    }
    return this;
  }

  /** Adds a field. */
  Forbidden field(Class<?> owner, String name) {
    try {
      members.add(owner.getField(name).getDeclaringClass().getName() + "." + name);
    } catch (NoSuchFieldException e) {
      throw new IllegalArgumentException(e);
    }
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

  private static String fullName(Executable member, String name) {
    return Stream.of(member.getParameterTypes())
        .map(Class::getName)
        .collect(
            Collectors.joining(", ", member.getDeclaringClass().getName() + "." + name + "(", ")"));
  }
}
