package connate.protocol;

/** Events as bytes. */
final class EventCodec {

  private static final int SHOWN = 1;
  private static final int KEPT = 2;
  private static final int ASSUMED = 3;
  private static final int CAUTIONED = 4;
  private static final int USED = 5;
  private static final int INPUT = 6;
  private static final int PRINTED = 7;
  private static final int PROGRESS = 8;
  private static final int RETURNED = 9;
  private static final int FAILED = 10;

  private EventCodec() {}

  static void write(WireWriter out, Event event) {
    if (event instanceof Event.Shown shown) {
      ItemCodec.write(out.tag(SHOWN), shown.item());
    } else if (event instanceof Event.Kept kept) {
      ItemCodec.measure(out.tag(KEPT).text(kept.name()), kept.value());
    } else if (event instanceof Event.Assumed assumed) {
      out.tag(ASSUMED).text(assumed.name());
      ItemCodec.measure(out, assumed.value());
      ItemCodec.measure(out, assumed.stated());
      out.flag(assumed.overridden());
    } else if (event instanceof Event.Cautioned c) {
      out.tag(CAUTIONED).text(c.code()).text(c.about()).text(c.text()).number(c.count());
    } else if (event instanceof Event.Used used) {
      used(out.tag(USED), used);
    } else {
      writeMore(out, event);
    }
  }

  private static void writeMore(WireWriter out, Event event) {
    if (event instanceof Event.InputRead i) {
      out.tag(INPUT).text(i.path()).text(i.absolute()).whole(i.bytes()).text(i.sha256());
      out.number(i.rows()).texts(i.mapping());
    } else if (event instanceof Event.Printed printed) {
      out.tag(PRINTED).text(printed.text()).flag(printed.error());
    } else if (event instanceof Event.Progress progress) {
      out.tag(PROGRESS).text(progress.what()).real(progress.done());
    } else if (event instanceof Event.Returned r) {
      ItemCodec.write(out.tag(RETURNED).text(r.variable()).text(r.type()), r.item());
    } else if (event instanceof Event.Failed failed) {
      failed(out.tag(FAILED), failed);
    }
  }

  static Event read(WireReader in) throws BadFrame {
    int tag = in.tag();
    switch (tag) {
      case SHOWN:
        return new Event.Shown(ItemCodec.read(in));
      case KEPT:
        return new Event.Kept(in.text(), ItemCodec.measure(in));
      case ASSUMED:
        return new Event.Assumed(
            in.text(), ItemCodec.measure(in), ItemCodec.measure(in), in.flag());
      case CAUTIONED:
        return new Event.Cautioned(in.text(), in.text(), in.text(), in.number());
      case USED:
        return new Event.Used(in.text(), in.text(), in.text(), in.text(), in.text(), in.text());
      default:
        return readMore(tag, in);
    }
  }

  private static Event readMore(int tag, WireReader in) throws BadFrame {
    switch (tag) {
      case INPUT:
        return new Event.InputRead(
            in.text(), in.text(), in.whole(), in.text(), in.number(), in.texts());
      case PRINTED:
        return new Event.Printed(in.text(), in.flag());
      case PROGRESS:
        return new Event.Progress(in.text(), in.real());
      case RETURNED:
        return new Event.Returned(in.text(), in.text(), ItemCodec.read(in));
      case FAILED:
        return failed(in);
      default:
        throw new BadFrame("event " + tag);
    }
  }

  private static void used(WireWriter out, Event.Used used) {
    out.text(used.id()).text(used.title()).text(used.equation()).text(used.source());
    out.text(used.status()).text(used.range());
  }

  private static void failed(WireWriter out, Event.Failed failed) {
    out.text(failed.kind()).text(failed.type()).text(failed.message());
    out.list(failed.frames(), (w, f) -> w.text(f.where()).text(f.file()).number(f.line()));
    out.flag(failed.badInput());
  }

  private static Event.Failed failed(WireReader in) throws BadFrame {
    return new Event.Failed(
        in.text(),
        in.text(),
        in.text(),
        in.list(r -> new Event.Frame(r.text(), r.text(), r.number())),
        in.flag());
  }
}
