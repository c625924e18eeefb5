package connate.engine;

import connate.fault.DataException;
import connate.protocol.Event;
import java.util.ArrayList;
import java.util.List;

/** Makes of an exception what the reader of a log needs to know. */
final class Mishap {

  private static final int MOST_FRAMES = 30;
  private static final int LONGEST = 20_000;

  private final UserClasses classes;
  private final String workbook;

  Mishap(UserClasses classes, String workbook) {
    this.classes = classes;
    this.workbook = workbook;
  }

  Event.Failed of(Throwable thrown) {
    if (thrown instanceof Stopped || Checkpoint.isWanted()) {
      return new Event.Failed("stopped", "", "stopped", List.of(), false);
    }
    Throwable told = thrown;
    if (thrown instanceof ExceptionInInitializerError && thrown.getCause() != null) {
      told = thrown.getCause();
    }
    if (told instanceof Refused) {
      return new Event.Failed("refused", "", told.getMessage(), frames(told), false);
    }
    DataException data = dataException(told);
    String kind = told instanceof OutOfMemoryError ? "memory" : "exception";
    String type = (data == null ? told : data).getClass().getName();
    String message = data == null ? message(told) : data.getMessage();
    return new Event.Failed(kind, shorter(type), cut(message), frames(told), data != null);
  }

  private static DataException dataException(Throwable thrown) {
    Throwable at = thrown;
    for (int depth = 0; at != null && depth < 20; depth++) {
      if (at instanceof DataException data) {
        return data;
      }
      at = at.getCause();
    }
    return null;
  }

  private static String message(Throwable thrown) {
    if (thrown instanceof OutOfMemoryError) {
      return "out of memory: " + thrown.getMessage();
    }
    if (thrown instanceof StackOverflowError) {
      return "a method calls itself without end: the stack is full";
    }
    String own = text(thrown);
    Throwable cause = thrown.getCause();
    String deeper = cause == null || cause == thrown ? "" : text(cause);
    boolean said = deeper.isEmpty() || own.contains(deeper);
    return said ? own : own.isEmpty() ? deeper : own + " (because: " + deeper + ")";
  }

  private static String text(Throwable thrown) {
    try {
      String message = thrown.getMessage();
      return message == null ? "" : message;
    } catch (RuntimeException e) {
      return "";
    }
  }

  private static String cut(String message) {
    return message.length() <= LONGEST ? message : message.substring(0, LONGEST) + "…";
  }

  private String shorter(String type) {
    return classes.shortName(type).orElse(type);
  }

  private List<Event.Frame> frames(Throwable thrown) {
    StackTraceElement[] trace = thrown.getStackTrace();
    int last = trace.length - 1;
    while (last >= 0 && !classes.isUsers(trace[last].getClassName())) {
      last--;
    }
    List<Event.Frame> frames = new ArrayList<>();
    for (int at = 0; at <= last && frames.size() < MOST_FRAMES; at++) {
      boolean again = at > 0 && trace[at].equals(trace[at - 1]);
      if (!again && concernsReader(trace[at].getClassName())) {
        frames.add(frame(trace[at]));
      }
    }
    return frames;
  }

  private boolean concernsReader(String type) {
    return classes.isUsers(type)
        || type.startsWith("connate.") && !type.startsWith("connate.engine.");
  }

  private Event.Frame frame(StackTraceElement element) {
    int line = Math.max(0, element.getLineNumber());
    String type = element.getClassName();
    if (!classes.isUsers(type)) {
      String file = element.getFileName() == null ? "" : element.getFileName();
      return new Event.Frame(type + "." + element.getMethodName(), file, line);
    }
    if (UserClasses.isShells(type)) {
      // the shell alone knows which line of which command this is
      return new Event.Frame(type + "." + element.getMethodName(), "", line);
    }
    String owner = classes.shortName(type).orElse("");
    String method = plain(element.getMethodName());
    String dot = owner.isEmpty() || method.isEmpty() ? "" : ".";
    return new Event.Frame(owner + dot + method, workbook, line);
  }

  private static String plain(String method) {
    if (method.startsWith("lambda$")) {
      return "lambda";
    }
    return method.startsWith("$") ? "" : method;
  }
}
