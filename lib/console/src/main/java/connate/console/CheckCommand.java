package connate.console;

import connate.run.Inspection;
import connate.workbook.Workbook;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Parses and compiles a workbook and says what it needs; runs nothing. */
@Command(
    name = "connate check",
    mixinStandardHelpOptions = true,
    header = {"connate check north.jsh", ""},
    description = "Parses and compiles a workbook, names its inputs and which are missing.")
final class CheckCommand implements Callable<Integer> {

  @Parameters(paramLabel = "WORKBOOK", description = "the workbook, a .jsh file")
  private Path file;

  @Option(names = "--data", paramLabel = "DIR", description = "a folder whose files come first")
  private Path data;

  @Override
  public Integer call() throws IOException {
    if (!Files.isRegularFile(file)) {
      System.err.println(Missing.words("workbook", file));
      return Exit.BAD_INPUT;
    }
    Inspection found = Inspection.of(Workbook.parse(file), data);
    System.out.println(
        found.steps()
            + " steps, "
            + found.commands()
            + " commands"
            + (found.way().isEmpty() ? "" : "; to be compiled command by command: " + found.way()));
    list("input", found.inputs());
    list("assumption", found.assumptions());
    list("kept", found.kept());
    found.missing().forEach(path -> System.err.println("missing input: " + path));
    found.refusal().ifPresent(System.err::println);
    found.problem().ifPresent(System.err::println);
    if (found.problem().isPresent()) {
      return Exit.FAILED;
    }
    if (found.refusal().isPresent()) {
      return Exit.REFUSED;
    }
    return found.missing().isEmpty() ? Exit.DONE : Exit.BAD_INPUT;
  }

  private static void list(String what, List<String> names) {
    names.forEach(name -> System.out.println(what + ": " + name));
  }
}
