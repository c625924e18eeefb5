package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.method.Caution;
import connate.method.Listening;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

/** Makes text of a file's bytes: UTF-8, UTF-16 where its mark says so, else Windows-1252. */
final class CsvText {

  private static final Charset OLD = Charset.forName("windows-1252");

  private CsvText() {}

  static String of(String file, byte[] bytes) {
    if (starts(bytes, 0xEF, 0xBB, 0xBF)) {
      return checked(file, utf8(file, bytes, 3));
    }
    if (starts(bytes, 0xFF, 0xFE)) {
      return checked(file, new String(bytes, 2, bytes.length - 2, StandardCharsets.UTF_16LE));
    }
    if (starts(bytes, 0xFE, 0xFF)) {
      return checked(file, new String(bytes, 2, bytes.length - 2, StandardCharsets.UTF_16BE));
    }
    if (starts(bytes, 0xD0, 0xCF, 0x11, 0xE0)) {
      throw other(
          file,
          "this is a spreadsheet of the old kind, or one locked by a password",
          "save it as .xlsx without a password, or as CSV");
    }
    for (byte one : bytes) {
      if (one == 0) {
        throw other(file, "it holds zero bytes, as no text does", "is it the right file?");
      }
    }
    return checked(file, utf8(file, bytes, 0));
  }

  private static boolean starts(byte[] bytes, int... mark) {
    if (bytes.length < mark.length) {
      return false;
    }
    for (int i = 0; i < mark.length; i++) {
      if ((bytes[i] & 0xFF) != mark[i]) {
        return false;
      }
    }
    return true;
  }

  private static String utf8(String file, byte[] bytes, int start) {
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .decode(ByteBuffer.wrap(bytes, start, bytes.length - start))
          .toString();
    } catch (CharacterCodingException e) {
      Listening.caution(
          Caution.of("T20", file, file + " is no UTF-8; it was read as Windows-1252"));
      return new String(bytes, start, bytes.length - start, OLD);
    }
  }

  private static String checked(String file, String text) {
    String start = text.substring(0, Math.min(text.length(), 4000)).toUpperCase(Locale.ROOT);
    boolean las = start.startsWith("~V") || start.contains("\n~V");
    if (las) {
      throw other(file, "this is a LAS file, no table", "read it with well(\"" + file + "\")");
    }
    return text;
  }

  private static DataException other(String file, String message, String help) {
    return new DataException(Fault.ofFile(file, "T15", message, help));
  }
}
