package connate.console;

import connate.file.AtomicFile;
import connate.record.LogRecord;
import connate.record.ReplayLog;
import connate.run.ReplaySettings;
import connate.workbook.Workbook;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Runs a workbook from top to bottom and writes its log. */
@Command(
    name = "connate replay",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    header = {
      "connate replay workbooks/tarn-hill/permeability.jsh",
      "connate replay north.jsh --assume \"porosity cutoff=10 %%\" --out north-10.html",
      ""
    },
    description = "Runs a workbook from top to bottom in a fresh engine and writes its log.")
final class ReplayCommand implements Callable<Integer> {

  @Parameters(paramLabel = "WORKBOOK", description = "the workbook, a .jsh file")
  private Path file;

  @Option(
      names = "--assume",
      paramLabel = "NAME=VALUE",
      description = "another value for an assumption; may stand several times")
  private List<String> assumptions = new ArrayList<>();

  @Option(names = "--data", paramLabel = "DIR", description = "a folder whose files come first")
  private Path data;

  @Option(
      names = {"-o", "--out"},
      paramLabel = "FILE",
      description = "where the log goes; else beside the workbook")
  private Path out;

  @Option(names = "--seed", paramLabel = "N", description = "the seed of all chance")
  private long seed = 1;

  @Option(names = "--pack", description = "put the input files into the log")
  private boolean pack;

  @Option(names = "--trust", description = "lift the guard; the log says so")
  private boolean trust;

  @Option(names = "--json", description = "print the kept results as JSON")
  private boolean json;

  @Option(
      names = {"-q", "--quiet"},
      description = "print no cautions and no progress")
  private boolean quiet;

  @Override
  public Integer call() throws IOException {
    if (!Files.isRegularFile(file)) {
      System.err.println(Missing.words("workbook", file));
      return Exit.BAD_INPUT;
    }
    ReplaySettings settings = settings();
    if (settings == null) {
      return Exit.USAGE;
    }
    byte[] bytes = Files.readAllBytes(file);
    Replayed done = Replayed.run(Workbook.parse(file), bytes, settings, pack, !quiet);
    ReplayLog log = done.log();
    Path written = write(done.page());
    Report report = new Report(log, System.out, System.err);
    if (json) {
      System.out.println(LogRecord.kept(log));
    } else {
      report.results(written);
    }
    if (!quiet) {
      report.cautions();
    }
    return report.ending(log.outcome(), written);
  }

  private ReplaySettings settings() {
    ReplaySettings settings = ReplaySettings.PLAIN.withSeed(seed).withData(data);
    for (String assumption : assumptions) {
      int equals = assumption.indexOf('=');
      if (equals < 1) {
        System.err.println(
            "connate: --assume takes NAME=VALUE, such as \"porosity cutoff=10 %\"; found «"
                + assumption
                + "»");
        return null;
      }
      settings =
          settings.withAssumption(
              assumption.substring(0, equals).strip(), assumption.substring(equals + 1).strip());
    }
    return trust ? settings.trusted() : settings;
  }

  private Path write(String page) {
    Path target = out == null ? beside() : out.toAbsolutePath();
    AtomicFile.write(target, page.getBytes(StandardCharsets.UTF_8));
    return target;
  }

  /** Beside the workbook, or in the current folder where that one is not ours to write. */
  private Path beside() {
    String name = file.getFileName().toString().replaceFirst("\\.jsh$", "") + ".html";
    Path folder = file.toAbsolutePath().getParent();
    if (Files.isWritable(folder)) {
      return folder.resolve(name);
    }
    System.err.println("connate: " + folder + " cannot be written; the log goes to this folder");
    return Path.of(name).toAbsolutePath();
  }
}
