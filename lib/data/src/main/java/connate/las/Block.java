package connate.las;

/**
 * The bytes of a data section and what the header says of them.
 *
 * @param from the offset of the first byte below the title
 * @param to the offset behind the last byte
 * @param columns the number of curves
 * @param nullValue the declared null, NaN where there is none
 */
record Block(int from, int to, int columns, double nullValue) {}
