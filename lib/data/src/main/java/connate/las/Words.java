package connate.las;

/** Fills messages; unlike a formatter it knows no locale and needs no time to start. */
final class Words {

  private Words() {}

  /** Returns a text with each {@code {}} replaced by the next value. */
  static String fill(String text, Object... values) {
    StringBuilder out = new StringBuilder();
    int from = 0;
    for (Object value : values) {
      int at = text.indexOf("{}", from);
      out.append(text, from, at).append(value);
      from = at + 2;
    }
    return out.append(text, from, text.length()).toString();
  }
}
