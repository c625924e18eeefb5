package connate.guard;

/**
 * What the guard does not allow.
 *
 * @param what the class or member, as one writes it
 * @param line the line of the source file, 0 where it is not known
 */
public record Refusal(String what, int line) {

  /** The way out. */
  public static final String HELP =
      "if you trust who wrote this workbook, run it with --trust; the log will say so";

  /** Returns the refusal in words. */
  public String message() {
    return "«" + what + "» is not allowed in a guarded workbook";
  }
}
