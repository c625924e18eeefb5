package connate.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.quantity.Numbers;
import connate.workbook.Command;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.List;
import java.util.Optional;

/**
 * What a log says, for programs: kept results, assumptions, cautions, inputs, methods, commands and
 * the workbook's text. Numbers stand at ten significant digits, so that the last bits of another
 * machine do not show.
 *
 * @param json the record as JSON in which no sign of markup stands
 * @param pack the input files as JSON, empty where none were packed
 * @param workbookSha256 the digest of the workbook's bytes
 */
public record LogRecord(String json, Optional<String> pack, String workbookSha256) {

  /** The version of the schema. */
  public static final int VERSION = 1;

  private static final JsonFactory FACTORY = new JsonFactory();

  /**
   * Makes the record of a replay.
   *
   * @param log the replay
   * @param workbook the workbook's bytes as they stand in its file
   * @param packed whether the input files come along
   */
  public static LogRecord of(ReplayLog log, byte[] workbook, boolean packed) {
    String sha256 = Digest.hex(workbook);
    String json = write(out -> record(out, log, workbook, sha256));
    Optional<String> pack = packed ? Optional.of(write(out -> pack(out, log))) : Optional.empty();
    return new LogRecord(json, pack, sha256);
  }

  /**
   * Returns the kept results alone as JSON, one a line, with how the replay ended: the same bytes
   * for the same results on any machine.
   */
  public static String kept(ReplayLog log) {
    StringBuilder out = new StringBuilder("{\n");
    out.append(
        write(json -> outcomeObject(json, log)).replaceFirst("^\\{", "").replaceFirst("}$", ""));
    out.append(",\n\"kept\":[");
    String between = "\n";
    for (ReplayLog.Of<Event.Kept> of : log.kept()) {
      out.append(between).append(write(json -> keptObject(json, of)));
      between = ",\n";
    }
    return out.append("\n]}").toString();
  }

  /** Writes JSON. */
  private interface Body {
    void write(JsonGenerator out) throws IOException;
  }

