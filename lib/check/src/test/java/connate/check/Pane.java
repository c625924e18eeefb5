package connate.check;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;

/** A console in a terminal that a test types into and reads, by way of tmux. */
final class Pane implements AutoCloseable {

  private static final long PATIENCE_NANOS = TimeUnit.SECONDS.toNanos(20);

  private final String socket;
  private final Path folder;

  private Pane(String socket, Path folder) {
    this.socket = socket;
    this.folder = folder;
  }

  /** Returns whether tmux is there. */
  static boolean isPossible() {
    try {
      return new ProcessBuilder("tmux", "-V").start().waitFor() == 0;
    } catch (IOException e) {
      return false;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return false;
    }
  }

  /** Opens a console whose files lie in a folder. */
  static Pane open(Path folder, String... arguments) {
    Pane pane =
        new Pane("connate-" + ProcessHandle.current().pid() + "-" + System.nanoTime(), folder);
    List<String> command =
        new ArrayList<>(
            List.of("new-session", "-d", "-x", "100", "-y", "40", "-c", folder.toString()));
    command.addAll(List.of("env", "XDG_STATE_HOME=" + folder.resolve("state"), "LC_ALL=C.UTF-8"));
    command.addAll(console());
    command.addAll(List.of(arguments));
    pane.tmux(command.toArray(String[]::new));
    return pane;
  }

  private static List<String> console() {
    String path =
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of("-XX:+UseSerialGC", "-XX:TieredStopAtLevel=1"));
    command.add("-Dconnate.terminal.input=true");
    command.addAll(List.of("-cp", path, "connate.console.Main"));
    return command;
  }

  /** Types a text. */
  Pane type(String text) {
    tmux("send-keys", "-l", "--", text.endsWith(";") ? text.replaceAll(";$", "\\\\;") : text);
    return this;
  }

  /** Presses a key by tmux's name for it. */
  Pane press(String key) {
    tmux("send-keys", key);
    return this;
  }

  /** Types a command and ends it with Enter. */
  Pane enter(String command) {
    return type(command).press("Enter");
  }

  /** Pastes a text as a terminal does. */
  Pane paste(String text) {
    tmux("set-buffer", "--", text);
    tmux("paste-buffer", "-p");
    return this;
  }

  /** Makes the window smaller or larger. */
  Pane resize(int columns, int rows) {
    tmux("resize-window", "-x", "" + columns, "-y", "" + rows);
    return this;
  }

  /** Waits until a text stands on the screen, and returns the screen. */
  String await(String text) {
    long end = System.nanoTime() + PATIENCE_NANOS;
    String screen = screen();
    while (!screen.contains(text)) {
      if (System.nanoTime() > end) {
        throw new AssertionError("no «" + text + "» on the screen:\n" + screen);
      }
      pause();
      screen = screen();
    }
    return screen;
  }

  String screen() {
    return tmux("capture-pane", "-p", "-S", "-200")
        .lines()
        .filter(l -> !l.isBlank())
        .collect(Collectors.joining("\n"));
  }

  /** Returns the process of the console. */
  ProcessHandle kernel() {
    long pid = Long.parseLong(tmux("list-panes", "-F", "#{pane_pid}").strip());
    return ProcessHandle.of(pid).orElseThrow();
  }

  /** Returns the process of its engine. */
  ProcessHandle engine() {
    return kernel().children().findFirst().orElseThrow();
  }

  /** Kills the console as if the machine went down; its engine ends with it. */
  void kill() {
    ProcessHandle kernel = kernel();
    kernel.destroyForcibly();
    kernel.onExit().join();
  }

  /** Leaves the console and waits until it has ended. */
  void leave() {
    ProcessHandle kernel = kernel();
    press("C-d");
    kernel.onExit().join();
  }

  private static void pause() {
    try {
      Thread.sleep(50);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new AssertionError(e);
    }
  }

  private String tmux(String... arguments) {
    List<String> command = new ArrayList<>(List.of("tmux", "-L", socket, "-f", "/dev/null"));
    command.addAll(List.of(arguments));
    try {
      Process process =
          new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).start();
      String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
      process.waitFor();
      return out;
    } catch (IOException e) {
      throw new AssertionError(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new AssertionError(e);
    }
  }

  @Override
  public void close() {
    tmux("kill-server");
  }
}
