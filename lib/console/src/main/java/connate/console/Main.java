package connate.console;

import connate.record.Versions;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import picocli.CommandLine;

/** Finds the command and runs it. Each command is loaded only when it is the one. */
public final class Main {

  private static final Map<String, Supplier<Callable<Integer>>> COMMANDS = commands();

  private Main() {}

  private static Map<String, Supplier<Callable<Integer>>> commands() {
    Map<String, Supplier<Callable<Integer>>> commands = new LinkedHashMap<>();
    commands.put("replay", ReplayCommand::new);
    commands.put("compare", CompareCommand::new);
    commands.put("verify", VerifyCommand::new);
    commands.put("unpack", UnpackCommand::new);
    commands.put("check", CheckCommand::new);
    commands.put("methods", MethodsCommand::new);
    return commands;
  }

  /** Runs the command that the arguments name and ends with its exit status. */
  public static void main(String... arguments) {
    System.exit(run(arguments));
  }

  /** Runs the command that the arguments name and returns its exit status. */
  public static int run(String... arguments) {
    if (arguments.length == 0 || ConsoleArguments.isFor(arguments[0])) {
      return Console.run(arguments);
    }
    String first = arguments[0];
    if (first.equals("--help") || first.equals("-h")) {
      System.out.println(Help.text());
      return Exit.DONE;
    }
    if (first.equals("--version")) {
      System.out.println("connate " + Versions.connate());
      return Exit.DONE;
    }
    Supplier<Callable<Integer>> command = COMMANDS.get(first);
    if (command == null) {
      System.err.println(
          "connate: no command «" + first + "»" + Help.near(first, COMMANDS.keySet()));
      System.err.println("connate --help lists them");
      return Exit.USAGE;
    }
    boolean debug = List.of(arguments).contains("--debug");
    String[] rest =
        Arrays.stream(arguments).skip(1).filter(a -> !a.equals("--debug")).toArray(String[]::new);
    CommandLine line = new CommandLine(command.get());
    line.setExecutionExceptionHandler((e, l, parsed) -> Failures.tell(e, debug));
    return line.execute(rest);
  }
}
