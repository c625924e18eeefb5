package connate.las;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * The column names that many files print on the title line of the data, or on a comment beside it.
 * They tell the true order of the columns where the curve section has another.
 */
final class ColumnLabels {

  private static final Set<String> DEPTHS = Set.of("DEPT", "DEPTH", "DEP");

  private ColumnLabels() {}

  /**
   * Returns for each curve the column that the labels give it, null where no label line names all
   * curves.
   */
  static int[] order(LasText text, Sections.Raw data, List<HeaderLine> curves) {
    for (String line : lines(text, data)) {
      int[] order =
          match(Items.split(line.replace(',', ' '), (byte) 0).toArray(new String[0]), curves);
      if (order != null) {
        return order;
      }
    }
    return null;
  }

  private static List<String> lines(LasText text, Sections.Raw data) {
    List<String> lines = new ArrayList<>();
    String title = data.title().strip();
    int blank = title.replace('\t', ' ').indexOf(' ');
    lines.add(blank < 0 ? "" : title.substring(blank));
    int end = text.lineEnd(data.bodyFrom());
    lines.add(comment(text, data.bodyFrom(), end));
    int above = text.lineStart(data.titleFrom()) - 1;
    if (above > text.from && text.bytes[above] == '\n' && text.bytes[above - 1] == '\r') {
      above--;
    }
    if (above > text.from) {
      lines.add(comment(text, text.lineStart(above), above));
    }
    return lines;
  }

  private static String comment(LasText text, int from, int to) {
    String line = from < to ? text.text(from, to).strip() : "";
    return line.startsWith("#") ? line.substring(1) : "";
  }

  private static int[] match(String[] labels, List<HeaderLine> curves) {
    if (labels.length != curves.size()) {
      return null;
    }
    int[] order = new int[labels.length];
    boolean[] taken = new boolean[labels.length];
    for (int curve = 0; curve < order.length; curve++) {
      String name = key(curves.get(curve).mnemonic());
      int column = 0;
      while (column < labels.length && (taken[column] || !key(labels[column]).equals(name))) {
        column++;
      }
      if (column == labels.length) {
        return null;
      }
      taken[column] = true;
      order[curve] = column;
    }
    return order;
  }

  private static String key(String name) {
    String upper = name.toUpperCase(Locale.ROOT);
    return DEPTHS.contains(upper) ? "DEPT" : upper;
  }

  /** Tells whether an order leaves every curve at its own column. */
  static boolean isIdentity(int[] order) {
    return Arrays.equals(order, identity(order.length));
  }

  /** Returns the order that leaves every curve at its own column. */
  static int[] identity(int curves) {
    int[] order = new int[curves];
    for (int i = 0; i < curves; i++) {
      order[i] = i;
    }
    return order;
  }
}
