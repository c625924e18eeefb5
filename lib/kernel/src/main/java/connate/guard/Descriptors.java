package connate.guard;

import java.util.ArrayList;
import java.util.List;

/** Reads descriptors of fields and methods. */
final class Descriptors {

  private Descriptors() {}

  /** Returns the classes that a descriptor names, with slashes. */
  static List<String> types(String descriptor) {
    List<String> found = new ArrayList<>();
    for (int at = descriptor.indexOf('L'); at >= 0; at = descriptor.indexOf('L', at)) {
      int end = descriptor.indexOf(';', at);
      if (end < 0) {
        return found;
      }
      found.add(descriptor.substring(at + 1, end));
      at = end;
    }
    return found;
  }

  /** Returns the class of an array's elements, empty for a primitive one; else the class itself. */
  static String element(String type) {
    if (!type.startsWith("[")) {
      return type;
    }
    String bare = type.replaceFirst("^\\[+", "");
    return bare.startsWith("L") ? bare.substring(1, bare.length() - 1) : "";
  }
}
