package connate.grains;

/** How a cumulative curve runs between two limits. */
public enum Between {

  /** Straight over the logarithm of size, as a curve is drawn on paper: the default. */
  LOGARITHMIC("logarithmic between the limits"),

  /** Straight over size. */
  LINEAR("linear between the limits");

  private final String words;

  Between(String words) {
    this.words = words;
  }

  /** Returns the share of the way from a to b at which x stands. */
  double share(double a, double b, double x) {
    return this == LINEAR ? (x - a) / (b - a) : StrictMath.log(x / a) / StrictMath.log(b / a);
  }

  /** Returns the size at a share of the way from a to b. */
  double at(double a, double b, double share) {
    return this == LINEAR
        ? a + share * (b - a)
        : StrictMath.exp(StrictMath.log(a) + share * StrictMath.log(b / a));
  }

  @Override
  public String toString() {
    return words;
  }
}
