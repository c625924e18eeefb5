package connate.check;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.FileReader;
import java.io.FileWriter;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.text.DecimalFormat;
import java.text.NumberFormat;
import java.time.format.DateTimeFormatter;
import java.util.Collections;
import java.util.Formatter;
import java.util.List;
import java.util.Random;
import java.util.Scanner;
import java.util.SplittableRandom;
import java.util.UUID;
import java.util.concurrent.ThreadLocalRandom;
import java.util.random.RandomGenerator;
import org.apache.commons.math3.random.MersenneTwister;
import org.apache.commons.math3.random.RandomDataGenerator;
import org.apache.commons.math3.random.Well19937c;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The same workbook gives the same bytes on every machine, and only the console speaks to the
 * terminal: so no call may ask the machine for chance, language or character set.
 */
class CallsTest {

  private static final Forbidden TERMINAL =
      new Forbidden()
          .field(System.class, "out")
          .field(System.class, "err")
          .method(System.class, "exit", int.class)
          .method(Runtime.class, "exit", int.class)
          .method(Runtime.class, "halt", int.class);

  private static final Forbidden CHANCE =
      new Forbidden()
          .constructor(Random.class)
          .constructor(SplittableRandom.class)
          .constructor(MersenneTwister.class)
          .constructor(Well19937c.class)
          .constructor(RandomDataGenerator.class)
          .method(Math.class, "random")
          .method(StrictMath.class, "random")
          .method(ThreadLocalRandom.class, "current")
          .method(RandomGenerator.class, "getDefault")
          .method(UUID.class, "randomUUID")
          .method(Collections.class, "shuffle", List.class);

  private static final Forbidden LANGUAGE =
      new Forbidden()
          .constructor(DecimalFormat.class, String.class)
          .constructor(Formatter.class)
          .constructor(Formatter.class, Appendable.class)
          .method(DateTimeFormatter.class, "ofPattern", String.class)
          .method(NumberFormat.class, "getInstance")
          .method(PrintStream.class, "printf", String.class, Object[].class)
          .method(PrintWriter.class, "printf", String.class, Object[].class)
          .method(String.class, "format", String.class, Object[].class)
          .method(String.class, "formatted", Object[].class)
          .method(String.class, "toLowerCase")
          .method(String.class, "toUpperCase");

  private static final Forbidden CHARACTERS =
      new Forbidden()
          .constructor(FileReader.class, File.class)
          .constructor(FileReader.class, String.class)
          .constructor(FileWriter.class, File.class)
          .constructor(FileWriter.class, String.class)
          .constructor(InputStreamReader.class, InputStream.class)
          .constructor(OutputStreamWriter.class, OutputStream.class)
          .constructor(PrintStream.class, OutputStream.class)
          .constructor(PrintStream.class, OutputStream.class, boolean.class)
          .constructor(PrintWriter.class, OutputStream.class)
          .constructor(PrintWriter.class, OutputStream.class, boolean.class)
          .constructor(PrintWriter.class, String.class)
          .constructor(Scanner.class, InputStream.class)
          .constructor(String.class, byte[].class)
          .method(ByteArrayOutputStream.class, "toString")
          .method(Charset.class, "defaultCharset")
          .method(String.class, "getBytes");

  @BeforeAll
  static void theHouseIsThere() {
    assertTrue(House.CLASSES.size() >= House.CLASSES_AT_LEAST, "saw only " + House.CLASSES.size());
  }

  /** The engine's own main, and the code that redirects what commands print, must touch both. */
  @Test
  void onlyConsoleAndEngineTouchTheProcess() {
    classes()
        .that()
        .resideOutsideOfPackages("connate.console..", "connate.engine..")
        .should(TERMINAL.untouched("standard streams and exit"))
        .check(House.CLASSES);
  }

  @Test
  void nothingIsDrawnWithoutASeed() {
    classes().should(CHANCE.untouched("unseeded chance")).check(House.CLASSES);
  }

  @Test
  void nothingDependsOnTheMachinesLanguage() {
    classes().should(LANGUAGE.untouched("default language")).check(House.CLASSES);
  }

  @Test
  void nothingDependsOnTheMachinesCharacterSet() {
    classes().should(CHARACTERS.untouched("default character set")).check(House.CLASSES);
  }

  /** The fixture touches every member on the four lists, so each entry is known to bite. */
  @Test
  void everyForbiddenCallIsFound() {
    for (Forbidden list : List.of(TERMINAL, CHANCE, LANGUAGE, CHARACTERS)) {
      assertEquals(
          list.size(),
          list.touchedBy(House.wrong("calls")).size(),
          () -> list.touchedBy(House.wrong("calls")).toString());
    }
  }
}
