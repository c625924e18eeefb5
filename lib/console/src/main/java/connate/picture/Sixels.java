package connate.picture;

import java.awt.image.BufferedImage;

/** Writes an image as sixels: bands of six rows, one colour after the other, of 216 colours. */
final class Sixels {

  private static final int LEVELS = 6;
  private static final int ROWS = 6;
  private static final int COLOURS = LEVELS * LEVELS * LEVELS;

  private Sixels() {}

  static String of(BufferedImage image) {
    StringBuilder out = new StringBuilder("\u001bPq\"1;1;");
    out.append(image.getWidth()).append(';').append(image.getHeight());
    for (int colour = 0; colour < COLOURS; colour++) {
      out.append('#').append(colour).append(";2;").append(colour / 36 * 20).append(';');
      out.append(colour / 6 % 6 * 20).append(';').append(colour % 6 * 20);
    }
    for (int top = 0; top < image.getHeight(); top += ROWS) {
      band(image, top, out);
    }
    return out.append("\u001b\\").toString();
  }

  private static void band(BufferedImage image, int top, StringBuilder out) {
    int[][] bits = new int[COLOURS][];
    for (int row = 0; row < ROWS && top + row < image.getHeight(); row++) {
      for (int x = 0; x < image.getWidth(); x++) {
        int colour = nearest(image.getRGB(x, top + row));
        if (bits[colour] == null) {
          bits[colour] = new int[image.getWidth()];
        }
        bits[colour][x] |= 1 << row;
      }
    }
    for (int colour = 0; colour < COLOURS; colour++) {
      if (bits[colour] != null) {
        out.append('#').append(colour);
        runs(bits[colour], out);
        out.append('$');
      }
    }
    out.append('-');
  }

  private static void runs(int[] columns, StringBuilder out) {
    int at = 0;
    while (at < columns.length) {
      int end = at + 1;
      while (end < columns.length && columns[end] == columns[at]) {
        end++;
      }
      char sign = (char) (63 + columns[at]);
      if (end - at > 3) {
        out.append('!').append(end - at).append(sign);
      } else {
        out.append(String.valueOf(sign).repeat(end - at));
      }
      at = end;
    }
  }

  private static int nearest(int rgb) {
    return level(rgb >> 16) * 36 + level(rgb >> 8) * 6 + level(rgb);
  }

  private static int level(int channel) {
    return Math.round((channel & 255) * (LEVELS - 1) / 255f);
  }
}
