package connate.chance;

/** A law of chance for one number, given by its quantiles. */
public interface Distribution {

  /**
   * Returns the value below which the given part lies.
   *
   * @param probability above 0 and below 1
   */
  double quantile(double probability);

  /** Returns the mean. */
  double mean();

  /** Returns the law in words, such as {@code normal, mean 0.35, standard deviation 0.1}. */
  String words();
}
