package connate.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * A session as an unsaved workbook: what was typed, in order, and what became of it. Prose counts
 * as having worked.
 */
public final class SessionBook {

  private final Map<Integer, Line> lines = new LinkedHashMap<>();
  private String folder = "";
  private Path file;
  private String savedText = "";

  /** What became of something typed. */
  enum State {
    /** It was written down and may have been running when the session broke off. */
    OPEN,
    WORKED,
    FAILED,
    UNDONE
  }

  private record Line(String text, State state) {}

  static SessionBook of(List<Entry> entries) {
    SessionBook book = new SessionBook();
    for (Entry entry : entries) {
      switch (entry.kind()) {
        case TYPED -> book.typed(entry.number(), entry.text());
        case WORKED -> book.worked(entry.number());
        case FAILED -> book.failed(entry.number());
        case UNDONE -> book.undone(entry.number());
        case FOLDER -> book.folder = entry.text();
        case SAVED -> book.saved(Path.of(entry.text()));
        case CLOSED -> {
          // changes nothing of what was typed
        }
      }
    }
    return book;
  }

  /** Notes what was typed under the number that the journal gave it. */
  public void typed(int number, String text) {
    lines.put(number, new Line(text, isProse(text) ? State.WORKED : State.OPEN));
  }

  /** Notes that it worked. */
  public void worked(int number) {
    set(number, State.WORKED);
  }

  /** Notes that it failed. */
  public void failed(int number) {
    set(number, State.FAILED);
  }

  /** Notes that it was undone. */
  public void undone(int number) {
    set(number, State.UNDONE);
  }

  /** Notes that the session was saved as a workbook. */
  public void saved(Path workbook) {
    file = workbook;
    savedText = workbook();
  }

  /** Returns the workbook file that the session was saved as or opened from. */
  public Optional<Path> file() {
    return Optional.ofNullable(file);
  }

  /** Returns whether something worked since the session was saved. */
  public boolean isUnsaved() {
    return !workbook().equals(savedText);
  }

  /** Returns the folder in which the session's files lie, where it is known. */
  public Optional<Path> folder() {
    return folder.isEmpty() ? Optional.empty() : Optional.of(Path.of(folder));
  }

  /** Returns the numbers of what worked, prose included, in order. */
  public List<Integer> workedNumbers() {
    return lines.entrySet().stream()
        .filter(e -> e.getValue().state() == State.WORKED)
        .map(Map.Entry::getKey)
        .toList();
  }

  /** Returns whether a text is prose alone. */
  public boolean isProse(int number) {
    return isProse(text(number));
  }

  /** Returns the number of the last command that worked, 0 for none. */
  public int lastWorked() {
    int last = 0;
    for (Map.Entry<Integer, Line> entry : lines.entrySet()) {
      if (entry.getValue().state() == State.WORKED && !isProse(entry.getValue().text())) {
        last = entry.getKey();
      }
    }
    return last;
  }

  /** Returns what was typed under a number. */
  public String text(int number) {
    return lines.get(number).text();
  }

  /** Returns the texts that worked, prose included, in order. */
  public List<String> worked() {
    return texts(State.WORKED);
  }

  /** Returns the commands of which nobody knows how they ended, as when the machine went down. */
  public List<String> open() {
    return texts(State.OPEN);
  }

  /** Returns whether nothing worked and nothing is open. */
  public boolean isEmpty() {
    return worked().isEmpty() && open().isEmpty();
  }

  /** Returns the workbook of what worked. */
  public String workbook() {
    StringBuilder out = new StringBuilder();
    boolean prose = false;
    for (String text : worked()) {
      boolean now = isProse(text);
      if (now && !prose && out.length() > 0) {
        out.append('\n');
      }
      if (!now && prose) {
        out.append('\n');
      }
      out.append(text.stripTrailing()).append('\n');
      prose = now;
    }
    return out.toString();
  }

  private List<String> texts(State state) {
    List<String> out = new ArrayList<>();
    lines.values().stream().filter(l -> l.state() == state).map(Line::text).forEach(out::add);
    return out;
  }

  private void set(int number, State state) {
    lines.computeIfPresent(number, (n, line) -> new Line(line.text(), state));
  }

  private static boolean isProse(String text) {
    return text.lines().map(String::strip).allMatch(l -> l.isEmpty() || l.startsWith("///"));
  }

  @Override
  public String toString() {
    return lines.values().stream()
        .map(l -> l.state() + " " + l.text())
        .collect(Collectors.joining("\n"));
  }
}
