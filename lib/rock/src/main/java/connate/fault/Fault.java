package connate.fault;

import java.util.Objects;

/**
 * One thing that is wrong in an input, with its place.
 *
 * @param file the file as the user named it
 * @param line the line, counted from 1; 0 where the whole file is meant
 * @param column the column in characters, counted from 1; 0 where the whole line is meant
 * @param length the number of characters that are marked, at least 1
 * @param code a short stable code such as {@code T03}, explained by {@code help("T03")}
 * @param message what was found and what was expected
 * @param text the line's text, empty where there is none to show
 * @param help one way out, empty where there is none
 */
public record Fault(
    String file,
    int line,
    int column,
    int length,
    String code,
    String message,
    String text,
    String help) {

  private static final int WINDOW = 100;

  /** Checks the places. */
  public Fault {
    Objects.requireNonNull(file, "file");
    if (line < 0 || column < 0 || length < 1) {
      throw new IllegalArgumentException("a place is counted from 1: " + line + ":" + column);
    }
  }

  /** Returns a fault of a whole file. */
  public static Fault ofFile(String file, String code, String message, String help) {
    return new Fault(file, 0, 0, 1, code, message, "", help);
  }

  /** Returns the place in the form {@code file:line:column}. */
  public String place() {
    if (line == 0) {
      return file;
    }
    return column == 0 ? file + ":" + line : file + ":" + line + ":" + column;
  }

  /** Returns the fault as it is printed: place, message, the line with a mark, the way out. */
  @Override
  public String toString() {
    StringBuilder out = new StringBuilder();
    out.append(place()).append(": error[").append(code).append("]: ").append(message);
    if (line > 0 && !text.isEmpty()) {
      appendWindow(out);
    }
    if (!help.isEmpty()) {
      out.append("\nhelp: ").append(help);
    }
    return out.toString();
  }

  private void appendWindow(StringBuilder out) {
    int start = Math.max(0, Math.min(column - 1 - WINDOW / 2, text.length() - WINDOW));
    int end = Math.min(text.length(), start + WINDOW);
    String number = Integer.toString(line);
    String shown = text.substring(start, end).replace('\t', ' ');
    out.append("\n  ").append(number).append(" | ").append(start > 0 ? "…" : "").append(shown);
    if (end < text.length()) {
      out.append('…');
    }
    if (column > 0 && column - 1 <= text.length()) {
      int indent = column - 1 - start + (start > 0 ? 1 : 0);
      int marks = Math.max(1, Math.min(length, end - column + 1));
      out.append("\n  ").append(" ".repeat(number.length())).append(" | ");
      out.append(" ".repeat(Math.max(0, indent))).append("^".repeat(marks));
    }
  }
}
