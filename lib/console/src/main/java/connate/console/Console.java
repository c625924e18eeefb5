package connate.console;

import connate.file.AtomicFile;
import connate.picture.PictureTerminal;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.record.Versions;
import connate.run.ReplaySettings;
import connate.session.Journal;
import connate.session.Journals;
import connate.session.SessionBook;
import connate.text.Ink;
import connate.workbook.Workbook;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.jline.terminal.Terminal;
import org.jline.utils.Signals;

/** The console: reads commands, runs each, and shows what it gives. */
public final class Console {

  private final ConsoleArguments arguments;
  private final Map<String, String> environment;
  private final Path state;
  private final Path here;
  private final Journals journals;
  private final ReplaySettings settings;
  private Screen screen;
  private Printer printer;
  private volatile Desk desk;
  private Housework housework;

  Console(ConsoleArguments arguments, Map<String, String> environment, Path state, Path folder) {
    this.here = folder;
    this.arguments = arguments;
    this.environment = environment;
    this.state = state;
    this.journals = new Journals(state.resolve("journals"));
    ReplaySettings plain = ReplaySettings.PLAIN.withData(arguments.data());
    this.settings = arguments.trusted() ? plain.trusted() : plain;
  }

  /** Runs the console until the user leaves; returns the exit status. */
  static int run(String... arguments) {
    ConsoleArguments parsed;
    try {
      parsed = ConsoleArguments.parse(arguments);
    } catch (IllegalArgumentException e) {
      System.err.println("connate: " + e.getMessage());
      return Exit.USAGE;
    }
    if (parsed.workbook() != null && !Files.isRegularFile(parsed.workbook())) {
      System.err.println(Missing.words("workbook", parsed.workbook()));
      return Exit.BAD_INPUT;
    }
    Map<String, String> environment = System.getenv();
    Path state = StateFolder.of(environment, System.getProperty("user.home"));
    System.setProperty("java.awt.headless", "true");
    Console console = new Console(parsed, environment, state, Path.of("").toAbsolutePath());
    return isTerminal() ? console.talk(Editor.system()) : console.pipe();
  }

  private static boolean isTerminal() {
    String told = System.getProperty("connate.terminal.input");
    return told == null ? System.console() != null : Boolean.parseBoolean(told);
  }

  // ---- a terminal

  int talk(Terminal terminal) {
    boolean dumb = terminal.getType().startsWith(Terminal.TYPE_DUMB);
    Ink ink = Ink.of(environment, !dumb, arguments.coloured());
    start(new Screen(terminal.writer(), () -> terminal.getSize().getColumns(), ink, !dumb), !dumb);
    Optional<Journals.Lost> lost = arguments.asks() ? journals.lost() : Optional.empty();
    if (lost.isEmpty()) {
      begin(arguments.workbook());
    }
    try (Editor editor =
        new Editor(
            terminal,
            new Suggestions(
                () -> desk.evaluator().analysis(),
                () -> desk.folder(),
                this::columns,
                () -> housework.topics()),
            this::explain,
            new HistoryFile(state.resolve("history")),
            ink.isOn())) {
      banner();
      lost.ifPresent(l -> decide(l, editor));
      terminal.handle(Terminal.Signal.INT, s -> desk.stop());
      Signals.register("HUP", () -> Runtime.getRuntime().halt(Exit.INTERRUPTED));
      replayed();
      loop(editor);
      leave();
    }
    return Exit.DONE;
  }

  private void loop(Editor editor) {
    Optional<String> typed = editor.read(prompt());
    while (typed.isPresent() && guarded(typed.get()) != Desk.Next.QUIT) {
      typed = editor.read(prompt());
    }
  }

  /** Does what was typed; a fault of ours costs a command, not the session. */
  private Desk.Next guarded(String typed) {
    try {
      return desk.enter(typed, housework);
    } catch (RuntimeException e) {
      printer.failed("our fault: " + e + "\nhelp: the session goes on; please report it");
      return Desk.Next.FAILED;
    }
  }

  private String prompt() {
    String name =
        desk.book()
            .file()
            .map(f -> f.getFileName().toString().replaceFirst("\\.jsh$", ""))
            .orElse("");
    return name + "> ";
  }

  private void banner() {
    screen.line(
        screen.ink().strong("Connate " + Versions.connate())
            + screen.ink().faint(": permeability of rock. help() shows the way, Ctrl-D leaves."));
  }

  /** Asks whether a session that broke off is to come back. */
  private void decide(Journals.Lost lost, Editor editor) {
    int count = lost.book().worked().size() + lost.book().open().size();
    boolean back =
        editor.agrees(
            "A session of "
                + (count == 1 ? "1 entry" : count + " entries")
                + " broke off. Bring it back? [Y/n] ");
    Journal journal = journals.resume(lost.file(), this::warn);
    if (!back) {
      Desk old = new Desk(screen, printer, home(lost), null, journal, lost.book());
      put(old);
      begin(arguments.workbook());
      return;
    }
    open(home(lost), journal, lost.book());
    desk.again();
    lost.book()
        .open()
        .forEach(
            t -> screen.line(screen.ink().caution("it was running and is not run again: " + t)));
    screen.line("it is back: " + commands(lost.book().worked().size()));
  }

  private Path home(Journals.Lost lost) {
    return lost.book().folder().filter(Files::isDirectory).orElse(here);
  }

  private void replayed() {
    if (arguments.workbook() != null && desk.book().isEmpty()) {
      replay(arguments.workbook());
    }
  }

