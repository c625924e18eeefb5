package connate.log;

import connate.protocol.Item;
import java.util.List;

/** Sets an item as HTML. */
final class ItemMarkup {

  private final Markup out;

  ItemMarkup(Markup out) {
    this.out = out;
  }

  /** Returns whether an item needs the width of the sheet rather than stand beside its command. */
  static boolean isWide(Item item) {
    if (item instanceof Item.Text text) {
      return text.text().lines().anyMatch(line -> line.length() > 60);
    }
    return !(item instanceof Item.Measure);
  }

  void write(Item item) {
    if (item instanceof Item.Text text) {
      out.leaf("pre", text.text(), "class", "text");
    } else if (item instanceof Item.Measure measure) {
      out.leaf("span", measure.text(), "class", "value");
    } else if (item instanceof Item.Grid grid) {
      grid(grid);
    } else if (item instanceof Item.Picture picture) {
      picture(picture);
    } else if (item instanceof Item.Group group) {
      group.items().forEach(this::write);
    }
  }

  private void grid(Item.Grid grid) {
    out.open(
        "div", "class", "scroll", "tabindex", "0", "role", "region", "aria-label", label(grid));
    out.open("table");
    if (!grid.caption().isEmpty()) {
      out.leaf("caption", grid.caption());
    }
    out.open("thead").open("tr");
    for (Item.Head head : grid.heads()) {
      out.open("th", "scope", "col", "class", cell(head)).text(head.name());
      if (!head.unit().isEmpty()) {
        out.empty("br").leaf("span", head.unit(), "class", "unit");
      }
      out.close();
    }
    out.close().close().open("tbody");
    grid.rows().forEach(row -> row(grid, row));
    out.close().close().close();
    notes(grid);
  }

  private void row(Item.Grid grid, List<String> cells) {
    out.open("tr");
    for (int column = 0; column < cells.size(); column++) {
      out.leaf("td", cells.get(column), "class", cell(grid.heads().get(column)));
    }
    out.close();
  }

  private void notes(Item.Grid grid) {
    boolean cut = grid.total() > grid.rows().size();
    if (!cut && grid.notes().isEmpty()) {
      return;
    }
    out.open("ul", "class", "notes");
    if (cut) {
      out.leaf("li", "… " + (grid.total() - grid.rows().size()) + " more rows");
    }
    grid.notes().forEach(note -> out.leaf("li", note));
    out.close();
  }

  private void picture(Item.Picture picture) {
    out.open("figure").checked(SvgGate.pass(picture.svg())).close();
  }

  private static String label(Item.Grid grid) {
    return grid.caption().isEmpty() ? "table" : grid.caption();
  }

  private static String cell(Item.Head head) {
    return head.numeric() ? "n" : "t";
  }
}
