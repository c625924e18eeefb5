package connate.record;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** SHA-256. */
public final class Digest {

  private Digest() {}

  /** Returns the digest of bytes. */
  public static byte[] sha256(byte[] bytes) {
    try {
      return MessageDigest.getInstance("SHA-256").digest(bytes);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }

  /** Returns the digest of bytes in lower-case hex. */
  public static String hex(byte[] bytes) {
    return HexFormat.of().formatHex(sha256(bytes));
  }
}
