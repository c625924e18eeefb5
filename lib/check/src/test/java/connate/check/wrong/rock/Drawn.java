package connate.check.wrong.rock;

import java.awt.Point;

/** Breaks a rule on purpose: the science draws. */
public final class Drawn {

  private Drawn() {}

  static Point origin() {
    return new Point();
  }
}
