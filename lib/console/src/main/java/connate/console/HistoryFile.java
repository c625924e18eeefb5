package connate.console;

import connate.file.AtomicFile;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;

/**
 * What was typed in all consoles, one entry a line. Each entry is appended on its own in one piece,
 * so that two consoles do not overwrite each other's; what is no text is passed over; a file that
 * cannot be written costs the history, never the session.
 */
final class HistoryFile {

  private static final long LARGEST = 2L << 20;
  private static final int MOST = 5000;
  private static final int LONGEST = 10_000;

  private final Path file;

  HistoryFile(Path file) {
    this.file = file;
  }

  /** Returns the entries, oldest first. */
  List<String> entries() {
    try {
      if (!Files.isRegularFile(file)) {
        return List.of();
      }
      boolean large = Files.size(file) > LARGEST;
      List<String> entries = parse(new String(Files.readAllBytes(file), StandardCharsets.UTF_8));
      if (large) {
        AtomicFile.write(file, text(entries).getBytes(StandardCharsets.UTF_8));
      }
      return entries;
    } catch (IOException | UncheckedIOException e) {
      return List.of();
    }
  }

  private static List<String> parse(String text) {
    List<String> entries = new ArrayList<>();
    text.lines()
        .filter(l -> !l.isBlank() && l.length() <= LONGEST && l.codePoints().noneMatch(c -> odd(c)))
        .map(HistoryFile::plain)
        .forEach(entries::add);
    return entries.subList(Math.max(0, entries.size() - MOST), entries.size());
  }

  private static boolean odd(int c) {
    return Character.isISOControl(c) && c != '\t' || c == 0xFFFD;
  }

  /** Adds an entry; returns whether it could be written. */
  boolean add(String entry) {
    try {
      Files.createDirectories(file.toAbsolutePath().getParent());
      byte[] line = text(List.of(entry)).getBytes(StandardCharsets.UTF_8);
      Files.write(file, line, StandardOpenOption.CREATE, StandardOpenOption.APPEND);
      return true;
    } catch (IOException e) {
      return false;
    }
  }

  private static String text(List<String> entries) {
    StringBuilder out = new StringBuilder();
    for (String entry : entries) {
      out.append(entry.replace("\\", "\\\\").replace("\r", "").replace("\n", "\\n")).append('\n');
    }
    return out.toString();
  }

  private static String plain(String line) {
    return line.replace("\\\\", "\u0000").replace("\\n", "\n").replace('\u0000', '\\');
  }
}
