package connate.workbook;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

/** A workbook as it stands in its file, split into steps and commands. Reading it runs nothing. */
public final class Workbook {

  private final String name;
  private final Path folder;
  private final String text;
  private final List<String> lines;
  private final int[] starts;
  private final List<Step> steps;
  private final List<Command> commands;

  private Workbook(String name, Path folder, String text) {
    this.name = name;
    this.folder = folder;
    this.text = text;
    this.lines = List.of(text.split("\n", -1));
    this.starts = new int[lines.size()];
    for (int line = 1; line < starts.length; line++) {
      starts[line] = starts[line - 1] + lines.get(line - 1).length() + 1;
    }
    this.steps = Splitting.of(text);
    this.commands = steps.stream().flatMap(s -> s.commands().stream()).toList();
  }

  /**
   * Reads a workbook file, which is UTF-8 with any line ending.
   *
   * @throws IOException if the file cannot be read or is no UTF-8
   */
  public static Workbook parse(Path file) throws IOException {
    Path whole = file.toAbsolutePath().normalize();
    return new Workbook(
        whole.getFileName().toString(), whole.getParent(), plain(Files.readString(whole)));
  }

  /**
   * Takes a workbook from its text.
   *
   * @param name the file name that messages show
   * @param folder the folder in which its data lie
   * @param text the text, with any line ending
   */
  public static Workbook parse(String name, Path folder, String text) {
    return new Workbook(name, folder.toAbsolutePath().normalize(), plain(text));
  }

  /** Returns whether a text ends in the middle of a command, so that more must follow. */
  public static boolean isOpen(String text) {
    String plain = plain(text);
    return hasOpenBlock(plain) || Splitting.isOpen(plain);
  }

  /** Returns whether a text block begins that no three quotes close. */
  private static boolean hasOpenBlock(String text) {
    List<Token> tokens = Lexer.tokens(text);
    String last = tokens.isEmpty() ? "" : tokens.get(tokens.size() - 1).text();
    boolean closed = last.length() >= 6 && last.endsWith("\"\"\"");
    boolean comment = last.startsWith("/*") && !last.endsWith("*/");
    return comment || last.startsWith("\"\"\"") && !closed;
  }

  private static String plain(String raw) {
    String text = raw.startsWith("\uFEFF") ? raw.substring(1) : raw;
    return text.indexOf('\r') < 0 ? text : text.replace("\r\n", "\n").replace('\r', '\n');
  }

  /** Returns the file's name. */
  public String name() {
    return name;
  }

  /** Returns the folder against which the paths of its commands are read. */
  public Path folder() {
    return folder;
  }

  /** Returns the text without byte order mark, lines parted by {@code \n}. */
  public String text() {
    return text;
  }

  /** Returns the lines without their ends. */
  public List<String> lines() {
    return lines;
  }

  /** Returns the steps. */
  public List<Step> steps() {
    return steps;
  }

  /** Returns the commands of all steps. */
  public List<Command> commands() {
    return commands;
  }

  /** Returns the line, counted from 1, of a place in the text. */
  public int lineAt(int offset) {
    int found = Arrays.binarySearch(starts, offset);
    return found >= 0 ? found + 1 : -found - 1;
  }

  /** Returns where a line, counted from 1, begins in the text. */
  public int startOf(int line) {
    return starts[line - 1];
  }

  /** Returns the column, counted from 1, of a place in the text. */
  public int columnAt(int offset) {
    return offset - text.lastIndexOf('\n', offset - 1);
  }
}
