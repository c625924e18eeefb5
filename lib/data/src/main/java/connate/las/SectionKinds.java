package connate.las;

import connate.las.LasSection.Kind;
import java.util.Locale;

/** Tells what a section holds from its title. */
final class SectionKinds {

  private SectionKinds() {}

  /** Returns the kind of a section. */
  static Kind of(Sections.Raw raw, LasVersion version) {
    String name = bare(raw.word());
    if (name.endsWith("_DATA") || name.endsWith("_DEFINITION") || name.endsWith("_PARAMETER")) {
      return ofSet(name, raw.word());
    }
    if (version == LasVersion.V3_0) {
      return ofWord(name);
    }
    return ofLetter(raw.letter());
  }

  private static Kind ofSet(String name, String word) {
    boolean isRepeat = word.indexOf('[') >= 0 && !word.contains("[1]");
    boolean isLog = name.startsWith("LOG_") && !isRepeat;
    if (name.endsWith("_DATA")) {
      return isLog ? Kind.DATA : Kind.SET_DATA;
    }
    if (name.endsWith("_DEFINITION")) {
      return isLog ? Kind.CURVE : Kind.SET_DEFINITION;
    }
    return isLog ? Kind.PARAMETER : Kind.SET_PARAMETER;
  }

  private static Kind ofWord(String name) {
    return switch (name) {
      case "VERSION", "V" -> Kind.VERSION;
      case "WELL", "W" -> Kind.WELL;
      case "PARAMETER", "PARAMETERS", "P" -> Kind.PARAMETER;
      case "CURVE", "CURVES", "C" -> Kind.CURVE;
      case "ASCII", "A" -> Kind.DATA;
      case "OTHER", "O" -> Kind.OTHER;
      default -> Kind.UNKNOWN;
    };
  }

  private static Kind ofLetter(char letter) {
    return switch (letter) {
      case 'V' -> Kind.VERSION;
      case 'W' -> Kind.WELL;
      case 'C' -> Kind.CURVE;
      case 'P' -> Kind.PARAMETER;
      case 'O' -> Kind.OTHER;
      case 'A' -> Kind.DATA;
      default -> Kind.UNKNOWN;
    };
  }

  /** Returns a title's word without a count such as {@code [1]}, in capitals. */
  static String bare(String word) {
    int bracket = word.indexOf('[');
    return (bracket < 0 ? word : word.substring(0, bracket)).toUpperCase(Locale.ROOT);
  }
}
