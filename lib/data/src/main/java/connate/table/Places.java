package connate.table;

/** Where a cell begins in its line. */
final class Places {

  private Places() {}

  /** Returns where the cell of a column begins, counted from 0, blanks and a quote left aside. */
  static int startOf(String line, int column, char separator) {
    int at = 0;
    boolean quoted = false;
    for (int found = 0; found < column && at < line.length(); at++) {
      char c = line.charAt(at);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == separator && !quoted) {
        found++;
      }
    }
    while (at < line.length() && line.charAt(at) == ' ') {
      at++;
    }
    return at < line.length() && line.charAt(at) == '"' ? at + 1 : at;
  }
}
