package connate.picture;

import java.awt.geom.Path2D;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the path data that our figures hold: straight moves and lines, closed or open. */
final class SvgPath {

  private static final Pattern PART = Pattern.compile("[MmLlHhVvZz]|-?(?:\\d+\\.?\\d*|\\.\\d+)");

  private final Path2D.Double path = new Path2D.Double(Path2D.WIND_NON_ZERO);
  private final Matcher parts;
  private double x;
  private double y;
  private double startX;
  private double startY;

  private SvgPath(String data) {
    parts = PART.matcher(data);
  }

  /** Returns the shape that path data describe. */
  static Path2D parse(String data) {
    return new SvgPath(data).read();
  }

  private Path2D read() {
    char command = 'M';
    while (parts.find()) {
      String part = parts.group();
      if (!Character.isLetter(part.charAt(0))) {
        apply(command, Double.parseDouble(part));
        command = command == 'M' ? 'L' : command == 'm' ? 'l' : command;
      } else if (part.equals("z") || part.equals("Z")) {
        path.closePath();
        x = startX;
        y = startY;
      } else {
        command = part.charAt(0);
      }
    }
    return path;
  }

  private void apply(char command, double first) {
    boolean relative = Character.isLowerCase(command);
    switch (Character.toUpperCase(command)) {
      case 'H' -> x = first + (relative ? x : 0);
      case 'V' -> y = first + (relative ? y : 0);
      default -> {
        double second = parts.find() ? Double.parseDouble(parts.group()) : 0;
        x = first + (relative ? x : 0);
        y = second + (relative ? y : 0);
      }
    }
    if (Character.toUpperCase(command) == 'M') {
      path.moveTo(x, y);
      startX = x;
      startY = y;
    } else {
      path.lineTo(x, y);
    }
  }
}
