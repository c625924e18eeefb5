package connate.session;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;

/** The folder of journals: a new one for each session, and those whose session did not end well. */
public final class Journals {

  private static final DateTimeFormatter NAME =
      DateTimeFormatter.ofPattern("uuuuMMdd-HHmmss-SSS", Locale.ROOT).withZone(ZoneOffset.UTC);
  private static final String END = ".journal";

  private final Path folder;

  /** Makes the view of a folder, which need not exist yet. */
  public Journals(Path folder) {
    this.folder = folder;
  }

  /** Starts the journal of a new session. */
  public Journal start(Instant now, long process, Consumer<String> warn) {
    return Journal.open(folder.resolve(NAME.format(now) + "-" + process + END), warn);
  }

  /** Continues the journal of a session that was brought back. */
  public Journal resume(Path file, Consumer<String> warn) {
    return Journal.open(file, warn);
  }

  /**
   * Returns the latest session that typed something, did not end well and whose console is gone.
   *
   * @return its journal and what it did
   */
  public Optional<Lost> lost() {
    List<Path> files = new ArrayList<>();
    try (DirectoryStream<Path> all = Files.newDirectoryStream(folder, "*" + END)) {
      all.forEach(files::add);
    } catch (IOException e) {
      return Optional.empty();
    }
    return files.stream()
        .sorted(Comparator.comparing((Path p) -> p.getFileName().toString()).reversed())
        .filter(Journals::isFree)
        .map(Journals::lost)
        .flatMap(Optional::stream)
        .findFirst();
  }

  /**
   * A session that did not end well.
   *
   * @param file its journal
   * @param book what it did
   */
  public record Lost(Path file, SessionBook book) {}

  private static Optional<Lost> lost(Path file) {
    List<Entry> entries;
    try {
      entries = Journal.read(file);
    } catch (java.io.UncheckedIOException e) {
      return Optional.empty();
    }
    boolean ended = entries.stream().anyMatch(e -> e.kind() == Entry.Kind.CLOSED);
    SessionBook book = SessionBook.of(entries);
    return ended || book.isEmpty() ? Optional.empty() : Optional.of(new Lost(file, book));
  }

  private static boolean isFree(Path file) {
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE);
        FileLock lock = channel.tryLock()) {
      return lock != null;
    } catch (IOException | OverlappingFileLockException e) {
      return false;
    }
  }
}
