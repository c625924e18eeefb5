package connate.text;

import connate.protocol.Item;
import java.util.ArrayList;
import java.util.List;

/** Sets an item as lines for a terminal of a given width. */
public final class ItemText {

  private static final int GAP = 2;
  private static final int NARROWEST = 20;

  private final int width;
  private final Ink ink;

  /** Makes a setter for a width in characters. */
  public ItemText(int width, Ink ink) {
    this.width = Math.max(NARROWEST, width);
    this.ink = ink;
  }

  /** Returns the lines of an item. */
  public List<String> lines(Item item) {
    List<String> out = new ArrayList<>();
    add(out, item);
    return out;
  }

  private void add(List<String> out, Item item) {
    if (item instanceof Item.Text text) {
      clean(text.text()).lines().forEach(out::add);
    } else if (item instanceof Item.Measure measure) {
      out.add(clean(measure.text()));
    } else if (item instanceof Item.Grid grid) {
      addGrid(out, grid);
    } else if (item instanceof Item.Picture picture) {
      addPicture(out, picture);
    } else if (item instanceof Item.Group group) {
      group.items().forEach(part -> add(out, part));
    }
  }

  /** A sketch has title and notes already; a picture without one shows them alone. */
  private void addPicture(List<String> out, Item.Picture picture) {
    String title = clean(picture.title());
    List<String> sketch = clean(picture.sketch()).lines().toList();
    out.add(ink.strong(title));
    boolean titled = !sketch.isEmpty() && sketch.get(0).strip().equals(title.strip());
    sketch.stream().skip(titled ? 1 : 0).forEach(out::add);
    picture.notes().stream()
        .map(ItemText::clean)
        .filter(note -> sketch.stream().noneMatch(line -> line.strip().equals(note.strip())))
        .forEach(note -> addFaint(out, note));
  }

  private void addFaint(List<String> out, String text) {
    Wrapping.of(text, width).forEach(line -> out.add(ink.faint(line)));
  }

  private void addGrid(List<String> out, Item.Grid grid) {
    if (!grid.caption().isEmpty()) {
      out.add(ink.strong(clean(grid.caption())));
    }
    int[] widths = widths(grid);
    int columns = fitting(widths);
    out.add(line(grid, grid.heads().stream().map(Item.Head::name).toList(), widths, columns));
    if (grid.heads().stream().anyMatch(h -> !h.unit().isEmpty())) {
      List<String> units = grid.heads().stream().map(Item.Head::unit).toList();
      out.add(ink.faint(line(grid, units, widths, columns)));
    }
    grid.rows().forEach(row -> out.add(line(grid, row, widths, columns)));
    addCuts(out, grid, columns);
    grid.notes().forEach(note -> addFaint(out, "  " + clean(note)));
  }

  /** Says what does not fit: columns to the right, rows below. */
  private void addCuts(List<String> out, Item.Grid grid, int columns) {
    if (grid.total() > grid.rows().size()) {
      out.add(ink.faint("  … " + (grid.total() - grid.rows().size()) + " more rows"));
    }
    if (columns < grid.heads().size()) {
      List<String> rest =
          grid.heads().subList(columns, grid.heads().size()).stream()
              .map(h -> clean(h.name()))
              .toList();
      out.add(ink.faint("  … " + rest.size() + " more columns: " + String.join(", ", rest)));
    }
  }

  private int fitting(int[] widths) {
    int used = 0;
    for (int column = 0; column < widths.length; column++) {
      used += GAP + widths[column];
      if (used > width && column > 0) {
        return column;
      }
    }
    return widths.length;
  }

  private static int[] widths(Item.Grid grid) {
    int[] widths = new int[grid.heads().size()];
    for (int column = 0; column < widths.length; column++) {
      Item.Head head = grid.heads().get(column);
      widths[column] = Math.max(length(clean(head.name())), length(clean(head.unit())));
      for (List<String> row : grid.rows()) {
        widths[column] = Math.max(widths[column], length(clean(row.get(column))));
      }
    }
    return widths;
  }

  private static String line(Item.Grid grid, List<String> cells, int[] widths, int columns) {
    StringBuilder out = new StringBuilder();
    for (int column = 0; column < columns; column++) {
      String cell = clean(cells.get(column));
      String gap = " ".repeat(Math.max(0, widths[column] - length(cell)));
      out.append(" ".repeat(GAP));
      out.append(grid.heads().get(column).numeric() ? gap + cell : cell + gap);
    }
    return out.toString().stripTrailing();
  }

  private static int length(String text) {
    return text.codePointCount(0, text.length());
  }

  /** Control characters from data must not reach a terminal, where they could move its cursor. */
  public static String clean(String text) {
    StringBuilder out = new StringBuilder(text.length());
    text.codePoints()
        .map(c -> Character.isISOControl(c) && c != '\n' ? (c == '\t' ? ' ' : '\uFFFD') : c)
        .forEach(out::appendCodePoint);
    return out.toString();
  }
}
