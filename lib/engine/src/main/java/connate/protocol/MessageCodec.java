package connate.protocol;

/** Requests and replies as bytes. */
final class MessageCodec {

  private static final int BEGIN = 1;
  private static final int LOAD = 2;
  private static final int INVOKE = 3;
  private static final int READ = 4;
  private static final int STOP = 5;
  private static final int CLOSE = 6;

  private static final int READY = 1;
  private static final int TOLD = 2;
  private static final int LOADED = 3;
  private static final int VALUE = 4;

  private MessageCodec() {}

  static byte[] bytes(Request request) {
    WireWriter out = new WireWriter();
    if (request instanceof Request.Begin b) {
      out.tag(BEGIN).text(b.workbook()).text(b.folder()).text(b.data());
      out.map(b.assumptions()).whole(b.seed()).flag(b.guarded());
    } else if (request instanceof Request.Load load) {
      out.tag(LOAD).list(load.classes(), (w, c) -> w.text(c.name()).block(c.bytes()));
    } else if (request instanceof Request.Invoke i) {
      out.tag(INVOKE).number(i.command()).text(i.owner()).text(i.method());
      out.text(i.variable()).text(i.type()).flag(i.muted());
    } else if (request instanceof Request.Read read) {
      out.tag(READ).text(read.owner()).text(read.field());
    } else if (request instanceof Request.Stop stop) {
      out.tag(STOP).number(stop.command());
    } else {
      out.tag(CLOSE);
    }
    return out.bytes();
  }

  static Request request(byte[] frame) throws BadFrame {
    WireReader in = new WireReader(frame);
    Request request = request(in.tag(), in);
    in.end();
    return request;
  }

  private static Request request(int tag, WireReader in) throws BadFrame {
    switch (tag) {
      case BEGIN:
        return new Request.Begin(in.text(), in.text(), in.text(), in.map(), in.whole(), in.flag());
      case LOAD:
        return new Request.Load(in.list(r -> new Request.Bytecode(r.text(), r.block())));
      case INVOKE:
        return new Request.Invoke(
            in.number(), in.text(), in.text(), in.text(), in.text(), in.flag());
      case READ:
        return new Request.Read(in.text(), in.text());
      case STOP:
        return new Request.Stop(in.number());
      case CLOSE:
        return new Request.Close();
      default:
        throw new BadFrame("request " + tag);
    }
  }

  static byte[] bytes(Reply reply) {
    WireWriter out = new WireWriter();
    if (reply instanceof Reply.Ready ready) {
      out.tag(READY).number(ready.version());
    } else if (reply instanceof Reply.Told told) {
      EventCodec.write(out.tag(TOLD).number(told.command()), told.event());
    } else if (reply instanceof Reply.Loaded loaded) {
      out.tag(LOADED).text(loaded.problem());
    } else if (reply instanceof Reply.Value value) {
      out.tag(VALUE).text(value.text());
    }
    return out.bytes();
  }

  static Reply reply(byte[] frame) throws BadFrame {
    WireReader in = new WireReader(frame);
    Reply reply = reply(in.tag(), in);
    in.end();
    return reply;
  }

  private static Reply reply(int tag, WireReader in) throws BadFrame {
    switch (tag) {
      case READY:
        return new Reply.Ready(in.number());
      case TOLD:
        return new Reply.Told(in.number(), EventCodec.read(in));
      case LOADED:
        return new Reply.Loaded(in.text());
      case VALUE:
        return new Reply.Value(in.text());
      default:
        throw new BadFrame("reply " + tag);
    }
  }
}
