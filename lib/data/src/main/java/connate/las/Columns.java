package connate.las;

import java.util.Arrays;

/** The numbers of a data section, column by column, growing row by row. */
final class Columns {

  final double[][] cells;
  private final String[][] words;
  private int[] offsets;
  private int rows;
  private int room;

  /**
   * Makes room.
   *
   * @param columns the number of columns
   * @param room the number of rows expected
   */
  Columns(int columns, int room) {
    this.room = Math.max(16, room);
    this.cells = new double[columns][this.room];
    this.words = new String[columns][];
    this.offsets = new int[this.room];
  }

  /** Returns the number of columns. */
  int count() {
    return cells.length;
  }

  /** Returns the number of rows that are complete. */
  int rows() {
    return rows;
  }

  /** Returns the index of the row to be filled, with room for it. */
  int nextRow() {
    if (rows == room) {
      room += room / 2;
      for (int c = 0; c < cells.length; c++) {
        cells[c] = Arrays.copyOf(cells[c], room);
        if (words[c] != null) {
          words[c] = Arrays.copyOf(words[c], room);
        }
      }
      offsets = Arrays.copyOf(offsets, room);
    }
    return rows;
  }

  /** Takes the row just filled, which starts at an offset of the file. */
  void accept(int offset) {
    offsets[rows++] = offset;
  }

  /** Returns the offset of a row in the file. */
  int offset(int row) {
    return offsets[row];
  }

  /** Makes a column hold words. */
  void makeText(int column) {
    words[column] = new String[room];
  }

  /** Tells whether a column holds words. */
  boolean isText(int column) {
    return words[column] != null;
  }

  /** Sets a word of the row to be filled; call {@link #nextRow} before. */
  void setWord(int column, String word) {
    words[column][rows] = word;
  }

  /** Returns the words of a column, null where it holds numbers. */
  String[] words(int column) {
    return words[column];
  }

  /** Leaves a row out. */
  void remove(int row) {
    int behind = rows - row - 1;
    for (int c = 0; c < cells.length; c++) {
      System.arraycopy(cells[c], row + 1, cells[c], row, behind);
      if (words[c] != null) {
        System.arraycopy(words[c], row + 1, words[c], row, behind);
      }
    }
    System.arraycopy(offsets, row + 1, offsets, row, behind);
    rows--;
  }
}
