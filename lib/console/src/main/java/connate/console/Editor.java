package connate.console;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jline.keymap.KeyMap;
import org.jline.reader.Completer;
import org.jline.reader.EndOfFileException;
import org.jline.reader.LineReader;
import org.jline.reader.LineReader.Option;
import org.jline.reader.LineReaderBuilder;
import org.jline.reader.Reference;
import org.jline.reader.UserInterruptException;
import org.jline.reader.Widget;
import org.jline.reader.impl.history.DefaultHistory;
import org.jline.terminal.Terminal;
import org.jline.terminal.TerminalBuilder;

/** The line editor: reads whole commands from a terminal. */
final class Editor implements AutoCloseable {

  private static final String TAB = "\t";
  private static final String EXPLAIN = "explain";
  private static final String COMPLETE = "complete-or-explain";

  private final Terminal terminal;
  private final LineReader reader;
  private final HistoryFile history;
  private String lastEntry = "";

  /** Explains what is being typed. */
  interface Explainer extends Function<Typing, List<String>> {}

  Editor(
      Terminal terminal,
      Completer completer,
      Explainer explainer,
      HistoryFile history,
      boolean coloured) {
    this.terminal = terminal;
    this.history = history;
    this.reader =
        LineReaderBuilder.builder()
            .terminal(terminal)
            .appName("connate")
            .parser(new Entering())
            .completer(completer)
            .highlighter(new Colours(coloured))
            .history(new DefaultHistory())
            .option(Option.DISABLE_EVENT_EXPANSION, true)
            .option(Option.CASE_INSENSITIVE, true)
            .option(Option.HISTORY_IGNORE_SPACE, false)
            .option(Option.INSERT_TAB, false)
            .option(Option.AUTO_FRESH_LINE, false)
            .variable(LineReader.SECONDARY_PROMPT_PATTERN, "%P  ")
            .variable(LineReader.LIST_MAX, 200)
            .build();
    for (String entry : history.entries()) {
      reader.getHistory().add(entry);
      lastEntry = entry;
    }
    bind(explainer);
  }

  /** Opens the terminal that this process runs in. */
  static Terminal system() {
    try {
      return TerminalBuilder.builder()
          .system(true)
          .provider("jni")
          .encoding(StandardCharsets.UTF_8)
          .dumb(true)
          .graphemeCluster(false)
          .build();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void bind(Explainer explainer) {
    Widget explain =
        () -> {
          tell(explainer);
          return true;
        };
    Widget complete =
        () -> {
          Typing typing = typing();
          if (typing.atArgument() && tell(explainer)) {
            return true;
          }
          reader.callWidget(LineReader.EXPAND_OR_COMPLETE);
          return true;
        };
    reader.getWidgets().put(EXPLAIN, explain);
    reader.getWidgets().put(COMPLETE, complete);
    for (String name : List.of(LineReader.EMACS, LineReader.VIINS)) {
      KeyMap<org.jline.reader.Binding> keys = reader.getKeyMaps().get(name);
      keys.bind(new Reference(COMPLETE), TAB);
      keys.bind(new Reference(EXPLAIN), KeyMap.alt('h'), "\u001bOP", "\u001b[11~");
    }
  }

  private Typing typing() {
    return Typing.of(reader.getBuffer().toString(), reader.getBuffer().cursor());
  }

  private boolean tell(Explainer explainer) {
    List<String> lines = explainer.apply(typing());
    if (lines.isEmpty()) {
      return false;
    }
    reader.printAbove(String.join("\n", lines));
    return true;
  }

  /** Reads a command, or several that were pasted; nothing where the user leaves. */
  Optional<String> read(String prompt) {
    while (true) {
      try {
        String typed = reader.readLine(prompt);
        remember(typed);
        return Optional.of(typed);
      } catch (UserInterruptException e) {
        // Ctrl-C clears what was typed
        continue;
      } catch (EndOfFileException e) {
        return Optional.empty();
      }
    }
  }

  private void remember(String typed) {
    if (!typed.isBlank() && !typed.equals(lastEntry)) {
      history.add(typed);
      lastEntry = typed;
    }
  }

  /** Asks a question that is answered with one letter; Enter says yes. */
  boolean agrees(String question) {
    Optional<String> answer = answer(question);
    return answer.isPresent()
        && !answer.get().strip().toLowerCase(java.util.Locale.ROOT).startsWith("n");
  }

  private Optional<String> answer(String question) {
    try {
      return Optional.of(LineReaderBuilder.builder().terminal(terminal).build().readLine(question));
    } catch (UserInterruptException | EndOfFileException e) {
      return Optional.empty();
    }
  }

  Terminal terminal() {
    return terminal;
  }

  @Override
  public void close() {
    try {
      terminal.close();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
