package connate.console;

import connate.compare.Verification;
import connate.record.Digest;
import connate.record.StoredLog;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.workbook.Workbook;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Replays what a log carries and says which results come out again. */
@Command(
    name = "connate verify",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    header = {"connate verify north.html", "connate verify north.html --data wells-2026/", ""},
    description = {
      "Replays what a log carries and says which results come out again.",
      "The input files come from the log where they are packed, else from the log's folder."
    })
final class VerifyCommand implements Callable<Integer> {

  @Parameters(paramLabel = "LOG", description = "a log")
  private Path file;

  @Option(names = "--data", paramLabel = "DIR", description = "a folder whose files come first")
  private Path data;

  @Option(
      names = "--tolerance",
      paramLabel = "PART",
      description = "the relative difference that is allowed; 1e-9 if not said")
  private double tolerance = 1e-9;

  @Option(names = "--trust", description = "lift the guard")
  private boolean trust;

  @Override
  public Integer call() throws IOException {
    StoredLog log = StoredLog.read(file);
    Path scratch = Files.createTempDirectory("connate-verify");
    try {
      if (log.isPacked()) {
        log.unpack(scratch);
        return judge(log, scratch, scratch);
      }
      Path beside = file.toAbsolutePath().getParent();
      return sameInputs(log, beside) ? judge(log, beside, scratch) : Exit.FAILED;
    } finally {
      remove(scratch);
    }
  }

  /** The digests come first: other data give other results, and that is no fault of the log. */
  private boolean sameInputs(StoredLog log, Path beside) throws IOException {
    boolean same = true;
    for (StoredLog.Input input : log.inputs().values()) {
      Path path = found(input.path(), beside);
      if (path == null) {
        System.err.println("input " + input.path() + ": not there; name its folder with --data");
        same = false;
      } else if (!Digest.hex(Files.readAllBytes(path)).equals(input.sha256())) {
        System.err.println(
            "input " + input.path() + ": not the file that was read (SHA-256 differs)");
        same = false;
      }
    }
    return same;
  }

  private Path found(String path, Path beside) {
    Path first = data == null ? beside.resolve(path) : data.resolve(path);
    return Files.isRegularFile(first)
        ? first
        : Files.isRegularFile(beside.resolve(path)) ? beside.resolve(path) : null;
  }

  private int judge(StoredLog log, Path folder, Path scratch) throws IOException {
    byte[] bytes = log.workbook();
    Workbook workbook =
        Workbook.parse(log.workbookName(), folder, new String(bytes, StandardCharsets.UTF_8));
    ReplaySettings settings = ReplaySettings.PLAIN.withSeed(log.seed()).withData(data);
    for (Map.Entry<String, String> override : log.overrides().entrySet()) {
      settings = settings.withAssumption(override.getKey(), override.getValue());
    }
    settings = trust ? settings.trusted() : settings;
    Replayed again = Replayed.run(workbook, bytes, settings, log.isPacked(), true);
    Path page = scratch.resolve("again.html");
    Files.writeString(page, again.page(), StandardCharsets.UTF_8);
    Verification verification = Verification.of(log, StoredLog.read(page), tolerance);
    return told(verification, again);
  }

  private static int told(Verification verification, Replayed again) {
    int name = verification.results().stream().mapToInt(r -> r.name().length()).max().orElse(0);
    for (Verification.Result result : verification.results()) {
      System.out.println(
          result.name() + " ".repeat(name - result.name().length()) + "  " + words(result));
    }
    if (again.log().outcome().kind() == ReplayOutcome.Kind.REFUSED) {
      System.err.println("the guard refused the workbook: verify with --trust if you do");
      return Exit.REFUSED;
    }
    if (verification.isReproduced() && verification.isPageSame()) {
      System.out.println("all results come out again, and the log byte for byte");
      return Exit.DONE;
    }
    System.out.println(
        verification.isReproduced()
            ? "all results come out again, but the log's text is not the one they give"
            : "not all results come out again");
    return Exit.FAILED;
  }

  private static String words(Verification.Result result) {
    return switch (result.verdict()) {
      case EXACT -> "exactly  " + result.is();
      case WITHIN -> "within the tolerance  " + result.was() + ", now " + result.is();
      case DIFFERS -> "DIFFERS  " + result.was() + ", now " + result.is();
      case MISSING -> "MISSING  " + result.was();
    };
  }

  private static void remove(Path folder) throws IOException {
    try (Stream<Path> all = Files.walk(folder)) {
      for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
        Files.deleteIfExists(path);
      }
    }
  }
}
