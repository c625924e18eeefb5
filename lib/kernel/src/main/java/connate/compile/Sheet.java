package connate.compile;

import connate.workbook.Workbook;
import java.util.ArrayList;
import java.util.List;

/**
 * A source file made of parts of a workbook and of words between them. It knows for each place
 * where that stands in the workbook, and keeps the parts on their lines when asked to.
 */
final class Sheet {

  private record Part(int start, int length, int offset) {}

  private final Workbook workbook;
  private final StringBuilder text = new StringBuilder();
  private final List<Part> parts = new ArrayList<>();
  private int line = 1;

  Sheet(Workbook workbook) {
    this.workbook = workbook;
  }

  /** Adds words of our own, without line ends. */
  Sheet add(String words) {
    text.append(words);
    return this;
  }

  /** Adds line ends until the line is reached, where it is not passed already. */
  Sheet toLineOf(int offset) {
    int wanted = workbook.lineAt(offset);
    while (line < wanted) {
      text.append('\n');
      line++;
    }
    return this;
  }

  /** Adds a part of the workbook as it stands there. */
  Sheet copy(int from, int to) {
    return copy(from, workbook.text().substring(from, to));
  }

  /** Adds a part of the workbook of which some letters were replaced. */
  Sheet copy(int from, String changed) {
    parts.add(new Part(text.length(), changed.length(), from));
    text.append(changed);
    for (int at = changed.indexOf('\n'); at >= 0; at = changed.indexOf('\n', at + 1)) {
      line++;
    }
    return this;
  }

  /** Returns how long the sheet is so far. */
  int length() {
    return text.length();
  }

  /**
   * Returns the place in the workbook of a place in the sheet: of the words between two parts, the
   * end of the first; -1 before all parts.
   */
  int offset(long place) {
    int low = 0;
    int high = parts.size() - 1;
    while (low <= high) {
      int middle = (low + high) >>> 1;
      if (parts.get(middle).start() <= place) {
        low = middle + 1;
      } else {
        high = middle - 1;
      }
    }
    if (high < 0) {
      return -1;
    }
    Part part = parts.get(high);
    return part.offset() + (int) Math.min(place - part.start(), part.length());
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
