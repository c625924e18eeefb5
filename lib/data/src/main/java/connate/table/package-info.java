/**
 * What a table of the field holds: columns of numbers with units, columns of words, and where each
 * row came from. Read {@link connate.table.Table} first; {@link connate.table.TableReader} is the
 * way from a file to a table, step by step: text to cells, cells to a header, columns to numbers.
 */
package connate.table;
