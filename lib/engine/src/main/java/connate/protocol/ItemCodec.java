package connate.protocol;

/** Items as bytes. */
final class ItemCodec {

  private static final int NONE = 0;
  private static final int TEXT = 1;
  private static final int MEASURE = 2;
  private static final int GRID = 3;
  private static final int PICTURE = 4;
  private static final int GROUP = 5;

  private ItemCodec() {}

  static void write(WireWriter out, Item item) {
    if (item == null) {
      out.tag(NONE);
    } else if (item instanceof Item.Text text) {
      out.tag(TEXT).text(text.text());
    } else if (item instanceof Item.Measure measure) {
      measure(out.tag(MEASURE), measure);
    } else if (item instanceof Item.Grid grid) {
      grid(out.tag(GRID), grid);
    } else if (item instanceof Item.Picture p) {
      out.tag(PICTURE).text(p.svg()).text(p.title()).text(p.description());
      out.texts(p.notes()).text(p.sketch());
    } else if (item instanceof Item.Group group) {
      out.tag(GROUP).list(group.items(), ItemCodec::write);
    }
  }

  static Item read(WireReader in) throws BadFrame {
    int tag = in.tag();
    switch (tag) {
      case NONE:
        return null;
      case TEXT:
        return new Item.Text(in.text());
      case MEASURE:
        return measure(in);
      case GRID:
        return grid(in);
      case PICTURE:
        return new Item.Picture(in.text(), in.text(), in.text(), in.texts(), in.text());
      case GROUP:
        return new Item.Group(in.list(ItemCodec::present));
      default:
        throw new BadFrame("item " + tag);
    }
  }

  static void measure(WireWriter out, Item.Measure m) {
    out.text(m.kind()).real(m.value()).text(m.unit()).real(m.low()).real(m.high());
    out.text(m.range()).number(m.count()).text(m.text());
  }

  static Item.Measure measure(WireReader in) throws BadFrame {
    return new Item.Measure(
        in.text(), in.real(), in.text(), in.real(), in.real(), in.text(), in.number(), in.text());
  }

  private static void grid(WireWriter out, Item.Grid grid) {
    out.text(grid.caption());
    out.list(grid.heads(), (w, h) -> w.text(h.name()).text(h.unit()).flag(h.numeric()));
    out.list(grid.rows(), WireWriter::texts).number(grid.total()).texts(grid.notes());
  }

  private static Item.Grid grid(WireReader in) throws BadFrame {
    return new Item.Grid(
        in.text(),
        in.list(r -> new Item.Head(r.text(), r.text(), r.flag())),
        in.list(WireReader::texts),
        in.number(),
        in.texts());
  }

  private static Item present(WireReader in) throws BadFrame {
    Item item = read(in);
    if (item == null) {
      throw new BadFrame("an empty place in a group");
    }
    return item;
  }
}
