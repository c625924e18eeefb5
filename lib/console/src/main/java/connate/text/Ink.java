package connate.text;

import java.util.Map;

/** Colour and weight in a terminal, or none where the user or the terminal wants none. */
public final class Ink {

  private final boolean on;

  private Ink(boolean on) {
    this.on = on;
  }

  /** Returns plain text. */
  public static Ink none() {
    return new Ink(false);
  }

  /**
   * Decides from the environment: {@code NO_COLOR} (not empty), {@code TERM=dumb} and output that
   * is no terminal each rule colour out.
   */
  public static Ink of(Map<String, String> environment, boolean terminal, boolean wanted) {
    String noColor = environment.getOrDefault("NO_COLOR", "");
    boolean dumb = "dumb".equals(environment.get("TERM"));
    return new Ink(wanted && terminal && noColor.isEmpty() && !dumb);
  }

  /** Returns whether anything is coloured. */
  public boolean isOn() {
    return on;
  }

  /** Sets a name or a heading. */
  public String strong(String text) {
    return wrap("1", text);
  }

  /** Sets what matters less: units, notes, paths. */
  public String faint(String text) {
    return wrap("2", text);
  }

  /** Sets a caution. */
  public String caution(String text) {
    return wrap("33", text);
  }

  /** Sets an error. */
  public String error(String text) {
    return wrap("31", text);
  }

  private String wrap(String code, String text) {
    return on && !text.isEmpty() ? "\u001b[" + code + "m" + text + "\u001b[0m" : text;
  }
}
