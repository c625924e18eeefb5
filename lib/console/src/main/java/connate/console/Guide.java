package connate.console;

import connate.method.MethodCard;
import connate.method.MethodCards;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/** What {@code help} and {@code methods} say. */
final class Guide {

  private static final Map<String, String> WORDS = words();

  private static Map<String, String> words() {
    Map<String, String> words = new LinkedHashMap<>();
    words.put("table", "var plugs = table(\"plugs.csv\");  reads a table: CSV or XLSX, with units");
    words.put("well", "var w = well(\"north.las\");  reads a well from a LAS file");
    words.put("wells", "var all = wells(\"wells/*.las\");  reads all wells that a pattern names");
    words.put("tops", "var tops = tops(\"tops.csv\");  reads the tops of zones");
    words.put("survey", "var path = survey(\"north-path.csv\");  reads a well's path");
    words.put("show", "show(value, …);  shows values, tables and figures; a log shows them too");
    words.put("keep", "keep(\"name\", value);  a kept result: first in the log, compared later");
    words.put(
        "assume", "var cut = assume(\"cutoff\", percent(8));  an assumption that a replay can set");
    words.put("methods", "methods()  lists published methods; methods(\"carbonate\") searches");
    words.put("inputs", "inputs()  lists the files read so far");
    words.put("results", "results()  lists the results kept so far");
    words.put("undo", "undo()  takes the last command back, with all that it changed");
    words.put("save", "save(\"north.jsh\")  writes what worked as a workbook, prose included");
    words.put("open", "open(\"north.jsh\")  starts anew with the steps of a workbook");
    words.put("log", "log(\"north.html\")  writes the calculation log of the session so far");
    words.put("why", "why()  tells where the last command failed: the calls that led there");
    words.put("quit", "quit()  or Ctrl-D leaves; Ctrl-C stops a command that runs");
    words.put("help", "help()  the start; help(\"timur\") a method, help(\"table\") a word");
    return words;
  }

  /** Returns the first page: five commands that lead from a file to a figure. */
  List<String> start(Path folder) {
    Optional<String> csv = tableIn(folder);
    String file = csv.orElse("core-plugs.csv");
    String hint =
        csv.isPresent()
            ? ""
            : "  (no CSV file lies here; the example of Tarn Hill has one: "
                + "open(\"…/workbooks/tarn-hill/permeability.jsh\"))";
    return List.of(
        "From a file to a figure:" + hint,
        "  var plugs = table(\"" + file + "\");",
        "  plugs",
        "  var fit = LogLinear.fit(plugs.get(\"porosity\"), plugs.get(\"k_air\"));",
        "  show(crossplot(plugs.get(\"porosity\"), plugs.get(\"k_air\")).line(fit));",
        "  save(\"first.jsh\")",
        "",
        "Values carry units: percent(21), mD(250), ft(8200). A line that starts with /// is prose.",
        "Tab completes, after ( it shows what goes in. Ctrl-R searches what was typed before.",
        "help(\"…\") tells of a word or a method: " + String.join(", ", WORDS.keySet()));
  }

  private static Optional<String> tableIn(Path folder) {
    try (Stream<Path> files = Files.list(folder)) {
      return files
          .map(f -> f.getFileName().toString())
          .filter(f -> f.endsWith(".csv"))
          .min(Comparator.comparing((String f) -> !f.contains("plug")).thenComparing(f -> f));
    } catch (IOException e) {
      return Optional.empty();
    }
  }

  /** Returns what is known of a word or method; empty where nothing is. */
  List<String> about(String name) {
    String word = name.strip().replaceAll("\\(.*", "");
    if (WORDS.containsKey(word)) {
      return List.of("  " + WORDS.get(word));
    }
    Optional<List<String>> page = HelpPages.of(word);
    if (page.isPresent()) {
      return page.get();
    }
    Optional<MethodCard> card = card(word);
    return card.map(c -> c.toString().lines().toList()).orElse(List.of());
  }

  private static Optional<MethodCard> card(String word) {
    String wanted = bare(word);
    return MethodCards.all().stream()
        .filter(c -> bare(c.id()).equals(wanted) || bare(c.title()).equals(wanted))
        .findFirst()
        .or(
            () ->
                MethodCards.all().stream().filter(c -> bare(c.id()).startsWith(wanted)).findFirst())
        .filter(c -> !wanted.isEmpty());
  }

  private static String bare(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]", "");
  }

  /** Returns the nearest name that help knows, as words. */
  String near(String name) {
    return Help.near(name, topics());
  }

  /** Returns all that help knows by name. */
  List<String> topics() {
    return Stream.concat(WORDS.keySet().stream(), MethodCards.all().stream().map(MethodCard::id))
        .toList();
  }

  /** Returns a line for each method that holds all of some words. */
  List<String> methods(String words) {
    List<MethodCard> found = words.isBlank() ? MethodCards.all() : MethodCards.find(words);
    int widest = found.stream().mapToInt(c -> c.id().length()).max().orElse(0);
    return found.stream()
        .map(
            c ->
                "  "
                    + c.id()
                    + " ".repeat(widest - c.id().length() + 2)
                    + c.title()
                    + (c.source().isEmpty() ? "" : ": " + source(c.source())))
        .toList();
  }

  private static String source(String whole) {
    int end = whole.indexOf(')');
    return end > 0 && end < 60 ? whole.substring(0, end + 1) : whole.split("[,.;]", 2)[0];
  }
}
