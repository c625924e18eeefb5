package connate.console;

import connate.formula.Formula;
import connate.formula.TransformForm;
import connate.method.MethodCard;
import java.io.File;
import java.io.IOException;
import java.lang.reflect.Field;
import java.lang.reflect.Modifier;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.jar.JarFile;
import java.util.stream.Stream;

/** The cards of all methods that the library holds, found by looking through its classes. */
final class Cards {

  private static final Set<String> NOT_SCIENCE =
      Set.of("console", "text", "session", "run", "compile", "guard", "log", "record", "engine");

  private final Map<String, MethodCard> cards = new TreeMap<>();
  private final Map<String, String> owners = new TreeMap<>();

  private Cards() {}

  /** Looks through the library. */
  static Cards find() {
    Cards found = new Cards();
    for (String name : classes()) {
      found.take(name);
    }
    return found;
  }

  /** Returns the cards in the order of their names. */
  List<MethodCard> all() {
    return List.copyOf(cards.values());
  }

  /** Returns the class that carries out a card. */
  String owner(MethodCard card) {
    return owners.getOrDefault(card.id(), "");
  }

  /** Returns the cards that hold all of some words. */
  List<MethodCard> about(String words) {
    String[] wanted = words.toLowerCase(Locale.ROOT).strip().split("[\\s,]+");
    return cards.values().stream().filter(c -> holds(c, wanted)).toList();
  }

  /** Returns the cards that are called so: by id, title or class. */
  List<MethodCard> named(String name) {
    String low = bare(name);
    List<MethodCard> exact =
        cards.values().stream()
            .filter(c -> bare(c.id()).equals(low) || bare(c.title()).equals(low))
            .toList();
    return exact.isEmpty()
        ? cards.values().stream()
            .filter(c -> bare(owner(c)).equals(low) || bare(c.id()).startsWith(low))
            .toList()
        : exact;
  }

  /** Returns all names by which a card can be asked for. */
  List<String> names() {
    Set<String> names = new TreeSet<>();
    cards.values().forEach(c -> names.add(c.id()));
    owners.values().forEach(names::add);
    return List.copyOf(names);
  }

  private static String bare(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]", "");
  }

  private boolean holds(MethodCard card, String[] words) {
    String all =
        String.join(" ", card.id(), card.title(), card.source(), String.join(" ", card.topics()))
            + " "
            + owner(card);
    String low = all.toLowerCase(Locale.ROOT);
    return Stream.of(words).allMatch(low::contains);
  }

  private void take(String name) {
    try {
      Class<?> type = Class.forName(name, false, Cards.class.getClassLoader());
      for (Field field : type.getDeclaredFields()) {
        Class<?> kind = field.getType();
        boolean card =
            kind == MethodCard.class || kind == Formula.class || kind == TransformForm.class;
        if (card && Modifier.isStatic(field.getModifiers()) && field.trySetAccessible()) {
          take(type, field.get(null));
        }
      }
    } catch (ReflectiveOperationException | LinkageError e) {
      // a class that cannot be loaded here states no card here
      return;
    }
  }

  private void take(Class<?> type, Object value) {
    MethodCard card = null;
    if (value instanceof MethodCard own) {
      card = own;
    } else if (value instanceof Formula<?> formula) {
      card = formula.card();
    } else if (value instanceof TransformForm form) {
      card = form.card();
    }
    if (card != null) {
      cards.putIfAbsent(card.id(), card);
      owners.putIfAbsent(card.id(), type.getSimpleName());
    }
  }

  private static List<String> classes() {
    List<String> names = new ArrayList<>();
    for (String part : System.getProperty("java.class.path").split(File.pathSeparator)) {
      Path path = Path.of(part);
      try {
        if (Files.isDirectory(path)) {
          try (Stream<Path> files = Files.walk(path)) {
            files.map(f -> path.relativize(f).toString()).forEach(f -> add(names, f));
          }
        } else if (path.getFileName().toString().startsWith("connate-")) {
          try (JarFile jar = new JarFile(path.toFile())) {
            jar.stream().forEach(e -> add(names, e.getName()));
          }
        }
      } catch (IOException e) {
        continue;
      }
    }
    return names;
  }

  private static void add(List<String> names, String file) {
    String name = file.replace('\\', '/');
    if (name.startsWith("connate/") && name.endsWith(".class") && !name.contains("-info")) {
      String[] parts = name.split("/");
      if (parts.length > 2 && !NOT_SCIENCE.contains(parts[1])) {
        names.add(name.substring(0, name.length() - ".class".length()).replace('/', '.'));
      }
    }
  }
}
