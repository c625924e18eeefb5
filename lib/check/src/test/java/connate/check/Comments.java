package connate.check;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.ModifiersTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.JavacTask;
import com.sun.source.util.TreePathScanner;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import javax.lang.model.element.Modifier;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** Finds the public and protected members of source files that carry no documentation comment. */
final class Comments extends TreePathScanner<Void, Void> {

  private static final JavaCompiler COMPILER = ToolProvider.getSystemJavaCompiler();

  private final DocTrees trees;
  private final List<String> missing = new ArrayList<>();
  private int seen;

  private Comments(DocTrees trees) {
    this.trees = trees;
  }

  /** Reads source files; they need not compile, only parse. */
  static Comments of(Iterable<? extends JavaFileObject> sources) throws IOException {
    JavacTask task = (JavacTask) COMPILER.getTask(null, null, null, null, null, sources);
    Comments comments = new Comments(DocTrees.instance(task));
    for (CompilationUnitTree unit : task.parse()) {
      comments.scan(unit, null);
    }
    return comments;
  }

  /** Gives access to source files on disk. */
  static StandardJavaFileManager files() {
    return COMPILER.getStandardFileManager(null, Locale.ROOT, null);
  }

  /** The members without a comment. */
  List<String> missing() {
    return missing;
  }

  /** How many members were looked at. */
  int seen() {
    return seen;
  }

  @Override
  public Void visitClass(ClassTree type, Void none) {
    if (!isVisible(type.getModifiers())) {
      return null;
    }
    look(type.getSimpleName().toString());
    return super.visitClass(type, none);
  }

  @Override
  public Void visitMethod(MethodTree method, Void none) {
    boolean overrides =
        method.getModifiers().getAnnotations().stream()
            .anyMatch(annotation -> annotation.getAnnotationType().toString().equals("Override"));
    if (!overrides && isVisible(method.getModifiers())) {
      look(method.getName().toString());
    }
    return null;
  }

  private boolean isVisible(ModifiersTree modifiers) {
    Set<Modifier> flags = modifiers.getFlags();
    return flags.contains(Modifier.PUBLIC) || flags.contains(Modifier.PROTECTED) || isInInterface();
  }

  private boolean isInInterface() {
    return getCurrentPath().getParentPath() != null
        && getCurrentPath().getParentPath().getLeaf().getKind() == Tree.Kind.INTERFACE;
  }

  private void look(String name) {
    seen++;
    String comment = trees.getDocComment(getCurrentPath());
    if (comment == null || comment.isBlank()) {
      String file = getCurrentPath().getCompilationUnit().getSourceFile().getName();
      missing.add(file.substring(file.lastIndexOf('/') + 1) + ": " + name);
    }
  }
}
