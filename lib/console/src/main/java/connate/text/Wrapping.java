package connate.text;

import java.util.ArrayList;
import java.util.List;

/** Breaks long lines between words. */
public final class Wrapping {

  private Wrapping() {}

  /** Returns a line as lines no longer than a width; what follows is indented like the first. */
  public static List<String> of(String line, int width) {
    List<String> out = new ArrayList<>();
    String rest = line;
    String indent = " ".repeat(line.length() - line.stripLeading().length());
    while (rest.length() > width) {
      int gap = rest.lastIndexOf(' ', width);
      if (gap <= indent.length()) {
        break;
      }
      out.add(rest.substring(0, gap).stripTrailing());
      rest = indent + rest.substring(gap + 1).stripLeading();
    }
    out.add(rest);
    return out;
  }
}