  // ---- a pipe

  private int pipe() {
    PrintWriter out = new PrintWriter(System.out, true, StandardCharsets.UTF_8);
    start(new Screen(out, () -> 100, Ink.none(), false), false);
    begin(arguments.workbook());
    boolean[] stopped = {false};
    Object before =
        Signals.register(
            "INT",
            () -> {
              stopped[0] = true;
              desk.stop();
            });
    try {
      replayed();
      Desk.Next next = lines();
      desk.journal().end();
      remove(desk.journal().file());
      desk.evaluator().close();
      return stopped[0] ? Exit.INTERRUPTED : next == Desk.Next.FAILED ? status() : Exit.DONE;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } finally {
      Signals.unregister("INT", before);
    }
  }

  private Desk.Next lines() throws IOException {
    StringBuilder open = new StringBuilder();
    BufferedReader in =
        new BufferedReader(new InputStreamReader(System.in, StandardCharsets.UTF_8));
    for (String line = in.readLine(); line != null; line = in.readLine()) {
      open.append(line).append('\n');
      if (!Workbook.isOpen(open.toString())) {
        Desk.Next next = desk.enter(open.toString(), housework);
        open.setLength(0);
        if (next != Desk.Next.GO_ON) {
          return next;
        }
      }
    }
    return desk.enter(open.toString(), housework);
  }

  private int status() {
    Optional<Event.Failed> failure = desk.failure();
    if (failure.isPresent() && failure.get().badInput()) {
      return Exit.BAD_INPUT;
    }
    boolean refused = failure.isPresent() && failure.get().kind().equals("refused");
    return refused ? Exit.REFUSED : Exit.FAILED;
  }

  // ---- sessions

  private void start(Screen shown, boolean moving) {
    screen = shown;
    long now = Instant.now().toEpochMilli();
    printer =
        new Printer(
            screen,
            new FigureFiles(
                state.resolve("figures").resolve(now + "-" + ProcessHandle.current().pid())),
            moving ? PictureTerminal.of(environment) : Optional.empty());
  }

  private void begin(Path workbook) {
    Path folder = workbook == null ? here : workbook.toAbsolutePath().normalize().getParent();
    Journal journal = journals.start(Instant.now(), ProcessHandle.current().pid(), this::warn);
    journal.in(folder);
    open(folder, journal, new SessionBook());
  }

  private void open(Path folder, Journal journal, SessionBook book) {
    String name = book.file().map(f -> f.getFileName().toString()).orElse("typed");
    Evaluator evaluator = Evaluator.open(name, folder, settings);
    desk = new Desk(screen, printer, folder, evaluator, journal, book);
    housework = new Housework(screen, printer, desk, settings, this::reopen);
  }

  /** Ends the session and starts another with the steps of a workbook. */
  private Desk.Next reopen(Path workbook) {
    leave();
    begin(workbook);
    return replay(workbook);
  }

  private Desk.Next replay(Path workbook) {
    try {
      String text = Workbook.parse(workbook).text();
      Desk.Next next = desk.enter(text, housework);
      desk.book().saved(workbook.toAbsolutePath().normalize());
      desk.journal().saved(workbook.toAbsolutePath().normalize());
      return next;
    } catch (IOException e) {
      printer.failed("error: " + workbook + " cannot be read: " + e.getMessage());
      return Desk.Next.FAILED;
    }
  }

  /** Ends the session; what was not saved as a workbook is put where it can be found. */
  private void leave() {
    put(desk);
    desk.evaluator().close();
  }

  private void put(Desk old) {
    SessionBook book = old.book();
    if (!book.worked().isEmpty() && book.isUnsaved()) {
      String name = old.journal().file().getFileName().toString().replace(".journal", ".jsh");
      Path file = state.resolve("sessions").resolve(name);
      try {
        Files.createDirectories(file.getParent());
        AtomicFile.write(file, book.workbook().getBytes(StandardCharsets.UTF_8));
        screen.line("not saved: " + commands(book.worked().size()) + "; they lie in " + file);
      } catch (IOException | UncheckedIOException e) {
        screen.line("not saved: they lie in " + old.journal().file());
        old.journal().end();
        return;
      }
    }
    old.journal().end();
    remove(old.journal().file());
  }

  private static void remove(Path file) {
    try {
      Files.deleteIfExists(file);
    } catch (IOException e) {
      // an ended journal that stays is not offered again
      return;
    }
  }

  private static String commands(int count) {
    return count == 1 ? "1 entry" : count + " entries";
  }

  private void warn(String text) {
    screen.line(screen.ink().caution("caution: " + text));
  }

  // ---- what the editor asks

  private Collection<String> columns() {
    TreeSet<String> names = new TreeSet<>();
    for (Event event : desk.events()) {
      if (event instanceof Event.Returned returned && returned.item() instanceof Item.Grid grid) {
        grid.heads().forEach(h -> names.add(h.name()));
      } else if (event instanceof Event.Shown shown && shown.item() instanceof Item.Grid grid) {
        grid.heads().forEach(h -> names.add(h.name()));
      } else if (event instanceof Event.InputRead read) {
        read.mapping().forEach(m -> names.add(m.split("[\\s\\[:,]", 2)[0]));
      }
    }
    names.remove("");
    return names;
  }

  private List<String> explain(Typing typing) {
    if (typing.text()) {
      return List.of();
    }
    return Explaining.at(typing.command(), typing.command().length(), desk.evaluator().analysis());
  }
}
