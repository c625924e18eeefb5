package connate.compile;

import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.BlockTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.NewArrayTree;
import com.sun.source.tree.ParenthesizedTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreePath;
import com.sun.source.util.Trees;
import connate.workbook.Command;
import connate.workbook.Workbook;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import javax.lang.model.element.Element;
import javax.lang.model.element.ExecutableElement;
import javax.lang.model.type.ArrayType;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.TypeKind;
import javax.lang.model.type.TypeMirror;

/**
 * Finds the types of all variables and expressions: the commands stand as statements of one method,
 * where {@code var} is allowed. A variable that is declared again begins a class within the method,
 * for there its name may hide the first.
 */
final class TypePass {

  private static final String RUN = "$run";
  private static final String VALUE = "$value";
  private static final String AGAIN = "$Again";

  private final Workbook workbook;
  private final List<Command> commands;
  private final List<String> preload;
  private final Sheet sheet;
  private final Map<Integer, List<Variable>> found = new TreeMap<>();
  private Trees trees;
  private SourcePositions positions;
  private Javac.Pass pass;

  TypePass(Workbook workbook, List<Command> commands, List<String> preload) {
    this.preload = preload;
    this.workbook = workbook;
    this.commands = commands;
    this.sheet = new Sheet(workbook);
  }

  /** Parses and attributes the commands. */
  Javac.Pass run(Javac javac) {
    write();
    pass = javac.typePass(sheet);
    if (pass.isParsed()) {
      trees = pass.trees();
      positions = trees.getSourcePositions();
      TreePath root = new TreePath(pass.unit());
      for (Tree type : pass.unit().getTypeDecls()) {
        collect(new TreePath(root, type));
      }
    }
    return pass;
  }

  /** Returns the variables of each command; of an expression, its value. */
  Map<Integer, List<Variable>> variables() {
    return found;
  }

  private void write() {
    Header.write(sheet, commands, preload);
    sheet.add("class " + Header.OWNER + " {\n");
    for (Command command : commands) {
      if (command.kind() == Command.Kind.TYPE || command.kind() == Command.Kind.METHOD) {
        sheet.add("static ").copy(command.codeStart(), command.unmodified()).add("\n");
      }
    }
    sheet.add("static void " + RUN + "() throws Throwable {\n");
    int again = 0;
    Set<String> names = new HashSet<>();
    for (Command command : commands) {
      if (command.kind() == Command.Kind.VARIABLE) {
        if (!command.declaredNames().stream().allMatch(names::add)) {
          sheet.add("class " + AGAIN + again + " { void " + RUN + "() throws Throwable {\n");
          again++;
        }
        sheet.copy(command.codeStart(), command.unmodified()).add(semicolon(command) + "\n");
      } else {
        statement(command);
      }
    }
    sheet.add("}}".repeat(again) + "}}\n");
  }

  private static String semicolon(Command command) {
    return command.code().endsWith(";") ? "" : ";";
  }

  private void statement(Command command) {
    switch (command.kind()) {
      case EXPRESSION:
        sheet.add("var " + VALUE + command.index() + " = ");
        sheet.copy(command.codeStart(), expression(command)).add(";\n");
        return;
      case STATEMENT, UNFINISHED:
        sheet.add("{").copy(command.codeStart(), command.code());
        sheet.add(Header.closed(command) + "}\n");
        return;
      default:
        return;
    }
  }

  private static String expression(Command command) {
    String code = command.code();
    return code.endsWith(";") ? code.substring(0, code.length() - 1) : code;
  }

  private void collect(TreePath path) {
    for (Tree member : ((ClassTree) path.getLeaf()).getMembers()) {
      if (member instanceof MethodTree method && method.getName().contentEquals(RUN)) {
        TreePath body = new TreePath(new TreePath(path, method), method.getBody());
        for (StatementTree statement : ((BlockTree) body.getLeaf()).getStatements()) {
          collect(body, statement);
        }
      }
    }
  }

