package connate.check.wrong.two;

/** Breaks two rules on purpose: another package has this name too, and so has Java. */
public final class Scanner {

  private Scanner() {}
}
