package connate.series;

import java.util.ArrayList;
import java.util.List;

/** A table as aligned text: names, units, rows, notes. */
final class ListingText {

  private ListingText() {}

  static String of(Listing listing) {
    List<List<String>> lines = lines(listing);
    StringBuilder out = new StringBuilder(listing.caption());
    int[] widths = widths(lines, listing.heads().size());
    for (List<String> line : lines) {
      out.append('\n');
      appendLine(out, listing, line, widths);
    }
    if (listing.total() > listing.rows().size()) {
      out.append("\n  … ").append(listing.total() - listing.rows().size()).append(" more rows");
    }
    for (String note : listing.notes()) {
      out.append("\n  ").append(note);
    }
    return out.toString();
  }

  private static List<List<String>> lines(Listing listing) {
    List<List<String>> lines = new ArrayList<>();
    lines.add(listing.heads().stream().map(Listing.Head::name).toList());
    if (listing.heads().stream().anyMatch(h -> h.unit() != null)) {
      lines.add(listing.heads().stream().map(ListingText::unit).toList());
    }
    for (int row = 0; row < listing.rows().size(); row++) {
      List<String> cells = new ArrayList<>();
      for (int column = 0; column < listing.heads().size(); column++) {
        cells.add(listing.text(row, column));
      }
      lines.add(cells);
    }
    return lines;
  }

  private static String unit(Listing.Head head) {
    return head.unit() == null || head.unit().isPure() ? "" : head.unit().symbol();
  }

  private static int[] widths(List<List<String>> lines, int columns) {
    int[] widths = new int[columns];
    for (List<String> line : lines) {
      for (int column = 0; column < columns; column++) {
        widths[column] = Math.max(widths[column], width(line.get(column)));
      }
    }
    return widths;
  }

  private static void appendLine(
      StringBuilder out, Listing listing, List<String> cells, int[] widths) {
    StringBuilder line = new StringBuilder();
    for (int column = 0; column < cells.size(); column++) {
      String cell = cells.get(column);
      String gap = " ".repeat(widths[column] - width(cell));
      line.append("  ").append(listing.isNumeric(column) ? gap + cell : cell + gap);
    }
    out.append(line.toString().stripTrailing());
  }

  private static int width(String text) {
    return text.codePointCount(0, text.length());
  }
}
