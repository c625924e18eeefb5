package connate.compile;

/**
 * A variable that a command declares, or the value of an expression.
 *
 * @param name the name; for an expression, the variable that it assigns, else empty
 * @param type its type, as it can be written down
 * @param typeFrom where its type stands in the workbook, where the compiler does not know it; else
 *     -1
 * @param isVoid whether it is a call that gives no value
 * @param broken whether the compiler could find no type
 * @param from where the initial value begins in the workbook, -1 where there is none
 * @param to where it ends
 * @param braces whether the initial value is an array in bare braces
 */
record Variable(
    String name,
    TypeName type,
    int typeFrom,
    boolean isVoid,
    boolean broken,
    int from,
    int to,
    boolean braces) {

  boolean hasValue() {
    return from >= 0;
  }
}
