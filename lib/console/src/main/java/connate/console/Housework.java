package connate.console;

import connate.file.AtomicFile;
import connate.log.LogPage;
import connate.log.RunFacts;
import connate.protocol.Event;
import connate.record.LogRecord;
import connate.record.ReplayLog;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.text.ItemText;
import connate.text.Wrapping;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

/** Answers the housekeeping calls of a session. */
final class Housework implements Desk.Answering {

  private final Screen screen;
  private final Printer printer;
  private final Desk desk;
  private final ReplaySettings settings;
  private final Instant started = Instant.now();
  private final Guide guide = new Guide();
  private final Function<Path, Desk.Next> opening;
  private Path refused;

  Housework(
      Screen screen,
      Printer printer,
      Desk desk,
      ReplaySettings settings,
      Function<Path, Desk.Next> opening) {
    this.screen = screen;
    this.printer = printer;
    this.desk = desk;
    this.settings = settings;
    this.opening = opening;
  }

  @Override
  public Desk.Next answer(Call call) {
    try {
      return switch (call.name()) {
        case "help" -> help(call.argument());
        case "methods" -> methods(call.argument().orElse(""));
        case "inputs" -> inputs();
        case "results" -> results();
        case "undo" -> undo();
        case "save" -> save(call.argument());
        case "open" -> open(call.argument());
        case "log" -> log(call.argument());
        case "why" -> why();
        default -> Desk.Next.QUIT;
      };
    } catch (UncheckedIOException e) {
      return failed("error: " + e.getMessage());
    }
  }

  /** Returns all that help knows by name. */
  List<String> topics() {
    return guide.topics();
  }

  private Desk.Next failed(String message) {
    printer.failed(message);
    return Desk.Next.FAILED;
  }

  private Desk.Next lines(List<String> lines) {
    lines.forEach(l -> Wrapping.of(ItemText.clean(l), screen.width()).forEach(screen::line));
    return Desk.Next.GO_ON;
  }

  private Desk.Next help(Optional<String> about) {
    if (about.isEmpty() || about.get().isBlank()) {
      return lines(guide.start(desk.folder()));
    }
    List<String> known = guide.about(about.get());
    if (!known.isEmpty()) {
      return lines(known);
    }
    List<String> documented = Explaining.of(about.get(), desk.evaluator().analysis());
    if (!documented.isEmpty()) {
      return lines(documented);
    }
    return failed("nothing is known of «" + about.get() + "»" + guide.near(about.get()));
  }

  private Desk.Next methods(String words) {
    List<String> found = guide.methods(words);
    if (found.isEmpty()) {
      return failed("no method holds «" + words + "»; methods() lists all");
    }
    return lines(found);
  }

  private Desk.Next inputs() {
    Map<String, Event.InputRead> read = new LinkedHashMap<>();
    for (Event event : desk.events()) {
      if (event instanceof Event.InputRead input) {
        read.put(input.path(), input);
      }
    }
    if (read.isEmpty()) {
      return lines(List.of("no file has been read yet; table(\"…\") reads one"));
    }
    return lines(
        read.values().stream()
            .map(i -> "  " + i.path() + ": " + Printer.rows(i) + ", " + i.bytes() + " bytes")
            .toList());
  }

  private Desk.Next results() {
    List<Event.Kept> kept =
        desk.events().stream()
            .filter(Event.Kept.class::isInstance)
            .map(Event.Kept.class::cast)
            .toList();
    if (kept.isEmpty()) {
      return lines(List.of("nothing is kept yet; keep(\"name\", value) keeps a result"));
    }
    kept.forEach(k -> screen.line("  " + printer.fact("", k.name(), k.value())));
    return Desk.Next.GO_ON;
  }

  private Desk.Next undo() {
    Optional<String> undone = desk.undo();
    if (undone.isEmpty()) {
      return failed("there is no command to take back");
    }
    return lines(List.of("taken back: " + undone.get()));
  }

  private Desk.Next save(Optional<String> name) {
    Optional<Path> target = name.map(n -> file(n, ".jsh")).or(() -> desk.book().file());
    if (target.isEmpty()) {
      return failed("under which name? save(\"north.jsh\")");
    }
    Path file = target.get();
    boolean own = desk.book().file().filter(file::equals).isPresent();
    if (Files.exists(file) && !own && !file.equals(refused)) {
      refused = file;
      return failed("«" + shown(file) + "» is there already; the same call again replaces it");
    }
    String text = desk.book().workbook();
    AtomicFile.write(file, text.getBytes(StandardCharsets.UTF_8));
    desk.book().saved(file);
    desk.journal().saved(file);
    String moved =
        file.getParent().equals(desk.folder())
            ? ""
            : "; files that it reads are looked for beside it, not in " + desk.folder();
    return lines(List.of("saved " + shown(file) + moved));
  }

  private Desk.Next open(Optional<String> name) {
    if (name.isEmpty()) {
      return failed("which workbook? open(\"north.jsh\")");
    }
    Path file = file(name.get(), ".jsh");
    if (!Files.isRegularFile(file)) {
      return failed(Missing.words("workbook", file));
    }
    return opening.apply(file);
  }

  private Desk.Next log(Optional<String> name) {
    String own = desk.book().file().map(f -> f.getFileName().toString()).orElse("session.jsh");
    Path file = file(name.orElse(own.replaceFirst("\\.jsh$", "") + ".html"), ".html");
    String text = desk.book().workbook();
    ReplayLog log = new ReplayLog(Workbook.parse(own, desk.folder(), text), settings);
    if (!fill(log)) {
      return failed("save this session and replay it: its commands do not part as they were typed");
    }
    LogRecord record = LogRecord.of(log, text.getBytes(StandardCharsets.UTF_8), false);
    Duration took = Duration.between(started, Instant.now());
    String page = LogPage.of(log, record, new RunFacts(started, took, "in the console"));
    AtomicFile.write(file, page.getBytes(StandardCharsets.UTF_8));
    return lines(List.of("log: " + file));
  }

  /** Gives the log what happened; the commands of its workbook are those that worked, in order. */
  private boolean fill(ReplayLog log) {
    List<Integer> ran =
        desk.book().workedNumbers().stream().filter(n -> !desk.book().isProse(n)).toList();
    List<Command> commands = log.workbook().commands();
    if (ran.size() != commands.size()) {
      return false;
    }
    for (Command command : commands) {
      log.started(command);
      desk.events(ran.get(command.index())).forEach(e -> log.event(command, e));
      log.finished(command);
    }
    log.ended(
        new ReplayOutcome(
            ReplayOutcome.Kind.COMPLETED, null, null, ReplaySettings.Way.SHELL, "", Set.of()));
    return true;
  }

  private Desk.Next why() {
    Optional<Event.Failed> failure = desk.failure();
    if (failure.isEmpty()) {
      return lines(List.of("nothing has failed"));
    }
    printer.failed(Wrong.ran(failure.get()));
    List<String> trace = Wrong.trace(failure.get());
    return lines(trace.isEmpty() ? List.of("  it failed before any call") : trace);
  }

  private Path file(String name, String ending) {
    String whole = name.endsWith(ending) ? name : name + ending;
    return desk.folder().resolve(whole).toAbsolutePath().normalize();
  }

  private String shown(Path file) {
    return file.startsWith(desk.folder()) ? desk.folder().relativize(file).toString() : "" + file;
  }
}
