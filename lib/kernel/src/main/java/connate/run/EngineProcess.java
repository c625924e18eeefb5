package connate.run;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * The process of an engine. Its class path comes from the system property {@code
 * connate.engine.classpath}, else it is this process's own; its class-data archive from {@code
 * connate.engine.archive}, where there is one.
 */
final class EngineProcess {

  private static final int TAIL = 4000;

  private final Process process;
  private final StringBuilder errors = new StringBuilder();

  private EngineProcess(Process process) {
    this.process = process;
    Thread drain = new Thread(this::drain, "engine-errors");
    drain.setDaemon(true);
    drain.start();
  }

  /** Starts a process. */
  static EngineProcess start() {
    try {
      return new EngineProcess(new ProcessBuilder(command()).start());
    } catch (IOException e) {
      throw new UncheckedIOException("the engine cannot be started: " + e.getMessage(), e);
    }
  }

  /** Returns the class path of engines, against which commands are compiled too. */
  static String classPath() {
    return System.getProperty("connate.engine.classpath", System.getProperty("java.class.path"));
  }

  private static List<String> command() {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(
        List.of(
            "-XX:+UseSerialGC",
            "-XX:-UsePerfData",
            // a short replay spends a fifth of its time compiling code that it hardly runs; long
            // loops still come to C2
            "-XX:Tier3InvocationThreshold=1000",
            "-XX:Tier3MinInvocationThreshold=500",
            "-XX:Tier3CompileThreshold=5000",
            "-XX:Tier4InvocationThreshold=20000",
            "-XX:Tier4MinInvocationThreshold=5000",
            "-XX:Tier4CompileThreshold=60000",
            "-XX:+DisplayVMOutputToStderr",
            "-Xshare:auto",
            "-Xlog:disable",
            "-Djava.awt.headless=true",
            "-Dfile.encoding=UTF-8",
            "-Duser.language=en",
            "-Duser.country=",
            "-Duser.timezone=UTC"));
    archive(command);
    String more = System.getProperty("connate.engine.options", "");
    if (!more.isBlank()) {
      command.addAll(List.of(more.strip().split("\\s+")));
    }
    command.addAll(List.of("-cp", classPath(), "connate.engine.EngineMain"));
    return command;
  }

  private static void archive(List<String> command) {
    String archive = System.getProperty("connate.engine.archive", "");
    if (!archive.isEmpty() && Files.isRegularFile(new File(archive).toPath())) {
      command.add("-XX:SharedArchiveFile=" + archive);
    }
  }

  Process process() {
    return process;
  }

  /** Returns the status of a process that is about to end, or kills it and returns -1. */
  int end(long millis) {
    try {
      if (process.waitFor(millis, TimeUnit.MILLISECONDS)) {
        return process.exitValue();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    process.destroyForcibly();
    return -1;
  }

  /** Returns the end of what the process wrote to its standard error. */
  String errors() {
    synchronized (errors) {
      return errors.toString().strip();
    }
  }

  private void drain() {
    byte[] buffer = new byte[1024];
    try (InputStream in = process.getErrorStream()) {
      for (int n = in.read(buffer); n >= 0; n = in.read(buffer)) {
        synchronized (errors) {
          errors.append(new String(buffer, 0, n, StandardCharsets.UTF_8));
          errors.delete(0, Math.max(0, errors.length() - TAIL));
        }
      }
    } catch (IOException e) {
      // the process has gone, and its errors with it
      return;
    }
  }
}
