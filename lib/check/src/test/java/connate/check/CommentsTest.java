package connate.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;
import org.junit.jupiter.api.Test;

/** Every public member says what it is, and every package which question it answers. */
class CommentsTest {

  @Test
  void everyPublicMemberHasAComment() throws IOException {
    List<Path> sources = House.mainSources();
    assertTrue(sources.size() >= House.SOURCES_AT_LEAST, "saw only " + sources.size());
    try (StandardJavaFileManager files = Comments.files()) {
      Comments comments = Comments.of(files.getJavaFileObjectsFromPaths(sources));
      assertTrue(comments.seen() >= 2 * House.SOURCES_AT_LEAST, "saw only " + comments.seen());
      assertEquals(List.of(), comments.missing());
    }
  }

  @Test
  void membersWithoutACommentAreFound() throws IOException {
    String source =
        """
        /** Said. */
        public class Told {
          public int a() { return 1; }
          /** Said. */
          public int b() { return 1; }
          int c() { return 1; }
          @Override public String toString() { return ""; }
          protected interface Inner { int d(); }
        }
        """;
    List<String> missing = Comments.of(List.of(inMemory(source))).missing();
    assertEquals(List.of("Told.java: a", "Told.java: Inner", "Told.java: d"), missing);
  }

  @Test
  void everyPackageSaysWhichQuestionItAnswers() throws IOException {
    Set<Path> folders = new TreeSet<>();
    House.mainSources().forEach(source -> folders.add(source.getParent()));
    assertTrue(folders.size() >= 10, "saw only " + folders);
    assertEquals(Set.of(), withoutWord(folders));
  }

  /** The fixtures have no package-info, so a folder of theirs is one that the rule must name. */
  @Test
  void aPackageWithoutAWordIsFound() throws IOException {
    Path silent = House.root().resolve("lib/check/src/test/java/connate/check/wrong/one");
    assertTrue(Files.isDirectory(silent));
    assertEquals(Set.of(silent), withoutWord(Set.of(silent)));
  }

  private static Set<Path> withoutWord(Set<Path> folders) throws IOException {
    Set<Path> silent = new TreeSet<>();
    for (Path folder : folders) {
      Path word = folder.resolve("package-info.java");
      if (!Files.exists(word) || !Files.readString(word).contains("/**")) {
        silent.add(folder);
      }
    }
    return silent;
  }

  private static JavaFileObject inMemory(String source) {
    return new SimpleJavaFileObject(URI.create("mem:///Told.java"), JavaFileObject.Kind.SOURCE) {
      @Override
      public CharSequence getCharContent(boolean ignoreEncodingErrors) {
        return source;
      }
    };
  }
}
