/**
 * How does a whole workbook become classes in one go? Two passes of the JDK's compiler: the first
 * learns the types of all variables and what each command reads and writes, the second makes one
 * method of each command and a static field of each variable.
 *
 * <p>Read {@link connate.compile.WholeCompiler} first, then {@link connate.compile.Compilation},
 * what it gives.
 */
package connate.compile;
