package connate.series;

/** Anything that shows best as a small table. */
public interface Listed {

  /** Returns the table. */
  Listing listing();
}
