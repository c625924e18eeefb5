package connate.compile;

import java.util.Set;

/**
 * How a compiled command is run.
 *
 * @param command the number of the command
 * @param method the method that runs it, empty for a declaration, which needs no running
 * @param variable the variable that it declares or assigns, empty for none
 * @param type the simple name of its value's type, empty for a statement
 * @param reads the variables of the workbook that it reads, itself or through its methods and types
 * @param writes the variables of the workbook that it sets
 */
public record Entry(
    int command,
    String method,
    String variable,
    String type,
    Set<String> reads,
    Set<String> writes) {}
