package connate.record;

import java.io.ByteArrayOutputStream;
import java.util.zip.DataFormatException;
import java.util.zip.Deflater;
import java.util.zip.Inflater;

/** Packs bytes and unpacks them again, within bounds. */
final class Deflate {

  private static final int CHUNK = 1 << 16;

  private Deflate() {}

  static byte[] pack(byte[] bytes) {
    Deflater deflater = new Deflater(Deflater.BEST_COMPRESSION);
    try {
      deflater.setInput(bytes);
      deflater.finish();
      ByteArrayOutputStream out = new ByteArrayOutputStream(bytes.length / 3 + 64);
      byte[] chunk = new byte[CHUNK];
      while (!deflater.finished()) {
        out.write(chunk, 0, deflater.deflate(chunk));
      }
      return out.toByteArray();
    } finally {
      deflater.end();
    }
  }

  /**
   * Unpacks bytes.
   *
   * @param most the largest size that is accepted
   * @throws IllegalArgumentException if the bytes are damaged or grow beyond the bound
   */
  static byte[] unpack(byte[] packed, long most) {
    Inflater inflater = new Inflater();
    try {
      inflater.setInput(packed);
      ByteArrayOutputStream out = new ByteArrayOutputStream(packed.length * 3 + 64);
      byte[] chunk = new byte[CHUNK];
      while (!inflater.finished()) {
        int n = inflater.inflate(chunk);
        if (n == 0 && !inflater.finished()) {
          throw new IllegalArgumentException("the packed data end too early");
        }
        out.write(chunk, 0, n);
        if (out.size() > most) {
          throw new IllegalArgumentException("the packed data grow beyond " + most + " bytes");
        }
      }
      return out.toByteArray();
    } catch (DataFormatException e) {
      throw new IllegalArgumentException("the packed data are damaged: " + e.getMessage(), e);
    } finally {
      inflater.end();
    }
  }
}
