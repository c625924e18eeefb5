package connate.check.wrong.calls;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.FileReader;
import java.io.FileWriter;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
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

/** Breaks the rules on purpose, each forbidden member once; it is read as bytes and never run. */
@SuppressWarnings({"DefaultCharset", "DefaultLocale", "StringCaseLocaleUsage", "resource"})
final class Careless {

  private Careless() {}

  static void terminal() {
    System.out.println();
    System.err.println();
    Runtime.getRuntime().exit(1);
    Runtime.getRuntime().halt(1);
    System.exit(1);
  }

  static List<Object> chance() {
    Collections.shuffle(List.of());
    return List.of(
        new Random(),
        new SplittableRandom(),
        new MersenneTwister(),
        new Well19937c(),
        new RandomDataGenerator(),
        Math.random(),
        StrictMath.random(),
        ThreadLocalRandom.current(),
        RandomGenerator.getDefault(),
        UUID.randomUUID());
  }

  static List<Object> language(PrintStream stream, PrintWriter writer, StringBuilder builder) {
    return List.of(
        new DecimalFormat("0.0"),
        new Formatter(),
        new Formatter(builder),
        DateTimeFormatter.ofPattern("e"),
        NumberFormat.getInstance(),
        stream.printf("%d", 1),
        writer.printf("%d", 1),
        String.format("%d", 1),
        "%d".formatted(1),
        "I".toLowerCase(),
        "i".toUpperCase());
  }

  static List<Object> characters(InputStream in, ByteArrayOutputStream out) throws IOException {
    return List.of(
        new FileReader(new File("a")),
        new FileReader("a"),
        new FileWriter(new File("a")),
        new FileWriter("a"),
        new InputStreamReader(in),
        new OutputStreamWriter(out),
        new PrintStream(out),
        new PrintStream(out, true),
        new PrintWriter(out),
        new PrintWriter(out, true),
        new PrintWriter("a"),
        new Scanner(in),
        new String(new byte[0]),
        out.toString(),
        Charset.defaultCharset(),
        "a".getBytes());
  }
}
