package connate.guard;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.compile.Compilation;
import connate.compile.WholeCompiler;
import connate.workbook.Workbook;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Checks what the guard refuses, and that it leaves honest work alone. All by hand. */
class GuardTest {

  private static final String PATH =
      System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));

  private static Optional<Refusal> judge(String text) {
    Workbook workbook = Workbook.parse("w.jsh", Path.of(""), text);
    Compilation compilation = WholeCompiler.compile(workbook, PATH);
    assertTrue(compilation.isUsable(), compilation.why());
    assertNull(compilation.problem(), () -> compilation.problem().message());
    assertNotNull(compilation.classes());
    return new Guard().judge(compilation.classes());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "Runtime.getRuntime().exec(\"ls\");",
        "new ProcessBuilder(\"ls\").start();",
        "java.nio.file.Files.readString(java.nio.file.Path.of(\"/etc/passwd\"))",
        "new java.io.File(\"x\").delete()",
        "new java.io.FileInputStream(\"x\").read()",
        "new java.io.FileWriter(\"x\");",
        "new java.io.PrintStream(\"x\");",
        "new java.io.PrintWriter(\"x\");",
        "new java.io.RandomAccessFile(\"x\", \"rw\");",
        "new Scanner(new java.io.File(\"x\"));",
        "new Formatter(\"x\");",
        "new java.net.URL(\"http://localhost\").openStream();",
        "new java.net.Socket(\"localhost\", 80);",
        "java.net.http.HttpClient.newHttpClient();",
        "System.getProperty(\"user.home\")",
        "System.getenv(\"HOME\")",
        "System.setProperty(\"a\", \"b\");",
        "System.setOut(null);",
        "System.load(\"x\");",
        "System.in.read();",
        "System.getProperties()",
        "Integer.getInteger(\"a\")",
        "Long.getLong(\"a\")",
        "Boolean.getBoolean(\"a\")",
        "Class.forName(\"java.lang.Runtime\")",
        "\"\".getClass().getMethods()",
        "\"\".getClass().getClassLoader()",
        "\"\".getClass().getModule()",
        "\"\".getClass().getResourceAsStream(\"x\");",
        "String.class.getDeclaredConstructors()",
        "java.lang.invoke.MethodHandles.lookup()",
        "java.lang.reflect.Array.newInstance(int.class, 3)",
        "java.lang.reflect.Proxy.newProxyInstance(null, null, null)",
        "new Thread(() -> {}).start();",
        "class T extends Thread implements Runnable { }\nnew T().start();",
        "class T extends Thread { }\nclass U extends T implements Supplier<String> { public String get() { return \"\"; } }\nnew U().start();",
        "Thread.currentThread().setDaemon(true);",
        "Thread.currentThread().getContextClassLoader()",
        "java.util.concurrent.Executors.newCachedThreadPool()",
        "java.util.concurrent.ForkJoinPool.commonPool()",
        "java.util.concurrent.CompletableFuture.runAsync(() -> {})",
        "new Timer();",
        "List.of(1).parallelStream().count()",
        "Stream.of(1).parallel().count()",
        "IntStream.range(0, 3).parallel().sum()",
        "Function<List<?>, Stream<?>> f = List::parallelStream;",
        "StreamSupport.stream(List.of(1).spliterator(), true)",
        "Supplier<Runtime> r = Runtime::getRuntime;",
        "Runtime r = null;",
        "Object o = Runtime.class;",
        "Object o = new Runtime[0];",
        "boolean b = (Object) \"x\" instanceof Process;",
        "native int f();",
        "class L extends ClassLoader { }",
        "Locale.setDefault(Locale.US);",
        "TimeZone.setDefault(null);",
        "class Z extends SimpleTimeZone { Z() { super(0, \"x\"); setDefault(this); } }",
        "ServiceLoader.load(Runnable.class)",
        "ResourceBundle.getBundle(\"x\")",
        "Properties p = new Properties();",
        "new java.io.ObjectInputStream(null);",
        "connate.method.Listening.to(null);",
        "Listening.quietly(() -> 1)",
        "connate.engine.Rendering.of(\"a\", 1)",
        "connate.engine.Checkpoint.pass();",
        "connate.protocol.Preload.imports(\"\")",
        "new connate.protocol.Channel(null, null);",
        "connate.file.AtomicFile.write(null, null);",
        "Well.read(java.nio.file.Path.of(\"x\"))",
        "LasFile.read(null)",
        "Wells.read(null, \"*.las\")",
        "tech.tablesaw.api.Table.read().csv(\"x\")",
        "tech.tablesaw.api.Table.create(\"x\").write().csv(\"x\");",
        "sun.misc.Unsafe.getUnsafe()",
        "java.util.logging.Logger.getLogger(\"x\")",
        "javax.script.ScriptEngine s = null;",
        "java.sql.DriverManager.getConnection(\"x\")",
        "java.awt.Desktop.getDesktop()",
        "new java.util.zip.ZipFile(\"x\")",
        "java.lang.management.ManagementFactory.getRuntimeMXBean()",
        "ProcessHandle.current().pid()",
        "StackWalker.getInstance()",
        "new Object().wait();",
        "jdk.jshell.JShell.create()",
        "org.objectweb.asm.ClassReader r = null;",
        "record R(java.io.File f) {}",
        "interface I { Process p(); }",
        "int f(java.net.URI u) { return 1; }",
        "new Throwable().printStackTrace(new java.io.PrintStream(\"x\"));",
        "javax.tools.ToolProvider.getSystemJavaCompiler()",
      })
  void refuses(String text) {
    Optional<Refusal> refusal = judge(text);
    assertTrue(refusal.isPresent(), text);
  }

  /** The positive control: a guard that refuses everything would pass the test above. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "var a = 1;\na + 1",
        "System.out.println(\"x\" + 1.5);",
        "System.err.printf(\"%d%n\", 3);",
        "List.of(3, 1).stream().sorted().map(v -> v * 2).toList()",
        "IntStream.range(0, 3).mapToObj(Integer::toString).collect(Collectors.joining(\",\"))",
        "record P(double x, String s) {}\nnew P(1, \"a\").equals(new P(1, \"a\"))",
        "enum E { A, B }\nswitch (E.A) { case A -> System.out.println(1); case B -> { } }",
        "E2 f(E2 e) { return switch (e) { case X -> e; default -> null; }; }\nenum E2 { X }",
        "sealed interface S permits C {}\nrecord C(int v) implements S {}\nS s = new C(1);\ns instanceof C c ? c.v() : 0",
        "class A implements Comparable<A> { public int compareTo(A o) { return 0; } }\nnew A().compareTo(new A())",
        "class B extends ArrayList<String> { int twice() { return size() * 2; } }\nnew B().twice()",
        "class X extends RuntimeException { X(String m) { super(m); } }\nnew X(\"m\").getMessage()",
        "interface F { int f(int v); default F then(F o) { return v -> o.f(f(v)); } }\nF f = v -> v + 1;\nf.then(f).f(1)",
        "class P implements Predicate<String> { public boolean test(String s) { return true; } }\nnew P().negate().test(\"\")",
        "Object o = new Object() { public String toString() { return \"anon\"; } };\no.toString()",
        "int[] a = {3, 1};\nArrays.sort(a);\na.clone()",
        "try { Integer.parseInt(\"x\"); } catch (NumberFormatException e) { System.out.println(e.getMessage()); } finally { }",
        "assert 1 > 0 : \"no\";",
        "synchronized (new Object()) { }",
        "String s = \"b\";\nswitch (s) { case \"a\": break; default: System.out.println(s); }",
        "java.time.LocalDate.of(2026, 12, 1).plusDays(3)",
        "new java.math.BigDecimal(\"1.5\").pow(2)",
        "java.util.regex.Pattern.compile(\"a+\").matcher(\"aa\").matches()",
        "String.format(Locale.ROOT, \"%.2f\", 1.5)",
        "new java.text.DecimalFormat(\"0.0\").format(1.25)",
        "new Random(3).nextInt()",
        "var n = new java.util.concurrent.atomic.AtomicInteger();\nn.incrementAndGet()",
        "mD(250).in(darcy)",
        "var d = assume(\"d\", gPerCm3(2.65));\nkeep(\"d\", d);\nshow(d, m(3));",
        "Series.of(\"phi\", percent, 1, 2).times(2).in(fraction)",
        "Formula f = null;\nMethodCard c = null;",
        "var fit = new org.apache.commons.math3.stat.regression.SimpleRegression();\nfit.addData(1, 2);",
        "tech.tablesaw.api.Table.create(\"t\").rowCount()",
        "tech.tablesaw.api.DoubleColumn.create(\"a\", 1, 2).mean()",
        "well(\"a.las\")",
        "wells(\"*.las\")",
        "System.exit(3);",
        "\"x\".getClass().getSimpleName()",
        "double area(Object o) { return o instanceof Double d ? d : 0; }\narea(1.0)",
        "Supplier<List<String>> made = ArrayList::new;\nmade.get()",
        "Function<Double, Double> root = StrictMath::sqrt;\nroot.apply(4.0)",
        "List<String> l = new ArrayList<>();\nIterator<String> i = l.iterator();\nwhile (i.hasNext()) i.next();",
        "Thread.sleep(1);",
        "throw new IllegalStateException(\"x\");",
      })
  void allows(String text) {
    assertEquals(Optional.empty(), judge(text), text);
  }

  @Test
  void namesCallAndLine() {
    Refusal refusal =
        judge("var a = 1;\n\nint f() {\n  return a +\n    System.getenv().size();\n}").get();
    assertEquals(new Refusal("java.lang.System.getenv", 5), refusal);
    assertEquals(
        "new java.io.File",
        judge("int g(String s) {\n return (int) new java.io.File(s).length(); }").get().what());
  }

  /** What was refused once is not known afterwards. */
  @Test
  void refusedClassesStayUnknown() {
    Workbook bad = Workbook.parse("w.jsh", Path.of(""), "Runtime.getRuntime()");
    Guard guard = new Guard();
    for (int i = 0; i < 2; i++) {
      assertTrue(guard.judge(WholeCompiler.compile(bad, PATH).classes()).isPresent());
    }
  }
}
