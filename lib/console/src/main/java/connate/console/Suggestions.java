package connate.console;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Supplier;
import java.util.stream.Stream;
import jdk.jshell.SourceCodeAnalysis;
import org.jline.reader.Candidate;
import org.jline.reader.Completer;
import org.jline.reader.LineReader;
import org.jline.reader.ParsedLine;

/** What may stand at the cursor: names and members; in a text, files, columns or methods. */
final class Suggestions implements Completer {

  private static final Set<String> FILES =
      Set.of("table", "well", "wells", "tops", "survey", "open", "save", "log");

  private final Supplier<SourceCodeAnalysis> analysis;
  private final Supplier<Path> folder;
  private final Supplier<Collection<String>> columns;
  private final Supplier<Collection<String>> topics;

  Suggestions(
      Supplier<SourceCodeAnalysis> analysis,
      Supplier<Path> folder,
      Supplier<Collection<String>> columns,
      Supplier<Collection<String>> topics) {
    this.analysis = analysis;
    this.folder = folder;
    this.columns = columns;
    this.topics = topics;
  }

  @Override
  public void complete(LineReader reader, ParsedLine line, List<Candidate> candidates) {
    Typing typing = Typing.of(line.line(), line.cursor());
    boolean closes = typing.text() && !line.line().startsWith("\"", line.cursor());
    for (String value : values(typing)) {
      String whole = closes && !value.endsWith("/") ? value + "\"" : value;
      candidates.add(new Candidate(whole, value, null, null, null, null, false));
    }
  }

  /** Returns what could take the place of the word at the cursor. */
  Collection<String> values(Typing typing) {
    if (typing.text()) {
      return typing.call().equals("help")
          ? topics.get()
          : FILES.contains(typing.call()) ? files(typing.typedWord()) : columns.get();
    }
    Set<String> values = new TreeSet<>();
    if (typing.first()) {
      Call.NAMES.forEach(n -> values.add(n + "("));
    }
    int[] anchor = {typing.word()};
    String typed = typing.command();
    for (var suggestion : analysis.get().completionSuggestions(typed, typed.length(), anchor)) {
      int start = Math.min(anchor[0], typed.length());
      String whole = typed.substring(0, start) + suggestion.continuation();
      if (whole.length() > typing.word()) {
        values.add(whole.substring(typing.word()));
      }
    }
    return values;
  }

  /** Returns the files whose path begins as typed; folders end in a slash. */
  private List<String> files(String typed) {
    int slash = typed.lastIndexOf('/');
    String inside = typed.substring(0, slash + 1);
    Path where = folder.get().resolve(inside);
    List<String> found = new ArrayList<>();
    try (Stream<Path> all = Files.list(where)) {
      all.filter(f -> !f.getFileName().toString().startsWith("."))
          .sorted()
          .forEach(f -> found.add(inside + f.getFileName() + (Files.isDirectory(f) ? "/" : "")));
    } catch (IOException e) {
      return List.of();
    }
    return found;
  }
}
