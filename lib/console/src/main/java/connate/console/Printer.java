package connate.console;

import connate.log.SvgGate;
import connate.log.Values;
import connate.picture.PictureTerminal;
import connate.picture.Raster;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.text.ItemText;
import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Prints what a command gives, as it comes. */
final class Printer {

  private static final int SHORT = 60;
  private static final int BRIEF = 3;
  private static final long AFTER_NANOS = 400_000_000L;

  private final Screen screen;
  private final FigureFiles figures;
  private final Optional<PictureTerminal> terminal;
  private long start = System.nanoTime();

  Printer(Screen screen, FigureFiles figures, Optional<PictureTerminal> terminal) {
    this.terminal = terminal;
    this.screen = screen;
    this.figures = figures;
  }

  /** Begins a command: progress is shown only of what takes long. */
  void begins() {
    start = System.nanoTime();
  }

  void event(Event event) {
    if (event instanceof Event.Shown shown) {
      item("", shown.item());
    } else if (event instanceof Event.Kept kept) {
      screen.line(fact("kept", kept.name(), kept.value()));
    } else if (event instanceof Event.Assumed assumed) {
      screen.line(fact("assumed", assumed.name(), assumed.value()));
    } else if (event instanceof Event.Cautioned caution) {
      screen.line(screen.ink().caution("caution: " + oneLine(caution.text())));
    } else if (event instanceof Event.InputRead read) {
      input(read);
    } else if (event instanceof Event.Printed printed) {
      screen.raw(ItemText.clean(printed.text()));
    } else if (event instanceof Event.Progress progress) {
      progress(progress);
    }
  }

  private void progress(Event.Progress progress) {
    long took = System.nanoTime() - start;
    if (took < AFTER_NANOS) {
      return;
    }
    String part = "";
    if (progress.done() > 0.02) {
      long left = Math.round(took / 1e9 * (1 - progress.done()) / progress.done());
      part = " " + Math.round(100 * progress.done()) + " %, about " + left + " s left";
    }
    screen.status(ItemText.clean(progress.what()) + part + " (Ctrl-C stops)");
  }

  private void input(Event.InputRead read) {
    screen.line(screen.ink().faint("read " + ItemText.clean(read.path()) + ", " + rows(read)));
  }

  static String rows(Event.InputRead read) {
    return read.rows() == 1 ? "1 row" : read.rows() + " rows";
  }

  /** Prints the value of a command. */
  void returned(Event.Returned returned) {
    screen.clearStatus();
    if (returned.item() != null) {
      item(returned.variable(), returned.item());
    }
  }

  /** Returns the head of a table that was given a name: enough to see that it is the right one. */
  private static Item brief(Item item) {
    if (item instanceof Item.Grid grid && grid.rows().size() > BRIEF) {
      List<List<String>> first = grid.rows().subList(0, BRIEF);
      return new Item.Grid(grid.caption(), grid.heads(), first, grid.total(), List.of());
    }
    return item;
  }

  private void item(String name, Item item) {
    if (item instanceof Item.Picture picture && drawn(picture)) {
      file(picture);
      return;
    }
    List<String> lines = screen.setter().lines(name.isEmpty() ? item : brief(item));
    if (name.isEmpty() || item instanceof Item.Grid || item instanceof Item.Group) {
      lines.forEach(screen::line);
    } else if (lines.size() == 1 && lines.get(0).length() <= SHORT) {
      screen.line(screen.ink().faint(name + " = ") + lines.get(0));
    } else {
      screen.line(screen.ink().faint(name + " ="));
      lines.forEach(screen::line);
    }
    pictures(item).forEach(this::file);
  }

  /**
   * Shows a figure as a picture; returns false where the terminal or the figure does not let us.
   */
  private boolean drawn(Item.Picture picture) {
    if (terminal.isEmpty()) {
      return false;
    }
    try {
      BufferedImage image = Raster.of(SvgGate.pass(picture.svg()), 1);
      screen.line(terminal.get().sequence(image));
      return true;
    } catch (IllegalArgumentException e) {
      return false;
    }
  }

  private static List<Item.Picture> pictures(Item item) {
    List<Item.Picture> found = new ArrayList<>();
    if (item instanceof Item.Picture picture) {
      found.add(picture);
    } else if (item instanceof Item.Group group) {
      group.items().forEach(i -> found.addAll(pictures(i)));
    }
    return found;
  }

  private void file(Item.Picture picture) {
    Optional<Path> file = figures.write(picture);
    screen.line(
        file.map(f -> screen.ink().faint("figure: " + f))
            .orElse(screen.ink().caution("caution: the figure could not be written to a file")));
  }

  /** Returns a named measure in one line. */
  String fact(String word, String name, Item.Measure value) {
    String range = Values.range(value);
    return screen.ink().faint(word.isEmpty() ? "" : word + " ")
        + ItemText.clean(name)
        + ": "
        + ItemText.clean(Values.plain(value))
        + (range.isEmpty() ? "" : screen.ink().faint("  (" + ItemText.clean(range) + ")"));
  }

  /** Prints why a command failed: what is wrong, the place, one way out. */
  void failed(String message) {
    screen.clearStatus();
    List<String> lines = ItemText.clean(message).lines().toList();
    for (int at = 0; at < lines.size(); at++) {
      screen.line(at == 0 ? screen.ink().error(lines.get(at)) : lines.get(at));
    }
  }

  private static String oneLine(String text) {
    return ItemText.clean(text).replaceAll("\\s*\\n\\s*", " ");
  }
}
