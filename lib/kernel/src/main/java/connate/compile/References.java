package connate.compile;

import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompoundAssignmentTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.UnaryTree;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import com.sun.source.util.Trees;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import javax.lang.model.element.Element;

/**
 * What each member of the compiled workbook refers to: variables, methods and types of the
 * workbook.
 */
final class References {

  /** The members that one member refers to, with the first place, and those variables it sets. */
  record Found(Map<Element, Long> uses, Set<Element> sets) {}

  private final Trees trees;
  private final Javac.Pass pass;
  private final Map<Element, Found> members = new LinkedHashMap<>();
  private final Map<String, Element> methods = new HashMap<>();
  private Element owner;

  References(Javac.Pass pass) {
    this.pass = pass;
    this.trees = pass.trees();
    TreePath root = new TreePath(pass.unit());
    for (Tree type : pass.unit().getTypeDecls()) {
      TreePath path = new TreePath(root, type);
      owner = trees.getElement(path);
      ((ClassTree) type).getMembers().forEach(member -> scan(new TreePath(path, member)));
    }
  }

  private void scan(TreePath path) {
    Element member = trees.getElement(path);
    if (member == null) {
      return;
    }
    Found found = new Found(new LinkedHashMap<>(), new LinkedHashSet<>());
    members.put(member, found);
    if (path.getLeaf() instanceof MethodTree method) {
      methods.put(method.getName().toString(), member);
    }
    new Scanner(found).scan(path, null);
  }

  /** Returns what the method of a name refers to itself. */
  Found of(String method) {
    return members.get(methods.get(method));
  }

  /** Returns all that a member refers to, itself or through what it refers to. */
  Set<Element> reach(Element member) {
    Set<Element> seen = new LinkedHashSet<>();
    reach(member, seen);
    return seen;
  }

  /** Returns the variables that a method sets, itself or through what it refers to. */
  Set<Element> sets(String method) {
    Set<Element> all = new LinkedHashSet<>(of(method).sets());
    reach(methods.get(method)).stream()
        .filter(members::containsKey)
        .forEach(m -> all.addAll(members.get(m).sets()));
    return all;
  }

  Element element(String method) {
    return methods.get(method);
  }

  private void reach(Element member, Set<Element> seen) {
    Found found = members.get(member);
    if (found != null) {
      for (Element next : found.uses().keySet()) {
        if (seen.add(next)) {
          reach(next, seen);
        }
      }
    }
  }

  private final class Scanner extends TreePathScanner<Void, Void> {
    private final Found found;

    Scanner(Found found) {
      this.found = found;
    }

    @Override
    public Void visitIdentifier(IdentifierTree tree, Void nothing) {
      Element element = trees.getElement(getCurrentPath());
      if (element != null && owner.equals(element.getEnclosingElement())) {
        long place = trees.getSourcePositions().getStartPosition(pass.unit(), tree);
        found.uses().putIfAbsent(element, place);
      }
      return super.visitIdentifier(tree, nothing);
    }

    @Override
    public Void visitAssignment(AssignmentTree tree, Void nothing) {
      set(tree.getVariable());
      return super.visitAssignment(tree, nothing);
    }

    @Override
    public Void visitCompoundAssignment(CompoundAssignmentTree tree, Void nothing) {
      set(tree.getVariable());
      return super.visitCompoundAssignment(tree, nothing);
    }

    @Override
    public Void visitUnary(UnaryTree tree, Void nothing) {
      if (tree.getKind().name().contains("CREMENT")) {
        set(tree.getExpression());
      }
      return super.visitUnary(tree, nothing);
    }

    private void set(Tree target) {
      if (target instanceof IdentifierTree) {
        Element element = trees.getElement(new TreePath(getCurrentPath(), target));
        if (element != null && owner.equals(element.getEnclosingElement())) {
          found.sets().add(element);
        }
      }
    }
  }
}
