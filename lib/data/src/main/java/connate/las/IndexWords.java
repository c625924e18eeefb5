package connate.las;

/**
 * What the well section says of the index.
 *
 * @param start STRT, NaN where it is missing
 * @param stop STOP, NaN where it is missing
 * @param step STEP, NaN where it is missing
 * @param startUnit the unit of STRT
 * @param lines the lines of STRT, STOP and STEP, 0 where one is missing
 * @param nullValue the declared null, NaN where there is none
 */
record IndexWords(
    double start, double stop, double step, String startUnit, int[] lines, double nullValue) {

  /** Returns the line of STRT (0), STOP (1) or STEP (2). */
  int line(int which) {
    return lines[which];
  }
}