  private static String write(Body body) {
    StringWriter text = new StringWriter();
    try (JsonGenerator out = FACTORY.createGenerator(text)) {
      body.write(out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString().replace("<", "\\u003c").replace(">", "\\u003e").replace("&", "\\u0026");
  }

  private static void record(JsonGenerator out, ReplayLog log, byte[] workbook, String sha256)
      throws IOException {
    out.writeStartObject();
    out.writeStringField("schema", "connate-record");
    out.writeNumberField("version", VERSION);
    out.writeStringField("connate", Versions.connate());
    out.writeStringField("title", log.title());
    out.writeObjectFieldStart("workbook");
    out.writeStringField("name", log.workbook().name());
    out.writeStringField("sha256", sha256);
    out.writeStringField("text", new String(workbook, StandardCharsets.UTF_8));
    out.writeEndObject();
    out.writeNumberField("seed", log.settings().seed());
    out.writeBooleanField("guarded", log.settings().guarded());
    outcome(out, log);
    kept(out, log);
    assumptions(out, log);
    cautions(out, log);
    inputs(out, log);
    methods(out, log);
    commands(out, log.workbook().commands());
    out.writeEndObject();
  }

  private static void outcomeObject(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeStartObject();
    outcome(out, log);
    out.writeEndObject();
  }

  private static void keptObject(JsonGenerator out, ReplayLog.Of<Event.Kept> of)
      throws IOException {
    out.writeStartObject();
    out.writeStringField("name", of.event().name());
    measure(out, of.event().value());
    out.writeNumberField("line", of.command().firstLine());
    out.writeEndObject();
  }

  private static void outcome(JsonGenerator out, ReplayLog log) throws IOException {
    if (log.outcome() == null) {
      return;
    }
    out.writeObjectFieldStart("outcome");
    out.writeStringField("kind", log.outcome().kind().name().toLowerCase(java.util.Locale.ROOT));
    if (log.outcome().command() != null) {
      out.writeNumberField("line", log.outcome().command().firstLine());
    }
    if (log.outcome().failure() != null) {
      out.writeStringField("failure", log.outcome().failure().kind());
      out.writeStringField("message", log.outcome().failure().message());
    }
    out.writeEndObject();
  }

  private static void kept(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeArrayFieldStart("kept");
    for (ReplayLog.Of<Event.Kept> of : log.kept()) {
      keptObject(out, of);
    }
    out.writeEndArray();
  }

  private static void measure(JsonGenerator out, Item.Measure value) throws IOException {
    out.writeStringField("kind", value.kind());
    number(out, "value", value.value());
    out.writeStringField("unit", value.unit());
    number(out, "low", value.low());
    number(out, "high", value.high());
    out.writeStringField("range", value.range());
    out.writeNumberField("n", value.count());
    out.writeStringField("text", value.text());
  }

  private static void number(JsonGenerator out, String name, double value) throws IOException {
    out.writeFieldName(name);
    if (Double.isFinite(value)) {
      out.writeNumber(Numbers.record(value));
    } else {
      out.writeNull();
    }
  }

  private static void assumptions(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeArrayFieldStart("assumptions");
    for (ReplayLog.Of<Event.Assumed> of : log.assumed()) {
      out.writeStartObject();
      out.writeStringField("name", of.event().name());
      measure(out, of.event().value());
      out.writeStringField("stated", of.event().stated().text());
      out.writeBooleanField("overridden", of.event().overridden());
      out.writeNumberField("line", of.command().firstLine());
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  private static void cautions(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeArrayFieldStart("cautions");
    for (ReplayLog.Of<Event.Cautioned> of : log.cautions()) {
      out.writeStartObject();
      out.writeStringField("code", of.event().code());
      out.writeStringField("about", of.event().about());
      out.writeStringField("text", of.event().text());
      out.writeNumberField("line", of.command().firstLine());
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  private static void inputs(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeArrayFieldStart("inputs");
    for (ReplayLog.Of<Event.InputRead> of : log.inputs()) {
      out.writeStartObject();
      out.writeStringField("path", of.event().path());
      out.writeNumberField("bytes", of.event().bytes());
      out.writeStringField("sha256", of.event().sha256());
      out.writeNumberField("rows", of.event().rows());
      out.writeArrayFieldStart("mapping");
      for (String line : of.event().mapping()) {
        out.writeString(line);
      }
      out.writeEndArray();
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  private static void methods(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeArrayFieldStart("methods");
    for (ReplayLog.Of<Event.Used> of : log.methods()) {
      out.writeStartObject();
      out.writeStringField("id", of.event().id());
      out.writeStringField("title", of.event().title());
      out.writeStringField("equation", of.event().equation());
      out.writeStringField("source", of.event().source());
      out.writeStringField("constants", of.event().status());
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  private static void commands(JsonGenerator out, List<Command> commands) throws IOException {
    out.writeArrayFieldStart("commands");
    for (Command command : commands) {
      out.writeStartObject();
      out.writeNumberField("line", command.firstLine());
      out.writeNumberField("lastLine", command.lastLine());
      out.writeStringField("sha256", Digest.hex(command.code().getBytes(StandardCharsets.UTF_8)));
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  /** The bytes are read again, and must still be those that the engine read. */
  private static void pack(JsonGenerator out, ReplayLog log) throws IOException {
    out.writeStartObject();
    out.writeArrayFieldStart("files");
    for (ReplayLog.Of<Event.InputRead> of : log.inputs()) {
      byte[] bytes = Files.readAllBytes(Path.of(of.event().absolute()));
      if (!Digest.hex(bytes).equals(of.event().sha256())) {
        throw new IOException(
            of.event().path() + " changed while the workbook ran: replay once more");
      }
      byte[] small = Deflate.pack(bytes);
      boolean smaller = small.length < bytes.length;
      out.writeStartObject();
      out.writeStringField("path", of.event().path());
      out.writeStringField("sha256", of.event().sha256());
      out.writeStringField("encoding", smaller ? "deflate+base64" : "base64");
      out.writeStringField("data", Base64.getEncoder().encodeToString(smaller ? small : bytes));
      out.writeEndObject();
    }
    out.writeEndArray();
    out.writeEndObject();
  }
}
