package connate.run;

import connate.compile.TypeName;
import connate.protocol.Event;
import connate.protocol.Preload;
import connate.protocol.Request;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import jdk.jshell.DeclarationSnippet;
import jdk.jshell.Diag;
import jdk.jshell.ExpressionSnippet;
import jdk.jshell.JShell;
import jdk.jshell.Snippet;
import jdk.jshell.SnippetEvent;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.VarSnippet;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.ExecutionControlProvider;
import jdk.jshell.spi.ExecutionEnv;

/**
 * Runs commands one at a time, each compiled by the JDK's shell when it comes. What a command
 * leaves behind, the next one sees. An engine that dies costs one command: a new one is brought to
 * where the last was.
 */
public final class Shell implements AutoCloseable {

  private static final String UNRESOLVED = "jdk.jshell.spi.SPIResolutionException";

  private final ShellControl control;
  private final JShell shell;
  private final ShellFrames frames;

  /** How a command fared. */
  public record Result(Event last, List<Flaw> flaws, List<String> unresolved) {}

  /**
   * What the compiler found.
   *
   * @param code the compiler's code for it
   * @param text the compiler's words
   * @param from where it begins in the command's source
   * @param to where it ends
   */
  public record Flaw(String code, String text, int from, int to) {}

  Shell(ShellControl control, String name) {
    this.control = control;
    this.frames = new ShellFrames(name);
    this.shell =
        JShell.builder()
            .executionEngine(new Provider(control), Map.of())
            .compilerOptions(
                "-classpath", EngineProcess.classPath(), "-XDstringConcat=inline", "-Xlint:none")
            .build();
    control.expect(-1, event -> {});
    shell.eval(
        Preload.imports(EngineProcess.classPath()).stream()
            .map(line -> "import " + line + ";")
            .collect(Collectors.joining(" ")));
  }

  /** Opens a shell with an engine of its own, under the guard where the settings ask for it. */
  public static Shell open(String name, java.nio.file.Path folder, ReplaySettings settings) {
    Request.Begin begin = Replay.begin(name, folder, settings);
    return new Shell(
        new ShellControl(Engine.start(), Engine::start, begin, Verdict.of(settings)), name);
  }

  /**
   * Runs a command.
   *
   * @param number the number that stands in its events
   * @param line the line on which it begins, for stack frames
   * @param source the command
   * @param told hears its events but the last
   */
  public Result run(int number, int line, String source, Consumer<Event> told) {
    control.expect(number, told);
    List<SnippetEvent> events =
        shell.eval(source).stream().filter(e -> e.causeSnippet() == null).toList();
    events.forEach(e -> frames.begins(e.snippet().id(), line));
    if (events.isEmpty()) {
      return new Result(new Event.Returned("", "", null), List.of(), List.of());
    }
    SnippetEvent event = events.get(events.size() - 1);
    Snippet snippet = event.snippet();
    if (event.status() == Snippet.Status.REJECTED) {
      return rejected(snippet);
    }
    if (control.last() instanceof Event.Failed failed) {
      if (failed.kind().equals("refused")) {
        shell.drop(snippet);
      }
      if (failed.type().equals(UNRESOLVED)) {
        return new Result(unknown(), List.of(), List.of());
      }
      boolean thrown = event.exception() != null;
      Event last = thrown ? frames.told(failed, event.exception().getStackTrace()) : failed;
      return new Result(last, List.of(), List.of());
    }
    return new Result(returned(event), List.of(), unresolved(event));
  }

  /** Returns what a call gives of a method that needs what is not there yet. */
  private Event.Failed unknown() {
    String names =
        shell
            .snippets()
            .filter(s -> shell.status(s) == Snippet.Status.RECOVERABLE_DEFINED)
            .flatMap(s -> shell.unresolvedDependencies((DeclarationSnippet) s))
            .map(d -> "«" + d.replaceFirst("^\\S+ ", "") + "»")
            .distinct()
            .collect(Collectors.joining(", "));
    String message = names + " is needed here, but stands only further down, or nowhere";
    return new Event.Failed("compile", "", message, List.of(), false);
  }

  private Result rejected(Snippet snippet) {
    List<Flaw> flaws =
        shell
            .diagnostics(snippet)
            .filter(Diag::isError)
            .map(
                d ->
                    new Flaw(
                        d.getCode(),
                        d.getMessage(Locale.ENGLISH),
                        (int) Math.max(0, d.getPosition()),
                        (int) Math.max(0, d.getEndPosition())))
            .toList();
    String message = flaws.isEmpty() ? "does not compile" : flaws.get(0).text();
    return new Result(new Event.Failed("compile", "", message, List.of(), false), flaws, List.of());
  }

  private Event returned(SnippetEvent event) {
    Snippet snippet = event.snippet();
    if (event.exception() != null) {
      return new Event.Failed("compile", "", event.exception().getMessage(), List.of(), false);
    }
    if (!(control.last() instanceof Event.Returned returned)) {
      return new Event.Returned("", "", null);
    }
    if (snippet instanceof VarSnippet variable) {
      boolean unnamed = snippet.subKind() == Snippet.SubKind.TEMP_VAR_EXPRESSION_SUBKIND;
      String name = unnamed ? "" : variable.name();
      return new Event.Returned(name, TypeName.simple(variable.typeName()), returned.item());
    }
    if (snippet instanceof ExpressionSnippet expression) {
      boolean assigns = snippet.subKind() == Snippet.SubKind.ASSIGNMENT_SUBKIND;
      String name = assigns ? expression.name() : "";
      return new Event.Returned(name, TypeName.simple(expression.typeName()), returned.item());
    }
    return new Event.Returned("", "", null);
  }

  private List<String> unresolved(SnippetEvent event) {
    boolean open =
        event.status() == Snippet.Status.RECOVERABLE_DEFINED
            || event.status() == Snippet.Status.RECOVERABLE_NOT_DEFINED;
    return open && event.snippet() instanceof DeclarationSnippet declaration
        ? shell.unresolvedDependencies(declaration).toList()
        : List.of();
  }

  /** Returns what completes and explains half-typed commands. */
  public SourceCodeAnalysis analysis() {
    return shell.sourceCodeAnalysis();
  }

  /** Returns the text of a variable's value. */
  public Optional<String> value(String name) {
    return shell
        .variables()
        .filter(v -> v.name().equals(name) && shell.status(v) == Snippet.Status.VALID)
        .reduce((a, b) -> b)
        .map(shell::varValue);
  }

  /** Stops the running command from another thread. */
  public void stop() {
    control.stop();
  }

  @Override
  public void close() {
    shell.close();
    control.close();
  }

  private record Provider(ShellControl control) implements ExecutionControlProvider {
    @Override
    public String name() {
      return "connate";
    }

    @Override
    public ExecutionControl generate(ExecutionEnv env, Map<String, String> parameters) {
      return control;
    }
  }
}
