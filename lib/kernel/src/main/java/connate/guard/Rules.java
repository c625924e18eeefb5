package connate.guard;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * The list of what is allowed, as it stands in {@code allow.txt}. Of the lines that fit a class or
 * a member, the last one counts.
 */
final class Rules {

  private final List<Rule> rules = new ArrayList<>();

  private record Rule(boolean allows, String types, Set<String> members) {

    boolean fits(String type) {
      if (types.equals("*")) {
        return true;
      }
      if (types.endsWith(".**")) {
        return type.startsWith(types.substring(0, types.length() - 2));
      }
      int star = types.indexOf('*');
      if (star < 0) {
        return type.equals(types) || type.startsWith(types + "$");
      }
      String tail = types.substring(star + 1);
      return type.startsWith(types.substring(0, star))
          && type.endsWith(tail)
          && type.indexOf('.', star) < 0;
    }
  }

  /** Returns the list that comes with the kernel. */
  static Rules load() {
    try (InputStream in = Rules.class.getResourceAsStream("allow.txt")) {
      return new Rules(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  Rules(String text) {
    for (String line : text.lines().toList()) {
      String bare = line.replaceFirst("#.*", "").strip();
      if (!bare.isEmpty()) {
        rules.add(rule(bare));
      }
    }
  }

  private static Rule rule(String line) {
    boolean allows = !line.startsWith("not ");
    String rest = allows ? line : line.substring(4).strip();
    int colon = rest.indexOf(':');
    if (colon < 0) {
      return new Rule(allows, rest, Set.of());
    }
    String[] members = rest.substring(colon + 1).strip().split("\\s+");
    return new Rule(allows, rest.substring(0, colon).strip(), Set.of(members));
  }

  /** Returns whether a class may be named; one of which some members are allowed may. */
  boolean allowsType(String type) {
    boolean allowed = false;
    for (Rule rule : rules) {
      if (rule.fits(type) && (rule.allows() || rule.members().isEmpty())) {
        allowed = rule.allows();
      }
    }
    return allowed;
  }

  /** Returns whether a member of a class may be used; {@code new} stands for its constructors. */
  boolean allowsMember(String type, String member) {
    String name = member.equals("<init>") ? "new" : member;
    boolean allowed = false;
    for (Rule rule : rules) {
      if (rule.fits(type) && (rule.members().isEmpty() || rule.members().contains(name))) {
        allowed = rule.allows();
      }
    }
    return allowed;
  }
}
