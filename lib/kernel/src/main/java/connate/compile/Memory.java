package connate.compile;

import connate.protocol.Request;
import java.io.ByteArrayOutputStream;
import java.io.OutputStream;
import java.net.URI;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.tools.FileObject;
import javax.tools.ForwardingJavaFileManager;
import javax.tools.JavaFileManager;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;

/** Takes the class files that the compiler writes, in memory. */
final class Memory extends ForwardingJavaFileManager<JavaFileManager> {

  private final Map<String, ByteArrayOutputStream> written = new LinkedHashMap<>();

  Memory(JavaFileManager next) {
    super(next);
  }

  List<Request.Bytecode> classes() {
    return written.entrySet().stream()
        .map(e -> new Request.Bytecode(e.getKey(), e.getValue().toByteArray()))
        .toList();
  }

  @Override
  public JavaFileObject getJavaFileForOutput(
      Location location, String name, JavaFileObject.Kind kind, FileObject sibling) {
    return new SimpleJavaFileObject(URI.create("memory:///" + uri(name) + ".class"), kind) {
      @Override
      public OutputStream openOutputStream() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        written.put(name, bytes);
        return bytes;
      }
    };
  }

  private static String uri(String name) {
    return Integer.toHexString(name.hashCode());
  }

  /** Returns a source file. */
  static JavaFileObject source(String text) {
    return new SimpleJavaFileObject(
        URI.create("memory:///workbook.jsh"), JavaFileObject.Kind.SOURCE) {
      @Override
      public CharSequence getCharContent(boolean ignoreErrors) {
        return text;
      }

      @Override
      public boolean isNameCompatible(String simpleName, Kind kind) {
        return true;
      }
    };
  }
}
