package connate.run;

import connate.protocol.Event;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Finds for the stack frames of the JDK's shell the lines of the workbook. */
final class ShellFrames {

  private final String workbook;
  private final Map<String, Integer> lines = new HashMap<>();

  ShellFrames(String workbook) {
    this.workbook = workbook;
  }

  /** Notes on which line a snippet begins. */
  void begins(String snippet, int line) {
    lines.put("#" + snippet, line);
  }

  /** Returns frames as the shell takes them. */
  static StackTraceElement[] raw(List<Event.Frame> frames) {
    return frames.stream()
        .map(
            f -> {
              int dot = f.where().lastIndexOf('.');
              String type = f.where().substring(0, Math.max(0, dot));
              String method = f.where().substring(dot + 1);
              return new StackTraceElement(type, method, f.file(), f.line());
            })
        .toArray(StackTraceElement[]::new);
  }

  /** Returns the failure with the frames as the shell understood them. */
  Event.Failed told(Event.Failed failed, StackTraceElement[] elements) {
    List<Event.Frame> frames = new ArrayList<>();
    for (StackTraceElement element : elements) {
      frames.add(frame(element));
    }
    return new Event.Failed(
        failed.kind(), failed.type(), failed.message(), frames, failed.badInput());
  }

  private Event.Frame frame(StackTraceElement element) {
    String file = element.getFileName() == null ? "" : element.getFileName();
    Integer first = lines.get(file);
    String owner = element.getClassName();
    if (first == null) {
      return new Event.Frame(owner + "." + element.getMethodName(), file, element.getLineNumber());
    }
    String method = element.getMethodName();
    String plain = method.startsWith("lambda$") ? "lambda" : method;
    String dot = owner.isEmpty() || plain.isEmpty() ? "" : ".";
    return new Event.Frame(
        owner.replace('$', '.') + dot + plain, workbook, first + element.getLineNumber() - 1);
  }
}
