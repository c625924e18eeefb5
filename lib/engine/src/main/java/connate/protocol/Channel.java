package connate.protocol;

import java.io.BufferedInputStream;
import java.io.DataInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.util.Optional;

/**
 * Frames over a pair of streams: a length of four bytes, then the message. One thread may read
 * while others write.
 */
public final class Channel {

  /** The version of the protocol; an engine of another version is not talked to. */
  public static final int VERSION = 1;

  /** The largest frame, in bytes. */
  public static final int LARGEST = 64 << 20;

  private final DataInputStream in;
  private final OutputStream out;

  /** Makes a channel. */
  public Channel(InputStream in, OutputStream out) {
    this.in = new DataInputStream(new BufferedInputStream(in, 1 << 16));
    this.out = out;
  }

  /** Sends a request. */
  public void send(Request request) throws IOException {
    write(MessageCodec.bytes(request));
  }

  /** Sends a reply. */
  public void send(Reply reply) throws IOException {
    write(MessageCodec.bytes(reply));
  }

  /** Returns the next request, empty where the other side has gone. */
  public Optional<Request> request() throws IOException {
    byte[] frame = read();
    return frame == null ? Optional.empty() : Optional.of(MessageCodec.request(frame));
  }

  /** Returns the next reply, empty where the other side has gone. */
  public Optional<Reply> reply() throws IOException {
    byte[] frame = read();
    return frame == null ? Optional.empty() : Optional.of(MessageCodec.reply(frame));
  }

  private synchronized void write(byte[] message) throws IOException {
    if (message.length > LARGEST) {
      throw new BadFrame("a message of " + message.length + " bytes");
    }
    ByteBuffer frame = ByteBuffer.allocate(4 + message.length);
    out.write(frame.putInt(message.length).put(message).array());
    out.flush();
  }

  private byte[] read() throws IOException {
    int size;
    try {
      size = in.readInt();
    } catch (EOFException e) {
      return null;
    }
    if (size < 1 || size > LARGEST) {
      throw new BadFrame("a message of " + size + " bytes");
    }
    byte[] message = new byte[size];
    in.readFully(message);
    return message;
  }
}
