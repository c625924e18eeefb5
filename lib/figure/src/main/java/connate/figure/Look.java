package connate.figure;

import connate.figure.svg.Mark;
import connate.figure.svg.Pen;

/**
 * Colour, mark and dash of one thing among several. No two of the first thirty are alike.
 *
 * @param colour the colour
 * @param mark the shape of its points
 * @param dash the dashes of its line
 * @param letter its character in a sketch
 */
record Look(String colour, Mark mark, String dash, char letter) {

  private static final Mark[] MARKS = {
    Mark.CIRCLE, Mark.TRIANGLE, Mark.SQUARE, Mark.DIAMOND, Mark.CROSS, Mark.PLUS
  };
  private static final String[] DASHES = {"", "7 3", "2 2.5", "9 3 2 3", "12 3", "4 2 1 2"};
  private static final String LETTERS = "oxsd*+nvae";

  static Look of(int index) {
    return new Look(
        Theme.LINES[index % Theme.LINES.length],
        MARKS[index % MARKS.length],
        DASHES[index % DASHES.length],
        LETTERS.charAt(index % LETTERS.length()));
  }

  Pen pen(double width) {
    return Pen.line(colour, width).dashed(dash);
  }

  /** Returns the same with a whole line. */
  Look whole() {
    return new Look(colour, mark, "", letter);
  }

  /** Returns the same with another character in a sketch. */
  Look letter(char other) {
    return new Look(colour, mark, dash, other);
  }

  /** Returns the same with round points. */
  Look round() {
    return new Look(colour, Mark.CIRCLE, dash, letter);
  }
}
