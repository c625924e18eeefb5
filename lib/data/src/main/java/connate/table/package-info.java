/**
 * What does a table of the field hold? Columns of numbers with units, columns of words, and where
 * each row came from. Read {@link connate.table.Table} first; {@link connate.table.Missing} says
 * what counts as no value. {@code TableReader} is the way from a file to a table, step by step:
 * bytes to cells ({@code CsvSheet}, {@code XlsxSheet}), cells to a header ({@code Header}), columns
 * to numbers or words ({@code ColumnReader}). What is ambiguous ends in a question with its place,
 * never in a guess; what needs a look, in a caution.
 */
package connate.table;
