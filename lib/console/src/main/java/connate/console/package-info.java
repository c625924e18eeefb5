/**
 * The command line: {@link connate.console.Main} finds the command, one class each carries it out.
 * Results go to standard output; progress, cautions and errors to standard error.
 */
package connate.console;
