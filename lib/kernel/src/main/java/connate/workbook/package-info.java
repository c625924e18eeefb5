/**
 * What does a workbook say? {@link connate.workbook.Workbook} holds the text, its steps and their
 * commands; read it first. Splitting looks at words and brackets only: whether a command makes
 * sense is the compiler's to say.
 */
package connate.workbook;
