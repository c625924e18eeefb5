package connate.figure.svg;

/** The one place where text becomes XML. */
final class Markup {

  private static final char REPLACEMENT = '\uFFFD';

  private Markup() {}

  /** Returns text that is safe between tags and in quoted attributes. */
  static String text(String raw) {
    StringBuilder out = new StringBuilder(raw.length() + 16);
    raw.codePoints().forEach(c -> append(out, c));
    return out.toString();
  }

  private static void append(StringBuilder out, int c) {
    switch (c) {
      case '&' -> out.append("&amp;");
      case '<' -> out.append("&lt;");
      case '>' -> out.append("&gt;");
      case '"' -> out.append("&quot;");
      case '\'' -> out.append("&#39;");
      case '\n', '\t', '\r' -> out.append(' ');
      default -> out.appendCodePoint(isPlain(c) ? c : REPLACEMENT);
    }
  }

  /** Controls, lone surrogates, marks that turn the direction of writing and non-characters. */
  private static boolean isPlain(int c) {
    boolean control = c < 0x20 || c >= 0x7F && c < 0xA0;
    boolean surrogate = c >= 0xD800 && c <= 0xDFFF;
    boolean turning = c >= 0x202A && c <= 0x202E || c >= 0x2066 && c <= 0x2069;
    boolean none = (c & 0xFFFE) == 0xFFFE || c >= 0xFDD0 && c <= 0xFDEF;
    return !(control || surrogate || turning || none);
  }
}
