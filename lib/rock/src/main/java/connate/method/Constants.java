package connate.method;

/** Whether the constants of a method were read in a source. */
public enum Constants {

  /** Somebody read them in the paper, or in an independent text that quotes it. */
  CHECKED("constants read in a source"),

  /** Nobody has read them in the paper yet. */
  FROM_MEMORY("constants from memory"),

  /** The method has none but those of mathematics and physics. */
  EXACT("no constants but those of mathematics and physics");

  private final String words;

  Constants(String words) {
    this.words = words;
  }

  /** Returns the state in words. */
  @Override
  public String toString() {
    return words;
  }
}
