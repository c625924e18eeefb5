package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import org.apache.commons.compress.archivers.zip.ZipArchiveEntry;
import org.apache.commons.compress.archivers.zip.ZipFile;

/**
 * Looks at what an XLSX file inflates to before anything parses it. It walks the same directory of
 * the archive as the reader does, so that both see the same parts.
 */
final class XlsxBounds {

  /** The most bytes of all parts together. */
  static final long LARGEST = 512L << 20;

  private static final byte[][] ENTITIES = {
    "<!DOCTYPE".getBytes(StandardCharsets.US_ASCII), "<!ENTITY".getBytes(StandardCharsets.US_ASCII)
  };

  private final String file;
  private final byte[] chunk = new byte[1 << 16];
  private long total;

  private XlsxBounds(String file) {
    this.file = file;
  }

  static void check(String file, byte[] bytes) throws IOException {
    XlsxBounds bounds = new XlsxBounds(file);
    try (ZipFile zip = ZipFile.builder().setByteArray(bytes).get()) {
      for (ZipArchiveEntry part : Collections.list(zip.getEntries())) {
        try (InputStream content = zip.getInputStream(part)) {
          bounds.check(
              content, part.getName().endsWith(".xml") || part.getName().endsWith(".rels"));
        }
      }
    }
  }

  private void check(InputStream content, boolean xml) throws IOException {
    int[] met = new int[ENTITIES.length];
    for (int n = content.read(chunk); n > 0; n = content.read(chunk)) {
      total += n;
      if (total > LARGEST) {
        throw refused(
            "T13",
            "it inflates to more than " + (LARGEST >> 20) + " MB",
            "save the sheet that matters as CSV");
      }
      for (int i = 0; xml && i < n; i++) {
        if (chunk[i] == 0 || isMet(met, chunk[i])) {
          throw refused(
              "T14",
              "it declares entities or is written in a way that no spreadsheet program uses",
              "open it in a spreadsheet program and save it anew");
        }
      }
    }
  }

  /** Counts how much of each word has been met, across the chunks. */
  private static boolean isMet(int[] met, byte next) {
    for (int word = 0; word < met.length; word++) {
      byte[] wanted = ENTITIES[word];
      if (next == wanted[met[word]]) {
        met[word]++;
      } else {
        met[word] = next == wanted[0] ? 1 : 0;
      }
      if (met[word] == wanted.length) {
        return true;
      }
    }
    return false;
  }

  private DataException refused(String code, String message, String help) {
    return new DataException(Fault.ofFile(file, code, message, help));
  }
}
