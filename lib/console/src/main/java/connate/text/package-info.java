/**
 * How results read in a terminal: {@link connate.text.ItemText} sets values, tables and figures as
 * lines that fit its width, {@link connate.text.Ink} decides about colour.
 */
package connate.text;
