package connate.guard;

import connate.protocol.Request;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Judges compiled commands before they are loaded. Everything that a class file names is looked up
 * in the list of what is allowed: classes, members, types in descriptors, the family of each class,
 * the methods that link lambdas. What is not on the list is refused.
 */
public final class Guard {

  /** Named by every class with a lambda; of their members only those that link are allowed. */
  private static final Set<String> LINKING =
      Set.of(
          "java.lang.invoke.MethodHandles",
          "java.lang.invoke.MethodHandles$Lookup",
          "java.lang.invoke.MethodHandle",
          "java.lang.invoke.MethodType",
          "java.lang.invoke.CallSite",
          "java.lang.invoke.TypeDescriptor",
          "java.lang.invoke.LambdaMetafactory",
          "java.lang.invoke.StringConcatFactory",
          "java.lang.runtime.ObjectMethods",
          "java.lang.runtime.SwitchBootstraps");

  private static final Set<String> LINKERS =
      Set.of(
          "java.lang.invoke.LambdaMetafactory.metafactory",
          "java.lang.invoke.StringConcatFactory.makeConcatWithConstants",
          "java.lang.runtime.ObjectMethods.bootstrap",
          "java.lang.runtime.SwitchBootstraps.typeSwitch",
          "java.lang.runtime.SwitchBootstraps.enumSwitch");

  private final Rules rules = Rules.load();
  private final Map<String, ClassFile> own = new HashMap<>();

  /** Judges classes that are to be loaded together; they may name each other and those before. */
  public synchronized Optional<Refusal> judge(List<Request.Bytecode> classes) {
    Map<String, ClassFile> added = new HashMap<>();
    for (Request.Bytecode bytecode : classes) {
      ClassFile file = new ClassFile(bytecode.bytes());
      added.put(file.name(), file);
    }
    own.putAll(added);
    for (Request.Bytecode bytecode : classes) {
      ClassFile file = added.get(bytecode.name().replace('.', '/'));
      Optional<Refusal> refusal =
          file == null ? Optional.of(new Refusal(bytecode.name(), 0)) : judge(file, bytecode);
      if (refusal.isPresent()) {
        added.keySet().forEach(own::remove);
        return refusal;
      }
    }
    return Optional.empty();
  }

  private Optional<Refusal> judge(ClassFile file, Request.Bytecode bytecode) {
    if (file.hasNatives()) {
      return Optional.of(new Refusal("a native method", 0));
    }
    if (file.hasDynamicConstants()) {
      return Optional.of(new Refusal("a dynamic constant", 0));
    }
    for (ClassFile.Reference reference : file.references()) {
      if (!allows(reference)) {
        return Optional.of(Sighting.of(bytecode.bytes(), reference));
      }
    }
    for (ClassFile.Reference linker : file.bootstraps()) {
      if (!LINKERS.contains(dotted(linker.owner()) + "." + linker.name())) {
        return Optional.of(new Refusal(dotted(linker.owner()) + "." + linker.name(), 0));
      }
    }
    Set<String> types = new LinkedHashSet<>(file.classes());
    types.addAll(file.parents());
    file.descriptors().forEach(d -> Descriptors.types(d).forEach(types::add));
    return types.stream()
        .filter(type -> !allowsType(type))
        .findFirst()
        .map(type -> Sighting.of(bytecode.bytes(), Descriptors.element(type)));
  }

  private boolean allowsType(String type) {
    String element = Descriptors.element(type);
    return element.isEmpty()
        || own.containsKey(element)
        || LINKING.contains(dotted(element))
        || rules.allowsType(dotted(element));
  }

  private boolean allows(ClassFile.Reference reference) {
    if (reference.owner().startsWith("[")) {
      return allowsType(reference.owner());
    }
    ClassFile mine = own.get(reference.owner());
    if (mine != null) {
      return allowsInherited(mine, reference);
    }
    String owner = dotted(reference.owner());
    return LINKERS.contains(owner + "." + reference.name())
        || rules.allowsMember(owner, reference.name());
  }

  /**
   * What a class of the user's inherits is judged where it comes from: by the first class above it
   * that is not the user's, or where that is {@code Object}, by the interfaces too.
   */
  private boolean allowsInherited(ClassFile mine, ClassFile.Reference reference) {
    Set<String> family = new LinkedHashSet<>();
    gather(mine, family);
    String member = reference.name() + " " + reference.descriptor();
    boolean declared =
        family.stream().map(own::get).anyMatch(f -> f != null && f.members().contains(member));
    String root = mine.parents().get(0);
    while (own.containsKey(root)) {
      root = own.get(root).parents().get(0);
    }
    if (declared || !root.equals("java/lang/Object")) {
      return declared || rules.allowsMember(dotted(root), reference.name());
    }
    return family.stream()
        .filter(type -> !own.containsKey(type))
        .anyMatch(type -> rules.allowsMember(dotted(type), reference.name()));
  }

  private void gather(ClassFile file, Set<String> family) {
    family.add(file.name());
    for (String parent : file.parents()) {
      if (family.add(parent) && own.containsKey(parent)) {
        gather(own.get(parent), family);
      }
    }
  }

  private static String dotted(String name) {
    return name.replace('/', '.');
  }
}
