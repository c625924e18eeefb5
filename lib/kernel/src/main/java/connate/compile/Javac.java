package connate.compile;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javax.tools.Diagnostic;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** The JDK's compiler, with the settings that all of a workbook's code is compiled with. */
final class Javac {

  private final JavaCompiler compiler;
  private final StandardJavaFileManager files;
  private final List<String> options;

  Javac(String classPath) {
    compiler = ToolProvider.getSystemJavaCompiler();
    if (compiler == null) {
      throw new IllegalStateException("a JDK is needed to compile workbooks, found a runtime only");
    }
    files = compiler.getStandardFileManager(null, Locale.ENGLISH, StandardCharsets.UTF_8);
    options =
        List.of(
            "-cp",
            classPath,
            "-proc:none",
            "-implicit:none",
            "-nowarn",
            "-Xlint:none",
            "-XDshould-stop.ifError=FLOW",
            "-XDstringConcat=inline");
  }

  /** Parses and checks a source file, ready to be generated. */
  Pass pass(Sheet sheet) {
    return new Pass(sheet, options);
  }

  /** Parses and attributes a source file, as far as types need it. */
  Pass typePass(Sheet sheet) {
    List<String> less = new ArrayList<>(options.subList(0, options.size() - 1));
    less.addAll(List.of("-XDshould-stop.ifError=ATTR", "-XDshould-stop.ifNoError=ATTR"));
    return new Pass(sheet, less);
  }

  /** One source file on its way through the compiler. */
  final class Pass {
    private final Sheet sheet;
    private final Memory memory = new Memory(files);
    private final List<Diagnostic<? extends JavaFileObject>> errors = new ArrayList<>();
    private final JavacTask task;
    private final CompilationUnitTree unit;
    private final boolean parsed;

    private Pass(Sheet sheet, List<String> settings) {
      this.sheet = sheet;
      task =
          (JavacTask)
              compiler.getTask(
                  null,
                  memory,
                  this::note,
                  settings,
                  null,
                  List.of(Memory.source(sheet.toString())));
      try {
        unit = task.parse().iterator().next();
        parsed = errors.isEmpty();
        if (parsed) {
          task.analyze();
        }
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }

    private void note(Diagnostic<? extends JavaFileObject> diagnostic) {
      if (diagnostic.getKind() == Diagnostic.Kind.ERROR) {
        errors.add(diagnostic);
      }
    }

    Sheet sheet() {
      return sheet;
    }

    boolean isParsed() {
      return parsed;
    }

    List<Diagnostic<? extends JavaFileObject>> errors() {
      return errors;
    }

    CompilationUnitTree unit() {
      return unit;
    }

    Trees trees() {
      return Trees.instance(task);
    }

    /** Writes the class files; empty where that brought errors. */
    List<connate.protocol.Request.Bytecode> generate() {
      try {
        task.generate();
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
      return errors.isEmpty() ? memory.classes() : List.of();
    }
  }
}
