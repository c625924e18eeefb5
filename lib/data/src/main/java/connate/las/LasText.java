package connate.las;

import connate.fault.DataException;
import connate.fault.Fault;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * The bytes of a file with their lines. A line ends at CR LF, LF or CR. The byte behind the last
 * one is a line feed, the file's own or one that is added, so that a scan along a line needs no
 * other bound.
 */
final class LasText {

  private static final Charset WINDOWS = Charset.forName("windows-1252");
  private static final byte CTRL_Z = 0x1A;
  private static final int STRIDE = 1 << 14;
  private static final int LONGEST = 1 << 24;

  final String file;
  final byte[] bytes;
  final int from;
  final int to;

  private final int[] linesBefore;
  private int counted = 1;

  private LasText(String file, byte[] bytes, int from, int to) {
    this.file = file;
    this.bytes = bytes;
    this.from = from;
    this.to = to;
    this.linesBefore = new int[(to - from) / STRIDE + 2];
  }

  /** Takes the bytes of a file; a byte order mark and a tail of Ctrl-Z or NUL are left out. */
  static LasText of(String file, byte[] content, Quirks quirks) {
    if (content.length >= 2 && isUtf16(content)) {
      throw refusal(file, "L02", "is UTF-16 text, where LAS is plain ASCII", "save as plain text");
    }
    int from = 0;
    if (content.length >= 3
        && content[0] == (byte) 0xEF
        && content[1] == (byte) 0xBB
        && content[2] == (byte) 0xBF) {
      from = 3;
      quirks.note("L70", 1, "starts with a byte order mark: left out");
    }
    int to = content.length;
    while (to > from && (content[to - 1] == CTRL_Z || content[to - 1] == 0)) {
      to--;
    }
    if (to < content.length) {
      quirks.note("L70", 0, "ends with " + (content.length - to) + " Ctrl-Z or NUL: left out");
    }
    if (to > from && content[to - 1] == '\n') {
      return new LasText(file, content, from, to - 1);
    }
    byte[] padded = Arrays.copyOf(content, to + 1);
    padded[to] = '\n';
    return new LasText(file, padded, from, to);
  }

  private static boolean isUtf16(byte[] b) {
    int first = (b[0] & 0xFF) << 8 | b[1] & 0xFF;
    return first == 0xFEFF || first == 0xFFFE || first == '~' || first == '~' << 8;
  }

  /** Returns the offset of the line end that follows, or is at, an offset. */
  int lineEnd(int at) {
    int i = at;
    while (bytes[i] != '\n' && bytes[i] != '\r') {
      i++;
    }
    return Math.min(i, to);
  }

  /** Returns the offset behind a line end. */
  int afterLine(int lineEnd) {
    if (lineEnd < to && bytes[lineEnd] == '\r' && bytes[lineEnd + 1] == '\n') {
      return Math.min(lineEnd + 2, to);
    }
    return Math.min(lineEnd + 1, to);
  }

  /** Returns the first offset in a line that holds no blank. */
  int skipBlanks(int at) {
    int i = at;
    while (bytes[i] == ' ' || bytes[i] == '\t') {
      i++;
    }
    return i;
  }

  /** Returns the offset of the start of the line that holds an offset. */
  int lineStart(int at) {
    int i = at;
    while (i > from && bytes[i - 1] != '\n' && bytes[i - 1] != '\r') {
      i--;
    }
    return i;
  }

  /** Returns the number of the line that holds an offset, counted from 1. */
  int lineOf(int offset) {
    int stride = (offset - from) / STRIDE;
    while (counted <= stride) {
      int start = from + (counted - 1) * STRIDE;
      linesBefore[counted] = linesBefore[counted - 1] + breaks(start, start + STRIDE);
      counted++;
    }
    return 1 + linesBefore[stride] + breaks(from + stride * STRIDE, offset);
  }

  private int breaks(int start, int end) {
    int count = 0;
    for (int i = start; i < end; i++) {
      byte b = bytes[i];
      if (b == '\n' || b == '\r' && bytes[i + 1] != '\n') {
        count++;
      }
    }
    return count;
  }

  /** Returns a piece as text: ASCII, else UTF-8 where it is valid, else Windows-1252. */
  String text(int start, int end) {
    if (end - start > LONGEST) {
      throw refusal("L16", "a line is longer than 16 MiB", "check the file's type");
    }
    for (int i = start; i < end; i++) {
      if (bytes[i] < 0) {
        return decoded(start, end);
      }
    }
    return new String(bytes, start, end - start, StandardCharsets.ISO_8859_1);
  }

  private String decoded(int start, int end) {
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .onMalformedInput(CodingErrorAction.REPORT)
          .onUnmappableCharacter(CodingErrorAction.REPORT)
          .decode(ByteBuffer.wrap(bytes, start, end - start))
          .toString();
    } catch (CharacterCodingException e) {
      return new String(bytes, start, end - start, WINDOWS);
    }
  }

  /** Returns the offset of a character of a line that was read as text. */
  int offset(int lineFrom, String line, int character) {
    boolean isOneToOne = lineEnd(lineFrom) - lineFrom == line.length();
    String before = line.substring(0, character);
    return lineFrom + (isOneToOne ? character : before.getBytes(StandardCharsets.UTF_8).length);
  }

  /** Returns a fault at a place, with the line's text. */
  Fault fault(int start, int end, String code, String message, String help) {
    int lineStart = lineStart(start);
    String line = text(lineStart, lineEnd(start));
    int column = text(lineStart, start).length() + 1;
    int length = Math.max(1, text(start, Math.max(start, end)).length());
    return new Fault(file, lineOf(start), column, length, code, message, line, help);
  }

  /** Returns an exception of one fault at a place. */
  DataException refusal(int start, int end, String code, String message, String help) {
    return new DataException(fault(start, end, code, message, help));
  }

  /** Returns an exception of one fault of the whole file. */
  DataException refusal(String code, String message, String help) {
    return refusal(file, code, message, help);
  }

  private static DataException refusal(String file, String code, String message, String help) {
    return new DataException(Fault.ofFile(file, code, message, help));
  }

  /** Returns an exception at a header line. */
  DataException refusal(HeaderLine at, String code, String message, String help) {
    return new DataException(
        new Fault(file, at.line(), 1, 1, code, message, at.text().strip(), help));
  }
}
