package connate.compile;

import connate.protocol.Preload;
import connate.protocol.Request;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.tools.Diagnostic;

/**
 * Compiles a workbook at once. Where a command does not compile, those before it are compiled all
 * the same; where the workbook does not fit this form, the answer says why.
 */
public final class WholeCompiler {

  private static final Set<String> NOT_IN_ONE_CLASS =
      Set.of(
          "compiler.err.already.defined",
          "compiler.err.duplicate.class",
          "compiler.err.name.clash.same.erasure",
          "compiler.err.limit.pool",
          "compiler.err.limit.string.overflow",
          "compiler.err.report.access",
          "compiler.err.not.def.public.cant.access",
          "compiler.err.override.static",
          "compiler.err.override.meth");

  private final Workbook workbook;
  private final Javac javac;
  private final Complaint complaint;
  private final List<String> preload;
  private List<Command> commands;
  private Problem problem;

  private WholeCompiler(Workbook workbook, String classPath) {
    this.workbook = workbook;
    this.javac = new Javac(classPath);
    this.complaint = new Complaint(workbook);
    this.commands = workbook.commands();
    this.preload = Preload.imports(classPath);
  }

  /** Compiles a workbook against a class path. */
  public static Compilation compile(Workbook workbook, String classPath) {
    String lean = LeanPath.of(classPath);
    Compilation compilation = new WholeCompiler(workbook, lean).compile();
    boolean settled = compilation.isUsable() && compilation.problem() == null;
    return settled || lean.equals(classPath)
        ? compilation
        : new WholeCompiler(workbook, classPath).compile();
  }

  private Compilation compile() {
    if (lateImport()) {
      return Compilation.commandByCommand("an import stands after other commands");
    }
    while (true) {
      TypePass types = new TypePass(workbook, commands, preload);
      Javac.Pass first = types.run(javac);
      if (!first.isParsed()) {
        cut(first, first.errors().get(0));
        continue;
      }
      Compilation compilation = compile(types.variables());
      if (compilation != null) {
        return compilation;
      }
    }
  }

  /** Compiles the commands whose types are known; {@code null} after a cut. */
  private Compilation compile(Map<Integer, List<Variable>> variables) {
    CodePass code = new CodePass(workbook, commands, variables, preload);
    if (!code.clash().isEmpty()) {
      return Compilation.commandByCommand(code.clash());
    }
    Javac.Pass pass = javac.pass(code.sheet());
    if (!pass.errors().isEmpty()) {
      return refused(pass, variables);
    }
    References references = new References(pass);
    Forward forward = new Forward(code, references, pass, commands);
    int runnable = commands.size();
    if (forward.command() != null) {
      problem = forward.problem(complaint);
      runnable = commands.indexOf(forward.command());
    }
    if (hasGuess(variables, runnable)) {
      return Compilation.commandByCommand("the type of a variable is not to be found");
    }
    List<Request.Bytecode> classes = pass.generate();
    if (!pass.errors().isEmpty()) {
      return refused(pass, variables);
    }
    List<Entry> entries = entries(variables, references).subList(0, runnable);
    return new Compilation(Header.OWNER, classes, entries, problem, "");
  }

  /** Returns whether a command that is to run has a type that the compiler did not find. */
  private boolean hasGuess(Map<Integer, List<Variable>> variables, int runnable) {
    return commands.subList(0, runnable).stream()
        .flatMap(command -> variables.getOrDefault(command.index(), List.of()).stream())
        .anyMatch(v -> v.broken() && !v.type().isWritten());
  }

  private boolean lateImport() {
    boolean others = false;
    for (Command command : commands) {
      boolean isImport = command.kind() == Command.Kind.IMPORT;
      if (isImport && others) {
        return true;
      }
      others |= !isImport;
    }
    return false;
  }

  private Compilation refused(Javac.Pass pass, Map<Integer, List<Variable>> variables) {
    boolean unsure =
        pass.errors().stream().anyMatch(e -> NOT_IN_ONE_CLASS.contains(e.getCode()))
            || variables.values().stream()
                .flatMap(List::stream)
                .anyMatch(v -> !v.isVoid() && !v.broken() && !v.type().exact());
    if (unsure || problem != null) {
      // either not the user's error, or one that came only when what stands below was cut off
      return Compilation.commandByCommand("one class cannot hold all its commands");
    }
    cut(pass, pass.errors().get(0));
    return null;
  }

  /** Notes the error of the first command that has one; from there on nothing is compiled. */
  private void cut(Javac.Pass pass, Diagnostic<?> any) {
    Command first = null;
    Diagnostic<?> told = any;
    for (Diagnostic<?> error : pass.errors()) {
      Command command = commandAt(pass.sheet().offset(place(error)));
      if (first == null || command.index() < first.index()) {
        first = command;
        told = error;
      }
    }
    int offset = pass.sheet().offset(place(told));
    int length = (int) (told.getEndPosition() - told.getPosition());
    take(
        complaint.of(
            told.getCode(),
            told.getMessage(Locale.ENGLISH),
            Math.max(offset, first.codeStart()),
            length,
            first),
        first);
  }

  private static long place(Diagnostic<?> diagnostic) {
    long position = diagnostic.getPosition();
    return position == Diagnostic.NOPOS ? 0 : position;
  }

  private void take(Problem found, Command at) {
    problem = found;
    commands = commands.subList(0, commands.indexOf(at));
  }

  private Command commandAt(int offset) {
    Command last = commands.get(0);
    for (Command command : commands) {
      if (command.codeStart() <= offset) {
        last = command;
      }
    }
    return last;
  }

  private List<Entry> entries(Map<Integer, List<Variable>> variables, References references) {
    List<Entry> entries = new ArrayList<>();
    for (Command command : commands) {
      String method = CodePass.method(command.index());
      Element element = references.element(method);
      if (element == null) {
        entries.add(new Entry(command.index(), "", "", "", Set.of(), Set.of()));
        continue;
      }
      List<Variable> values = variables.getOrDefault(command.index(), List.of());
      Variable last = values.isEmpty() ? null : values.get(values.size() - 1);
      entries.add(
          new Entry(
              command.index(),
              method,
              last == null ? "" : last.name(),
              last == null ? "" : last.type().shown(),
              names(references.reach(element)),
              names(references.sets(method))));
    }
    return entries;
  }

  private static Set<String> names(Set<Element> elements) {
    Set<String> names = new LinkedHashSet<>();
    for (Element element : elements) {
      if (element.getKind() == ElementKind.FIELD) {
        names.add(element.getSimpleName().toString());
      }
    }
    return names;
  }
}
