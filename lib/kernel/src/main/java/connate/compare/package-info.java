/**
 * What two logs have in common and where they differ: {@link connate.compare.Comparison} sets their
 * inputs, assumptions, commands and results side by side; {@link connate.compare.Verification} says
 * whether a log's results come out again.
 */
package connate.compare;