  private void collect(TreePath body, StatementTree statement) {
    TreePath path = new TreePath(body, statement);
    if (statement instanceof VariableTree variable) {
      int start = (int) positions.getStartPosition(pass.unit(), statement);
      int place = variable.getInitializer() == null ? start : initial(variable)[0];
      Command command = commandAt(place);
      if (command != null) {
        found
            .computeIfAbsent(command.index(), i -> new ArrayList<>())
            .add(variable(path, variable, command));
      }
    } else if (statement instanceof ClassTree type
        && type.getSimpleName().toString().startsWith(AGAIN)) {
      collect(path);
    }
  }

  private Command commandAt(int place) {
    int offset = sheet.offset(place);
    return commands.stream()
        .filter(c -> c.codeStart() <= offset && offset <= c.codeEnd())
        .findFirst()
        .orElse(null);
  }

  private int[] initial(VariableTree variable) {
    return new int[] {
      (int) positions.getStartPosition(pass.unit(), variable.getInitializer()),
      (int) positions.getEndPosition(pass.unit(), variable.getInitializer())
    };
  }

  private Variable variable(TreePath path, VariableTree tree, Command command) {
    Element element = trees.getElement(path);
    TypeMirror type = element == null ? null : element.asType();
    boolean expression = command.kind() == Command.Kind.EXPRESSION;
    ExpressionTree value = tree.getInitializer();
    boolean isVoid = expression && isVoid(path, value);
    boolean isNull = value != null && value.getKind() == Tree.Kind.NULL_LITERAL && expression;
    boolean broken = !isVoid && !isNull && (type == null || isUnknown(type));
    String name = expression ? assigned(value) : tree.getName().toString();
    TypeName typeName =
        isNull ? TypeName.OBJECT : isVoid ? TypeName.NONE : written(tree, type, broken);
    int typeFrom =
        broken && typeName.isWritten()
            ? sheet.offset(positions.getStartPosition(pass.unit(), tree.getType()))
            : -1;
    if (value == null) {
      return new Variable(name, typeName, typeFrom, isVoid, broken, -1, -1, false);
    }
    int[] place = initial(tree);
    return new Variable(
        name,
        typeName,
        typeFrom,
        isVoid,
        broken,
        sheet.offset(place[0]),
        sheet.offset(place[1]),
        value instanceof NewArrayTree array && array.getType() == null);
  }

  private static boolean isUnknown(TypeMirror type) {
    if (type instanceof ArrayType array) {
      return isUnknown(array.getComponentType());
    }
    return type.getKind() == TypeKind.ERROR
        || type.getKind() == TypeKind.DECLARED
            && ((DeclaredType) type).getTypeArguments().stream().anyMatch(TypePass::isUnknown);
  }

  /** A type that is not known is written as it stands, for the compiler to complain about. */
  private TypeName written(VariableTree tree, TypeMirror type, boolean broken) {
    if (!broken) {
      return TypeName.of(type);
    }
    int from = (int) positions.getStartPosition(pass.unit(), tree.getType());
    int to = (int) positions.getEndPosition(pass.unit(), tree.getType());
    String text = from < 0 || to <= from ? "var" : sheet.toString().substring(from, to);
    return text.equals("var") ? TypeName.NONE : new TypeName(text.replace('\n', ' '), true);
  }

  private boolean isVoid(TreePath path, ExpressionTree value) {
    ExpressionTree inner = value;
    TreePath at = new TreePath(path, value);
    while (inner instanceof ParenthesizedTree parentheses) {
      inner = parentheses.getExpression();
      at = new TreePath(at, inner);
    }
    return inner.getKind() == Tree.Kind.METHOD_INVOCATION
        && trees.getElement(at) instanceof ExecutableElement method
        && method.getReturnType().getKind() == TypeKind.VOID;
  }

  private static String assigned(ExpressionTree value) {
    return value instanceof AssignmentTree assignment
            && assignment.getVariable() instanceof IdentifierTree name
        ? name.getName().toString()
        : "";
  }

  Workbook workbook() {
    return workbook;
  }
}
