package connate.run;

import connate.compile.Compilation;
import connate.compile.WholeCompiler;
import connate.guard.Refusal;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.io.IOException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.PathMatcher;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * What a workbook needs and says, found without running it: whether it compiles, whether the guard
 * would let it run, which files it names and which of them are missing. Names that are computed
 * while it runs cannot be seen.
 *
 * @param steps the number of steps
 * @param commands the number of commands
 * @param way why it would be compiled command by command, empty where it need not
 * @param inputs the files and patterns that it names
 * @param missing those that fit no file
 * @param assumptions the names of its assumptions
 * @param kept the names of its kept results
 * @param problem why it does not compile, with its place
 * @param refusal why the guard would refuse it
 */
public record Inspection(
    int steps,
    int commands,
    String way,
    List<String> inputs,
    List<String> missing,
    List<String> assumptions,
    List<String> kept,
    Optional<String> problem,
    Optional<String> refusal) {

  private static final String TEXT = "\\s*\\(\\s*\"((?:[^\"\\\\]|\\\\.)*)\"";
  private static final Pattern INPUT =
      Pattern.compile("\\b(?:table|well|wells|tops|survey|sieves)" + TEXT);
  private static final Pattern ASSUMED = Pattern.compile("\\bassume" + TEXT);
  private static final Pattern KEPT = Pattern.compile("\\bkeep" + TEXT);

  /** Looks at a workbook. */
  public static Inspection of(Workbook workbook, Path data) {
    Compilation compilation = WholeCompiler.compile(workbook, EngineProcess.classPath());
    List<String> inputs = names(workbook, INPUT);
    return new Inspection(
        workbook.steps().size(),
        workbook.commands().size(),
        compilation.why(),
        inputs,
        inputs.stream().filter(name -> !isThere(name, workbook.folder(), data)).toList(),
        names(workbook, ASSUMED),
        names(workbook, KEPT),
        Optional.ofNullable(compilation.problem()).map(p -> p.message()),
        Verdict.of(compilation.classes(), ReplaySettings.PLAIN).map(Refusal::message));
  }

  private static List<String> names(Workbook workbook, Pattern pattern) {
    List<String> names = new ArrayList<>();
    for (Command command : workbook.commands()) {
      Matcher matcher = pattern.matcher(command.code());
      while (matcher.find()) {
        if (!names.contains(matcher.group(1))) {
          names.add(matcher.group(1));
        }
      }
    }
    return List.copyOf(names);
  }

  private static boolean isThere(String name, Path folder, Path data) {
    return isThere(name, folder) || data != null && isThere(name, data);
  }

  private static boolean isThere(String name, Path folder) {
    if (!name.contains("*") && !name.contains("?")) {
      return Files.isRegularFile(folder.resolve(name));
    }
    PathMatcher matcher = FileSystems.getDefault().getPathMatcher("glob:" + name);
    try (Stream<Path> all = Files.walk(folder, 6)) {
      return all.anyMatch(path -> matcher.matches(folder.relativize(path)));
    } catch (IOException e) {
      return false;
    }
  }
}
