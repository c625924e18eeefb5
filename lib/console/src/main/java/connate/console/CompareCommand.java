package connate.console;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import connate.compare.Change;
import connate.compare.Comparison;
import connate.record.StoredLog;
import connate.text.ItemText;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Sets two logs side by side. */
@Command(
    name = "connate compare",
    mixinStandardHelpOptions = true,
    header = {"connate compare november.html december.html", ""},
    description = "Says what moved between two logs, and by how much. Runs nothing.",
    footer = {"", "Exit: 0 nothing differs, 1 something does."})
final class CompareCommand implements Callable<Integer> {

  @Parameters(index = "0", paramLabel = "OLD", description = "a log")
  private Path old;

  @Parameters(index = "1", paramLabel = "NEW", description = "another log")
  private Path now;

  @Option(names = "--json", description = "print the differences as JSON")
  private boolean json;

  @Override
  public Integer call() throws IOException {
    Comparison comparison = Comparison.of(StoredLog.read(old), StoredLog.read(now));
    if (json) {
      System.out.println(json(comparison));
    } else {
      text(comparison);
    }
    return comparison.isSame() ? Exit.DONE : Exit.FAILED;
  }

  private static void text(Comparison comparison) {
    for (String what : List.of("input", "assumption", "workbook", "result")) {
      List<Change> some = comparison.changes().stream().filter(c -> c.what().equals(what)).toList();
      if (!some.isEmpty()) {
        System.out.println(heading(what));
        int name = some.stream().mapToInt(c -> c.name().length()).max().orElse(0);
        for (Change change : some) {
          System.out.println(
              "  "
                  + ItemText.clean(change.name())
                  + " ".repeat(name - change.name().length())
                  + "  "
                  + ItemText.clean(change.words()));
        }
      }
    }
    System.out.println(
        comparison.isSame()
            ? "nothing differs"
            : comparison.same() + " kept results are the same in both");
  }

  private static String heading(String what) {
    return switch (what) {
      case "input" -> "Inputs";
      case "assumption" -> "Assumptions";
      case "workbook" -> "Workbook";
      default -> "Kept results";
    };
  }

  private static String json(Comparison comparison) throws IOException {
    StringWriter text = new StringWriter();
    try (JsonGenerator out = new JsonFactory().createGenerator(text)) {
      out.writeStartArray();
      for (Map<String, String> change : comparison.members()) {
        out.writeStartObject();
        for (Map.Entry<String, String> member : change.entrySet()) {
          out.writeStringField(member.getKey(), member.getValue());
        }
        out.writeEndObject();
      }
      out.writeEndArray();
    }
    return text.toString();
  }
}
