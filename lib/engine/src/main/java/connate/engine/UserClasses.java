package connate.engine;

import connate.protocol.Request;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Pattern;

/** The classes of the user's commands, apart from the library's. */
final class UserClasses extends ClassLoader {

  /** The class around the user's own: of a workbook, or of one command of a shell. */
  private static final Pattern WRAPPER =
      Pattern.compile("^(?:\\$Workbook|REPL\\.\\$JShell\\$[0-9]+[A-Z]*)\\$?");

  private final Map<String, byte[]> waiting = new ConcurrentHashMap<>();

  private final Set<String> names = ConcurrentHashMap.newKeySet();

  UserClasses() {
    super("workbook", UserClasses.class.getClassLoader());
  }

  /** Takes classes, which are woven and defined when they are first needed. */
  void add(List<Request.Bytecode> classes) {
    for (Request.Bytecode loaded : classes) {
      names.add(loaded.name());
      waiting.put(loaded.name(), loaded.bytes());
    }
  }

  @Override
  protected Class<?> findClass(String name) throws ClassNotFoundException {
    byte[] bytes = waiting.remove(name);
    if (bytes == null) {
      throw new ClassNotFoundException(name);
    }
    byte[] woven = Weaver.weave(bytes);
    return defineClass(name, woven, 0, woven.length);
  }

  /** Returns whether a class of that name is one of the user's. */
  boolean isUsers(String name) {
    return names.contains(name);
  }

  /** Returns whether a class of the user's was compiled by the JDK's shell. */
  static boolean isShells(String name) {
    return name.startsWith("REPL.");
  }

  /** Returns the user's class of a stack frame, where it is one. */
  Optional<String> shortName(String name) {
    if (!isUsers(name)) {
      return Optional.empty();
    }
    String nested = WRAPPER.matcher(name).replaceFirst("");
    return Optional.of(nested.replace('$', '.'));
  }
}
