package connate.session;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;

/**
 * The journal of one session: a text file to which each command goes before it runs. It is locked
 * while its session lives, so that another console leaves it alone.
 *
 * <p>Where the disk refuses (it is full, say), the entries are held in memory, the user is told
 * once, and every later entry tries again to write all that is held.
 */
public final class Journal implements AutoCloseable {

  private final Path file;
  private final Consumer<String> warn;
  private final List<Entry> held = new ArrayList<>();
  private FileChannel channel;
  private FileLock lock;
  private long sound;
  private boolean warned;
  private int last;

  private Journal(Path file, Consumer<String> warn) {
    this.file = file;
    this.warn = warn;
  }

  /**
   * Opens a journal, new or to be continued.
   *
   * @param file the file
   * @param warn is told in words where the journal cannot be written
   */
  public static Journal open(Path file, Consumer<String> warn) {
    Journal journal = new Journal(file, warn);
    journal.tryOpen();
    return journal;
  }

  /** Writes down a command before it runs, and returns its number. */
  public synchronized int typed(String text) {
    last++;
    write(new Entry(Entry.Kind.TYPED, last, text));
    return last;
  }

  /** Writes down that a command worked. */
  public synchronized void worked(int number) {
    write(new Entry(Entry.Kind.WORKED, number, ""));
  }

  /** Writes down that a command failed. */
  public synchronized void failed(int number, String why) {
    write(new Entry(Entry.Kind.FAILED, number, why));
  }

  /** Writes down that a command was undone. */
  public synchronized void undone(int number) {
    write(new Entry(Entry.Kind.UNDONE, number, ""));
  }

  /** Writes down that the session was saved as a workbook. */
  public synchronized void saved(Path workbook) {
    write(new Entry(Entry.Kind.SAVED, 0, workbook.toString()));
  }

  /** Writes down in which folder the session's files lie. */
  public synchronized void in(Path folder) {
    write(new Entry(Entry.Kind.FOLDER, 0, folder.toString()));
  }

  /** Ends the journal of a session that the user left; it is not offered again. */
  public synchronized void end() {
    write(new Entry(Entry.Kind.CLOSED, 0, ""));
    close();
  }

  /** Returns the file. */
  public Path file() {
    return file;
  }

  /** Returns whether everything typed so far is on disk. */
  public synchronized boolean isOnDisk() {
    return held.isEmpty() && channel != null;
  }

  /** Lets go of the file without ending the session. */
  @Override
  public synchronized void close() {
    try {
      if (channel != null) {
        channel.close();
      }
    } catch (IOException e) {
      warn.accept("the journal " + file + " could not be closed: " + e.getMessage());
    }
    channel = null;
  }

  /** Returns the entries of a journal file; a last line that was cut off does not count. */
  static List<Entry> read(Path file) {
    try {
      String text = new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
      List<Entry> entries = new ArrayList<>();
      int start = 0;
      for (int end = text.indexOf('\n'); end >= 0; end = text.indexOf('\n', start)) {
        Entry entry = Entry.read(text.substring(start, end));
        if (entry != null) {
          entries.add(entry);
        }
        start = end + 1;
      }
      return entries;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void write(Entry entry) {
    held.add(entry);
    try {
      if (channel == null) {
        tryOpen();
      }
      if (channel != null) {
        flush();
      }
    } catch (IOException e) {
      tell(e.getMessage());
    }
  }

  private void flush() throws IOException {
    while (!held.isEmpty()) {
      ByteBuffer line =
          ByteBuffer.wrap((held.get(0).line() + "\n").getBytes(StandardCharsets.UTF_8));
      channel.position(sound);
      try {
        while (line.hasRemaining()) {
          channel.write(line);
        }
        channel.force(false);
      } catch (IOException e) {
        channel.truncate(sound);
        throw e;
      }
      sound = channel.position();
      held.remove(0);
    }
    if (warned) {
      warned = false;
      warn.accept("the journal can be written again; nothing is missing from it");
    }
  }

  private void tryOpen() {
    try {
      Files.createDirectories(file.toAbsolutePath().getParent());
      channel =
          FileChannel.open(
              file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
      lock = channel.tryLock();
      if (lock == null) {
        channel.close();
        channel = null;
        tell("another console is writing it");
        return;
      }
      startAfter(read(file));
    } catch (IOException | UncheckedIOException e) {
      channel = null;
      tell(e.getMessage());
    }
  }

  /** Continues behind the last whole line. */
  private void startAfter(List<Entry> entries) throws IOException {
    for (Entry entry : entries) {
      last = Math.max(last, entry.number());
    }
    byte[] bytes = Files.readAllBytes(file);
    int end = bytes.length;
    while (end > 0 && bytes[end - 1] != '\n') {
      end--;
    }
    sound = end;
    channel.truncate(sound);
  }

  private void tell(String why) {
    if (!warned) {
      warned = true;
      warn.accept(
          "the journal "
              + file
              + " cannot be written ("
              + why
              + "): what you type is held in memory until it can; save(\"name.jsh\") elsewhere");
    }
  }
}
