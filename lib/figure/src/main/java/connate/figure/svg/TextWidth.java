package connate.figure.svg;

import java.text.Normalizer;

/**
 * The width of text, from the advance widths that Liberation Sans, Arial and Helvetica share. A
 * page that has none of these sets the text in its own sans-serif; layouts leave room for that.
 */
final class TextWidth {

  /** Thousandths of the height, from blank to tilde; Liberation Sans 2.1 (SIL OFL 1.1). */
  private static final int[] PLAIN = {
    278, 278, 355, 556, 556, 889, 667, 191, 333, 333, 389, 584, 278, 333, 278, 278, 556, 556, 556,
    556, 556, 556, 556, 556, 556, 556, 278, 278, 584, 584, 584, 556, 1015, 667, 667, 722, 722, 667,
    611, 778, 722, 278, 500, 667, 556, 833, 722, 778, 667, 778, 722, 667, 611, 722, 667, 944, 667,
    667, 611, 278, 278, 278, 469, 556, 333, 556, 556, 500, 556, 556, 278, 556, 556, 222, 222, 500,
    222, 833, 556, 556, 556, 556, 333, 500, 278, 556, 500, 722, 500, 500, 500, 334, 260, 334, 584
  };

  private static final double BOLDER = 1.07;
  private static final int WIDE = 1000;
  private static final int SMALL = 333;
  private static final int OTHER = 600;

  private TextWidth() {}

  /** Returns the width in heights of the font. */
  static double of(String text, boolean bold) {
    long sum = text.codePoints().mapToLong(TextWidth::of).sum();
    return sum / 1000.0 * (bold ? BOLDER : 1);
  }

  private static int of(int c) {
    if (c >= ' ' && c <= '~') {
      return PLAIN[c - ' '];
    }
    if ("²³¹⁰⁴⁵⁶⁷⁸⁹⁻·°".indexOf(c) >= 0) {
      return SMALL;
    }
    if (c >= 0xC0 && c < 0x180) {
      int base = Normalizer.normalize(Character.toString(c), Normalizer.Form.NFD).codePointAt(0);
      return base <= '~' ? PLAIN[base - ' '] : OTHER;
    }
    return c >= 0x1100 && c < 0xFE00 && !(c >= 0x2000 && c < 0x2C00) ? WIDE : OTHER;
  }
}
