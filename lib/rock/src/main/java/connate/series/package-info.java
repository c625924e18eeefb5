/**
 * How many values stand together: a {@link connate.series.Series} is a column of numbers with a
 * name and a unit, a {@link connate.series.Labels} a column of words; an {@link
 * connate.series.Estimate} is a value with its range, a {@link connate.series.Listing} a small
 * table of results. The science knows no other table.
 */
package connate.series;
