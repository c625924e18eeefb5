package connate.protocol;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;

/** Reads the fields of one frame. Nothing is believed: sizes are checked against what is there. */
final class WireReader {

  private static final int DEEPEST = 16;

  private final ByteBuffer in;
  private int depth;

  WireReader(byte[] frame) {
    in = ByteBuffer.wrap(frame);
  }

  int tag() throws BadFrame {
    return read(ByteBuffer::get);
  }

  int number() throws BadFrame {
    return read(ByteBuffer::getInt);
  }

  long whole() throws BadFrame {
    return read(ByteBuffer::getLong);
  }

  double real() throws BadFrame {
    return read(ByteBuffer::getDouble);
  }

  boolean flag() throws BadFrame {
    return tag() != 0;
  }

  String text() throws BadFrame {
    return new String(block(), StandardCharsets.UTF_8);
  }

  byte[] block() throws BadFrame {
    byte[] bytes = new byte[size(1)];
    in.get(bytes);
    return bytes;
  }

  <T> List<T> list(Part<T> part) throws BadFrame {
    depth++;
    if (depth > DEEPEST) {
      throw new BadFrame("nested deeper than " + DEEPEST);
    }
    int size = size(1);
    List<T> values = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      values.add(part.read(this));
    }
    depth--;
    return values;
  }

  List<String> texts() throws BadFrame {
    return list(WireReader::text);
  }

  Map<String, String> map() throws BadFrame {
    Map<String, String> values = new TreeMap<>();
    int size = size(8);
    for (int i = 0; i < size; i++) {
      values.put(text(), text());
    }
    return values;
  }

  void end() throws BadFrame {
    if (in.hasRemaining()) {
      throw new BadFrame(in.remaining() + " bytes too many");
    }
  }

  private int size(int least) throws BadFrame {
    int size = number();
    if (size < 0 || size > in.remaining() / least) {
      throw new BadFrame("a size of " + size + " in a rest of " + in.remaining() + " bytes");
    }
    return size;
  }

  private <T> T read(Function<ByteBuffer, T> reading) throws BadFrame {
    try {
      return reading.apply(in);
    } catch (BufferUnderflowException e) {
      throw new BadFrame("a frame ends early");
    }
  }

  /** A part of a frame. */
  interface Part<T> {
    T read(WireReader in) throws BadFrame;
  }
}
