package connate.compile;

import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import javax.lang.model.element.TypeElement;
import javax.lang.model.type.ArrayType;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.IntersectionType;
import javax.lang.model.type.TypeKind;
import javax.lang.model.type.TypeMirror;
import javax.lang.model.type.TypeVariable;
import javax.lang.model.type.WildcardType;

/**
 * A type written down, so that a field can have it.
 *
 * @param text the type in full, empty where it cannot be written down
 * @param exact whether the text is the type itself, not one a little wider
 */
public record TypeName(String text, boolean exact) {

  private static final int DEEPEST = 6;
  private static final Pattern COMMA = Pattern.compile(",\\s*");
  private static final Pattern QUALIFIER =
      Pattern.compile("\\b(?:[a-z_][A-Za-z0-9_]*\\.)+(?=[A-Z$])");

  /** No type that could be written. */
  static final TypeName NONE = new TypeName("", false);

  /** The type of what may be anything. */
  static final TypeName OBJECT = new TypeName("java.lang.Object", true);

  /** Writes a type. */
  public static TypeName of(TypeMirror type) {
    return of(type, 0);
  }

  /** Returns the type as a reader wants it: without packages, of several bounds the first. */
  String shown() {
    return simple(exact ? text : text.replace("? extends ", ""));
  }

  /** Returns a type's text as a reader wants it: without packages, of several bounds the first. */
  public static String simple(String type) {
    String bare = QUALIFIER.matcher(type).replaceAll("").replace(Header.OWNER + ".", "");
    StringBuilder out = new StringBuilder();
    int depth = 0;
    int skipping = -1;
    for (char c : bare.toCharArray()) {
      depth -= c == '>' ? 1 : 0;
      skipping = skipping > depth || skipping == depth && c == ',' ? -1 : skipping;
      skipping = skipping < 0 && c == '&' ? depth : skipping;
      if (skipping < 0) {
        out.append(c);
      }
      depth += c == '<' ? 1 : 0;
    }
    return COMMA.matcher(out).replaceAll(", ");
  }

  boolean isWritten() {
    return !text.isEmpty();
  }

  private static TypeName of(TypeMirror type, int depth) {
    if (type.getKind().isPrimitive()) {
      return new TypeName(type.getKind().name().toLowerCase(java.util.Locale.ROOT), true);
    }
    switch (type.getKind()) {
      case ARRAY:
        TypeName part = of(((ArrayType) type).getComponentType(), depth);
        return part.isWritten() ? new TypeName(part.text + "[]", part.exact) : NONE;
      case DECLARED:
        return declared((DeclaredType) type, depth);
      case INTERSECTION:
        return wider(((IntersectionType) type).getBounds().get(0), depth);
      case TYPEVAR:
        return wider(((TypeVariable) type).getUpperBound(), depth);
      default:
        return NONE;
    }
  }

  private static TypeName wider(TypeMirror bound, int depth) {
    return new TypeName(of(bound, depth).text, false);
  }

  private static TypeName declared(DeclaredType type, int depth) {
    TypeElement element = (TypeElement) type.asElement();
    if (element.getQualifiedName().isEmpty()) {
      return NONE;
    }
    List<? extends TypeMirror> arguments = type.getTypeArguments();
    if (arguments.isEmpty()) {
      return new TypeName(owner(type, element, depth), true);
    }
    List<TypeName> names = arguments.stream().map(a -> argument(a, depth + 1)).toList();
    String text = names.stream().map(TypeName::text).collect(Collectors.joining(", ", "<", ">"));
    boolean exact = names.stream().allMatch(TypeName::exact);
    return new TypeName(owner(type, element, depth) + text, exact);
  }

  private static String owner(DeclaredType type, TypeElement element, int depth) {
    if (type.getEnclosingType().getKind() == TypeKind.DECLARED) {
      return declared((DeclaredType) type.getEnclosingType(), depth).text
          + "."
          + element.getSimpleName();
    }
    return element.getQualifiedName().toString();
  }

  private static TypeName argument(TypeMirror type, int depth) {
    if (depth > DEEPEST) {
      return new TypeName("?", false);
    }
    if (type.getKind() == TypeKind.WILDCARD) {
      return wildcard((WildcardType) type, depth);
    }
    TypeName name = of(type, depth);
    if (!name.isWritten()) {
      return new TypeName("?", false);
    }
    boolean bound = type.getKind() == TypeKind.INTERSECTION || type.getKind() == TypeKind.TYPEVAR;
    boolean wider = bound || !name.exact;
    return wider ? new TypeName("? extends " + name.text, false) : name;
  }

  private static TypeName wildcard(WildcardType type, int depth) {
    TypeMirror above = type.getExtendsBound();
    TypeMirror below = type.getSuperBound();
    if (above == null && below == null) {
      return new TypeName("?", true);
    }
    TypeName bound = of(above == null ? below : above, depth);
    if (!bound.isWritten()) {
      return new TypeName("?", false);
    }
    if (above == null) {
      return bound.exact ? new TypeName("? super " + bound.text, true) : new TypeName("?", false);
    }
    return new TypeName("? extends " + bound.text, bound.exact);
  }
}
