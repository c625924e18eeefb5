package connate.protocol;

import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collection;
import java.util.Map;
import java.util.function.BiConsumer;

/** Writes the fields of one frame. */
final class WireWriter {

  private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
  private final DataOutputStream out = new DataOutputStream(bytes);

  byte[] bytes() {
    return bytes.toByteArray();
  }

  WireWriter tag(int tag) {
    return write(() -> out.writeByte(tag));
  }

  WireWriter number(int value) {
    return write(() -> out.writeInt(value));
  }

  WireWriter whole(long value) {
    return write(() -> out.writeLong(value));
  }

  WireWriter real(double value) {
    return write(() -> out.writeDouble(value));
  }

  WireWriter flag(boolean value) {
    return write(() -> out.writeBoolean(value));
  }

  WireWriter text(String value) {
    return block(value.getBytes(StandardCharsets.UTF_8));
  }

  WireWriter block(byte[] value) {
    return write(
        () -> {
          out.writeInt(value.length);
          out.write(value);
        });
  }

  <T> WireWriter list(Collection<T> values, BiConsumer<WireWriter, T> each) {
    number(values.size());
    values.forEach(value -> each.accept(this, value));
    return this;
  }

  WireWriter texts(Collection<String> values) {
    return list(values, WireWriter::text);
  }

  WireWriter map(Map<String, String> values) {
    return list(values.entrySet(), (w, e) -> w.text(e.getKey()).text(e.getValue()));
  }

  private WireWriter write(Writing writing) {
    try {
      writing.run();
      return this;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private interface Writing {
    void run() throws IOException;
  }
}
