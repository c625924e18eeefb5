package connate.record;

import connate.protocol.Event;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.run.ReplayWatcher;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Collects what happens during a replay, for the log and the record. */
public final class ReplayLog implements ReplayWatcher {

  /**
   * Something that happened, and the command that it happened in.
   *
   * @param command the command
   * @param event what happened
   * @param <E> the kind of event
   */
  public record Of<E extends Event>(Command command, E event) {}

  private final Workbook workbook;
  private final ReplaySettings settings;
  private final Map<Integer, List<Event>> events = new LinkedHashMap<>();
  private final List<Of<Event>> all = new ArrayList<>();
  private ReplayOutcome outcome;

  /** Makes a log of a workbook that is about to be replayed. */
  public ReplayLog(Workbook workbook, ReplaySettings settings) {
    this.workbook = workbook;
    this.settings = settings;
  }

  @Override
  public void started(Command command) {
    events.put(command.index(), new ArrayList<>());
  }

  @Override
  public void event(Command command, Event event) {
    events.computeIfAbsent(command.index(), i -> new ArrayList<>()).add(event);
    all.add(new Of<>(command, event));
  }

  @Override
  public void finished(Command command) {
    // its last event has told
  }

  /** Notes how the replay ended. */
  public void ended(ReplayOutcome how) {
    outcome = how;
  }

  /** Returns the workbook. */
  public Workbook workbook() {
    return workbook;
  }

  /** Returns the title: the first heading of the first level in the prose, else the file name. */
  public String title() {
    return workbook.steps().stream()
        .flatMap(step -> step.prose().lines())
        .map(String::strip)
        .filter(line -> line.startsWith("# "))
        .map(line -> line.substring(2).strip())
        .findFirst()
        .orElse(workbook.name());
  }

  /** Returns the settings. */
  public ReplaySettings settings() {
    return settings;
  }

  /** Returns how the replay ended, {@code null} while it has not. */
  public ReplayOutcome outcome() {
    return outcome;
  }

  /** Returns whether a command was begun. */
  public boolean ran(Command command) {
    return events.containsKey(command.index());
  }

  /** Returns what happened in a command, in order. */
  public List<Event> of(Command command) {
    return events.getOrDefault(command.index(), List.of());
  }

  /** Returns the kept results; where a name was kept twice the last holds. */
  public List<Of<Event.Kept>> kept() {
    return lastByName(Event.Kept.class, Event.Kept::name);
  }

  /** Returns the assumptions; where a name was stated twice the last holds. */
  public List<Of<Event.Assumed>> assumed() {
    return lastByName(Event.Assumed.class, Event.Assumed::name);
  }

  /** Returns the cautions, each text once, with the command that raised it first. */
  public List<Of<Event.Cautioned>> cautions() {
    return firstByName(Event.Cautioned.class, e -> e.code() + e.about() + e.text());
  }

  /** Returns the methods used, by id. */
  public List<Of<Event.Used>> methods() {
    List<Of<Event.Used>> out = new ArrayList<>(firstByName(Event.Used.class, Event.Used::id));
    out.sort(java.util.Comparator.comparing(of -> of.event().title()));
    return out;
  }

  /** Returns the input files, by path. */
  public List<Of<Event.InputRead>> inputs() {
    List<Of<Event.InputRead>> out =
        new ArrayList<>(firstByName(Event.InputRead.class, Event.InputRead::path));
    out.sort(java.util.Comparator.comparing(of -> of.event().path()));
    return out;
  }

  private <E extends Event> List<Of<E>> firstByName(
      Class<E> kind, java.util.function.Function<E, String> name) {
    Map<String, Of<E>> found = new LinkedHashMap<>();
    each(kind, of -> found.putIfAbsent(name.apply(of.event()), of));
    return List.copyOf(found.values());
  }

  private <E extends Event> List<Of<E>> lastByName(
      Class<E> kind, java.util.function.Function<E, String> name) {
    Map<String, Of<E>> found = new LinkedHashMap<>();
    each(kind, of -> found.put(name.apply(of.event()), of));
    return List.copyOf(found.values());
  }

  private <E extends Event> void each(Class<E> kind, java.util.function.Consumer<Of<E>> use) {
    for (Of<Event> of : all) {
      if (kind.isInstance(of.event())) {
        use.accept(new Of<>(of.command(), kind.cast(of.event())));
      }
    }
  }
}
